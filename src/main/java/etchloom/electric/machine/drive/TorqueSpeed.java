package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * The torque that the bus and a current limit leave at each speed, all current across the field
 * (i_d = 0).
 *
 * <p>In the line's star at the angular frequency ω: {@code u_q = R i + ω λ}, {@code u_d = −ω L i},
 * and the peak of the phase voltage is their root of squares (textbook dq equations at steady
 * state). The torque at the shaft is less by the drag of eddy and circulating currents; bearings
 * and air are left out.
 *
 * @param circuit the machine
 * @param fluxWeber flux linkage of one winding, peak
 * @param windingC temperature of the copper, °C
 * @param ampereRms limit of one winding's current
 * @param busVolt supply, or infinite where none is stated
 * @param dragNm drag at a speed in rad/s
 */
public record TorqueSpeed(
    Circuit circuit,
    double fluxWeber,
    double windingC,
    double ampereRms,
    double busVolt,
    DoubleUnaryOperator dragNm) {
  /** What keeps the torque from being larger. */
  public enum Limit {
    CURRENT("current"),
    VOLTAGE("voltage");

    private final String word;

    Limit(String word) {
      this.word = word;
    }

    public String word() {
      return word;
    }
  }

  /** One point of the line; at the shaft, never below nought. */
  public record Point(double rpm, double newtonMetre, Limit limit) {}

  /** Points of the line: enough for a plot. */
  private static final int POINTS = 25;

  /** No-load speed, where the back-EMF takes the whole voltage, rad/s. */
  public static double noLoadRadPerSecond(Circuit c, double fluxWeber, double busVolt) {
    return c.phaseVoltPeak(busVolt) / (c.polePairs() * c.lineWeber(fluxWeber));
  }

  /** The line from standstill to the no-load speed, in even steps. */
  public List<Point> line() {
    double top = noLoadRadPerSecond(circuit, fluxWeber, busVolt);
    List<Point> out = new ArrayList<>();
    for (int i = 0; i < POINTS; i++) {
      out.add(at(top * i / (POINTS - 1)));
    }
    return out;
  }

  /** The most torque at a speed, rad/s. */
  public Point at(double radPerSecond) {
    double most = Math.sqrt(2) * circuit.lineAmpere(ampereRms);
    double byVoltage = amperePeakByVoltage(radPerSecond);
    boolean voltage = byVoltage < most;
    double ampere = Math.max(0, Math.min(most, byVoltage));
    double air = circuit.torqueNm(circuit.lineWeber(fluxWeber), ampere);
    double shaft = Math.max(0, air - dragNm.applyAsDouble(radPerSecond));
    double rpm = radPerSecond * 30 / Math.PI;
    return new Point(rpm, shaft, voltage ? Limit.VOLTAGE : Limit.CURRENT);
  }

  /** The largest peak in the line that the voltage allows; nought above the no-load speed. */
  public double amperePeakByVoltage(double radPerSecond) {
    if (busVolt == Double.POSITIVE_INFINITY) {
      return busVolt;
    }
    double w = circuit.electricalRadPerSecond(radPerSecond);
    double r = circuit.lineOhm(windingC);
    double x = w * circuit.lineHenry();
    double e = w * circuit.lineWeber(fluxWeber);
    double v = circuit.phaseVoltPeak(busVolt);
    if (e >= v) {
      return 0;
    }
    // (R i + E)² + (X i)² = V², solved without a difference of nearly equal numbers.
    double half = r * e;
    double rest = (v - e) * (v + e);
    return rest / (half + Math.sqrt(half * half + (r * r + x * x) * rest));
  }
}
