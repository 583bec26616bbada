package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.Staged;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Keys set anew from a command line. */
class CommandLineValuesTest {
  private static final String WHEEL = Found.file("wheel.yaml");

  private static Staged<SpecFile> read(String... settings) {
    return readIn(WHEEL, settings);
  }

  private static Staged<SpecFile> readIn(String text, String... settings) {
    Map<String, String> m = new LinkedHashMap<>();
    for (String s : settings) {
      int at = s.indexOf('=');
      m.put(s.substring(0, at), s.substring(at + 1));
    }
    return SpecReader.read("wheel.yaml", Found.utf8(text), m);
  }

  /** The same as the file with the same words in it. */
  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "coil.track=0.25mm, track: 0.2 mm, track: 0.25 mm",
    "coil.track=0.25 mm, track: 0.2 mm, track: 0.25 mm",
    "coil.track=250um, track: 0.2 mm, track: 250 um",
    "coil.track=2.5e-1mm, track: 0.2 mm, track: 0.25 mm",
    "winding.coils=12, coils: 9, coils: 12",
    "coil.turns=7, turns: fill, turns: 7",
    "winding.connection=delta, connection: star, connection: delta",
    "duty.speed=300rad/s, speed: 3000 rpm, speed: 300 rad/s",
    "board.copper=35um, copper: 1 oz, copper: 35 um",
    "board.copper=2oz, copper: 1 oz, copper: 2 oz",
    "board.holes.circle=77mm, circle: 78 mm, circle: 77 mm",
    "rotor.magnet.remanence=1200mT, remanence: 1.3 T, remanence: 1200 mT",
    "rotor.magnet.density=7400, '    limit: 80 C', '    limit: 80 C\n    density: 7400'",
    "rotor.counter-plate.gap=1mm, '  iron: none', '  iron: none\n  counter-plate: {gap: 1 mm}'",
    "rim.track=0.5mm, 'fab: standard', 'rim: {track: 0.5 mm}\nfab: standard'",
    "revision=2A, revision: B, revision: 2A",
    "title=1 mm, title: Test wheel, title: 1 mm",
    "fab=fine, fab: standard, fab: fine"
  })
  void aValue_standsForTheFilesOwn(String setting, String piece, String by) {
    Staged<SpecFile> with = read(setting);
    assertEquals("", DiagnosticText.text(with.diagnostics()));
    Staged<SpecFile> edited = readIn(Found.with(WHEEL, piece, by));
    assertEquals(edited.value().orElseThrow().spec(), with.value().orElseThrow().spec());
  }

  @Test
  void aListItem_isCountedFromNought() {
    String text = Found.with(WHEEL, "bore: 14 mm", "stackup: [0.2 mm, 0.66 mm, 0.2 mm]");
    Spec spec = readIn(text, "board.stackup[1]=0.7mm").value().orElseThrow().spec();
    assertEquals(List.of(0.2, 0.7, 0.2), spec.board().stackupMm());
    refused(
        readIn(text, "board.stackup[3]=0.7mm"),
        "board.stackup[3]=0.7mm on the command line:"
            + " error[unknown-key]: board.stackup[3]: the file's list has 3 values, counted from [0]");
    refused(
        read("board.stackup[0]=1mm"),
        "board.stackup[0]=1mm on the command line:"
            + " error[unknown-key]: board.stackup[0]: the file has no such list");
  }

  @Test
  void aFault_namesTheKeyAndTheCommandLine() {
    refused(
        read("coil.track=0mm"),
        "coil.track=0mm on the command line: error[out-of-range]:"
            + " coil.track: '0mm' is out of range; allowed is 0.02 mm to 20 mm");
    refused(
        read("coil.track=0.2"),
        "coil.track=0.2 on the command line: error[missing-unit]:"
            + " coil.track: the unit is missing; write for example `0.2 mm` (mm, cm, m, um, \u00b5m,"
            + " mil or in)");
    refused(
        read("coil.space="),
        "coil.space= on the command line: error[empty-value]: coil.space:"
            + " this key has no value");
    refused(
        read("coil=3"),
        "coil=3 on the command line: error[wrong-shape]: coil: a group of keys"
            + " belongs here, not one value");
    refused(
        read("coil.taper=yes"),
        "coil.taper=yes on the command line: error[unknown-word]:"
            + " coil.taper: 'yes' was found; allowed is off or on");
    String deep = "a.b.c.d.e.f.g.h.i.j.k.l.m.n.o.p.q=1";
    refused(
        read(deep),
        deep + " on the command line: error[unknown-key]: no key lies 17 levels" + " deep");
  }

  @Test
  void anUnknownKey_hasTheNearestBesideIt() {
    Staged<SpecFile> read = read("coil.trak=0.2mm");
    Diagnostic d = read.diagnostics().get(0);
    assertEquals("coil.trak=0.2mm on the command line", d.where().file());
    assertEquals("coil.trak", d.key());
    assertEquals(List.of("did you mean 'track'?"), d.hints());
  }

  /** The file's own value is where it clashes, but the command line brought the clash about. */
  @Test
  void aClashInTheFile_namesTheCommandLineToo() {
    Staged<SpecFile> read = read("coil.outer-radius=10mm");
    assertEquals(List.of("23:17 radii coil.inner-radius"), Found.in(read));
    assertEquals(
        List.of("the command line sets coil.outer-radius=10mm"), read.diagnostics().get(0).hints());
    String wrong = Found.with(WHEEL, "coils: 9", "coils: 10");
    Staged<SpecFile> both = readIn(wrong, "coil.track=0.3mm");
    assertEquals(List.of("19:10 coil-count winding.coils"), Found.in(both));
    assertEquals(List.of(), both.diagnostics().get(0).hints());
  }

  @Test
  void aKeyLeftOut_isMissedInTheFile() {
    String text = Found.with(WHEEL, "  space: 0.2 mm\n", "");
    assertEquals(
        List.of("21:1 missing-key coil.space"), Found.in(readIn(text, "coil.track=0.3mm")));
  }

  /** Later stages point at these keys, too. */
  @Test
  void places_areKept() {
    Positions at = read("coil.track=0.3mm").value().orElseThrow().positions();
    assertEquals("coil.track=0.3mm on the command line", at.at("coil.track").file());
    assertEquals(27, at.at("coil.space").line());
    assertEquals(21, at.at("coil").line());
  }

  @Test
  void theMapsOrder_doesNotMatter() {
    Staged<SpecFile> one =
        read("board.copper=2oz", "coil.x=1", "coil.a=2", "board.copper.outer=1oz");
    Staged<SpecFile> two =
        read("coil.a=2", "board.copper.outer=1oz", "coil.x=1", "board.copper=2oz");
    assertEquals(DiagnosticText.text(one.diagnostics()), DiagnosticText.text(two.diagnostics()));
  }

  private static void refused(Staged<SpecFile> read, String line) {
    assertEquals(line + "\n", DiagnosticText.lines(read.diagnostics()));
    assertTrue(read.value().isEmpty());
  }
}
