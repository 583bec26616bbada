package etchloom.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.machine.EmfFigures;
import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.Spec.Connection;
import etchloom.testing.WindingSpecs;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What windings of other phase counts and with paths in parallel do, against plain arithmetic. */
class WindingElectricsTest {
  /** Annealed copper at 20 °C, Ω·mm: 1/58 Ω·mm²/m, IEC 60028. */
  private static final double RHO = 1e-3 / 58;

  /**
   * Torque times speed is the sum of EMF times current over the phases, mean of a turn: with the
   * waveforms as reported and sinusoidal currents that lag each other by the phases' angles as the
   * spec page has them, at the angle where they give most.
   */
  @ParameterizedTest(name = "{0} phases, {1} coils, {2} poles, {3}, {4} paths")
  @CsvSource({
    "1,6,6,open,1,'0'",
    "2,8,6,open,1,'0 90'",
    "3,12,10,star,1,'0 120 240'",
    "3,12,10,star,2,'0 120 240'",
    "3,9,12,delta,3,'0 120 240'",
    "5,10,8,star,1,'0 72 144 216 288'",
    "6,12,10,star,1,'0 120 240 30 150 270'"
  })
  void powerOfTheEmfIsThatOfTheTorque(
      int m, int coils, int poles, String connection, int paths, String degrees) {
    Drawn d = WindingSpecs.of(m, coils, poles, connection).paths(paths).drawn();
    EmfFigures emf = d.electrics().machine().emf().orElseThrow();
    double[] lag = lags(degrees);
    double re = 0;
    double im = 0;
    for (EmfFigures.Sample s : emf.waveform()) {
      for (int k = 0; k < m; k++) {
        double a = Math.toRadians(s.electricalDegrees() - lag[k]);
        re += s.voltSecondPerRadian().get(k) * Math.cos(a) / emf.waveform().size();
        im += s.voltSecondPerRadian().get(k) * Math.sin(a) / emf.waveform().size();
      }
    }
    double torque = d.electrics().machine().torque().orElseThrow().newtonMetrePerAmperePeak();
    assertEquals(1, Math.hypot(re, im) / torque, 1e-6);
    assertTrue(emf.counterClockwise());
  }

  private static double[] lags(String degrees) {
    return java.util.Arrays.stream(degrees.split(" ")).mapToDouble(Double::parseDouble).toArray();
  }

  /** Every pair of terminals against a network of all tracks and barrels, solved by elimination. */
  @ParameterizedTest(name = "{0} phases, {1} coils, {2} poles, {3}, {4} paths")
  @CsvSource({
    "3,9,12,star,3",
    "3,12,10,open,2",
    "3,9,12,delta,3",
    "1,6,6,open,3",
    "2,16,12,open,4"
  })
  void terminalsAgreeWithAHandMadeNetwork(
      int m, int coils, int poles, String connection, int paths) {
    Drawn d = WindingSpecs.of(m, coils, poles, connection).paths(paths).drawn();
    Artwork art = d.assembly().artwork();
    for (ResistanceFigures.TerminalOhm t : d.electrics().resistance().terminals()) {
      assertEquals(1, HandNetwork.ohm(art, t.from(), t.to()) / t.ohm(), 1e-9, t.key());
    }
  }

  /** Equal paths of k-th the coils beside each other: a k²-th of the resistance, and a little. */
  @Test
  void parallelPathsDivideResistanceAndEmf() {
    Drawn one = WindingSpecs.of(3, 9, 12, "star").drawn();
    Drawn three = WindingSpecs.of(3, 9, 12, "star").paths(3).drawn();
    double coil = one.electrics().resistance().coilOhm();
    assertEquals(coil, three.electrics().resistance().coilOhm(), 1e-12);
    double paralleled = three.electrics().resistance().meanPhaseOhm();
    assertTrue(paralleled > coil / 3 && paralleled < coil / 3 * 1.25, () -> "" + paralleled);
    double flux = one.electrics().machine().emf().orElseThrow().fluxLinkageWeber();
    assertEquals(
        flux / 3,
        three.electrics().machine().emf().orElseThrow().fluxLinkageWeber(),
        flux / 3 * 5e-3);
    double henry = one.electrics().inductance().phaseSelfHenry() / 9;
    assertEquals(henry, three.electrics().inductance().phaseSelfHenry(), henry * 0.05);
    // The same copper carries the same power: the motor constant falls by the rings' share only.
    double before = one.electrics().machine().torque().orElseThrow().motorConstant();
    double after = three.electrics().machine().torque().orElseThrow().motorConstant();
    assertTrue(after > 0.85 * before && after < before, before + " " + after);
  }

  /**
   * Greatest line voltage and greatest phase peak from a bus, by going through all angles: a line
   * may take the whole bus, whichever two phases it joins (with two phases the star point too).
   */
  @ParameterizedTest
  @CsvSource({"2,'0 90'", "3,'0 120 240'", "5,'0 72 144 216 288'", "6,'0 120 240'"})
  void starUsesTheWholeBusBetweenTheTwoPhasesThatAreFarthestApart(int m, String degrees) {
    double[] lag = lags(degrees);
    double most = 0;
    for (int i = 0; i < 36000; i++) {
      List<Double> volts = new ArrayList<>();
      for (double l : lag) {
        volts.add(Math.cos(Math.toRadians(i / 100.0 - l)));
      }
      if (m == 2) {
        volts.add(0.0);
      }
      double high = volts.stream().mapToDouble(v -> v).max().orElseThrow();
      double low = volts.stream().mapToDouble(v -> v).min().orElseThrow();
      most = Math.max(most, high - low);
    }
    assertEquals(most, Circuit.greatestShare(m, Connection.STAR), 1e-7);
    Circuit c = new Circuit(m, Connection.STAR, 5, 1, 1e-5, 1e-5);
    assertEquals(1 / most, c.phaseVoltPeak(1), 1e-7);
  }

  /** Nodes, conductances, and Gauss's elimination, with formulas from the textbook. */
  private static final class HandNetwork {
    static double ohm(Artwork art, String from, String to) {
      Map<String, Integer> nodes = new TreeMap<>();
      List<double[]> branches = new ArrayList<>();
      for (Conductor c : art.conductors()) {
        Stackup.Copper copper = art.stackup().copper().get(c.layer() - 1);
        double area = (c.widthMm() - copper.undercutMm()) * copper.thicknessMm();
        branches.add(
            new double[] {
              node(nodes, c.fromJoint(), c.layer()),
              node(nodes, c.toJoint(), c.layer()),
              area / (RHO * c.path().lengthMm())
            });
      }
      double drop = art.stackup().heightMm(1) - art.stackup().heightMm(2);
      for (Joint j : art.joints()) {
        if (j.hole().isPresent()) {
          double inner = j.hole().get() / 2;
          double outer = inner + art.stackup().platingMm();
          double area = Math.PI * (outer * outer - inner * inner);
          branches.add(
              new double[] {node(nodes, j.id(), 1), node(nodes, j.id(), 2), area / (RHO * drop)});
        }
      }
      int a = node(nodes, id(art, from), 1);
      int b = node(nodes, id(art, to), 1);
      return solve(nodes.size(), branches, a, b);
    }

    private static int id(Artwork art, String mark) {
      return art.terminals().stream()
          .filter(t -> t.mark().equals(mark))
          .findFirst()
          .orElseThrow()
          .id();
    }

    private static int node(Map<String, Integer> nodes, int joint, int layer) {
      return nodes.computeIfAbsent(joint + "/" + layer, k -> nodes.size());
    }

    /** One ampere in at a, out at b, which is earth; every other net floats on a tiny leak. */
    private static double solve(int n, List<double[]> branches, int a, int b) {
      double[][] g = new double[n][n + 1];
      for (double[] x : branches) {
        int i = (int) x[0];
        int j = (int) x[1];
        g[i][i] += x[2];
        g[j][j] += x[2];
        g[i][j] -= x[2];
        g[j][i] -= x[2];
      }
      for (int i = 0; i < n; i++) {
        g[i][i] += 1e-14;
      }
      g[b][b] += 1e12;
      g[a][n] = 1;
      for (int p = 0; p < n; p++) {
        for (int r = p + 1; r < n; r++) {
          double f = g[r][p] / g[p][p];
          if (f != 0) {
            for (int c = p; c <= n; c++) {
              g[r][c] -= f * g[p][c];
            }
          }
        }
      }
      double[] v = new double[n];
      for (int p = n - 1; p >= 0; p--) {
        double sum = g[p][n];
        for (int c = p + 1; c < n; c++) {
          sum -= g[p][c] * v[c];
        }
        v[p] = sum / g[p][p];
      }
      return v[a] - v[b];
    }
  }
}
