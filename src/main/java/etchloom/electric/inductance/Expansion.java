package etchloom.electric.inductance;

/**
 * Multipole expansions of the vector potential in Cartesian coordinates, up to a total order.
 *
 * <p>A cluster's moments are {@code ∑ j x^a y^b z^c / (a! b! c!)} about its centre, for the current
 * times length along x and along y, one value for each power (a, b, c) of total degree up to the
 * order. Two clusters a distance R apart, of radii r1 and r2, then couple to within about ((r1 +
 * r2)/R)^(order + 1) of what their currents would if they did not cancel.
 *
 * <p>Source: Taylor's theorem; the recurrence for the derivatives of 1/r as in Z.-H. Duan and R.
 * Krasny, "An adaptive treecode for computing nonbonded potential energy", J. Comput. Chem. 22
 * (2001), recalled and held against differences by a test.
 */
final class Expansion {
  static final int ORDER = 4;
  static final int TERMS = (ORDER + 1) * (ORDER + 2) * (ORDER + 3) / 6;

  /** Powers of x, y and z of each term, by total degree. */
  private static final int[] POWER_X = new int[TERMS];

  private static final int[] POWER_Y = new int[TERMS];
  private static final int[] POWER_Z = new int[TERMS];
  private static final double[] FACTORIAL = new double[TERMS];

  /** The term with one power of x, y, z fewer; of two fewer; -1 where there is none. */
  private static final int[][] LESS = new int[6][TERMS];

  /** First term of each degree, and one past the last. */
  private static final int[] DEGREE_FROM = new int[ORDER + 2];

  /** {@code SUM[m][n]}: the term whose powers are those of m and n added. */
  private static final int[][] SUM = new int[TERMS][];

  static {
    int[][][] at = new int[ORDER + 1][ORDER + 1][ORDER + 1];
    int next = 0;
    for (int degree = 0; degree <= ORDER; degree++) {
      DEGREE_FROM[degree] = next;
      for (int i = degree; i >= 0; i--) {
        for (int j = degree - i; j >= 0; j--) {
          int k = degree - i - j;
          POWER_X[next] = i;
          POWER_Y[next] = j;
          POWER_Z[next] = k;
          FACTORIAL[next] = factorial(i) * factorial(j) * factorial(k);
          LESS[0][next] = i > 0 ? at[i - 1][j][k] : -1;
          LESS[1][next] = j > 0 ? at[i][j - 1][k] : -1;
          LESS[2][next] = k > 0 ? at[i][j][k - 1] : -1;
          LESS[3][next] = i > 1 ? at[i - 2][j][k] : -1;
          LESS[4][next] = j > 1 ? at[i][j - 2][k] : -1;
          LESS[5][next] = k > 1 ? at[i][j][k - 2] : -1;
          at[i][j][k] = next++;
        }
      }
    }
    DEGREE_FROM[ORDER + 1] = next;
    for (int m = 0; m < TERMS; m++) {
      int room = DEGREE_FROM[ORDER - degree(m) + 1];
      SUM[m] = new int[room];
      for (int n = 0; n < room; n++) {
        SUM[m][n] = at[POWER_X[m] + POWER_X[n]][POWER_Y[m] + POWER_Y[n]][POWER_Z[m] + POWER_Z[n]];
      }
    }
  }

  private final double[] power = new double[TERMS];
  private final double[] derivative = new double[TERMS];

  private static double factorial(int n) {
    return n < 2 ? 1 : n * factorial(n - 1);
  }

  private static int degree(int m) {
    return POWER_X[m] + POWER_Y[m] + POWER_Z[m];
  }

  /** Powers over factorials of a vector into {@code power}. */
  private void powers(double x, double y, double z) {
    power[0] = 1;
    for (int m = 1; m < TERMS; m++) {
      if (POWER_X[m] > 0) {
        power[m] = power[LESS[0][m]] * x / POWER_X[m];
      } else if (POWER_Y[m] > 0) {
        power[m] = power[LESS[1][m]] * y / POWER_Y[m];
      } else {
        power[m] = power[LESS[2][m]] * z / POWER_Z[m];
      }
    }
  }

  /** Adds a current element at a place seen from the centre; moments x at {@code at}, y after. */
  void addPoint(double x, double y, double z, double jx, double jy, double[] moment, int at) {
    powers(x, y, z);
    for (int m = 0; m < TERMS; m++) {
      moment[at + m] += jx * power[m];
      moment[at + TERMS + m] += jy * power[m];
    }
  }

  /** Adds half the second moments that a current element has of its own. */
  static void addSpread(
      double xx, double xy, double yy, double zz, double j, double[] moment, int at) {
    for (int m = DEGREE_FROM[2]; m < DEGREE_FROM[3]; m++) {
      double half =
          POWER_X[m] == 2
              ? xx
              : POWER_Y[m] == 2 ? yy : POWER_Z[m] == 2 ? zz : POWER_Z[m] == 0 ? 2 * xy : 0;
      moment[at + m] += j * half;
    }
  }

  /** Adds a child's moments to its parent's; the vector goes from the parent's centre. */
  void addShifted(
      double x, double y, double z, double[] moment, int child, double[] sum, int parent) {
    powers(x, y, z);
    for (int n = 0; n < TERMS; n++) {
      double qx = moment[child + n];
      double qy = moment[child + TERMS + n];
      int[] to = SUM[n];
      for (int d = 0; d < to.length; d++) {
        // The powers of the shift and of the child add; both come with their factorials.
        int m = to[d];
        sum[parent + m] += qx * power[d];
        sum[parent + TERMS + m] += qy * power[d];
      }
    }
  }

  /**
   * The sum over both clusters' elements of {@code j·j'/r}.
   *
   * @param x from the first's centre to the second's
   * @param mirrored whether the second is its own image upside down
   */
  double couple(
      double x,
      double y,
      double z,
      double[] first,
      int a,
      double[] second,
      int b,
      boolean mirrored) {
    derivatives(x, y, z);
    double sum = 0;
    for (int m = 0; m < TERMS; m++) {
      int[] to = SUM[m];
      double sx = 0;
      double sy = 0;
      for (int n = 0; n < to.length; n++) {
        double d = derivative[to[n]];
        if (mirrored && (POWER_Z[n] & 1) != 0) {
          d = -d;
        }
        sx += d * second[b + n];
        sy += d * second[b + TERMS + n];
      }
      double part = sx * first[a + m] + sy * first[a + TERMS + m];
      sum += (degree(m) & 1) == 0 ? part : -part;
    }
    return sum;
  }

  /** Derivatives of 1/r at a place, by the recurrence of its Taylor coefficients. */
  void derivatives(double x, double y, double z) {
    double inverse = 1 / (x * x + y * y + z * z);
    derivative[0] = Math.sqrt(inverse);
    for (int degree = 1; degree <= ORDER; degree++) {
      double first = -(2 - 1.0 / degree) * inverse;
      double second = -(1 - 1.0 / degree) * inverse;
      for (int m = DEGREE_FROM[degree]; m < DEGREE_FROM[degree + 1]; m++) {
        derivative[m] =
            first * (x * less(0, m) + y * less(1, m) + z * less(2, m))
                + second * (less(3, m) + less(4, m) + less(5, m));
      }
    }
    for (int m = 0; m < TERMS; m++) {
      derivative[m] *= FACTORIAL[m];
    }
  }

  private double less(int which, int m) {
    int at = LESS[which][m];
    return at < 0 ? 0 : derivative[at];
  }
}
