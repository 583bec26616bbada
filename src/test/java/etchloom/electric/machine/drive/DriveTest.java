package etchloom.electric.machine.drive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;
import java.util.Arrays;
import org.junit.jupiter.api.Test;

/**
 * Check values DR-1 to DR-17 (textbook conventions: amplitude-invariant dq, 10 pole pairs, 2 mV·s
 * peak a phase), and hand calculations.
 */
class DriveTest {
  private static final double RPM = 30 / Math.PI;
  private static final Circuit STAR = circuit(Connection.STAR);

  private static Circuit circuit(Connection c) {
    return new Circuit(3, c, 10, 0.25, 30e-6, 25e-6);
  }

  private static void close(double want, double got) {
    assertEquals(want, got, 1e-6 * Math.abs(want));
  }

  @Test
  void currentLoop() {
    CurrentLoop g = CurrentLoop.of(STAR, 1000);
    close(0.188495559, g.proportionalGain());
    close(1570.79633, g.integralGain());
    close(
        0.000159154943,
        g.proportionalGain()
            / g.integralGain()
            / (30e-6 / 0.25)
            / (2 * Math.PI * g.bandwidthHertz()));
  }

  @Test
  void torqueConstants() {
    close(0.03, STAR.torqueNm(2e-3, 1));
    close(0.0424264069, STAR.torqueNm(2e-3, Math.sqrt(2)));
    close(0.0346410162, STAR.terminalShare() * 10 * 2e-3);
    close(275.664448, RPM / (STAR.terminalShare() * 10 * 2e-3));
  }

  @Test
  void noLoadSpeedOfCentredModulation() {
    close(6615.94675, RPM * TorqueSpeed.noLoadRadPerSecond(STAR, 2e-3, 24));
    double open = TorqueSpeed.noLoadRadPerSecond(circuit(Connection.OPEN), 2e-3, 24);
    close(24 / 0.02, open);
    double delta = TorqueSpeed.noLoadRadPerSecond(circuit(Connection.DELTA), 2e-3, 24);
    close(24 / 0.02, delta);
  }

  /** DR-17; a delta's line has the ripple of L/3; open windings half of a half bridge's (DR-16). */
  @Test
  void ripple() {
    assertEquals(3.33333333, Ripple.amperePeakToPeak(STAR, 24, 40e3), 1e-6);
    Circuit delta = circuit(Connection.DELTA);
    assertEquals(10, Ripple.amperePeakToPeak(delta, 24, 40e3), 1e-6);
    Circuit open = circuit(Connection.OPEN);
    assertEquals(2.5, Ripple.amperePeakToPeak(open, 24, 40e3), 1e-6);
  }

  /**
   * Stars pulse by pulse: every leg's centred pulse, the star point at the legs' mean or on a leg
   * of its own, currents by the voltage over an inductance of 1; the worst over depth and angle.
   */
  @Test
  void rippleOfStarsReplayed() {
    double[][] lags = {{0, 90}, {0, 120, 240}, {0, 72, 144, 216, 288}};
    for (double[] lag : lags) {
      double worst = 0;
      for (int depth = 1; depth <= 40; depth++) {
        for (int degree = 0; degree < 360; degree += 3) {
          worst = Math.max(worst, replayed(lag, depth / 40.0, degree));
        }
      }
      Circuit c = new Circuit(lag.length, Connection.STAR, 1, 1, 1, 1);
      assertEquals(Ripple.amperePeakToPeak(c, 1, 1), worst, 2e-3 * worst);
    }
  }

  private static double replayed(double[] lag, double depth, double degree) {
    int m = lag.length;
    boolean starOnLeg = m == 2;
    double[] duty = new double[starOnLeg ? 3 : m];
    for (int k = 0; k < m; k++) {
      duty[k] = Math.cos(Math.toRadians(degree - lag[k]));
    }
    double high = Arrays.stream(duty).max().orElseThrow();
    double low = Arrays.stream(duty).min().orElseThrow();
    // The largest phase peak that the bus allows at any angle, times the depth.
    double peak = depth / Circuit.greatestShare(m, Connection.STAR);
    for (int k = 0; k < duty.length; k++) {
      duty[k] = 0.5 + peak * (duty[k] - (high + low) / 2);
    }
    int steps = 2000;
    double most = 0;
    for (int k = 0; k < m; k++) {
      double at = 0;
      double min = 0;
      double max = 0;
      double mean = starOnLeg ? duty[m] : Arrays.stream(duty).average().orElseThrow();
      for (int i = 0; i < steps; i++) {
        double t = Math.abs((i + 0.5) / steps - 0.5) * 2;
        double star = 0;
        for (double d : duty) {
          star += (t < d ? 1.0 : 0.0) / duty.length;
        }
        if (starOnLeg) {
          star = t < duty[m] ? 1 : 0;
        }
        at += ((t < duty[k] ? 1 : 0) - star - (duty[k] - mean)) / steps;
        min = Math.min(min, at);
        max = Math.max(max, at);
      }
      most = Math.max(most, max - min);
    }
    return most;
  }

  /** With the series inductance in place the ripple is a fifth of the peak, by the same formula. */
  @Test
  void seriesInductance() {
    double add = Ripple.seriesHenry(STAR, 24, 40e3, 2);
    Circuit more = new Circuit(3, Connection.STAR, 10, 0.25, 30e-6 + add, 25e-6);
    close(0.2 * 2 * Math.sqrt(2), Ripple.amperePeakToPeak(more, 24, 40e3));
    assertEquals(0, Ripple.seriesHenry(STAR, 24, 40e3, 50));
  }

  /** A triangle of 1 A from peak to peak has an rms of 1/√12. */
  @Test
  void rippleSquare() {
    int n = 100_000;
    double sum = 0;
    for (int i = 0; i < n; i++) {
      double x = Math.abs(2 * (i + 0.5) / n - 1) - 0.5;
      sum += x * x / n;
    }
    assertEquals(sum, Ripple.meanSquare(1), 1e-9);
  }

  /** At a point that the voltage limits, the dq equations give back the bus's peak. */
  @Test
  void voltageLimit() {
    TorqueSpeed t = new TorqueSpeed(STAR, 2e-3, 80, 20, 24, w -> 0);
    double w = 5000 / RPM;
    TorqueSpeed.Point p = t.at(w);
    assertEquals(TorqueSpeed.Limit.VOLTAGE, p.limit());
    double i = p.newtonMetre() / 0.03;
    double q = 0.25 * (1 + 0.00393 * 60) * i + 10 * w * 2e-3;
    double d = -10 * w * 30e-6 * i;
    close(24 / Math.sqrt(3), Math.hypot(q, d));
  }

  @Test
  void line_fromStandstillToNoLoad() {
    TorqueSpeed t = new TorqueSpeed(STAR, 2e-3, 20, 5, 24, w -> 1e-6 * w);
    var line = t.line();
    close(0.0424264069 * 5, line.get(0).newtonMetre());
    assertEquals(TorqueSpeed.Limit.CURRENT, line.get(0).limit());
    TorqueSpeed.Point last = line.get(line.size() - 1);
    close(6615.94675, last.rpm());
    assertEquals(0, last.newtonMetre());
    for (int i = 1; i < line.size(); i++) {
      assertTrue(line.get(i).newtonMetre() <= line.get(i - 1).newtonMetre());
    }
  }

  /** Two hundred volts rms on 30 Ω and 10 Ω in series with ωL of 30 Ω: 4 A by 40-30-50. */
  @Test
  void generator() {
    double w = 100;
    Circuit c = new Circuit(3, Connection.OPEN, 2, 10, 30 / (2 * w), 0.1);
    double flux = 200 * Math.sqrt(2) / (2 * w);
    Generator g = new Generator(c, flux, w, 30);
    close(200, Generator.openVoltRms(c, flux, w));
    close(4, g.ampereRms(20));
    close(120, g.loadVoltRms(20));
    close(3 * 16 * 30, g.loadWatt(20));
  }
}
