package etchloom.proof.plane;

import java.util.Arrays;

/**
 * Square cells over a set of edges; each cell lists the edges that pass through it or within {@link
 * #MARGIN_NM} of it. The cell's size is chosen so that cells and entries both stay in proportion to
 * the number of edges.
 */
final class EdgeGrid {
  /** Far above the moves that rounding to the grid makes, far below any copper. */
  static final int MARGIN_NM = 8;

  private final int[] ax;
  private final int[] ay;
  private final int[] bx;
  private final int[] by;
  private final double cell;
  private final double perCell;
  private final long x0;
  private final long y0;
  private final int columns;
  private final int rows;
  private final int[] start;
  private final int[] entries;
  private int[] cover = new int[64];

  /** Edges run from their lower left end: {@code ax <= bx}. */
  EdgeGrid(int n, int[] ax, int[] ay, int[] bx, int[] by) {
    this.ax = ax;
    this.ay = ay;
    this.bx = bx;
    this.by = by;
    long minX = Integer.MAX_VALUE;
    long minY = Integer.MAX_VALUE;
    long maxX = Integer.MIN_VALUE;
    long maxY = Integer.MIN_VALUE;
    double run = 0;
    for (int i = 0; i < n; i++) {
      minX = Math.min(minX, ax[i]);
      maxX = Math.max(maxX, bx[i]);
      minY = Math.min(minY, Math.min(ay[i], by[i]));
      maxY = Math.max(maxY, Math.max(ay[i], by[i]));
      run += ((double) bx[i] - ax[i]) + Math.abs((double) by[i] - ay[i]);
    }
    x0 = n == 0 ? 0 : minX - 2 * MARGIN_NM;
    y0 = n == 0 ? 0 : minY - 2 * MARGIN_NM;
    double w = n == 0 ? 1 : maxX - x0 + 2.0 * MARGIN_NM;
    double h = n == 0 ? 1 : maxY - y0 + 2.0 * MARGIN_NM;
    cell = Math.max(Math.max(run / (1.5 * n + 1), Math.sqrt(w * h / (2.0 * n + 1))), 1000);
    perCell = 1 / cell;
    columns = (int) (w / cell) + 1;
    rows = (int) (h / cell) + 1;
    start = new int[columns * rows + 1];
    entries = fill(n);
  }

  private int[] fill(int n) {
    int[] cells = new int[4 * n];
    int[] counts = new int[n];
    int all = 0;
    for (int i = 0; i < n; i++) {
      int k = cover(i);
      if (all + k > cells.length) {
        cells = Arrays.copyOf(cells, Math.max(2 * cells.length, all + k));
      }
      for (int c = 0; c < k; c++) {
        cells[all++] = cover[c];
        start[cover[c] + 1]++;
      }
      counts[i] = k;
    }
    for (int c = 0; c < columns * rows; c++) {
      start[c + 1] += start[c];
    }
    int[] next = Arrays.copyOf(start, start.length);
    int[] out = new int[all];
    int k = 0;
    for (int i = 0; i < n; i++) {
      for (int end = k + counts[i]; k < end; k++) {
        out[next[cells[k]]++] = i;
      }
    }
    return out;
  }

  int cells() {
    return columns * rows;
  }

  int from(int c) {
    return start[c];
  }

  int to(int c) {
    return start[c + 1];
  }

  int entry(int k) {
    return entries[k];
  }

  int covered(int k) {
    return cover[k];
  }

  private int cover(int i) {
    return cover(ax[i], ay[i], bx[i], by[i], MARGIN_NM);
  }

  /**
   * Finds the cells within {@code margin} of an edge that runs from its lower left end; their
   * number is returned, they themselves are read by {@link #covered}.
   */
  int cover(double px, double py, double qx, double qy, double margin) {
    double lo = Math.min(py, qy);
    double hi = Math.max(py, qy);
    int r0 = row(lo - margin);
    int r1 = row(hi + margin);
    if (r0 == r1) {
      return span(0, r0, px - margin, qx + margin);
    }
    double slope = (qx - px) / (qy - py);
    int k = 0;
    for (int r = r0; r <= r1; r++) {
      double y1 = Math.max(lo, Math.min(hi, y0 + r * cell - margin));
      double y2 = Math.max(lo, Math.min(hi, y0 + (r + 1) * cell + margin));
      double xa = hi == lo ? px : px + (y1 - py) * slope;
      double xb = hi == lo ? qx : px + (y2 - py) * slope;
      k = span(k, r, Math.min(xa, xb) - margin, Math.max(xa, xb) + margin);
    }
    return k;
  }

  /** The cells that a box touches. */
  int coverBox(double minX, double minY, double maxX, double maxY) {
    int k = 0;
    for (int r = row(minY); r <= row(maxY); r++) {
      k = span(k, r, minX, maxX);
    }
    return k;
  }

  private int span(int k, int r, double from, double to) {
    int c0 = column(from);
    int c1 = column(to);
    if (k + c1 - c0 + 1 > cover.length) {
      cover = Arrays.copyOf(cover, Math.max(cover.length * 2, k + c1 - c0 + 1));
    }
    int n = k;
    for (int c = c0; c <= c1; c++) {
      cover[n++] = r * columns + c;
    }
    return n;
  }

  private int row(double y) {
    return place((y - y0) * perCell, rows);
  }

  private int column(double x) {
    return place((x - x0) * perCell, columns);
  }

  private static int place(double at, int count) {
    return at <= 0 ? 0 : at >= count - 1 ? count - 1 : (int) at;
  }

  /**
   * The edge met first on the way from a point to the left, or -1. Of edges that meet in one point
   * there, the one that lies rightmost just above it.
   */
  int leftOf(int x, int y) {
    int best = -1;
    double bestX = Double.NEGATIVE_INFINITY;
    int r = row(y);
    for (int c = column(x); c >= 0; c--) {
      for (int k = start[r * columns + c]; k < start[r * columns + c + 1]; k++) {
        int e = entries[k];
        if (e != best && strictlyLeft(e, x, y)) {
          double at = crossing(e, y);
          if (at > bestX || (at == bestX && slope(e) > slope(best))) {
            best = e;
            bestX = at;
          }
        }
      }
      if (best >= 0 && bestX >= x0 + c * cell) {
        return best;
      }
    }
    return best;
  }

  /** Whether an edge spans the height, its upper end left out, and passes left of the point. */
  private boolean strictlyLeft(int e, int x, int y) {
    if (ay[e] == by[e] || Math.min(ay[e], by[e]) > y || Math.max(ay[e], by[e]) <= y) {
      return false;
    }
    int side = Exact.side(ax[e], ay[e], bx[e], by[e], x, y);
    return by[e] > ay[e] ? side < 0 : side > 0;
  }

  private double crossing(int e, int y) {
    boolean up = by[e] > ay[e];
    double lx = up ? ax[e] : bx[e];
    double ly = up ? ay[e] : by[e];
    return lx + (y - ly) * slope(e);
  }

  private double slope(int e) {
    return ((double) bx[e] - ax[e]) / ((double) by[e] - ay[e]);
  }
}
