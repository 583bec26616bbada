package etchloom.proof.plane;

import java.util.Arrays;

/**
 * Two boundaries made to run through the same corners where they are all but the same: corners of
 * the second are moved onto those of the first, and an edge takes up the corners of the other
 * boundary that lie beside it. Stretches that differ by rounding alone then cancel.
 */
final class Snap {
  private final int tolerance;
  private final Figure target;
  private final NodeTable cells;
  private final int[] nextInCell;
  private final int[] firstInCell;

  private Snap(Figure target, int toleranceNm) {
    this.target = target;
    tolerance = toleranceNm;
    int n = target.edges();
    cells = new NodeTable(n);
    nextInCell = new int[n];
    firstInCell = new int[n];
    for (int e = 0; e < n; e++) {
      int before = cells.size();
      int c = cells.id(cell(target.fromX(e)), cell(target.fromY(e)));
      nextInCell[e] = c == before ? -1 : firstInCell[c];
      firstInCell[c] = e;
    }
  }

  /** The boundary of a with weight 1 and that of b with weight -1. */
  static EdgeSet difference(Figure a, Figure b, int toleranceNm) {
    Snap snap = new Snap(a, toleranceNm);
    int n = b.edges();
    int[] bx = new int[n];
    int[] by = new int[n];
    for (int e = 0; e < n; e++) {
      int near = snap.nearest(b.fromX(e), b.fromY(e));
      bx[e] = near < 0 ? b.fromX(e) : a.fromX(near);
      by[e] = near < 0 ? b.fromY(e) : a.fromY(near);
    }
    int[] ax = new int[a.edges()];
    int[] ay = new int[a.edges()];
    for (int e = 0; e < a.edges(); e++) {
      ax[e] = a.fromX(e);
      ay[e] = a.fromY(e);
    }
    EdgeSet out = new EdgeSet();
    write(a, ax, ay, beside(a, bx, by, toleranceNm), bx, by, 1, out);
    write(b, bx, by, beside(b, ax, ay, toleranceNm), ax, ay, -1, out);
    return out;
  }

  /** Pairs of an edge and a corner of the other boundary that lies beside it, by edge. */
  private static long[] beside(Figure f, int[] x, int[] y, int tolerance) {
    long[] pairs = new long[16];
    int size = 0;
    for (int k = 0; k < x.length; k++) {
      for (int e : f.edgesWithin(x[k], y[k], tolerance)) {
        if (size == pairs.length) {
          pairs = Arrays.copyOf(pairs, size * 2);
        }
        pairs[size++] = ((long) e << 32) | k;
      }
    }
    long[] out = Arrays.copyOf(pairs, size);
    Arrays.sort(out);
    return out;
  }

  private static void write(
      Figure f, int[] x, int[] y, long[] beside, int[] cx, int[] cy, int weight, EdgeSet out) {
    int at = 0;
    for (int e = 0; e < f.edges(); e++) {
      int first = at;
      while (at < beside.length && (int) (beside[at] >>> 32) == e) {
        at++;
      }
      int next = f.next(e);
      double ux = (double) x[next] - x[e];
      double uy = (double) y[next] - y[e];
      long[] order = new long[at - first];
      double[] along = new double[at - first];
      int n = 0;
      for (int k = first; k < at; k++) {
        int c = (int) beside[k];
        double t = (cx[c] - (double) x[e]) * ux + (cy[c] - (double) y[e]) * uy;
        if (t > 0 && t < ux * ux + uy * uy) {
          int p = n++;
          while (p > 0 && along[p - 1] > t) {
            along[p] = along[p - 1];
            order[p] = order[p - 1];
            p--;
          }
          along[p] = t;
          order[p] = c;
        }
      }
      int lastX = x[e];
      int lastY = y[e];
      for (int p = 0; p < n; p++) {
        int c = (int) order[p];
        out.add(lastX, lastY, cx[c], cy[c], weight, EdgeSet.STRAIGHT);
        lastX = cx[c];
        lastY = cy[c];
      }
      out.add(lastX, lastY, x[next], y[next], weight, EdgeSet.STRAIGHT);
    }
  }

  private int cell(int v) {
    return Math.floorDiv(v, Math.max(1, 4 * tolerance));
  }

  private int nearest(int x, int y) {
    int best = -1;
    long bestSquare = (long) tolerance * tolerance + 1;
    for (int cx = cell(x - tolerance); cx <= cell(x + tolerance); cx++) {
      for (int cy = cell(y - tolerance); cy <= cell(y + tolerance); cy++) {
        int c = cells.find(cx, cy);
        for (int k = c < 0 ? -1 : firstInCell[c]; k >= 0; k = nextInCell[k]) {
          long dx = (long) target.fromX(k) - x;
          long dy = (long) target.fromY(k) - y;
          if (dx * dx + dy * dy < bestSquare) {
            bestSquare = dx * dx + dy * dy;
            best = k;
          }
        }
      }
    }
    return best;
  }
}
