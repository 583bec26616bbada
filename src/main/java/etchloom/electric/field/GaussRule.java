package etchloom.electric.field;

/** Gauss-Legendre nodes and weights on [-1, 1]. */
public final class GaussRule {
  private final double[] node;
  private final double[] weight;

  /** Newton's iteration on the Legendre polynomial of degree n; nodes good to rounding. */
  public GaussRule(int n) {
    node = new double[n];
    weight = new double[n];
    for (int i = 0; i < n; i++) {
      double x = Math.cos(Math.PI * (i + 0.75) / (n + 0.5));
      double slope = 0;
      for (int k = 0; k < 8; k++) {
        double p0 = 1;
        double p1 = x;
        for (int j = 2; j <= n; j++) {
          double p2 = ((2 * j - 1) * x * p1 - (j - 1) * p0) / j;
          p0 = p1;
          p1 = p2;
        }
        slope = n * (x * p1 - p0) / (x * x - 1);
        x -= p1 / slope;
      }
      node[i] = x;
      weight[i] = 2 / ((1 - x * x) * slope * slope);
    }
  }

  public int size() {
    return node.length;
  }

  public double node(int i) {
    return node[i];
  }

  public double weight(int i) {
    return weight[i];
  }
}
