package etchloom.electric.inductance;

/** Turns multipole moments about the shaft: a linear map within each degree and power of z. */
final class Turn {
  private static final int COUNT = Terms.COUNT;

  private final Terms terms = Terms.all();
  private final double c;
  private final double s;

  /** For each term what it takes of each term of its degree. */
  private final double[][] factor = new double[COUNT][];

  /**
   * @param c cosine of the angle, counter-clockwise
   * @param s sine of the angle
   */
  Turn(double c, double s) {
    this.c = c;
    this.s = s;
    for (int m = 0; m < COUNT; m++) {
      int first = terms.first(terms.degree(m));
      factor[m] = new double[terms.first(terms.degree(m) + 1) - first];
      for (int n = 0; n < factor[m].length; n++) {
        if (terms.power(2, first + n) == terms.power(2, m)) {
          factor[m][n] = share(terms.power(0, m), terms.power(1, m), terms.power(0, first + n));
        }
      }
    }
  }

  /**
   * The coefficient of {@code x^p} in {@code (c x − s y)^a (s x + c y)^b}, times the factorials
   * that the moments come with.
   */
  private double share(int a, int b, int p) {
    double sum = 0;
    for (int i = Math.max(0, p - b); i <= Math.min(a, p); i++) {
      int j = p - i;
      double ways = choose(a, i) * choose(b, j);
      double sign = (a - i) % 2 == 0 ? 1 : -1;
      sum += sign * ways * Math.pow(c, i + b - j) * Math.pow(s, a - i + j);
    }
    double before = Terms.ofNumber(p) * Terms.ofNumber(a + b - p);
    return sum * before / (Terms.ofNumber(a) * Terms.ofNumber(b));
  }

  private static double choose(int n, int k) {
    return Terms.ofNumber(n) / (Terms.ofNumber(k) * Terms.ofNumber(n - k));
  }

  /** All clusters' moments after the turn. */
  double[] of(double[] moment) {
    double[] out = new double[moment.length];
    for (int at = 0; at < moment.length; at += Expansion.VALUES) {
      for (int m = 0; m < COUNT; m++) {
        int first = at + terms.first(terms.degree(m));
        double[] f = factor[m];
        double qx = 0;
        double qy = 0;
        for (int n = 0; n < f.length; n++) {
          qx += f[n] * moment[first + n];
          qy += f[n] * moment[first + COUNT + n];
        }
        out[at + m] = c * qx - s * qy;
        out[at + COUNT + m] = s * qx + c * qy;
      }
    }
    return out;
  }
}
