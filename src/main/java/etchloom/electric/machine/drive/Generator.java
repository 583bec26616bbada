package etchloom.electric.machine.drive;

import etchloom.electric.machine.circuit.Circuit;

/**
 * A machine driven at a speed with a resistor on each winding: {@code I = E / |R + R_load + jωL|},
 * fundamentals, rms of one winding (textbook synchronous generator without saliency).
 *
 * @param circuit the machine
 * @param fluxWeber flux linkage of one winding, peak
 * @param radPerSecond of the shaft
 * @param loadOhm on each winding
 */
public record Generator(Circuit circuit, double fluxWeber, double radPerSecond, double loadOhm) {
  /** Open-circuit voltage of one winding, V rms. */
  public static double openVoltRms(Circuit c, double fluxWeber, double radPerSecond) {
    return c.electricalRadPerSecond(radPerSecond) * fluxWeber / Math.sqrt(2);
  }

  /** A rms in each winding and its load, the copper at a temperature. */
  public double ampereRms(double tempC) {
    double x = circuit.electricalRadPerSecond(radPerSecond) * circuit.windingHenry();
    double r = circuit.windingOhm(tempC) + loadOhm;
    return openVoltRms(circuit, fluxWeber, radPerSecond) / Math.hypot(r, x);
  }

  public double loadVoltRms(double tempC) {
    return ampereRms(tempC) * loadOhm;
  }

  /** W in all loads together. */
  public double loadWatt(double tempC) {
    double i = ampereRms(tempC);
    return circuit.phases() * i * i * loadOhm;
  }
}
