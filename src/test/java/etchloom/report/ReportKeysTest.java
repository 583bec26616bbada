package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import etchloom.electric.machine.MachineFigures;
import etchloom.electric.machine.Need;
import etchloom.spec.Spec;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The keys that machine and duty bring: section 6 of the spec page, key for key. */
class ReportKeysTest {
  private static final Results STAR = Samples.Electric.STAR;

  private static final List<String> INDUCTANCE =
      List.of(
          "inductance.coilHenry",
          "inductance.phaseSelfHenry",
          "inductance.phaseMutualHenry",
          "inductance.synchronousHenry",
          "inductance.terminalHenry");

  private static final List<String> FIELD =
      List.of(
          "emf.fluxLinkageWeber",
          "emf.phasePeakVoltSecondPerRadian",
          "emf.terminalPeakVoltSecondPerRadian",
          "emf.rpmPerVolt",
          "torque.newtonMetrePerAmperePeak",
          "torque.newtonMetrePerAmpereRms",
          "torque.motorConstant",
          "loss.eddyWatt",
          "rotor.magnetPullNewton",
          "rotor.bondStressPascal");

  private static final List<String> DUTY =
      List.of(
          "resistance.hotTerminalOhm",
          "resistance.hotC",
          "loss.copperWatt",
          "loss.rippleWatt",
          "thermal.copperC",
          "thermal.stable",
          "thermal.chartAmpere",
          "drive.electricalHz",
          "drive.rippleAmperePeakToPeak",
          "drive.seriesInductanceForRippleHenry",
          "drive.proportionalGain",
          "drive.integralGain",
          "drive.bandwidthHertz",
          "drive.speedLimitRpm",
          "drive.senseSpeedRpm");

  private static final List<String> ALWAYS =
      List.of(
          "drive.polePairs",
          "drive.timeConstantSecond",
          "spread.terminalOhmPercent.worst",
          "spread.terminalOhmPercent.rss",
          "spread.terminalOhmPercent.monteCarlo95",
          "spread.imbalancePercent.worst");

  private static List<String> missing(Results r, List<List<String>> wanted) {
    Map<String, Object> flat = ReportJson.figures(r);
    List<String> out = new ArrayList<>();
    wanted.forEach(out::addAll);
    out.removeAll(flat.keySet());
    return out;
  }

  @Test
  void fullSpec_hasAllKeys() {
    assertEquals(List.of(), missing(STAR, List.of(INDUCTANCE, FIELD, DUTY, ALWAYS)));
    Map<String, Object> flat = ReportJson.figures(STAR);
    assertFalse(flat.keySet().stream().anyMatch(k -> k.startsWith("generator.")));
    assertFalse(flat.containsKey("emf.deltaCirculatingAmpere"));
    assertFalse(flat.containsKey("loss.circulatingWatt"));
    assertFalse(flat.containsKey("rotor.axialPullNewton"), "no iron beyond the board");
  }

  @Test
  void lists_haveTheirKeys() throws IOException {
    Map<String, Object> tree = JSON.std.mapFrom(ReportJson.write(STAR));
    entry(tree, "emf", "waveform", List.of("electricalDegrees", "U", "V", "W"));
    entry(tree, "emf", "harmonics", List.of("order", "phasePeakVoltSecondPerRadian"));
    entry(tree, "drive", "torqueSpeed", List.of("rpm", "newtonMetre", "limit"));
    entry(tree, "verdict", "duty", List.of("what", "needed", "got", "met", "unit", "limitedBy"));
  }

  private static void entry(Map<?, ?> tree, String part, String list, List<String> keys) {
    List<?> entries = (List<?>) ((Map<?, ?>) tree.get(part)).get(list);
    assertFalse(entries.isEmpty(), list);
    entries.forEach(e -> assertEquals(keys, List.copyOf(((Map<?, ?>) e).keySet()), list));
  }

  @Test
  void numbersAreTheRecords() {
    Map<String, Object> flat = ReportJson.figures(STAR);
    MachineFigures m = STAR.machine().orElseThrow();
    same(m.emf().orElseThrow().rpmPerVolt(), flat.get("emf.rpmPerVolt"));
    same(
        m.torque().orElseThrow().newtonMetrePerAmpereRms(),
        flat.get("torque.newtonMetrePerAmpereRms"));
    same(m.loss().rippleWatt().orElseThrow(), flat.get("loss.rippleWatt"));
    same(m.thermal().hotC(), flat.get("resistance.hotC"));
    same(
        STAR.inductance().orElseThrow().synchronousHenry(),
        flat.get("inductance.synchronousHenry"));
    // m/2 pole pairs times flux linkage, texts on field-oriented control; amplitude-invariant
    assertEquals(
        1.5 * 4 * (double) flat.get("emf.fluxLinkageWeber"),
        (double) flat.get("torque.newtonMetrePerAmperePeak"),
        1e-9);
  }

  /** Ten significant digits. */
  private static void same(double expected, Object actual) {
    assertEquals(expected, (double) actual, 5e-10 * Math.abs(expected));
  }

  @Test
  void withoutRotorAndDuty_keysAreAbsent_notNought() {
    Results bare = Samples.Electric.BARE;
    Map<String, Object> flat = ReportJson.figures(bare);
    assertEquals(List.of(), missing(bare, List.of(INDUCTANCE, ALWAYS)));
    FIELD.forEach(k -> assertFalse(flat.containsKey(k), k));
    DUTY.stream()
        .filter(k -> !k.equals("thermal.chartAmpere")) // at the default limit
        .forEach(k -> assertFalse(flat.containsKey(k), k));
    assertFalse(flat.keySet().stream().anyMatch(k -> k.startsWith("generator.")));
  }

  @Test
  void delta_hasItsCirculatingCurrent_generatorItsPower() {
    Map<String, Object> flat =
        ReportJson.figures(Samples.electric(Samples.small(Spec.Connection.DELTA, true)));
    for (String k :
        List.of(
            "emf.deltaCirculatingAmpere",
            "loss.circulatingWatt",
            "generator.phaseVoltRms",
            "generator.loadVoltRms",
            "generator.powerWatt",
            "generator.efficiency")) {
      assertTrue(flat.containsKey(k), k);
    }
  }

  @Test
  void everyFigureOfTheReport_isShownToPeople() {
    List<String> shown =
        Figures.shown(ReportJson.figures(STAR)).values().stream()
            .flatMap(List::stream)
            .map(Figure.Shown::path)
            .toList();
    for (String k : ReportJson.figures(STAR).keySet()) {
      String part = k.substring(0, Math.max(0, k.indexOf('.')));
      boolean elsewhere =
          List.of("", "tool", "winding", "geometry", "verdict", "check", "proof").contains(part);
      assertTrue(elsewhere || shown.contains(k), k);
    }
  }

  @Test
  void duty_isAnsweredInWords() {
    DutyAnswer a = DutyAnswer.of(STAR);
    List<Need> needs = STAR.machine().orElseThrow().verdict();
    assertEquals(needs.size(), a.rows().size());
    assertEquals(needs.stream().allMatch(Need::met), a.met().orElseThrow());
    assertEquals("DUTY NOT JUDGED", DutyAnswer.of(Samples.Electric.BARE).word());
  }

  @Test
  void lackingKeys_areNamed_whereTheMachineIsWorkedOut() {
    String text = ReportText.text(Samples.Electric.BARE, false).replaceAll("\\s+", " ");
    assertTrue(text.contains("add rotor.magnet and rotor.air-gap for: back-emf, torque"), text);
    assertTrue(text.contains("add duty.bus and duty.switching for: "), text);
    assertFalse(text.contains("not worked out"), text);
    ReportText.text(STAR, false).lines().forEach(l -> assertTrue(Text.columns(l) <= 80, l));
  }
}
