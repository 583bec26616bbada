package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;

/**
 * The current ripple of pulse-width modulation in a phase's terminal, peak to peak, at its worst
 * over the modulation, with centred pulses, {@code V / (k L f)}.
 *
 * <p>k is 6 for a star of three, for each of two such stars, and for a delta by its star of L/3; 8
 * for open windings on full bridges with unipolar pulses (textbook); 4 for two phases whose star
 * point is on a third leg; 5(√5 − 1) for a star of five. The tests replay the stars pulse by pulse.
 *
 * <p>L is what the pulses meet, {@link Circuit#rippleHenry()}: the synchronous inductance in a star
 * or delta of three, of two stars each by itself; elsewhere the pulses of the phases are not in
 * step, and the lesser of self and synchronous inductance is taken.
 */
public final class Ripple {
  /** Ripple that is commonly held small, peak to peak over the peak of the duty's current. */
  public static final double AIM = 0.2;

  private Ripple() {}

  private static double divisor(Circuit c) {
    if (c.connection() == Connection.OPEN) {
      return 8;
    }
    return switch (c.phases()) {
      case 2 -> 4;
      case 5 -> 5 * (Math.sqrt(5) - 1);
      default -> 6;
    };
  }

  /** What the pulses meet in one winding, see above. Any unit. */
  public static double henry(
      int phases, Connection connection, double self, double synchronous, double terminal) {
    if (phases == 6 && connection == Connection.STAR) {
      return terminal / 2;
    }
    return phases == 3 && connection != Connection.OPEN ? synchronous : Math.min(self, synchronous);
  }

  /** A, peak to peak. */
  public static double amperePeakToPeak(Circuit c, double busVolt, double switchingHertz) {
    return busVolt / (divisor(c) * c.lineRippleHenry() * switchingHertz);
  }

  /**
   * The inductance in series with each terminal that brings the ripple to {@link #AIM} of the peak
   * of the duty's current; 0 where it is there already.
   *
   * @param lineAmpereRms the duty's current in a terminal
   */
  public static double seriesHenry(
      Circuit c, double busVolt, double switchingHertz, double lineAmpereRms) {
    double aim = AIM * Math.sqrt(2) * lineAmpereRms;
    double whole = busVolt / (divisor(c) * aim * switchingHertz);
    return Math.max(0, whole - c.lineRippleHenry());
  }

  /** What a ripple adds to the square of a current's rms: a triangle's, Δ²/12. */
  public static double meanSquare(double amperePeakToPeak) {
    return amperePeakToPeak * amperePeakToPeak / 12;
  }
}
