package etchloom.electric.field;

/** Complete elliptic integrals. */
final class Elliptic {
  /** The iteration is quadratic: this change leaves an error near 1e-16. */
  private static final double CLOSE = 1e-8;

  private Elliptic() {}

  /**
   * Bulirsch's general complete integral, the integral from 0 to π/2 of {@code (a cos² + b sin²) /
   * ((cos² + p sin²) sqrt(cos² + kc² sin²))}.
   *
   * <p>Source: R. Bulirsch, "Numerical calculation of elliptic integrals and elliptic functions
   * III", Numerische Mathematik 13 (1969), the algorithm for p &gt; 0; recalled. Relative error
   * near 1e-15 while a and b do not cancel.
   *
   * @param kc complementary modulus, positive
   * @param p positive
   */
  static double cel(double kc, double p, double a, double b) {
    double k = Math.abs(kc);
    double e = k;
    double m = 1;
    double q = Math.sqrt(p);
    double c = a;
    double d = b / q;
    while (true) {
      double f = c;
      c = d / q + c;
      double g = e / q;
      d = 2 * (f * g + d);
      q = g + q;
      g = m;
      m = k + m;
      if (Math.abs(g - k) <= g * CLOSE) {
        return Math.PI / 2 * (c * m + d) / (m * (m + q));
      }
      k = 2 * Math.sqrt(e);
      e = k * m;
    }
  }

  /**
   * The complete integral of the second kind.
   *
   * @param kc complementary modulus, positive
   */
  static double e(double kc) {
    return cel(kc, 1, 1, kc * kc);
  }
}
