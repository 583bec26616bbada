package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;
import java.util.Arrays;

/**
 * The pulses that one phase of the line's star meets in a switching period, and the ripple they
 * leave in R and L in series: between two edges the current goes exponentially to the voltage over
 * R, and the steady state is the one that comes back to where it began.
 *
 * <p>Centred pulses, the legs' duties centred between the rails (space-vector modulation); each of
 * two stars of three by itself, a delta by its star, open windings on full bridges whose legs are
 * driven in opposite ways.
 */
final class Pulses {
  /** Angles over half a turn; the other half is the same with the signs turned. */
  private static final int ANGLES = 24;

  /** Below this share of the time constant an interval's square is summed by Simpson's rule. */
  private static final double SHORT = 0.05;

  /** Phases of a star whose point floats; 2 where it is on a leg of its own; 1 on a full bridge. */
  private final int star;

  Pulses(Circuit c) {
    star = c.connection() == Connection.OPEN ? 1 : c.phases() == 6 ? 3 : c.phases();
  }

  /**
   * Mean square of the ripple over half a turn of the field, in units of (bus over R)².
   *
   * @param depth of the modulation, 0 to 1
   * @param period of the switching over the time constant
   */
  double meanSquare(double depth, double period) {
    double sum = 0;
    for (int i = 0; i < ANGLES; i++) {
      sum += meanSquareAt(duties(depth, Math.PI * (i + 0.5) / ANGLES), period);
    }
    return sum / ANGLES;
  }

  /** Share of the period that each leg is on; the first is the phase's own. */
  private double[] duties(double depth, double angle) {
    if (star == 1) {
      double half = depth * Math.cos(angle) / 2;
      return new double[] {0.5 + half, 0.5 - half};
    }
    double[] d = new double[star == 2 ? 3 : star];
    double apart = star == 2 ? Math.PI / 2 : 2 * Math.PI / star;
    double high = star == 2 ? 0 : -1;
    double low = star == 2 ? 0 : 1;
    for (int k = 0; k < star; k++) {
      d[k] = Math.cos(angle - k * apart);
      high = Math.max(high, d[k]);
      low = Math.min(low, d[k]);
    }
    double peak = depth / Circuit.greatestShare(star, Connection.STAR);
    for (int k = 0; k < d.length; k++) {
      d[k] = 0.5 + peak * (d[k] - (high + low) / 2);
    }
    return d;
  }

  private double meanSquareAt(double[] duty, double period) {
    int n = duty.length;
    double[] edges = duty.clone();
    Arrays.sort(edges);
    // From the middle of the pulses to the period's end; what came before is its mirror image.
    double[] length = new double[n + 1];
    double[] level = new double[n + 1];
    double mean = 0;
    for (int j = 0; j <= n; j++) {
      double from = j == 0 ? 0 : edges[j - 1];
      double to = j == n ? 1 : edges[j];
      length[j] = to - from;
      level[j] = level(duty, (from + to) / 2);
      mean += level[j] * length[j];
    }
    double[] gained = new double[n + 1];
    for (int k = 0; k <= n; k++) {
      gained[k] = -Math.expm1(-length[k] * period / 2);
    }
    double end = 0;
    for (int j = -n - 1; j <= n; j++) {
      int k = j < 0 ? -j - 1 : j;
      end += (level[k] - mean - end) * gained[k];
    }
    double at = end / -Math.expm1(-period);
    double sum = 0;
    for (int j = -n - 1; j <= n; j++) {
      int k = j < 0 ? -j - 1 : j;
      double goal = level[k] - mean;
      sum += length[k] / 2 * interval(at, goal, length[k] * period / 2, gained[k]);
      at += (goal - at) * gained[k];
    }
    return sum;
  }

  /** The phase's voltage at a share of the way from the pulses' middle to the period's end. */
  private double level(double[] duty, double way) {
    double own = way < duty[0] ? 1 : 0;
    if (star <= 2) {
      return own - (way < duty[duty.length - 1] ? 1 : 0);
    }
    int on = 0;
    for (double d : duty) {
      on += way < d ? 1 : 0;
    }
    return own - (double) on / star;
  }

  /**
   * Mean square of a current that goes from a value towards a goal for {@code a} time constants.
   *
   * @param gained share of the way that is made in that time, {@code 1 − e^−a}
   */
  private static double interval(double from, double goal, double a, double gained) {
    if (a < SHORT) {
      double middle = from + (goal - from) * -Math.expm1(-a / 2);
      double to = from + (goal - from) * gained;
      return (from * from + 4 * middle * middle + to * to) / 6;
    }
    double off = from - goal;
    return goal * goal + (2 * goal * off * gained + off * off * gained * (2 - gained) / 2) / a;
  }
}
