package etchloom.electric.field;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class RingKernelTest {
  /** By another road: the periodic integrand by the trapezium rule, exact once it is resolved. */
  private static double quadrature(double r, double s, double d, int n) {
    int points = 200_000;
    double sum = 0;
    for (int i = 0; i < points; i++) {
      double a = 2 * Math.PI * i / points;
      double q = r * r + s * s + d * d - 2 * r * s * Math.cos(a);
      sum += d * Math.cos(n * a) / (q * Math.sqrt(q));
    }
    return sum * 2 * Math.PI / points;
  }

  /** Beside another ring, far off, whose recurrence is the shorter one. */
  private static int fill(int polePairs, int orders, double[] place, double[] out) {
    double[][] all = {new double[orders], out};
    int[] count = new int[2];
    double[] rings = {10 * place[1], place[1]};
    new RingKernel(polePairs, orders, 2).fill(place[0], rings, place[2], all, count);
    return count[1];
  }

  private static int fillRadial(int polePairs, int orders, double[] place, double[] out) {
    double[][] all = {out, new double[orders]};
    int[] count = new int[2];
    double[] rings = {place[1], 10 * place[1]};
    new RingKernel(polePairs, orders, 2).fillRadial(place[0], rings, place[2], all, count);
    return count[0];
  }

  @Test
  void agreesWithQuadrature() {
    double[][] places = {{20, 20.1, 0.8}, {12, 26, 0.8}, {20, 20, 6}, {25, 15, -3}, {3, 21, 1}};
    for (double[] p : places) {
      double[] out = new double[6];
      int n = fill(6, 6, p, out);
      double whole = Math.abs(quadrature(p[0], p[1], p[2], 0));
      for (int i = 0; i < n; i++) {
        double want = quadrature(p[0], p[1], p[2], 6 * (2 * i + 1));
        assertEquals(want, out[i], 1e-9 * Math.abs(want) + 1e-13 * whole, p[0] + " order " + i);
      }
    }
  }

  @Test
  void highOrdersCloseBy() {
    double[] out = new double[40];
    assertEquals(40, fill(8, 40, new double[] {20, 20.02, 0.2}, out));
    double want = quadrature(20, 20.02, 0.2, 8 * 79);
    assertEquals(want, out[39], 1e-8 * Math.abs(want));
  }

  /** The radial kernel, {@code (r − s cos) cos(n·) / (…)^(3/2)}, by the trapezium rule. */
  @Test
  void radialAgreesWithQuadrature() {
    double[][] places = {{20, 20.1, 0.8}, {12, 26, 0.8}, {20, 20, 6}, {25, 15, -3}, {21, 19, 1}};
    for (double[] p : places) {
      double[] out = new double[4];
      int n = fillRadial(6, 4, p, out);
      for (int i = 0; i < n; i++) {
        double want = radial(p[0], p[1], p[2], 6 * (2 * i + 1));
        double scale = Math.abs(radial(p[0], p[1], p[2], 0));
        assertEquals(want, out[i], 1e-7 * Math.abs(want) + 1e-12 * scale, p[0] + " order " + i);
      }
    }
  }

  private static double radial(double r, double s, double d, int n) {
    int points = 20_000;
    double sum = 0;
    for (int i = 0; i < points; i++) {
      double a = 2 * Math.PI * i / points;
      double q = r * r + s * s + d * d - 2 * r * s * Math.cos(a);
      sum += (r - s * Math.cos(a)) * Math.cos(n * a) / (q * Math.sqrt(q));
    }
    return sum * 2 * Math.PI / points;
  }
}
