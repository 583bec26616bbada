package etchloom.electric.machine.heat;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.resistance.Copper;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/**
 * All losses of a machine at one operating point, by copper temperature.
 *
 * @param windingAmpereRms current of one winding at a temperature, without ripple; a generator's
 *     falls as its copper warms
 * @param rippleSquare what ripple adds to the square of the current's rms in a terminal, A²
 * @param layersWatt at 20 °C for each (rad/s)², of currents among layers side by side
 * @param radPerSecond of the shaft
 */
public record Losses(
    Circuit circuit,
    DoubleUnaryOperator windingAmpereRms,
    double rippleSquare,
    Optional<EddyLoss> eddy,
    Optional<CirculatingCurrent> circulating,
    OptionalDouble layersWatt,
    double radPerSecond) {

  /** I²R of the wanted current, W. */
  public double copperWatt(double tempC) {
    double i = windingAmpereRms.applyAsDouble(tempC);
    return circuit.phases() * i * i * circuit.windingOhm(tempC);
  }

  public double rippleWatt(double tempC) {
    return circuit.phases() * rippleSquare * circuit.lineOhm(tempC);
  }

  public double eddyWatt(double tempC) {
    return eddy.map(e -> e.watt(radPerSecond, tempC)).orElse(0.0);
  }

  public double circulatingWatt(double tempC) {
    double layers = layersWatt.orElse(0) * radPerSecond * radPerSecond / Copper.factor(tempC);
    return circulating.map(c -> c.watt(radPerSecond, tempC)).orElse(0.0) + layers;
  }

  /** All but the wanted current's own. */
  public double otherWatt(double tempC) {
    return rippleWatt(tempC) + eddyWatt(tempC) + circulatingWatt(tempC);
  }

  public double totalWatt(double tempC) {
    return copperWatt(tempC) + otherWatt(tempC);
  }
}
