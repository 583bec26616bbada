package etchloom.proof.ohm;

import java.util.Arrays;

/**
 * A symmetric positive matrix of conductances, factored row by row within its envelope; thin shapes
 * numbered from one end have a narrow one.
 *
 * <p>Source: A. George, J. W. Liu, "Computer Solution of Large Sparse Positive Definite Systems",
 * 1981, chapter 4.
 */
final class Skyline {
  private final int n;
  private final int[] firstColumn;
  private final int[] rowStart;
  private final double[] values;

  /**
   * @param firstColumn of each row, at most the row itself
   */
  Skyline(int[] firstColumn) {
    n = firstColumn.length;
    this.firstColumn = firstColumn.clone();
    rowStart = new int[n + 1];
    for (int i = 0; i < n; i++) {
      rowStart[i + 1] = Math.addExact(rowStart[i], i - firstColumn[i] + 1);
    }
    values = new double[rowStart[n]];
  }

  static long size(int[] firstColumn) {
    long sum = 0;
    for (int i = 0; i < firstColumn.length; i++) {
      sum += i - firstColumn[i] + 1;
    }
    return sum;
  }

  /** Adds to the entry of a row and a column not after it. */
  void add(int row, int column, double value) {
    values[rowStart[row] + column - firstColumn[row]] += value;
  }

  /** Replaces the matrix by its Cholesky factor. */
  void factor() {
    for (int i = 0; i < n; i++) {
      int ri = rowStart[i] - firstColumn[i];
      for (int j = firstColumn[i]; j <= i; j++) {
        int rj = rowStart[j] - firstColumn[j];
        double sum = values[ri + j];
        for (int k = Math.max(firstColumn[i], firstColumn[j]); k < j; k++) {
          sum -= values[ri + k] * values[rj + k];
        }
        values[ri + j] = j < i ? sum / values[rj + j] : Math.sqrt(Math.max(sum, 1e-300));
      }
    }
  }

  double[] solve(double[] right) {
    double[] x = Arrays.copyOf(right, n);
    for (int i = 0; i < n; i++) {
      int ri = rowStart[i] - firstColumn[i];
      double sum = x[i];
      for (int k = firstColumn[i]; k < i; k++) {
        sum -= values[ri + k] * x[k];
      }
      x[i] = sum / values[ri + i];
    }
    for (int i = n - 1; i >= 0; i--) {
      int ri = rowStart[i] - firstColumn[i];
      x[i] /= values[ri + i];
      for (int k = firstColumn[i]; k < i; k++) {
        x[k] -= values[ri + k] * x[i];
      }
    }
    return x;
  }
}
