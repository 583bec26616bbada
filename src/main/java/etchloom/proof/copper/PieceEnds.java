package etchloom.proof.copper;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;

/** The ends of pieces from left to right. */
final class PieceEnds {
  private final double[] x;
  private final int[] piece;

  PieceEnds(List<DrawnPiece> pieces) {
    int n = pieces.size();
    Integer[] order = new Integer[2 * n];
    double[] all = new double[2 * n];
    for (int i = 0; i < n; i++) {
      all[2 * i] = pieces.get(i).shape().start().x();
      all[2 * i + 1] = pieces.get(i).shape().end().x();
    }
    Arrays.setAll(order, i -> i);
    Arrays.sort(order, (i, j) -> Double.compare(all[i], all[j]));
    x = new double[2 * n];
    piece = new int[2 * n];
    for (int k = 0; k < 2 * n; k++) {
      x[k] = all[order[k]];
      piece[k] = order[k] / 2;
    }
  }

  /** The pieces with an end at an abscissa. */
  int[] at(double abscissa, double tolerance) {
    int lo = Arrays.binarySearch(x, abscissa - tolerance);
    int from = lo < 0 ? -lo - 1 : lo;
    while (from > 0 && x[from - 1] >= abscissa - tolerance) {
      from--;
    }
    int to = from;
    while (to < x.length && x[to] <= abscissa + tolerance) {
      to++;
    }
    return IntStream.range(from, to).map(k -> piece[k]).distinct().toArray();
  }
}
