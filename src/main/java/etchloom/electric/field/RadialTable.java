package etchloom.electric.field;

import java.util.Arrays;

/** Several functions of the radius at once, by natural cubic splines over common knots. */
final class RadialTable {
  private final double[] knot;
  private final int width;
  private final double[] value;
  private final double[] bend;

  /**
   * @param knot ascending, at least 3
   * @param rows the functions' values at each knot, all of one length
   */
  RadialTable(double[] knot, double[][] rows) {
    this.knot = Arrays.copyOf(knot, knot.length);
    width = rows[0].length;
    value = new double[knot.length * width];
    for (int i = 0; i < knot.length; i++) {
      System.arraycopy(rows[i], 0, value, i * width, width);
    }
    bend = bends();
  }

  /** Second derivatives at the knots, nought at both ends. */
  private double[] bends() {
    int n = knot.length;
    double[] m = new double[n * width];
    double[] pivot = new double[n];
    for (int i = 1; i < n - 1; i++) {
      double h0 = knot[i] - knot[i - 1];
      double h1 = knot[i + 1] - knot[i];
      double lower = i > 1 ? h0 / pivot[i - 1] : 0;
      pivot[i] = 2 * (h0 + h1) - lower * h0;
      for (int j = 0; j < width; j++) {
        int k = i * width + j;
        double rise1 = (value[k + width] - value[k]) / h1;
        double rise0 = (value[k] - value[k - width]) / h0;
        m[k] = 6 * (rise1 - rise0) - lower * m[k - width];
      }
    }
    for (int i = n - 2; i >= 1; i--) {
      double h1 = knot[i + 1] - knot[i];
      for (int j = 0; j < width; j++) {
        int k = i * width + j;
        m[k] = (m[k] - h1 * m[k + width]) / pivot[i];
      }
    }
    return m;
  }

  int width() {
    return width;
  }

  /** Outside the knots the nearest end's value holds. */
  void at(double r, double[] out) {
    double x = Math.max(knot[0], Math.min(knot[knot.length - 1], r));
    int lo = 0;
    int hi = knot.length - 1;
    while (hi - lo > 1) {
      int mid = (lo + hi) >>> 1;
      if (knot[mid] <= x) {
        lo = mid;
      } else {
        hi = mid;
      }
    }
    double h = knot[hi] - knot[lo];
    double b = (x - knot[lo]) / h;
    double a = 1 - b;
    double ca = (a * a * a - a) * h * h / 6;
    double cb = (b * b * b - b) * h * h / 6;
    int k = lo * width;
    for (int j = 0; j < width; j++, k++) {
      out[j] = a * value[k] + b * value[k + width] + ca * bend[k] + cb * bend[k + width];
    }
  }
}
