package etchloom.electric.inductance;

/**
 * Multipole expansions of the vector potential in Cartesian coordinates, up to a total order.
 *
 * <p>A cluster's moments are {@code ∑ j x^a y^b z^c / (a! b! c!)} about its centre, one for each
 * term, for the current times length along x and then along y. Two clusters of radii r1 and r2 a
 * distance R apart couple to within about {@code ((r1 + r2) / R)^(order + 1)} of what their
 * currents would come to if none cancelled.
 *
 * <p>Source: Taylor's theorem; the recurrence for the derivatives of 1/r as in Z.-H. Duan and R.
 * Krasny, "An adaptive treecode for computing nonbonded potential energy in classical molecular
 * systems", J. Comput. Chem. 22 (2001), recalled and held against differences by a test.
 *
 * <p>Keeps scratch values: one for each thread.
 */
final class Expansion {
  /** Values a cluster has: those of the currents along x, then those along y. */
  static final int VALUES = 2 * Terms.COUNT;

  private static final int COUNT = Terms.COUNT;

  private final Terms terms = Terms.all();
  private final double[] power = new double[COUNT];

  /** The last stands for terms that do not exist and stays 0. */
  private final double[] derivative = new double[COUNT + 1];

  /** Powers of a vector over their factorials. */
  private void powers(double x, double y, double z) {
    power[0] = 1;
    for (int m = 1; m < COUNT; m++) {
      int axis = terms.power(0, m) > 0 ? 0 : terms.power(1, m) > 0 ? 1 : 2;
      double by = axis == 0 ? x : axis == 1 ? y : z;
      power[m] = power[terms.oneLess(axis, m)] * by / terms.power(axis, m);
    }
  }

  /** Adds a current element at a place seen from the centre, to the moments from {@code at} on. */
  void addPoint(double x, double y, double z, double jx, double jy, double[] moment, int at) {
    powers(x, y, z);
    for (int m = 0; m < COUNT; m++) {
      moment[at + m] += jx * power[m];
      moment[at + COUNT + m] += jy * power[m];
    }
  }

  /** Adds what a current element's own extent comes to: half its second moments about itself. */
  void addSpread(
      double xx, double xy, double yy, double zz, double jx, double jy, double[] moment, int at) {
    for (int m = terms.first(2); m < terms.first(3); m++) {
      double half =
          terms.power(0, m) == 2
              ? xx
              : terms.power(1, m) == 2
                  ? yy
                  : terms.power(2, m) == 2 ? zz : terms.power(2, m) == 0 ? 2 * xy : 0;
      moment[at + m] += jx * half;
      moment[at + COUNT + m] += jy * half;
    }
  }

  /**
   * Adds a child's moments to its parent's.
   *
   * @param x from the parent's centre to the child's
   */
  void addShifted(double x, double y, double z, double[] moment, int child, int parent) {
    powers(x, y, z);
    for (int n = 0; n < COUNT; n++) {
      double qx = moment[child + n];
      double qy = moment[child + COUNT + n];
      int[] to = terms.sums(n);
      for (int d = 0; d < to.length; d++) {
        moment[parent + to[d]] += qx * power[d];
        moment[parent + COUNT + to[d]] += qy * power[d];
      }
    }
  }

  /**
   * The sum over both clusters' elements of {@code j·j'/r}.
   *
   * @param x from the first's centre to the second's
   * @param upsideDown whether the second is its own image upside down
   */
  double couple(
      double x,
      double y,
      double z,
      double[] first,
      int a,
      double[] second,
      int b,
      boolean upsideDown) {
    double[] d = derivatives(x, y, z);
    double sum = 0;
    for (int m = 0; m < COUNT; m++) {
      int[] both = terms.sums(m);
      double sx = 0;
      double sy = 0;
      for (int n = 0; n < both.length; n++) {
        double share = upsideDown ? terms.mirrored(n) * d[both[n]] : d[both[n]];
        sx += share * second[b + n];
        sy += share * second[b + COUNT + n];
      }
      double part = sx * first[a + m] + sy * first[a + COUNT + m];
      sum += (terms.degree(m) & 1) == 0 ? part : -part;
    }
    return sum;
  }

  /** All derivatives of 1/r at a place, by the recurrence of its Taylor coefficients. */
  double[] derivatives(double x, double y, double z) {
    double[] d = derivative;
    double inverse = 1 / (x * x + y * y + z * z);
    d[0] = Math.sqrt(inverse);
    for (int degree = 1; degree <= Terms.ORDER; degree++) {
      double first = -(2 - 1.0 / degree) * inverse;
      double second = -(1 - 1.0 / degree) * inverse;
      for (int m = terms.first(degree); m < terms.first(degree + 1); m++) {
        double one = x * d[terms.oneLess(0, m)] + y * d[terms.oneLess(1, m)];
        double two = d[terms.twoLess(0, m)] + d[terms.twoLess(1, m)] + d[terms.twoLess(2, m)];
        d[m] = first * (one + z * d[terms.oneLess(2, m)]) + second * two;
      }
    }
    for (int m = 0; m < COUNT; m++) {
      d[m] *= terms.factorial(m);
    }
    return d;
  }
}
