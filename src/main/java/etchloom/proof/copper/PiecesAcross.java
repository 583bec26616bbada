package etchloom.proof.copper;

import java.util.Arrays;
import java.util.List;

/** Pieces in the order of their lower left ends from left to right, to within {@link #STEP_MM}. */
final class PiecesAcross {
  /** The order is that of whole steps. */
  static final double STEP_MM = 1e-6;

  /** Beyond this, all are taken for equally far. */
  private static final double FAR_MM = 2000;

  private static final int INDEX_BITS = 30;

  private final DrawnPiece[] pieces;
  private final double[] x;

  PiecesAcross(List<DrawnPiece> some) {
    int n = some.size();
    long[] order = new long[n];
    for (int i = 0; i < n; i++) {
      double at = Math.max(-FAR_MM, Math.min(FAR_MM, some.get(i).lowEnd().x()));
      order[i] = ((long) Math.rint(at / STEP_MM) << INDEX_BITS) + i;
    }
    Arrays.sort(order);
    pieces = new DrawnPiece[n];
    x = new double[n];
    for (int k = 0; k < n; k++) {
      pieces[k] = some.get((int) (order[k] & ((1L << INDEX_BITS) - 1)));
      x[k] = pieces[k].lowEnd().x();
    }
  }

  int size() {
    return pieces.length;
  }

  DrawnPiece piece(int k) {
    return pieces[k];
  }

  /** Of the lower left end, mm. */
  double x(int k) {
    return x[k];
  }
}
