package etchloom.electric.machine.heat;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.resistance.Copper;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;

/**
 * All losses of a machine at one operating point, by copper temperature.
 *
 * @param windingAmpereRms current of one winding at a temperature, without ripple; a generator's
 *     falls as its copper warms
 * @param rippleSquare what ripple adds to the square of a line current's rms, A², by the winding's
 *     current and the copper's temperature
 * @param layersWatt at 20 °C for each (rad/s)², of currents among layers side by side
 * @param radPerSecond of the shaft
 */
public record Losses(
    Circuit circuit,
    DoubleUnaryOperator windingAmpereRms,
    DoubleBinaryOperator rippleSquare,
    Optional<EddyLoss> eddy,
    Optional<CirculatingCurrent> circulating,
    OptionalDouble layersWatt,
    double radPerSecond) {

  /** I²R of the wanted current, W. */
  public double copperWatt(double tempC) {
    return copperWatt(windingAmpereRms.applyAsDouble(tempC), tempC);
  }

  private double copperWatt(double ampereRms, double tempC) {
    return circuit.phases() * ampereRms * ampereRms * circuit.windingOhm(tempC);
  }

  public double rippleWatt(double tempC) {
    return rippleWatt(windingAmpereRms.applyAsDouble(tempC), tempC);
  }

  private double rippleWatt(double ampereRms, double tempC) {
    double square = rippleSquare.applyAsDouble(ampereRms, tempC);
    return circuit.phases() * square * circuit.lineOhm(tempC);
  }

  public double eddyWatt(double tempC) {
    return eddy.map(e -> e.watt(radPerSecond, tempC)).orElse(0.0);
  }

  public double circulatingWatt(double tempC) {
    double layers = layersWatt.orElse(0) * radPerSecond * radPerSecond / Copper.factor(tempC);
    return circulating.map(c -> c.watt(radPerSecond, tempC)).orElse(0.0) + layers;
  }

  /** All of them, were another current in the windings, A rms; 0 leaves all but its own. */
  public double totalWatt(double ampereRms, double tempC) {
    return copperWatt(ampereRms, tempC)
        + rippleWatt(ampereRms, tempC)
        + eddyWatt(tempC)
        + circulatingWatt(tempC);
  }

  public double totalWatt(double tempC) {
    return totalWatt(windingAmpereRms.applyAsDouble(tempC), tempC);
  }
}
