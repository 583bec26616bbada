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

/**
 * One mistake in a spec, and all that is said about it: place, code and key of every finding, and a
 * piece of the words. Places were counted in spec/wheel.yaml by hand.
 */
class SpecFindingsTest {
  private static final String WHEEL = Found.file("wheel.yaml");

  record Case(String name, String piece, String by, String says, List<String> found) {
    @Override
    public String toString() {
      return name;
    }
  }

  private static Case c(String name, String piece, String by, String says, String... found) {
    return new Case(name, piece, by, says, List.of(found));
  }

  static Stream<Case> keys() {
    return Stream.of(
        c(
            "misspelt key",
            "  track:",
            "  trak:",
            "did you mean 'track'?",
            "21:1 missing-key coil.track",
            "26:3 unknown-key coil.trak"),
        c(
            "misspelt top key",
            "fab:",
            "fabb:",
            "did you mean 'fab'?",
            "1:1 missing-key fab",
            "38:1 unknown-key fabb"),
        c(
            "part of a key",
            "  air-gap:",
            "  gap:",
            "did you mean 'air-gap'?",
            "7:3 unknown-key rotor.gap"),
        c("key in capitals", "  bus", "  BUS", "did you mean 'bus'?", "40:3 unknown-key duty.BUS"),
        c(
            "key of another group",
            "  speed:",
            "  coils: 9\n  speed:",
            "it takes use, torque, load",
            "41:3 unknown-key duty.coils"),
        c(
            "missing key",
            "  coils: 9\n",
            "",
            "it takes a whole number, 1 to 360",
            "17:1 missing-key winding.coils"),
        c(
            "missing group",
            "via:\n  hole: 0.3 mm\n  pad: 0.6 mm\n",
            "",
            "a group of keys",
            "1:1 missing-key via"),
        c(
            "empty group",
            "  hole: 0.3 mm\n  pad: 0.6 mm\n",
            "",
            "it takes a length",
            "28:1 missing-key via.hole",
            "28:1 missing-key via.pad"),
        c("empty value", "fab: standard", "fab:", "has no value", "38:1 empty-value fab"),
        c("null", "coils: 9", "coils: null", "has no value", "19:3 empty-value winding.coils"),
        c(
            "duplicate key",
            "  coils: 9\n",
            "  coils: 9\n  coils: 12\n",
            "already given",
            "20:3 duplicate-key winding.coils"),
        c(
            "duplicate group",
            "fab: standard",
            "fab: standard\nrotor: {poles: 3}",
            "delete one",
            "39:1 duplicate-key rotor"),
        c(
            "value for a group",
            "via:\n  hole: 0.3 mm\n  pad: 0.6 mm\n",
            "via: 0.3 mm\n",
            "a group of keys belongs here",
            "28:6 wrong-shape via"),
        c(
            "list for a group",
            "via:\n  hole: 0.3 mm\n  pad: 0.6 mm\n",
            "via: [0.3 mm]\n",
            "not a list",
            "28:6 wrong-shape via"),
        c(
            "list for a value",
            "coils: 9",
            "coils: [9]",
            "not a list",
            "19:10 wrong-shape winding.coils"),
        c(
            "group for a value",
            "coils: 9",
            "coils: {n: 9}",
            "not a group",
            "19:10 wrong-shape winding.coils"),
        c(
            "value for a list",
            "copper: 1 oz",
            "copper: 1 oz\n  stackup: 0.2 mm",
            "[0.2 mm, 0.66 mm, 0.2 mm]",
            "35:12 wrong-shape board.stackup"),
        c(
            "empty list",
            "copper: 1 oz",
            "copper: 1 oz\n  stackup: []",
            "empty",
            "35:12 empty-value board.stackup"),
        c(
            "list as key",
            "fab: standard",
            "fab: standard\n? [a, b]\n: 1",
            "single word",
            "39:3 key-shape"),
        c("alias", "  poles: 12\n", "  poles: &p 12\n", "not allowed", "5:10 anchor rotor.poles"),
        c(
            "anchor and alias",
            "pad: 0.6 mm",
            "pad: *p",
            "write the value itself",
            "30:8 anchor via.pad"),
        c("tag", "poles: 12", "poles: !!int 12", "tags", "5:10 tag rotor.poles"));
  }

  static Stream<Case> values() {
    return Stream.of(
        c(
            "missing unit",
            "track: 0.2 mm",
            "track: 0.2",
            "write for example `0.2 mm`",
            "26:10 missing-unit coil.track"),
        c(
            "copper without unit",
            "copper: 1 oz",
            "copper: 35",
            "`35 um`",
            "34:11 missing-unit board.copper"),
        c(
            "no space",
            "track: 0.2 mm",
            "track: 0.2mm",
            "write `track: 0.2 mm`",
            "26:10 unit-space coil.track"),
        c(
            "two spaces",
            "track: 0.2 mm",
            "track: 0.2  mm",
            "exactly one space",
            "26:10 unit-space coil.track"),
        c(
            "tab before the unit",
            "track: 0.2 mm",
            "track: 0.2\tmm",
            "'0.2\\tmm'",
            "26:10 unit-space coil.track"),
        c(
            "unit of another kind",
            "track: 0.2 mm",
            "track: 0.2 V",
            "mm, cm, m, um",
            "26:10 wrong-unit coil.track"),
        c(
            "unit in capitals",
            "bus: 24 V",
            "bus: 24 v",
            "did you mean `bus: 24 V`?",
            "40:8 wrong-unit duty.bus"),
        c(
            "misspelt unit",
            "3000 rpm",
            "3000 rmp",
            "did you mean `speed: 3000 rpm`?",
            "41:10 wrong-unit duty.speed"),
        c(
            "degree sign",
            "limit: 80 C",
            "limit: 80 \u00b0C",
            "did you mean `limit: 80 C`?",
            "15:12 wrong-unit rotor.magnet.limit"),
        c(
            "count with unit",
            "coils: 9",
            "coils: 9 mm",
            "a whole number, 1 to 360",
            "19:10 not-whole winding.coils"),
        c(
            "count with point",
            "coils: 9",
            "coils: 9.0",
            "a whole number",
            "19:10 not-whole winding.coils"),
        c(
            "count in quotes",
            "coils: 9",
            "coils: \"9\"",
            "`coils: 9`",
            "19:10 not-whole winding.coils"),
        c(
            "NaN",
            "track: 0.2 mm",
            "track: .nan",
            "a finite number",
            "26:10 not-a-number coil.track"),
        c(
            "NaN with unit",
            "track: 0.2 mm",
            "track: NaN mm",
            "a finite number",
            "26:10 not-a-number coil.track"),
        c(
            "infinity",
            "track: 0.2 mm",
            "track: -.inf",
            "a finite number",
            "26:10 not-a-number coil.track"),
        c(
            "beyond a double",
            "track: 0.2 mm",
            "track: 1e999 mm",
            "a finite number",
            "26:10 not-a-number coil.track"),
        c(
            "huge exponent",
            "track: 0.2 mm",
            "track: 1e2147483647 mm",
            "a finite number",
            "26:10 not-a-number coil.track"),
        c(
            "tiny exponent",
            "track: 0.2 mm",
            "track: 1e-2147483648 mm",
            "allowed is 0.02 mm",
            "26:10 out-of-range coil.track"),
        c(
            "word for a number",
            "track: 0.2 mm",
            "track: wide",
            "a length in mm",
            "26:10 not-a-number coil.track"),
        c(
            "decimal comma",
            "track: 0.2 mm",
            "track: 0,2 mm",
            "a point, not a comma",
            "26:10 not-a-number coil.track"),
        c(
            "negative",
            "track: 0.2 mm",
            "track: -0.2 mm",
            "0.02 mm to 20 mm",
            "26:10 out-of-range coil.track"),
        c(
            "negative count",
            "coils: 9",
            "coils: -9",
            "1 to 360",
            "19:10 out-of-range winding.coils"),
        c("no coils", "coils: 9", "coils: 0", "1 to 360", "19:10 out-of-range winding.coils"),
        c(
            "odd poles",
            "poles: 12",
            "poles: 13",
            "an even whole number, 2 to 200",
            "5:10 out-of-range rotor.poles"),
        c(
            "a thousand million turns",
            "turns: fill",
            "turns: 1000000000",
            "1 to 2000",
            "25:10 out-of-range coil.turns"),
        c(
            "turns beyond an int",
            "turns: fill",
            "turns: 99999999999999999999",
            "1 to 2000",
            "25:10 out-of-range coil.turns"),
        c(
            "misspelt fill",
            "turns: fill",
            "turns: fil",
            "did you mean `turns: fill`?",
            "25:10 not-whole coil.turns"),
        c(
            "misspelt word",
            "outline: disc",
            "outline: disk",
            "did you mean `outline: disc`?",
            "9:14 unknown-word rotor.magnet.outline"),
        c(
            "unknown word",
            "connection: star",
            "connection: zigzag",
            "star, delta or open",
            "20:15 unknown-word winding.connection"),
        c(
            "misspelt class",
            "fab: standard",
            "fab: standrad",
            "did you mean `fab: standard`?",
            "38:6 unknown-word fab"),
        c(
            "four phases",
            "phases: 3",
            "phases: 4",
            "1, 2, 3, 5 or 6",
            "18:11 out-of-range winding.phases"),
        c(
            "density with unit",
            "limit: 80 C",
            "limit: 80 C\n    density: 7500 kg",
            "without a unit",
            "16:14 wrong-unit rotor.magnet.density"),
        c(
            "odd layers",
            "layers: 4",
            "layers: 5",
            "an even whole number, 2 to 16",
            "32:11 out-of-range board.layers"));
  }

  static Stream<Case> texts() {
    return Stream.of(
        c("path in the title", "Test wheel", "../../etc/passwd", "`/`", "2:8 text title"),
        c("backslash in the title", "Test wheel", "a\\b", "`\\`", "2:8 text title"),
        c(
            "markup in the title",
            "Test wheel",
            "<script>alert(1)</script>",
            "`/`, `<` and `>`",
            "2:8 text title"),
        c(
            "title without a letter",
            "Test wheel",
            "\"\u4e2d !\"",
            "no letter a-z",
            "2:8 text title"),
        c("empty title", "Test wheel", "\"  \"", "empty", "2:8 text title"),
        c(
            "line end in the title",
            "Test wheel",
            "\"a\\nb\"",
            "cannot be printed",
            "2:8 text title"),
        c(
            "hidden sign in the title",
            "Test wheel",
            "\"a\\u202eb\"",
            "cannot be printed",
            "2:8 text title"),
        c(
            "half a character in the title",
            "Test wheel",
            "\"a\\ud800\"",
            "cannot be printed",
            "2:8 text title"),
        c("long title", "Test wheel", "x".repeat(121), "at most 120", "2:8 text title"),
        c(
            "path as revision",
            "revision: B",
            "revision: ../B",
            "starts with a letter or digit",
            "3:11 text revision"),
        c(
            "markup as finish",
            "bore: 14 mm",
            "finish: <b>gold</b>",
            "`<` and `>`",
            "36:11 text board.finish"),
        c(
            "fab path with a line end",
            "fab: standard",
            "fab: \"a\\n.yaml\"",
            "cannot be printed",
            "38:6 text fab"),
        c("version", "etchloom: 1", "etchloom: 2", "this program reads 1", "1:11 format etchloom"),
        c(
            "rules file",
            "etchloom: 1",
            "etchloom-fab: 1",
            "a fab rules file",
            "1:15 format etchloom-fab"));
  }

  static Stream<Case> together() {
    return Stream.of(
        c(
            "inner beyond outer radius",
            "inner-radius: 12 mm",
            "inner-radius: 32 mm",
            "32 mm is not less than outer-radius, 30 mm",
            "23:17 radii coil.inner-radius"),
        c(
            "no room for a turn",
            "inner-radius: 12 mm",
            "inner-radius: 29.9 mm",
            "0.1 mm apart",
            "26:10 radii coil.track"),
        c(
            "coil beyond the board",
            "  diameter: 84 mm\n  bore: 14 mm\n  holes: {count: 4, diameter:"
                + " 3.2 mm, circle: 78 mm, start: 45 deg}\n",
            "  diameter: 58 mm\n",
            "board.diameter / 2 = 29 mm",
            "24:17 board coil.outer-radius"),
        c(
            "coil in the bore",
            "bore: 14 mm",
            "bore: 24 mm",
            "board.bore / 2 = 12 mm",
            "23:17 board coil.inner-radius"),
        c(
            "bore beyond the board",
            "bore: 14 mm",
            "bore: 90 mm",
            "84 mm",
            "23:17 board coil.inner-radius",
            "36:9 board board.bore",
            "37:47 holes board.holes.circle"),
        c(
            "holes in the coils",
            "circle: 78 mm",
            "circle: 50 mm",
            "in the coils",
            "37:47 holes board.holes.circle"),
        c(
            "holes over the edge",
            "circle: 78 mm",
            "circle: 82 mm",
            "the board ends at 42 mm",
            "37:47 holes board.holes.circle"),
        c(
            "holes in each other",
            "count: 4, diameter: 3.2 mm",
            "count: 60, diameter: 4.2 mm",
            "60 holes of 4.2 mm run into each other",
            "37:18 holes board.holes.count"),
        c(
            "coils and phases",
            "coils: 9",
            "coils: 10",
            "the nearest counts are 9 and 12",
            "19:10 coil-count winding.coils"),
        c(
            "paths",
            "connection: star",
            "connection: star\n  parallel-paths: 2",
            "to 2 paths",
            "21:19 coil-count winding.parallel-paths",
            "21:19 not-built-yet winding.parallel-paths"),
        c(
            "pad and hole",
            "pad: 0.6 mm",
            "pad: 0.3 mm",
            "not more than the hole",
            "30:8 pad via.pad"),
        c(
            "terminals that touch",
            "bore: 14 mm",
            "terminals: {pitch: 2 mm}",
            "terminals would touch",
            "36:22 pad board.terminals.pitch"),
        c(
            "dielectrics and layers",
            "bore: 14 mm",
            "stackup: [0.2 mm, 0.2 mm]",
            "4 layers have 3 dielectrics",
            "36:3 stackup board.stackup"),
        c(
            "dielectrics and thickness",
            "bore: 14 mm",
            "stackup: [0.2 mm, 2 mm, 0.2 mm]",
            "at most 10 % off",
            "36:3 stackup board.stackup"),
        c(
            "two phases in delta",
            "phases: 3\n  coils: 9\n  connection: star",
            "phases: 2\n  coils: 8\n  connection: delta",
            "allowed is open or star",
            "18:11 not-built-yet winding.phases",
            "20:15 connection winding.connection"),
        c(
            "copper limit and ambient",
            "bus: 24 V",
            "ambient: 110 C",
            "is not above ambient",
            "40:12 duty duty.ambient"),
        c(
            "bandwidth",
            "bus: 24 V",
            "switching: 20 kHz\n  bandwidth: 15 kHz",
            "half the switching",
            "41:14 duty duty.bandwidth"));
  }

  static Stream<Case> physics() {
    return Stream.of(
        c(
            "no gap",
            "air-gap: 0.8 mm",
            "air-gap: 0 mm",
            "0.01 mm to 100 mm",
            "7:12 out-of-range rotor.air-gap"),
        c(
            "remanence",
            "1.3 T",
            "5 T",
            "0.01 T to 2 T",
            "13:16 out-of-range rotor.magnet.remanence"),
        c(
            "discs overlap",
            "diameter: 10 mm",
            "diameter: 11 mm",
            "at most 10.87 mm with 12 poles",
            "10:15 magnet-overlap rotor.magnet.diameter"),
        c(
            "sectors overlap",
            "outline: disc\n    diameter: 10 mm\n    pitch-radius: 21 mm",
            "outline: sector\n    inner-radius: 15 mm\n    outer-radius: 25 mm\n    span: 31 deg",
            "at most 30 deg with 12 poles",
            "12:11 magnet-overlap rotor.magnet.span"),
        c(
            "sector radii",
            "outline: disc\n    diameter: 10 mm\n    pitch-radius: 21 mm",
            "outline: sector\n    inner-radius: 25 mm\n    outer-radius: 25 mm\n    span: 30 deg",
            "not less than outer-radius",
            "10:19 radii rotor.magnet.inner-radius"),
        c(
            "blocks overlap",
            "outline: disc\n    diameter: 10 mm",
            "outline: block\n    length: 10 mm\n    width: 9 mm",
            "at most 8.574 mm",
            "11:12 magnet-overlap rotor.magnet.width"),
        c(
            "size of another outline",
            "pitch-radius: 21 mm",
            "pitch-radius: 21 mm\n    span: 20 deg",
            "it takes diameter and pitch-radius",
            "12:11 key-conflict rotor.magnet.span"),
        c(
            "magnets beyond their disc",
            "iron: none",
            "outer-diameter: 50 mm",
            "25 mm",
            "11:19 magnet-overlap rotor.magnet.pitch-radius"),
        c(
            "no remanence left",
            "temperature: 40 C",
            "remanence-drift: -2 %\n    temperature: 75 C",
            "at 75 C this drift leaves -10 %",
            "14:22 magnet-heat rotor.magnet.remanence-drift"),
        c(
            "plate among magnets",
            "sides: one",
            "sides: two\n  counter-plate: {gap: 1 mm}",
            "`sides: one` only",
            "7:3 key-conflict rotor.counter-plate"));
  }

  static Stream<Case> notBuilt() {
    return Stream.of(
        c(
            "round",
            "outline: wedge",
            "outline: round",
            "only `outline: wedge`",
            "22:12 not-built-yet coil.outline"),
        c(
            "racetrack",
            "outline: wedge",
            "outline: racetrack\n  width: 9 mm",
            "only `outline: wedge`",
            "22:12 not-built-yet coil.outline"),
        c(
            "parallel layers",
            "turns: fill",
            "turns: fill\n  layers: parallel",
            "only `layers: series`",
            "26:11 not-built-yet coil.layers"),
        c(
            "taper",
            "turns: fill",
            "turns: fill\n  taper: on",
            "only `taper: off`",
            "26:10 not-built-yet coil.taper"),
        c(
            "parallel paths",
            "connection: star",
            "connection: star\n  parallel-paths: 3",
            "only `parallel-paths: 1`",
            "21:19 not-built-yet winding.parallel-paths"),
        c(
            "five phases",
            "phases: 3\n  coils: 9",
            "phases: 5\n  coils: 15",
            "only `phases: 3`",
            "18:11 not-built-yet winding.phases"),
        c(
            "vias side by side",
            "pad: 0.6 mm",
            "pad: 0.6 mm\n  count: 2",
            "only `count: 1`",
            "31:10 not-built-yet via.count"),
        c(
            "tab",
            "bore: 14 mm",
            "tab: {width: 20 mm, length: 8 mm}",
            "not built yet",
            "36:3 not-built-yet board.tab"),
        c(
            "wide tab",
            "bore: 14 mm",
            "tab: {width: 90 mm, length: 8 mm}",
            "84 mm",
            "36:3 not-built-yet board.tab",
            "36:16 board board.tab.width"),
        c(
            "pad terminals",
            "bore: 14 mm",
            "terminals: {kind: pad}",
            "only `kind: hole`",
            "36:21 not-built-yet board.terminals.kind"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource({"keys", "values", "texts", "physics", "notBuilt"})
  void oneMistake(Case c) {
    check(c);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("together")
  void keysAgainstEachOther(Case c) {
    check(c);
  }

  private static void check(Case c) {
    Staged<SpecFile> read = read(Found.with(WHEEL, c.piece(), c.by()));
    assertEquals(c.found(), Found.in(read), () -> DiagnosticText.text(read.diagnostics()));
    assertTrue(Found.words(read).contains(c.says()), () -> DiagnosticText.text(read.diagnostics()));
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
    String out = Found.with(WHEEL, "bore: 14 mm", "bore: 14 mm\n  star-point: terminal");
    assertEquals(List.of(), Found.in(read(out)));
  }

  @Test
  void starPoint_goesWithStarOnly() {
    String out = Found.with(WHEEL, "bore: 14 mm", "bore: 14 mm\n  star-point: terminal");
    String delta = Found.with(out, "connection: star", "connection: delta");
    assertEquals(List.of("37:15 key-conflict board.star-point"), Found.in(read(delta)));
    String two = Found.with(WHEEL, "phases: 3\n  coils: 9", "phases: 2\n  coils: 8");
    assertEquals(
        List.of("18:11 not-built-yet winding.phases", "20:15 connection winding.connection"),
        Found.in(read(two)));
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
