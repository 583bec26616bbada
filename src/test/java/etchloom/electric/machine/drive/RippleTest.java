package etchloom.electric.machine.drive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;
import java.util.Arrays;
import org.junit.jupiter.api.Test;

/**
 * Ripple against check values DR-16 and DR-17, against hand calculations, and against a replay that
 * knows nothing of exponentials: legs switched pulse by pulse, {@code L di/dt + R i = v} stepped
 * through a period, the mean taken off.
 */
class RippleTest {
  private static final double COLD = 20;

  private static Circuit circuit(Connection c, int phases, double ohm, double henry) {
    return new Circuit(phases, c, 10, ohm, henry, henry);
  }

  private static Ripple ripple(Connection c, double ohm) {
    return new Ripple(circuit(c, 3, ohm, 30e-6), 24, 40e3);
  }

  /** DR-17; a delta's line has the ripple of L/3; open windings half of a half bridge's (DR-16). */
  @Test
  void withoutResistance() {
    assertEquals(3.33333333, ripple(Connection.STAR, 1e-6).amperePeakToPeak(COLD), 1e-6);
    assertEquals(10, ripple(Connection.DELTA, 1e-6).amperePeakToPeak(COLD), 1e-6);
    assertEquals(2.5, ripple(Connection.OPEN, 1e-6).amperePeakToPeak(COLD), 1e-6);
    // DR-17 holds with the machine's own quarter ohm within its tolerance of 0.2 %.
    assertEquals(3.33333333, ripple(Connection.STAR, 0.25).amperePeakToPeak(COLD), 0.002 * 3.333);
  }

  /** By hand: 5 V, 5.27 Ω, 2 µs against 20 µs; the wave of 2/3 of 5 V settles on either side. */
  @Test
  void muchResistance() {
    Circuit c = circuit(Connection.STAR, 3, 5.27, 5.27 * 2e-6);
    Ripple r = new Ripple(c, 5, 50e3);
    double e = Math.exp(-5);
    double step = 5 * 2 / 3.0 / 5.27;
    assertEquals(step * (1 - e) * (1 - e) / (1 - e * e), r.amperePeakToPeak(COLD), 1e-12);
    assertTrue(r.amperePeakToPeak(COLD) < step);
    // Warm copper leaves less of it: IEC 60028.
    double hot = 1 + 0.00393 * 60;
    double want = step / hot * Math.tanh(2.5 * hot);
    assertEquals(want, r.amperePeakToPeak(80), 1e-9);
  }

  /** The worst over depth and angle, from nearly pure inductance to nearly pure resistance. */
  @Test
  void worstReplayed() {
    for (int phases : new int[] {1, 2, 3, 5}) {
      Connection how = phases == 1 ? Connection.OPEN : Connection.STAR;
      for (double ohm : new double[] {1e-3, 1, 5, 40}) {
        double worst = 0;
        for (int depth = 1; depth <= 20; depth++) {
          for (int degree = 0; degree < 180; degree += 6) {
            worst = Math.max(worst, replayed(phases, ohm, depth / 20.0, degree, 1000)[0]);
          }
        }
        Ripple r = new Ripple(circuit(how, phases, ohm, 1), 1, 1);
        String which = phases + " phases, R T/L " + ohm;
        double stated = r.amperePeakToPeak(COLD);
        assertTrue(stated > 0.995 * worst, which + ": " + stated + " for " + worst);
        double high = phases == 5 && ohm > 0.1 && ohm < 10 ? 1.08 : 1.005;
        assertTrue(stated < high * worst, which + ": " + stated + " for " + worst);
      }
    }
  }

  /** The mean square at a depth, over all angles. */
  @Test
  void meanSquareReplayed() {
    for (int phases : new int[] {1, 2, 3, 5}) {
      Connection how = phases == 1 ? Connection.OPEN : Connection.STAR;
      for (double ohm : new double[] {1e-3, 1, 5, 40}) {
        for (double depth : new double[] {0.1, 0.5, 1}) {
          double want = 0;
          for (int degree = 0; degree < 360; degree += 4) {
            want += replayed(phases, ohm, depth, degree, 2000)[1] / 90;
          }
          Ripple r = new Ripple(circuit(how, phases, ohm, 1), 1, 1);
          String which = phases + " phases, R T/L " + ohm + ", depth " + depth;
          assertEquals(want, r.meanSquare(depth, COLD), 0.01 * want, which);
          assertTrue(r.meanSquare(depth, COLD) <= r.amperePeakToPeak(COLD) / 4, which);
        }
      }
    }
  }

  /** A floating star at no modulation has no ripple (DR-18), nor has a full bridge. */
  @Test
  void noModulation_noRipple() {
    assertEquals(0, ripple(Connection.STAR, 1).meanSquare(0, COLD), 1e-12);
    assertEquals(0, ripple(Connection.OPEN, 1).meanSquare(0, COLD), 1e-12);
  }

  /** The worst wave all the time: a triangle's Δ²/12 without resistance, else its square's sum. */
  @Test
  void worstMeanSquare() {
    Ripple ideal = ripple(Connection.STAR, 1e-6);
    double triangle = Math.pow(ideal.amperePeakToPeak(COLD), 2) / 12;
    assertEquals(triangle, ideal.worstMeanSquare(COLD), 1e-6 * triangle);
    double ohm = 6; // 5 time constants to a period of 25 us
    double step = 24 * 2 / 3.0 / ohm;
    double top = step / 2 * Math.tanh(1.25);
    int n = 100_000;
    double sum = 0;
    for (int i = 0; i < n; i++) {
      double t = 2.5 * (i + 0.5) / n;
      double at = step / 2 + (-top - step / 2) * Math.exp(-t);
      sum += at * at / n;
    }
    assertEquals(sum, ripple(Connection.STAR, ohm).worstMeanSquare(COLD), 1e-6 * sum);
  }

  /** With the series inductance in place the ripple is a fifth of the peak. */
  @Test
  void seriesInductance() {
    for (double ohm : new double[] {1e-6, 0.25, 2}) {
      double add = ripple(Connection.STAR, ohm).seriesHenry(2, 80);
      Circuit more = circuit(Connection.STAR, 3, ohm, 30e-6 + add);
      double aim = 0.2 * 2 * Math.sqrt(2);
      assertEquals(aim, new Ripple(more, 24, 40e3).amperePeakToPeak(80), 1e-9);
    }
    assertEquals(0, ripple(Connection.STAR, 0.25).seriesHenry(50, COLD));
    assertEquals(0, ripple(Connection.STAR, 100).seriesHenry(2, COLD));
  }

  /** By hand: 3 A peak on 2 Ω and 5 V of EMF against 24 V/√3; reactance 0.3 Ω. */
  @Test
  void depth() {
    Ripple r = new Ripple(circuit(Connection.STAR, 3, 2, 30e-6), 24, 40e3);
    double depth = r.depth(5 / 10e3, 1000, 3 / Math.sqrt(2), COLD);
    assertEquals(Math.hypot(11, 0.9) / (24 / Math.sqrt(3)), depth, 1e-12);
    assertEquals(1, r.depth(5 / 10e3, 1000, 9, COLD));
    Ripple delta = new Ripple(circuit(Connection.DELTA, 3, 6, 90e-6), 24, 40e3);
    double flux = Math.sqrt(3) * 5 / 10e3;
    assertEquals(depth, delta.depth(flux, 1000, 3 / Math.sqrt(6), COLD), 1e-12);
  }

  /**
   * Peak to peak and mean square of one phase: L, bus and period of 1. One phase: a full bridge.
   */
  private static double[] replayed(int m, double ohm, double depth, double degree, int steps) {
    double[] duty = legs(m, depth, degree);
    double[] volt = new double[steps];
    for (int i = 0; i < steps; i++) {
      double t = Math.abs((i + 0.5) / steps - 0.5) * 2;
      double mean = 0;
      for (double d : duty) {
        mean += (t < d ? 1.0 : 0.0) / duty.length;
      }
      double point = m <= 2 ? (t < duty[duty.length - 1] ? 1 : 0) : mean;
      volt[i] = (t < duty[0] ? 1 : 0) - point;
    }
    double rest = Arrays.stream(volt).average().orElseThrow();
    // Trapezoidal steps, i' = v − R i. They are linear: one period from nought gives the start of
    // the steady state.
    double keep = (1 - ohm / (2 * steps)) / (1 + ohm / (2 * steps));
    double gain = 1.0 / steps / (1 + ohm / (2 * steps));
    double at = 0;
    double all = 1;
    for (double v : volt) {
      at = keep * at + gain * (v - rest);
      all *= keep;
    }
    at /= 1 - all;
    double min = at;
    double max = at;
    double sum = 0;
    for (double v : volt) {
      double next = keep * at + gain * (v - rest);
      sum += (at * at + at * next + next * next) / 3 / steps;
      at = next;
      min = Math.min(min, at);
      max = Math.max(max, at);
    }
    return new double[] {max - min, sum};
  }

  private static double[] legs(int m, double depth, double degree) {
    if (m == 1) {
      double half = depth / 2 * Math.cos(Math.toRadians(degree));
      return new double[] {0.5 + half, 0.5 - half};
    }
    double[] duty = new double[m == 2 ? 3 : m];
    for (int k = 0; k < m; k++) {
      duty[k] = Math.cos(Math.toRadians(degree - k * (m == 2 ? 90 : 360.0 / m)));
    }
    double high = Arrays.stream(duty).max().orElseThrow();
    double low = Arrays.stream(duty).min().orElseThrow();
    // The largest phase peak that the bus allows at any angle, times the depth.
    double peak = depth / Circuit.greatestShare(m, Connection.STAR);
    for (int k = 0; k < duty.length; k++) {
      duty[k] = 0.5 + peak * (duty[k] - (high + low) / 2);
    }
    return duty;
  }
}
