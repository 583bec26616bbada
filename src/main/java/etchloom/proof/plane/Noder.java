package etchloom.proof.plane;

import java.util.Arrays;

/**
 * Cuts edges where they meet until any two have at most an end in common or are the same.
 *
 * <p>A crossing is rounded to the grid, which moves the edges by less than 1 nm and may make new
 * crossings; so the cut pieces are tested again, round by round, until nothing is left to cut
 * (iterated snap rounding, after Halperin and Packer, "Iterated snap rounding", Computational
 * Geometry 23 (2002)). Every decision is exact; two or three rounds are usual. Cost is linear in
 * edges and crossings where edges are spread evenly.
 *
 * <p>Their hot pixels are left for what that does not settle soon: of three edges that run within a
 * nanometre of each other, every crossing that is rounded makes another one a few nanometres on, as
 * in a zip. Then an edge is cut at every corner that it passes in less than a pixel.
 */
final class Noder {
  private static final int MAX_ROUNDS = 200;

  /** Far more rounds than figures need that are not zipped. */
  private static final int PLAIN_ROUNDS = 12;

  /** Half the diagonal of a pixel of 1 nm, squared. */
  private static final double PIXEL_SQUARE = 0.5;

  private static final int MAX_EDGES = 40_000_000;

  /** Stops inputs made to be slow; real layers need some ten tests an edge. */
  private static final long MAX_TESTS = 4_000_000_000L;

  int size;
  int[] ax;
  int[] ay;
  int[] bx;
  int[] by;
  int[] weight;
  int[] source;

  /** The next piece of the same first edge, -1 at the end. */
  private int[] next;

  private final EdgeGrid grid;
  private int splits;
  private int[] splitEdge = new int[64];
  private int[] splitX = new int[64];
  private int[] splitY = new int[64];
  private long tests;
  private boolean hot;

  Noder(EdgeSet s) {
    size = s.size;
    ax = Arrays.copyOf(s.ax, size);
    ay = Arrays.copyOf(s.ay, size);
    bx = Arrays.copyOf(s.bx, size);
    by = Arrays.copyOf(s.by, size);
    weight = Arrays.copyOf(s.weight, size);
    source = Arrays.copyOf(s.source, size);
    next = new int[size];
    Arrays.fill(next, -1);
    grid = new EdgeGrid(size, s.ax, s.ay, s.bx, s.by);
    testAll();
    int[] changed = cut();
    for (int round = 0; changed.length > 0; round++) {
      if (round == MAX_ROUNDS) {
        throw new OutOfRange("the outlines are too tangled to be worked out");
      }
      hot = round >= PLAIN_ROUNDS;
      testAgain(changed);
      changed = cut();
    }
  }

  private void testAll() {
    for (int c = 0; c < grid.cells(); c++) {
      int end = grid.to(c);
      for (int k = grid.from(c); k < end; k++) {
        int i = grid.entry(k);
        int left = ax[i];
        int right = bx[i];
        int low = Math.min(ay[i], by[i]);
        int high = Math.max(ay[i], by[i]);
        for (int m = k + 1; m < end; m++) {
          int j = grid.entry(m);
          if (ax[j] <= right
              && bx[j] >= left
              && Math.min(ay[j], by[j]) <= high
              && Math.max(ay[j], by[j]) >= low) {
            test(i, j);
          }
        }
      }
      countTests((long) (end - grid.from(c)) * (end - grid.from(c)));
    }
  }

  private void countTests(long more) {
    tests += more;
    if (tests > MAX_TESTS || splits > MAX_EDGES) {
      throw new OutOfRange("the outlines are too tangled to be worked out");
    }
  }

  private void testAgain(int[] changed) {
    // The grid speaks of the first edges, whose number is that of the entries' largest index.
    int[] seen = new int[size];
    Arrays.fill(seen, -1);
    for (int e : changed) {
      int cells = grid.cover(ax[e], ay[e], bx[e], by[e], EdgeGrid.MARGIN_NM);
      for (int c = 0; c < cells; c++) {
        int cell = grid.covered(c);
        for (int k = grid.from(cell); k < grid.to(cell); k++) {
          int first = grid.entry(k);
          if (seen[first] != e) {
            seen[first] = e;
            testPieces(e, first);
          }
        }
      }
    }
  }

  private void testPieces(int e, int first) {
    int n = 0;
    for (int f = first; f >= 0; f = next[f]) {
      n++;
      if (f != e
          && ax[f] <= bx[e]
          && bx[f] >= ax[e]
          && Math.min(ay[f], by[f]) <= Math.max(ay[e], by[e])
          && Math.max(ay[f], by[f]) >= Math.min(ay[e], by[e])) {
        test(e, f);
      }
    }
    countTests(n);
  }

  private void test(int i, int j) {
    boolean aa = ax[i] == ax[j] && ay[i] == ay[j];
    boolean bb = bx[i] == bx[j] && by[i] == by[j];
    if (aa && bb) {
      return;
    }
    boolean ab = ax[i] == bx[j] && ay[i] == by[j];
    boolean ba = bx[i] == ax[j] && by[i] == ay[j];
    if (aa || bb || ab || ba) {
      testJoined(i, j, aa || ab, aa || ba);
      return;
    }
    if (hot && (pass(i, j) || pass(j, i))) {
      return; // the pieces are tested again
    }
    int ja = side(i, ax[j], ay[j]);
    int jb = side(i, bx[j], by[j]);
    if (ja * jb > 0) {
      return;
    }
    int ia = side(j, ax[i], ay[i]);
    int ib = side(j, bx[i], by[i]);
    if (ia * ib > 0) {
      return;
    }
    if (ja != 0 && jb != 0 && ia != 0 && ib != 0) {
      cross(i, j);
      return;
    }
    touch(i, ja, ax[j], ay[j]);
    touch(i, jb, bx[j], by[j]);
    touch(j, ia, ax[i], ay[i]);
    touch(j, ib, bx[i], by[i]);
  }

  /** Two edges with one end in common still overlap where they lead the same way. */
  private void testJoined(int i, int j, boolean atStartOfI, boolean atStartOfJ) {
    int ix = atStartOfI ? bx[i] : ax[i];
    int iy = atStartOfI ? by[i] : ay[i];
    int jx = atStartOfJ ? bx[j] : ax[j];
    int jy = atStartOfJ ? by[j] : ay[j];
    if (side(i, jx, jy) == 0) {
      touch(i, 0, jx, jy);
      touch(j, 0, ix, iy);
    } else if (hot) {
      pass(i, jx, jy);
      pass(j, ix, iy);
    }
  }

  /**
   * Cuts an edge where it passes an end of the other in less than a pixel; one cut a round will do.
   */
  private boolean pass(int i, int j) {
    return pass(i, ax[j], ay[j]) || pass(i, bx[j], by[j]);
  }

  private boolean pass(int i, int x, int y) {
    double ux = (double) bx[i] - ax[i];
    double uy = (double) by[i] - ay[i];
    double along = ((double) x - ax[i]) * ux + ((double) y - ay[i]) * uy;
    double square = ux * ux + uy * uy;
    double off = cross(i, x, y);
    if (along <= 0 || along >= square || off * off > PIXEL_SQUARE * square) {
      return false;
    }
    int before = splits;
    split(i, x, y);
    return splits > before;
  }

  private void touch(int i, int side, int x, int y) {
    if (side == 0
        && x >= ax[i]
        && x <= bx[i]
        && y >= Math.min(ay[i], by[i])
        && y <= Math.max(ay[i], by[i])) {
      split(i, x, y);
    }
  }

  private void cross(int i, int j) {
    double a = cross(i, ax[j], ay[j]);
    double b = cross(i, bx[j], by[j]);
    double t = a / (a - b);
    int x = (int) Math.rint(ax[j] + t * ((double) bx[j] - ax[j]));
    int y = (int) Math.rint(ay[j] + t * ((double) by[j] - ay[j]));
    split(i, x, y);
    split(j, x, y);
  }

  private double cross(int i, int x, int y) {
    return Exact.cross(
        (long) bx[i] - ax[i], (long) by[i] - ay[i], (long) x - ax[i], (long) y - ay[i]);
  }

  private int side(int i, int x, int y) {
    return Exact.side(ax[i], ay[i], bx[i], by[i], x, y);
  }

  private void split(int e, int x, int y) {
    if ((x == ax[e] && y == ay[e]) || (x == bx[e] && y == by[e])) {
      return;
    }
    if (splits == splitEdge.length) {
      splitEdge = Arrays.copyOf(splitEdge, splits * 2);
      splitX = Arrays.copyOf(splitX, splits * 2);
      splitY = Arrays.copyOf(splitY, splits * 2);
    }
    splitEdge[splits] = e;
    splitX[splits] = x;
    splitY[splits] = y;
    splits++;
  }

  /** Replaces the edges to be split by their pieces; the pieces are returned. */
  private int[] cut() {
    long[] order = new long[splits];
    for (int k = 0; k < splits; k++) {
      order[k] = ((long) splitEdge[k] << 32) | k;
    }
    Arrays.sort(order);
    int[] changed = new int[splits * 2];
    int n = 0;
    for (int k = 0; k < order.length; ) {
      int e = (int) (order[k] >>> 32);
      int end = k;
      while (end < order.length && (int) (order[end] >>> 32) == e) {
        end++;
      }
      n = cutOne(e, order, k, end, changed, n);
      k = end;
    }
    splits = 0;
    return Arrays.copyOf(changed, n);
  }

  private int cutOne(int e, long[] order, int from, int to, int[] changed, int count) {
    int n = count;
    long ux = (long) bx[e] - ax[e];
    long uy = (long) by[e] - ay[e];
    long[] along = new long[to - from];
    int[] which = new int[to - from];
    for (int k = from; k < to; k++) {
      int s = (int) order[k];
      long a = ((long) splitX[s] - ax[e]) * ux + ((long) splitY[s] - ay[e]) * uy;
      int p = k - from;
      while (p > 0 && along[p - 1] > a) {
        along[p] = along[p - 1];
        which[p] = which[p - 1];
        p--;
      }
      along[p] = a;
      which[p] = s;
    }
    int endX = bx[e];
    int endY = by[e];
    int w = weight[e];
    int lastX = ax[e];
    int lastY = ay[e];
    boolean first = true;
    for (int p = 0; p <= which.length; p++) {
      int x = p < which.length ? splitX[which[p]] : endX;
      int y = p < which.length ? splitY[which[p]] : endY;
      if (x == lastX && y == lastY) {
        continue;
      }
      int piece = first ? e : append(e);
      set(piece, lastX, lastY, x, y, w);
      changed[n++] = piece;
      first = false;
      lastX = x;
      lastY = y;
    }
    return n;
  }

  private int append(int e) {
    if (size == ax.length) {
      int m = size + size / 2 + 16;
      ax = Arrays.copyOf(ax, m);
      ay = Arrays.copyOf(ay, m);
      bx = Arrays.copyOf(bx, m);
      by = Arrays.copyOf(by, m);
      weight = Arrays.copyOf(weight, m);
      source = Arrays.copyOf(source, m);
      next = Arrays.copyOf(next, m);
    }
    source[size] = source[e];
    next[size] = next[e];
    next[e] = size;
    return size++;
  }

  private void set(int e, int x0, int y0, int x1, int y1, int w) {
    boolean forward = x0 < x1 || (x0 == x1 && y0 < y1);
    ax[e] = forward ? x0 : x1;
    ay[e] = forward ? y0 : y1;
    bx[e] = forward ? x1 : x0;
    by[e] = forward ? y1 : y0;
    weight[e] = forward ? w : -w;
  }
}
