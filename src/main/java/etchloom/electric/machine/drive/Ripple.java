package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;
import java.util.OptionalDouble;

/**
 * The current ripple of pulse-width modulation in a terminal, peak to peak, at its worst over the
 * modulation, with centred pulses: {@code V / (6 L f)} for a star of three and for a delta by its
 * star of L/3, {@code V / (8 L f)} for open windings on full bridges with unipolar pulses
 * (textbook; the first replayed by simulation elsewhere). Others are not known here.
 */
public final class Ripple {
  /** Ripple that is commonly held small, peak to peak over the peak of the duty's current. */
  public static final double AIM = 0.2;

  private Ripple() {}

  private static OptionalDouble divisor(Circuit c) {
    if (c.connection() == Connection.OPEN) {
      return OptionalDouble.of(8);
    }
    return c.phases() == 3 || c.phases() == 6 ? OptionalDouble.of(6) : OptionalDouble.empty();
  }

  /** Whether there is a formula for this connection. */
  public static boolean known(Circuit c) {
    return divisor(c).isPresent();
  }

  /** A, peak to peak; empty where no formula is known for the connection. */
  public static OptionalDouble amperePeakToPeak(Circuit c, double busVolt, double switchingHertz) {
    OptionalDouble k = divisor(c);
    return k.isEmpty()
        ? k
        : OptionalDouble.of(busVolt / (k.getAsDouble() * c.lineHenry() * switchingHertz));
  }

  /**
   * The inductance in series with each terminal that brings the ripple to {@link #AIM} of the peak
   * of the duty's current; 0 where it is there already.
   *
   * @param lineAmpereRms the duty's current in a terminal
   */
  public static OptionalDouble seriesHenry(
      Circuit c, double busVolt, double switchingHertz, double lineAmpereRms) {
    OptionalDouble k = divisor(c);
    if (k.isEmpty()) {
      return k;
    }
    double aim = AIM * Math.sqrt(2) * lineAmpereRms;
    double whole = busVolt / (k.getAsDouble() * aim * switchingHertz);
    return OptionalDouble.of(Math.max(0, whole - c.lineHenry()));
  }

  /** What a ripple adds to the square of a current's rms: a triangle's, Δ²/12. */
  public static double meanSquare(double amperePeakToPeak) {
    return amperePeakToPeak * amperePeakToPeak / 12;
  }
}
