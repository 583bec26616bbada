package etchloom.electric.inductance;

import static etchloom.electric.inductance.Expansion.TERMS;

/** Turns multipole moments about the shaft: a linear map within each degree and power of z. */
final class Turn {
  private final double c;
  private final double s;
  private final double[][] factor = new double[TERMS][];

  /**
   * @param c cosine of the angle, counter-clockwise
   * @param s sine of the angle
   */
  Turn(double c, double s) {
    this.c = c;
    this.s = s;
    for (int m = 0; m < TERMS; m++) {
      int degree = Expansion.degree(m);
      int first = Expansion.DEGREE_FROM[degree];
      factor[m] = new double[Expansion.DEGREE_FROM[degree + 1] - first];
      for (int n = 0; n < factor[m].length; n++) {
        if (Expansion.POWER_Z[first + n] == Expansion.POWER_Z[m]) {
          factor[m][n] = share(m, Expansion.POWER_X[first + n]);
        }
      }
    }
  }

  /**
   * What term m after the turn takes of the term with p powers of x before: the coefficient of
   * {@code x^p} in {@code (c x − s y)^a (s x + c y)^b}, with the factorials that moments come with.
   */
  private double share(int m, int p) {
    int a = Expansion.POWER_X[m];
    int b = Expansion.POWER_Y[m];
    double sum = 0;
    for (int i = Math.max(0, p - b); i <= Math.min(a, p); i++) {
      int j = p - i;
      double ways = choose(a, i) * choose(b, j);
      sum += ways * Math.pow(c, i + b - j) * Math.pow(s, a - i + j) * ((a - i) % 2 == 0 ? 1 : -1);
    }
    double before = Expansion.factorial(p) * Expansion.factorial(a + b - p);
    return sum * before / (Expansion.factorial(a) * Expansion.factorial(b));
  }

  private static double choose(int n, int k) {
    return Expansion.factorial(n) / (Expansion.factorial(k) * Expansion.factorial(n - k));
  }

  /** All clusters' moments, laid out as in {@link Clusters#moments}. */
  double[] of(double[] moment) {
    double[] out = new double[moment.length];
    for (int at = 0; at < moment.length; at += 2 * TERMS) {
      for (int m = 0; m < TERMS; m++) {
        int first = at + Expansion.DEGREE_FROM[Expansion.degree(m)];
        double[] f = factor[m];
        double qx = 0;
        double qy = 0;
        for (int n = 0; n < f.length; n++) {
          qx += f[n] * moment[first + n];
          qy += f[n] * moment[first + TERMS + n];
        }
        out[at + m] = c * qx - s * qy;
        out[at + TERMS + m] = s * qx + c * qy;
      }
    }
    return out;
  }
}
