package etchloom.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.machine.TaperFigures;
import etchloom.electric.machine.TorqueFigures;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.report.ReportJson;
import etchloom.spec.FabReader;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What the report says of tracks that widen, against the other boards drawn by themselves. */
class TaperGainTest {
  private static Drawn own;
  private static TaperFigures gain;

  @BeforeAll
  static void draw() {
    own = drawn("taper: on", "taper: on");
    gain = own.electrics().taper().orElseThrow();
  }

  private static Drawn drawn(String from, String to) {
    String text = new String(Templates.bytes("record-player"), StandardCharsets.UTF_8);
    assertTrue(text.contains(from), from);
    SpecFile f =
        SpecReader.read("spec", text.replace(from, to).getBytes(StandardCharsets.UTF_8))
            .value()
            .orElseThrow();
    return Pipeline.run(f.spec(), FabReader.builtIn(f.spec().fab()), f.positions(), false)
        .value()
        .orElseThrow();
  }

  private static double ohm(Drawn d) {
    return d.electrics().resistance().terminals().stream()
        .mapToDouble(TerminalOhm::ohm)
        .max()
        .orElseThrow();
  }

  private static TorqueFigures torque(Drawn d) {
    return d.electrics().machine().torque().orElseThrow();
  }

  private static void agrees(Drawn d, TaperFigures.Variant v) {
    assertEquals(d.spec().coil().trackMm(), v.trackMm(), 1e-12);
    assertEquals(ohm(d), v.terminalOhm(), 1e-12);
    assertEquals(torque(d), v.torque().orElseThrow());
    // Warmer copper loses less, and the ripple that warms it is taken from the board's own.
    double eddy = d.electrics().machine().loss().eddyWatt().orElseThrow();
    assertEquals(eddy, v.eddyWatt().orElseThrow(), 1e-3 * eddy);
  }

  @Test
  void plainIsTheSameSpecWithoutTaper() {
    Drawn plain = drawn("taper: on", "taper: off");
    agrees(plain, gain.plain());
    assertTrue(plain.electrics().taper().isEmpty());
    assertFalse(ReportJson.figures(plain.results("1")).containsKey("taper.widestMm"));
    assertEquals(100 * (ohm(own) / ohm(plain) - 1), gain.resistancePercent(), 1e-9);
    double km = torque(own).motorConstant() / torque(plain).motorConstant();
    assertEquals(100 * (km - 1), gain.motorConstantPercent().orElseThrow(), 1e-9);
  }

  /** One step wider has no room for the turns. */
  @Test
  void widerIsTheWidestEvenTrack() {
    double most = gain.wider().orElseThrow().trackMm();
    String even = "turns: 12\n  track: " + most + " mm\n  space: 0.2 mm\n  taper: off\n";
    String text = new String(Templates.bytes("record-player"), StandardCharsets.UTF_8);
    String coil = text.substring(text.indexOf("turns: 12"), text.indexOf("\nrim:"));
    agrees(drawn(coil, even), gain.wider().orElseThrow());
    SpecFile f = SpecReader.read("spec", Templates.bytes("record-player")).value().orElseThrow();
    var fab = FabReader.builtIn(f.spec().fab());
    var over = f.spec().withEvenTrack(most + 0.01, 12);
    assertTrue(Pipeline.run(over, fab, f.positions(), false).value().isEmpty());
  }

  @Test
  void reportHasItsKeys() {
    Map<String, Object> flat = ReportJson.figures(own.results("1"));
    for (String key :
        new String[] {
          "widestMm",
          "widths",
          "resistanceChangePercent",
          "torqueChangePercent",
          "motorConstantChangePercent",
          "plainTerminalOhm",
          "plainNewtonMetrePerAmperePeak",
          "plainMotorConstant",
          "plainEddyWatt",
          "widerTrackMm",
          "widerTerminalOhm",
          "widerNewtonMetrePerAmperePeak",
          "widerMotorConstant",
          "widerEddyWatt"
        }) {
      assertTrue(flat.containsKey("taper." + key), key);
    }
    assertTrue((double) flat.get("taper.resistanceChangePercent") < 0);
    assertTrue((double) flat.get("taper.motorConstantChangePercent") > 0);
  }
}
