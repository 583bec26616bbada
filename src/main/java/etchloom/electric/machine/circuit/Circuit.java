package etchloom.electric.machine.circuit;

import etchloom.electric.resistance.Copper;
import etchloom.spec.Spec.Connection;

/**
 * A balanced machine by the values of one winding, and the star that a drive sees in its place.
 *
 * <p>A delta of R, L, λ is, from its corners, a star of R/3, L/3, λ/√3 that carries √3 times the
 * winding's current (textbook star-delta transformation); windings in star or open are their own
 * star. Values of this star are called the line's.
 *
 * @param windingOhm20 one winding with its leads, at 20 °C
 * @param windingHenry synchronous: self less mutual
 * @param rippleHenry what the pulses of a drive meet in one winding, see {@link
 *     etchloom.electric.machine.drive.Ripple}
 * @param zeroHenry what a current equal in all windings meets: self plus all mutuals
 */
public record Circuit(
    int phases,
    Connection connection,
    int polePairs,
    double windingOhm20,
    double windingHenry,
    double rippleHenry,
    double zeroHenry) {

  /** A machine whose pulses meet the synchronous inductance, as with three phases in star. */
  public Circuit(
      int phases,
      Connection connection,
      int polePairs,
      double windingOhm20,
      double windingHenry,
      double zeroHenry) {
    this(phases, connection, polePairs, windingOhm20, windingHenry, windingHenry, zeroHenry);
  }

  public Circuit {
    if (!(windingOhm20 > 0 && windingOhm20 < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException("a winding of " + windingOhm20 + " ohm");
    }
    if (!(windingHenry > 0 && windingHenry < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException("a winding of " + windingHenry + " H");
    }
  }

  /**
   * One winding's resistance from the mean between two terminals: half of it in a star, 3/2 of it
   * in a triangle, all of it where both ends come out.
   */
  public static double windingOhm(Connection connection, double terminalOhm) {
    return switch (connection) {
      case STAR -> terminalOhm / 2;
      case DELTA -> terminalOhm * 1.5;
      case OPEN -> terminalOhm;
    };
  }

  public double windingOhm(double tempC) {
    return windingOhm20 * Copper.factor(tempC);
  }

  public double lineOhm(double tempC) {
    return delta() ? windingOhm(tempC) / 3 : windingOhm(tempC);
  }

  public double lineHenry() {
    return delta() ? windingHenry / 3 : windingHenry;
  }

  public double lineRippleHenry() {
    return delta() ? rippleHenry / 3 : rippleHenry;
  }

  /** Current in a terminal for a current in a winding. */
  public double lineAmpere(double windingAmpere) {
    return delta() ? Math.sqrt(3) * windingAmpere : windingAmpere;
  }

  /** Flux linkage (or voltage) of the line's star for that of a winding. */
  public double lineWeber(double windingWeber) {
    return delta() ? windingWeber / Math.sqrt(3) : windingWeber;
  }

  /**
   * Voltage between two terminals over that of a winding: line to line between neighbouring phases
   * of a star, √3 for three; a winding's own where it is open or in delta.
   */
  public double terminalShare() {
    if (connection != Connection.STAR) {
      return 1;
    }
    return switch (phases) {
      case 2 -> Math.sqrt(2);
      case 5 -> 2 * Math.sin(Math.PI / 5);
      default -> Math.sqrt(3);
    };
  }

  /**
   * The greatest voltage between any two terminals that a star point joins over that of a winding:
   * with five phases not neighbours but phases 144° apart, {@code 2 cos π/10}.
   */
  public static double greatestShare(int phases, Connection connection) {
    if (connection != Connection.STAR) {
      return 1;
    }
    return switch (phases) {
      case 2 -> Math.sqrt(2);
      case 5 -> 2 * Math.cos(Math.PI / 10);
      default -> Math.sqrt(3);
    };
  }

  /**
   * Largest peak of a phase's voltage that a drive makes from a bus with centred modulation, of the
   * line's star: bus/√3 for three phases (textbook: space-vector modulation), bus / (2 cos π/2m)
   * for m odd, all of the bus where each winding has a full bridge.
   */
  public double phaseVoltPeak(double busVolt) {
    if (connection == Connection.OPEN) {
      return busVolt;
    }
    return switch (phases) {
      case 2 -> busVolt / Math.sqrt(2);
      case 5 -> busVolt / (2 * Math.cos(Math.PI / 10));
      default -> busVolt / Math.sqrt(3);
    };
  }

  /**
   * Torque of field-oriented sinusoidal currents, N·m: {@code m/2 · p · λ · i}, peaks of one
   * winding (amplitude-invariant dq transform, no current along d). With one phase it is the mean
   * of a torque that pulsates between nought and twice.
   */
  public double torqueNm(double fluxWeber, double amperePeak) {
    return phases / 2.0 * polePairs * fluxWeber * amperePeak;
  }

  public double electricalRadPerSecond(double radPerSecond) {
    return polePairs * radPerSecond;
  }

  private boolean delta() {
    return connection == Connection.DELTA;
  }
}
