package etchloom.receive;

/**
 * What the pairs show when one phase's own resistance is changed by a factor.
 *
 * <p>A phase is a resistor between two nodes, so each pair's resistance is a quotient of two linear
 * functions of it (Kirchhoff's laws, solved by Cramer's rule) and known for every factor from three
 * values: the phase shorted, as drawn, and open.
 *
 * @param mark the phase's
 */
record PhaseShift(String mark, double[] shorted, double[] drawn, double[] open) {

  /** Each pair's resistance with the phase's times a factor. */
  double[] at(double factor) {
    double[] out = new double[drawn.length];
    for (int p = 0; p < out.length; p++) {
      out[p] = at(p, factor);
    }
    return out;
  }

  private double at(int p, double factor) {
    double r0 = shorted[p];
    double r1 = drawn[p];
    if (Double.isInfinite(r1) || !(r1 > r0 * (1 + 1e-9))) {
      return r1;
    }
    if (Double.isInfinite(open[p])) {
      return r0 + (r1 - r0) * factor;
    }
    double k = (open[p] - r1) / (r1 - r0);
    return (r0 * k + open[p] * factor) / (k + factor);
  }
}
