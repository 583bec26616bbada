package etchloom.electric.machine.heat;

import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.machine.emf.FluxSeries;
import java.util.List;

/**
 * The current that the windings' voltages drive round a closed delta: what does not cancel round
 * the loop, above all orders divisible by three, over the loop's resistance and its zero-sequence
 * inductance. Textbook circuit theory; all orders of the copper's own series.
 */
public final class CirculatingCurrent {
  private final Circuit circuit;
  private final double[] voltSecond;

  public CirculatingCurrent(Circuit circuit, List<FluxSeries> phases) {
    this.circuit = circuit;
    voltSecond = new double[phases.get(0).orders()];
    for (int i = 0; i < voltSecond.length; i++) {
      double re = 0;
      double im = 0;
      for (FluxSeries p : phases) {
        re += p.re(i);
        im += p.im(i);
      }
      voltSecond[i] = Math.hypot(re, im);
    }
  }

  /** A rms round the loop. */
  public double ampereRms(double radPerSecond, double tempC) {
    double r = circuit.phases() * circuit.windingOhm(tempC);
    double sum = 0;
    for (int i = 0; i < voltSecond.length; i++) {
      double w = (2 * i + 1) * circuit.electricalRadPerSecond(radPerSecond);
      double x = w * circuit.phases() * Math.max(0, circuit.zeroHenry());
      double e = voltSecond[i] * radPerSecond;
      sum += e * e / 2 / (r * r + x * x);
    }
    return Math.sqrt(sum);
  }

  public double watt(double radPerSecond, double tempC) {
    double i = ampereRms(radPerSecond, tempC);
    return circuit.phases() * circuit.windingOhm(tempC) * i * i;
  }
}
