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
  private final double[] ratio;

  /**
   * @param polePairs orders are its odd multiples
   * @param orders how many
   */
  RingKernel(int polePairs, int orders) {
    step = polePairs;
    ratio = new double[polePairs * (2 * orders - 1) + 2];
  }

  /**
   * @param r radius of the field point, mm, positive
   * @param s radius of the ring, mm, positive
   * @param d height of the point over the ring, mm, not 0
   * @param out entry i becomes the value of order (2i + 1) times the pole pairs, 1/mm²
   * @return how many entries were set; the rest are next to nothing beside order 0
   */
  int fill(double r, double s, double d, double[] out) {
    double near = (r - s) * (r - s) + d * d;
    double sum = (r + s) * (r + s) + d * d;
    double x = near / (2 * r * s);
    double eta = 2 * Math.log(Math.sqrt(x / 2) + Math.sqrt(1 + x / 2));
    int top = (int) Math.min(ratio.length - 2, Math.ceil(DEEP / eta));
    if (top < step) {
      return 0;
    }
    ratios(1 + x, eta, top);
    double v = d * 4 * Elliptic.e(Math.sqrt(near / sum)) / (near * Math.sqrt(sum));
    int count = 0;
    int next = step;
    for (int n = 1; n <= top; n++) {
      v *= ratio[n];
      if (n == next) {
        out[count++] = v;
        next += 2 * step;
      }
    }
    return count;
  }

  /**
   * The same for the radial field: {@code (r − s cos ψ) cos(nψ) / (…)^(3/2)}, which is the axial
   * kernel without its factor d, times r, less s times the mean of the two neighbouring orders.
   *
   * @see #fill
   */
  int fillRadial(double r, double s, double d, double[] out) {
    double near = (r - s) * (r - s) + d * d;
    double sum = (r + s) * (r + s) + d * d;
    double x = near / (2 * r * s);
    double eta = 2 * Math.log(Math.sqrt(x / 2) + Math.sqrt(1 + x / 2));
    int top = (int) Math.min(ratio.length - 1, Math.ceil(DEEP / eta) + 1);
    if (top <= step) {
      return 0;
    }
    ratios(1 + x, eta, top);
    double before = 4 * Elliptic.e(Math.sqrt(near / sum)) / (near * Math.sqrt(sum));
    double now = before * ratio[1];
    int count = 0;
    int next = step;
    for (int n = 1; n < top; n++) {
      double after = now * ratio[n + 1];
      if (n == next) {
        out[count++] = r * now - s * (before + after) / 2;
        next += 2 * step;
      }
      before = now;
      now = after;
    }
    return count;
  }

  /** Ratio of order n to order n − 1, for n from 1 to top. */
  private void ratios(double chi, double eta, int top) {
    int start = top + (int) Math.ceil(RUN_IN / eta) + 4;
    double n = start;
    double q = (n * chi - Math.sqrt(n * n * chi * chi - n * n + 0.25)) / (n - 0.5);
    for (int k = start - 1; k > top; k--) {
      q = (k + 0.5) / (2 * k * chi - (k - 0.5) * q);
    }
    for (int k = top; k >= 1; k--) {
      q = (k + 0.5) / (2 * k * chi - (k - 0.5) * q);
      ratio[k] = q;
    }
  }
}
