package etchloom.electric.field;

/**
 * The axial field of a ring of charge that varies as a cosine round the shaft: the integral over a
 * turn of {@code d cos(nψ) / (r² + s² + d² − 2 r s cos ψ)^(3/2)} for many orders n at once.
 *
 * <p>It is proportional to the derivative of the Legendre function {@code Q} of order n − 1/2 at
 * {@code χ = (r² + s² + d²) / (2 r s)}, the solution of its three-term recurrence that dies out as
 * n grows. So the ratios of neighbours come from the recurrence run downwards (a continued
 * fraction), and the first value from the elliptic integral of the second kind. Relative error
 * below 1e-10 at any n. Source: recurrences and toroidal functions as in Abramowitz and Stegun
 * 1964, 8.5.3 and 8.11 (recalled); held against quadrature by a test.
 */
final class RingKernel {
  /** Orders this far down (e^-n, 1.5e-8 of the lowest) add nothing that counts. */
  private static final double DEEP = 18;

  /**
   * The start of the downward run forgets its own error as e^-2n; e^-18 on a start good to 1e-4.
   */
  private static final double RUN_IN = 9;

  private final int step;
  private final int rings;

  /** Ratio of order n to order n − 1 of ring i at {@code n * rings + i}. */
  private final double[] ratio;

  private final int most;
  private final double[] chi;
  private final double[] q;
  private final double[] value;
  private final int[] top;

  /**
   * @param polePairs orders are its odd multiples
   * @param orders how many
   * @param rings how many rings are worked out at once: each step of a ring's recurrence waits for
   *     the one before, so that several side by side take little longer than one
   */
  RingKernel(int polePairs, int orders, int rings) {
    step = polePairs;
    this.rings = rings;
    most = polePairs * (2 * orders - 1) + 1;
    ratio = new double[(most + 1) * rings];
    chi = new double[rings];
    q = new double[rings];
    value = new double[rings];
    top = new int[rings];
  }

  /**
   * @param r radius of the field point, mm, positive
   * @param s radii of the rings, mm, positive
   * @param d height of the point over the rings, mm, not 0
   * @param out row i becomes ring i's values, entry k of order (2k + 1) times the pole pairs, 1/mm²
   * @param count entry i becomes how many of them were set; the rest are next to nothing beside
   *     order 0
   */
  void fill(double r, double[] s, double d, double[][] out, int[] count) {
    prepare(r, s, d, most - 1, 0);
    for (int i = 0; i < rings; i++) {
      count[i] = 0;
      value[i] *= d;
    }
    int deepest = deepest();
    int order = 0;
    int next = step;
    for (int n = 1; n <= deepest; n++) {
      for (int i = 0; i < rings; i++) {
        value[i] *= ratio[n * rings + i];
      }
      if (n == next) {
        for (int i = 0; i < rings; i++) {
          if (n <= top[i]) {
            out[i][order] = value[i];
            count[i] = order + 1;
          }
        }
        order++;
        next += 2 * step;
      }
    }
  }

  private int deepest() {
    int deepest = 0;
    for (int t : top) {
      deepest = Math.max(deepest, t);
    }
    return deepest;
  }

  /**
   * Sets each ring's orders that count, its ratios up to the deepest of them, and its value of
   * order 0 without the factor d.
   */
  private void prepare(double r, double[] s, double d, int limit, int more) {
    double flattest = Double.POSITIVE_INFINITY;
    for (int i = 0; i < rings; i++) {
      double near = (r - s[i]) * (r - s[i]) + d * d;
      double sum = (r + s[i]) * (r + s[i]) + d * d;
      double x = near / (2 * r * s[i]);
      double eta = 2 * Math.log(Math.sqrt(x / 2) + Math.sqrt(1 + x / 2));
      top[i] = (int) Math.min(limit, Math.ceil(DEEP / eta) + more);
      chi[i] = 1 + x;
      value[i] = 4 * Elliptic.e(Math.sqrt(near / sum)) / (near * Math.sqrt(sum));
      flattest = Math.min(flattest, eta);
    }
    int deepest = deepest();
    if (deepest >= step) {
      ratios(deepest, deepest + (int) Math.ceil(RUN_IN / flattest) + 4);
    }
  }

  /**
   * The same for the radial field: {@code (r − s cos ψ) cos(nψ) / (…)^(3/2)}, which is the axial
   * kernel without its factor d, times r, less s times the mean of the two neighbouring orders.
   *
   * @see #fill
   */
  void fillRadial(double r, double[] s, double d, double[][] out, int[] count) {
    prepare(r, s, d, most, 1);
    for (int i = 0; i < rings; i++) {
      count[i] = 0;
      if (top[i] > step) {
        count[i] = radial(r, s[i], i, out[i]);
      }
    }
  }

  private int radial(double r, double s, int ring, double[] out) {
    double before = value[ring];
    double now = before * ratio[rings + ring];
    int count = 0;
    int next = step;
    for (int n = 1; n < top[ring]; n++) {
      double after = now * ratio[(n + 1) * rings + ring];
      if (n == next) {
        out[count++] = r * now - s * (before + after) / 2;
        next += 2 * step;
      }
      before = now;
      now = after;
    }
    return count;
  }

  /** The recurrence downwards from an order above all that are wanted. */
  private void ratios(int deepest, int start) {
    double n = start;
    for (int i = 0; i < rings; i++) {
      double c = chi[i];
      q[i] = (n * c - Math.sqrt(n * n * c * c - n * n + 0.25)) / (n - 0.5);
    }
    for (int k = start - 1; k >= 1; k--) {
      double up = k + 0.5;
      double twice = 2.0 * k;
      double down = k - 0.5;
      for (int i = 0; i < rings; i++) {
        q[i] = up / (twice * chi[i] - down * q[i]);
      }
      if (k <= deepest) {
        System.arraycopy(q, 0, ratio, k * rings, rings);
      }
    }
  }
}
