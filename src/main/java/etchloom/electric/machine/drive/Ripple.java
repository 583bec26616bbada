package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.spec.Spec.Connection;

/**
 * The current ripple of pulse-width modulation in a line, with centred pulses, in a winding of
 * resistance and inductance.
 *
 * <p>At its worst over the modulation the voltage across a phase of the line's star is a square
 * wave of equal halves, and the steady state of R and L in series under it is known exactly
 * (textbook, first order): from peak to peak {@code (U/R) tanh(T/4τ)}, with U the wave's height, T
 * its period and τ = L/R. For τ ≫ T that is {@code V/(k L f)}: k is 6 for a star of three, for each
 * of two such stars, and for a delta by its star of L/3 and R/3; 8 for open windings on full
 * bridges with unipolar pulses; 4 for two phases whose star point is on a third leg; 5(√5 − 1) for
 * a star of five, whose wave has more than two levels: there both ends, τ ≫ T and τ ≪ T, are met
 * and what is between them up to 8 % high. The tests replay all of them pulse by pulse.
 *
 * <p>L is what the pulses meet, {@link Circuit#rippleHenry()}: the synchronous inductance in a star
 * or delta of three, of two stars each by itself; elsewhere the pulses of the phases are not in
 * step, and the lesser of self and synchronous inductance is taken. Resistance at the copper's
 * temperature; no skin effect at the switching frequency.
 */
public record Ripple(Circuit circuit, double busVolt, double switchingHertz) {
  /** Ripple that is commonly held small, peak to peak over the peak of the duty's current. */
  public static final double AIM = 0.2;

  /** Below this the series of {@code 1 − tanh(x)/x} is nearer than its terms. */
  private static final double SMALL = 1e-3;

  /** What the pulses meet in one winding, see above. Any unit. */
  public static double henry(
      int phases, Connection connection, double self, double synchronous, double terminal) {
    if (phases == 6 && connection == Connection.STAR) {
      return terminal / 2;
    }
    return phases == 3 && connection != Connection.OPEN ? synchronous : Math.min(self, synchronous);
  }

  /** At its worst over the modulation, A peak to peak in a line. */
  public double amperePeakToPeak(double tempC) {
    return steadyAmpere(tempC) * Math.tanh(quarters(tempC));
  }

  /**
   * What that worst ripple adds to the square of a line current's rms if it were there all the
   * time, A²: {@code (U/2R)² (1 − tanh(x)/x)}, x = T/4τ, which tends to a triangle's Δ²/12.
   */
  public double worstMeanSquare(double tempC) {
    double x = quarters(tempC);
    double part = x < SMALL ? x * x / 3 - 2 * x * x * x * x / 15 : 1 - Math.tanh(x) / x;
    double half = steadyAmpere(tempC) / 2;
    return half * half * part;
  }

  /**
   * What the ripple adds to the square of a line current's rms at one depth of modulation, the mean
   * over a turn of the field, A².
   *
   * @param depth peak of a phase's voltage over the greatest the bus gives, 0 to 1
   */
  public double meanSquare(double depth, double tempC) {
    double tau = circuit.lineRippleHenry() / circuit.lineOhm(tempC);
    return new Pulses(circuit).meanSquare(depth, 1 / (tau * switchingHertz))
        * square(busVolt / circuit.lineOhm(tempC));
  }

  /**
   * The depth of modulation that a current needs: {@code |R i + jωL i + E|} over the greatest peak
   * the bus gives, current across the field, at most 1.
   *
   * @param fluxWeber flux linkage of one winding, peak
   * @param radPerSecond of the shaft
   * @param windingAmpereRms of one winding
   */
  public double depth(
      double fluxWeber, double radPerSecond, double windingAmpereRms, double tempC) {
    double w = circuit.electricalRadPerSecond(radPerSecond);
    double i = Math.sqrt(2) * circuit.lineAmpere(windingAmpereRms);
    double across = circuit.lineOhm(tempC) * i + w * circuit.lineWeber(fluxWeber);
    double need = Math.hypot(across, w * circuit.lineHenry() * i);
    return Math.min(1, need / circuit.phaseVoltPeak(busVolt));
  }

  /**
   * The inductance in series with each line that brings the worst ripple to {@link #AIM} of the
   * peak of the duty's current in a line, itself without resistance; 0 where it is there already.
   *
   * @param lineAmpereRms the duty's current in a line
   */
  public double seriesHenry(double lineAmpereRms, double tempC) {
    double share = AIM * Math.sqrt(2) * lineAmpereRms / steadyAmpere(tempC);
    if (share >= 1) {
      return 0;
    }
    double x = (Math.log1p(share) - Math.log1p(-share)) / 2; // the inverse of tanh
    double whole = circuit.lineOhm(tempC) / (4 * x * wavesPerPeriod() * switchingHertz);
    return Math.max(0, whole - circuit.lineRippleHenry());
  }

  /** Difference of the currents that the wave's two levels would end at, A. */
  private double steadyAmpere(double tempC) {
    return height() * busVolt / circuit.lineOhm(tempC);
  }

  /** A quarter of the wave's period over the time constant. */
  private double quarters(double tempC) {
    double tau = circuit.lineRippleHenry() / circuit.lineOhm(tempC);
    return 1 / (4 * tau * wavesPerPeriod() * switchingHertz);
  }

  /** Height of the worst wave of a phase's voltage, as a share of the bus. */
  private double height() {
    if (circuit.connection() == Connection.OPEN) {
      return 1;
    }
    return switch (circuit.phases()) {
      case 2 -> 1;
      case 5 -> 4 / 5.0;
      default -> 2 / 3.0;
    };
  }

  /** How often that wave comes in a period of the switching; k = 4 of these over the height. */
  private double wavesPerPeriod() {
    if (circuit.connection() == Connection.OPEN) {
      return 2;
    }
    return circuit.phases() == 5 ? Math.sqrt(5) - 1 : 1;
  }

  private static double square(double x) {
    return x * x;
  }
}
