package etchloom.electric.inductance;

/** The terms of a Cartesian multipole expansion: powers of x, y and z, in order of total degree. */
final class Terms {
  /** Highest total degree. */
  static final int ORDER = 4;

  static final int COUNT = (ORDER + 1) * (ORDER + 2) * (ORDER + 3) / 6;

  private static final Terms ALL = new Terms();

  private final int[][] power = new int[3][COUNT];
  private final int[] degree = new int[COUNT];
  private final double[] factorial = new double[COUNT];

  /** First term of each degree, and one past the last. */
  private final int[] firstOf = new int[ORDER + 2];

  /** For x, y, z: the term with one power fewer, then with two fewer; COUNT where there is none. */
  private final int[][] less = new int[6][COUNT];

  /** For terms m and n whose degrees add up to no more than the order, the term of both powers. */
  private final int[][] sum = new int[COUNT][];

  private Terms() {
    int[][][] at = new int[ORDER + 1][ORDER + 1][ORDER + 1];
    int next = 0;
    for (int d = 0; d <= ORDER; d++) {
      firstOf[d] = next;
      for (int i = d; i >= 0; i--) {
        for (int j = d - i; j >= 0; j--) {
          at[i][j][d - i - j] = next;
          set(next++, at, i, j, d - i - j);
        }
      }
    }
    firstOf[ORDER + 1] = next;
    for (int m = 0; m < COUNT; m++) {
      sum[m] = new int[firstOf[ORDER - degree[m] + 1]];
      for (int n = 0; n < sum[m].length; n++) {
        sum[m][n] =
            at[power[0][m] + power[0][n]][power[1][m] + power[1][n]][power[2][m] + power[2][n]];
      }
    }
  }

  private void set(int m, int[][][] at, int i, int j, int k) {
    power[0][m] = i;
    power[1][m] = j;
    power[2][m] = k;
    degree[m] = i + j + k;
    factorial[m] = ofNumber(i) * ofNumber(j) * ofNumber(k);
    for (int fewer = 1; fewer <= 2; fewer++) {
      int row = 3 * (fewer - 1);
      less[row][m] = i < fewer ? COUNT : at[i - fewer][j][k];
      less[row + 1][m] = j < fewer ? COUNT : at[i][j - fewer][k];
      less[row + 2][m] = k < fewer ? COUNT : at[i][j][k - fewer];
    }
  }

  static double ofNumber(int n) {
    double product = 1;
    for (int i = 2; i <= n; i++) {
      product *= i;
    }
    return product;
  }

  static Terms all() {
    return ALL;
  }

  /**
   * @param axis 0 to 2 for x, y, z
   */
  int power(int axis, int m) {
    return power[axis][m];
  }

  int degree(int m) {
    return degree[m];
  }

  /** -1 for an odd power of z, else 1: what turning upside down does. */
  int mirrored(int m) {
    return (power[2][m] & 1) == 0 ? 1 : -1;
  }

  /** First term of a degree, up to one beyond the highest. */
  int first(int ofDegree) {
    return firstOf[ofDegree];
  }

  /** Product of the factorials of the powers. */
  double factorial(int m) {
    return factorial[m];
  }

  /** The term with one power of an axis fewer; COUNT where there is none. */
  int oneLess(int axis, int m) {
    return less[axis][m];
  }

  /** The term with two powers of an axis fewer; COUNT where there is none. */
  int twoLess(int axis, int m) {
    return less[3 + axis][m];
  }

  /** For each term that may be added to m, the term of both. */
  int[] sums(int m) {
    return sum[m];
  }
}
