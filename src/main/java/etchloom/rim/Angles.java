package etchloom.rim;

/** Angles on the circle, rad. */
final class Angles {
  /** Angles closer than this are the same. */
  static final double SAME = 1e-9;

  private Angles() {}

  /** In [0, 2π). */
  static double positive(double a) {
    double r = a % (2 * Math.PI);
    if (r < 0) {
      r += 2 * Math.PI;
    }
    return r >= 2 * Math.PI ? 0 : r;
  }

  /** In (-π, π]. */
  static double signed(double a) {
    double r = positive(a);
    return r > Math.PI ? r - 2 * Math.PI : r;
  }
}
