package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.rules.RuleReport;
import etchloom.spec.Spec;
import etchloom.testing.Specs;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** The keys and numbers of the report, read back by a JSON parser. */
class ReportJsonTest {
  private static final Results SMALL = Samples.template(Samples.SMALL);

  /**
   * Section 6 of the spec page, for what every board has; one entry a leaf, lists as {@code []}.
   */
  private static final List<String> ALWAYS =
      List.of(
          "tool.version",
          "title",
          "revision",
          "verdict.made",
          "winding.phases",
          "winding.coils",
          "winding.poles",
          "winding.connection",
          "winding.parallelPaths",
          "winding.windingFactor",
          "winding.distributionFactor",
          "winding.sequence[].coil",
          "winding.sequence[].phase",
          "winding.sequence[].sign",
          "winding.axisDegrees.U",
          "winding.axisDegrees.V",
          "winding.axisDegrees.W",
          "geometry.turnsPerLayer",
          "geometry.layers",
          "geometry.trackMm",
          "geometry.spaceMm",
          "geometry.coilLayers[].layer",
          "geometry.coilLayers[].lengthMm",
          "geometry.coilLayers[].ohm",
          "geometry.copperLayers[].layer",
          "geometry.copperLayers[].areaMm2",
          "geometry.copperLayers[].trackLengthMm",
          "geometry.vias",
          "geometry.boardDiameterMm",
          "resistance.coilOhm",
          "resistance.phaseOhm.U",
          "resistance.phaseOhm.V",
          "resistance.phaseOhm.W",
          "resistance.imbalancePercent",
          "resistance.minTerminalOhm",
          "resistance.maxTerminalOhm",
          "resistance.rssMinTerminalOhm",
          "resistance.rssMaxTerminalOhm",
          "check.passed",
          "check.minimum.track",
          "check.minimum.space",
          "check.minimum.ring",
          "check.minimum.holeGap",
          "check.minimum.edge");

  private static Map<String, Object> read(byte[] json) throws IOException {
    return JSON.std.mapFrom(json);
  }

  private static Set<String> leaves(Map<String, Object> tree) {
    Set<String> out = new TreeSet<>();
    leaves("", tree, out);
    return out;
  }

  private static void leaves(String path, Object value, Set<String> out) {
    if (value instanceof Map<?, ?> m) {
      m.forEach((k, v) -> leaves(path.isEmpty() ? (String) k : path + "." + k, v, out));
    } else if (value instanceof List<?> l) {
      l.forEach(v -> leaves(path + "[]", v, out));
    } else {
      out.add(path);
    }
  }

  @Test
  void everyKeyOfABoardIsThere() throws IOException {
    Set<String> keys = leaves(read(ReportJson.write(SMALL)));
    List<String> missing = new ArrayList<>(ALWAYS);
    missing.removeAll(keys);
    assertEquals(List.of(), missing);
    assertTrue(keys.contains("resistance.terminalOhm.U1-V1"), keys.toString());
    assertTrue(keys.contains("resistance.hotTerminalOhm"));
    assertTrue(keys.contains("resistance.hotC"));
  }

  @Test
  void noDuty_noHotResistance() throws IOException {
    Set<String> keys = leaves(read(ReportJson.write(Samples.bare(Specs.wheel(2)))));
    assertFalse(keys.contains("resistance.hotTerminalOhm"), keys.toString());
    assertFalse(keys.contains("resistance.hotC"));
  }

  @Test
  void numbersAreTheRecords() throws IOException {
    ResistanceFigures f = SMALL.resistance();
    Map<String, Object> tree = read(ReportJson.write(SMALL));
    Map<?, ?> r = (Map<?, ?>) tree.get("resistance");
    same(f.coilOhm(), r.get("coilOhm"));
    Map<?, ?> phases = (Map<?, ?>) r.get("phaseOhm");
    f.phases().forEach(p -> same(p.ohm(), phases.get(p.mark())));
    Map<?, ?> terminals = (Map<?, ?>) r.get("terminalOhm");
    assertEquals(f.terminals().size(), terminals.size());
    f.terminals().forEach(t -> same(t.ohm(), terminals.get(t.key())));
    same(f.worst().orElseThrow().maxTerminalOhm(), r.get("maxTerminalOhm"));
    same(f.rss().orElseThrow().minTerminalOhm(), r.get("rssMinTerminalOhm"));
    // IEC 60028 (recalled): 0.00393 per kelvin from 20 C
    double hotC = SMALL.spec().duty().orElseThrow().copperLimitC();
    same(hotC, r.get("hotC"));
    same(f.meanTerminalOhm() * (1 + 0.00393 * (hotC - 20)), r.get("hotTerminalOhm"));
    Map<?, ?> g = (Map<?, ?>) tree.get("geometry");
    List<?> layers = (List<?>) g.get("coilLayers");
    for (int i = 0; i < layers.size(); i++) {
      Map<?, ?> l = (Map<?, ?>) layers.get(i);
      assertEquals("L" + (i + 1), l.get("layer"));
      same(f.coilLayers().get(i).lengthMm(), l.get("lengthMm"));
      same(f.coilLayers().get(i).ohm(), l.get("ohm"));
    }
  }

  private static void same(double expected, Object actual) {
    // ten significant digits: half of the last one is 5e-10 of the smallest leading digit
    assertEquals(expected, ((Number) actual).doubleValue(), 5e-10 * Math.abs(expected));
  }

  @Test
  void noNumberHasMoreThanTenDigits() throws IOException {
    String text = new String(ReportJson.write(SMALL), StandardCharsets.US_ASCII);
    Matcher number = Pattern.compile("[:\\[,]\\s*-?([0-9.]+)").matcher(text);
    int longest = 0;
    while (number.find()) {
      String digits = number.group(1).replace(".", "").replaceFirst("^0+", "");
      assertTrue(digits.length() <= 10, number.group());
      longest = Math.max(longest, digits.length());
    }
    assertEquals(10, longest);
  }

  @Test
  void findings_lengthsInMm_othersWithTheirUnit() throws IOException {
    Results broken = Samples.with(SMALL, Samples.broken());
    Map<String, Object> tree = read(ReportJson.write(broken));
    assertEquals(false, ((Map<?, ?>) tree.get("verdict")).get("made"));
    Map<?, ?> check = (Map<?, ?>) tree.get("check");
    assertEquals(false, check.get("passed"));
    Map<?, ?> close = (Map<?, ?>) ((List<?>) check.get("findings")).get(0);
    assertEquals(
        Set.of("rule", "layer", "xMm", "yMm", "measuredMm", "requiredMm", "what"), close.keySet());
    same(0.112, close.get("measuredMm"));
    Map<?, ?> deep = (Map<?, ?>) ((List<?>) check.get("findings")).get(1);
    assertEquals(
        Set.of("rule", "xMm", "yMm", "measured", "required", "unit", "what"), deep.keySet());
  }

  @Test
  void checkAlone_isTheSameCheck() throws IOException {
    Results broken = Samples.with(SMALL, Samples.broken());
    Map<String, Object> alone = read(ReportJson.writeCheck(broken));
    assertEquals(Set.of("tool", "title", "revision", "check"), alone.keySet());
    assertEquals(read(ReportJson.write(broken)).get("check"), alone.get("check"));
    RuleReport rules = Samples.broken();
    assertEquals(
        alone.get("check"),
        read(ReportJson.writeCheck(Samples.VERSION, rules, Samples.proof())).get("check"));
  }

  @Test
  void sameBytesInEveryLocale() {
    byte[] first = ReportJson.write(SMALL);
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
      assertArrayEquals(first, ReportJson.write(SMALL));
    } finally {
      Locale.setDefault(before);
    }
    for (byte b : first) {
      assertTrue(b >= 0, "not ASCII");
    }
  }

  @Test
  void figures_haveTheFilesPaths() {
    Map<String, Object> flat = ReportJson.figures(SMALL);
    same(SMALL.resistance().phases().get(0).ohm(), flat.get("resistance.phaseOhm.U"));
    assertEquals("star", flat.get("winding.connection"));
    assertEquals(true, flat.get("verdict.made"));
    assertFalse(flat.keySet().stream().anyMatch(k -> k.contains("sequence")));
  }

  @Test
  void deltaHasNoStarPoint_openHasItsOwnPairs() {
    Map<String, Object> delta =
        ReportJson.figures(Samples.bare(Specs.wheel(2).connected(Spec.Connection.DELTA)));
    assertTrue(delta.containsKey("resistance.terminalOhm.U1-V1"), delta.toString());
    assertFalse(delta.keySet().stream().anyMatch(k -> k.endsWith("N")));
    Map<String, Object> open =
        ReportJson.figures(Samples.bare(Specs.wheel(2).connected(Spec.Connection.OPEN)));
    assertTrue(open.containsKey("resistance.terminalOhm.U1-U2"), open.toString());
    assertFalse(open.containsKey("resistance.terminalOhm.U1-V1"));
  }

  @Test
  void proof_onlyWhereFilesWereReadBack() throws IOException {
    assertFalse(read(ReportJson.write(SMALL)).containsKey("proof"));
    Results proven = SMALL.withProof(Samples.proof());
    Map<String, Object> flat = ReportJson.figures(proven);
    assertEquals(7L, flat.get("proof.islands.L1"));
    assertEquals(1L, flat.get("proof.loops.L2"));
    assertEquals(0L, flat.get("proof.shorts"));
    assertEquals(2.5e-7, flat.get("proof.gerberDxfAreaDifferenceMm2"));
    assertEquals(
        Set.of(
            "islands",
            "loops",
            "circuits",
            "circuitsExpected",
            "nets",
            "opens",
            "shorts",
            "gerberDxfAreaDifferenceMm2"),
        ((Map<?, ?>) read(ReportJson.write(proven)).get("proof")).keySet());
  }
}
