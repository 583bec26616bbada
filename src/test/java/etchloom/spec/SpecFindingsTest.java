package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.DiagnosticText;
import etchloom.diagnostic.Staged;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Mistakes in a spec, and all that is said about them; most stand in spec/wheel-findings.txt. */
class SpecFindingsTest {
  private static final String WHEEL = Found.file("wheel.yaml");

  static Stream<Mistake> mistakes() {
    return Mistake.in("wheel-findings.txt");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("mistakes")
  void oneMistake(Mistake m) {
    m.check(SpecReader.read("wheel.yaml", m.madeIn(WHEEL)));
  }

  private static Staged<SpecFile> read(String text) {
    return SpecReader.read("wheel.yaml", Found.utf8(text));
  }

  @Test
  void theFileItself_readsClean() {
    assertEquals(List.of(), Found.in(read(WHEEL)));
  }

  @Test
  void builtWords_areTaken() {
    String open = Found.with(WHEEL, "connection: star", "connection: open\n  parallel-paths: 1");
    String off = Found.with(open, "turns: fill", "turns: 12\n  taper: off\n  layers: series");
    assertEquals(List.of(), Found.in(read(off)));
    String on = Found.with(off, "taper: off", "taper: on");
    assertEquals(List.of(), Found.in(read(on)));
    assertTrue(read(on).value().orElseThrow().spec().coil().taper());
    String out = Found.with(WHEEL, "bore: 14 mm", "bore: 14 mm\n  star-point: terminal");
    assertEquals(List.of(), Found.in(read(out)));
  }

  @Test
  void starPoint_goesWithStarOnly() {
    String out = Found.with(WHEEL, "bore: 14 mm", "bore: 14 mm\n  star-point: terminal");
    String delta = Found.with(out, "connection: star", "connection: delta");
    assertEquals(List.of("37:15 key-conflict board.star-point"), Found.in(read(delta)));
    String two = Found.with(WHEEL, "phases: 3\n  coils: 9", "phases: 2\n  coils: 8");
    assertEquals(List.of("20:15 connection winding.connection"), Found.in(read(two)));
  }

  @Test
  void aHotMagnet_isAWarning() {
    Staged<SpecFile> read = read(Found.with(WHEEL, "temperature: 40 C", "temperature: 90 C"));
    assertEquals(List.of("14:18 magnet-heat rotor.magnet.temperature"), Found.in(read));
    assertTrue(read.value().isPresent());
    assertTrue(Found.words(read).contains("at 90 C, above its limit of 80 C"));
  }

  /** Twelve mistakes of all kinds in one file, all in one run, and nothing but them. */
  @Test
  void everyMistake_isFoundInOneRun() {
    String text = WHEEL;
    text = Found.with(text, "revision: B", "revison: B");
    text = Found.with(text, "poles: 12", "poles: 13");
    text = Found.with(text, "air-gap: 0.8 mm", "air-gap: 0.8");
    text = Found.with(text, "outline: disc", "outline: disk");
    text = Found.with(text, "1.3 T", "5 T");
    text = Found.with(text, "coils: 9", "coils: 10");
    text = Found.with(text, "inner-radius: 12 mm", "inner-radius: 32 mm");
    text = Found.with(text, "track: 0.2 mm", "track: 0.2mm");
    text = Found.with(text, "pad: 0.6 mm", "pad: 0.2 mm");
    text = Found.with(text, "copper: 1 oz", "copper: &c 1 oz");
    text = Found.with(text, "fab: standard", "fab: standrad");
    text = Found.with(text, "3000 rpm", "3000 Hz");
    assertEquals(
        List.of(
            "3:1 unknown-key revison",
            "5:10 out-of-range rotor.poles",
            "7:12 missing-unit rotor.air-gap",
            "9:14 unknown-word rotor.magnet.outline",
            "13:16 out-of-range rotor.magnet.remanence",
            "19:10 coil-count winding.coils",
            "23:17 radii coil.inner-radius",
            "26:10 unit-space coil.track",
            "30:8 pad via.pad",
            "34:11 anchor board.copper",
            "38:6 unknown-word fab",
            "41:10 wrong-unit duty.speed"),
        Found.in(read(text)));
  }

  /** What is printed for one mistake, to the letter. */
  @Test
  void aFinding_showsTheLineAndTheWayOut() {
    Staged<SpecFile> read = read(Found.with(WHEEL, "outline: wedge", "outline: wegde"));
    assertEquals(
        """
        wheel.yaml:22:12: error[unknown-word]: coil.outline: 'wegde' was found; allowed is wedge, \
        round or racetrack
          22 |   outline: wegde
             |            ^^^^^
          hint: did you mean `outline: wedge`?
        """,
        DiagnosticText.text(read.diagnostics()));
  }
}
