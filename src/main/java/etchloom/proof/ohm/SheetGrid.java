package etchloom.proof.ohm;

import etchloom.proof.plane.Figure;
import java.util.Arrays;

/**
 * One piece of a figure on square cells: which cells it covers, and which share of the side between
 * two cells lies in it. The conductance between the middles of two cells is that share over the
 * sheet's resistance; walls that cut a cell need nothing else.
 *
 * <p>Source: Y. T. Ng, C. Min, F. Gibou, "An efficient fluid–solid coupling algorithm for
 * single-phase flows", Journal of Computational Physics 228 (2009): second order for insulating
 * walls.
 */
final class SheetGrid {
  private static final double MM = 1e-6;

  final double h;
  private final double x0;
  private final double y0;
  private final int columns;
  private final int rows;
  private final int[] cell;
  int cells;

  /** Two cells and the open share of the side between them. */
  int links;

  int[] from = new int[1024];
  int[] to = new int[1024];
  double[] open = new double[1024];

  /** The island's edges. */
  private final int[] edges;

  private final Figure f;

  SheetGrid(Figure f, int[] islandEdges, double[] box, double h) {
    this.f = f;
    this.edges = islandEdges;
    this.h = h;
    // The half step keeps the grid's lines off the corners of figures on round numbers.
    x0 = box[0] - 1.37 * h;
    y0 = box[1] - 1.41 * h;
    columns = (int) Math.ceil((box[2] - x0) / h) + 1;
    rows = (int) Math.ceil((box[3] - y0) / h) + 1;
    cell = new int[Math.multiplyExact(columns, rows)];
    Arrays.fill(cell, -1);
    lines(true);
    lines(false);
  }

  /** All grid lines of one direction, upright ones for links to the right. */
  private void lines(boolean upright) {
    int n = upright ? columns : rows;
    double o = upright ? x0 : y0;
    int[] start = new int[n + 2];
    for (int e : edges) {
      for (int i = first(e, upright, o); i <= last(e, upright, o, n); i++) {
        start[i + 1]++;
      }
    }
    for (int i = 0; i <= n; i++) {
      start[i + 1] += start[i];
    }
    double[] at = new double[start[n + 1]];
    int[] next = Arrays.copyOf(start, start.length);
    for (int e : edges) {
      for (int i = first(e, upright, o); i <= last(e, upright, o, n); i++) {
        at[next[i]++] = crossing(e, upright, o + i * h);
      }
    }
    for (int i = 1; i < n; i++) {
      Arrays.sort(at, start[i], start[i + 1]);
      for (int k = start[i]; k + 1 < start[i + 1]; k += 2) {
        inside(upright, i, at[k], at[k + 1]);
      }
    }
  }

  private double along(int e, boolean upright, boolean end) {
    int v = upright ? (end ? f.toX(e) : f.fromX(e)) : end ? f.toY(e) : f.fromY(e);
    return v * MM;
  }

  /** The first grid line beyond the edge's lower end; an edge that ends on a line counts once. */
  private int first(int e, boolean upright, double o) {
    double low = Math.min(along(e, upright, false), along(e, upright, true));
    return Math.max(0, (int) Math.floor((low - o) / h) + 1);
  }

  private int last(int e, boolean upright, double o, int n) {
    double high = Math.max(along(e, upright, false), along(e, upright, true));
    return Math.min(n, (int) Math.floor((high - o) / h));
  }

  private double crossing(int e, boolean upright, double line) {
    double a = along(e, upright, false);
    double b = along(e, upright, true);
    double t = (line - a) / (b - a);
    double c = along(e, !upright, false);
    return c + t * (along(e, !upright, true) - c);
  }

  private void inside(boolean upright, int line, double low, double high) {
    double o = upright ? y0 : x0;
    for (int k = (int) Math.floor((low - o) / h); k <= (int) Math.floor((high - o) / h); k++) {
      double share = (Math.min(high, o + (k + 1) * h) - Math.max(low, o + k * h)) / h;
      if (share > 1e-6) {
        link(
            upright ? cell(line - 1, k) : cell(k, line - 1),
            upright ? cell(line, k) : cell(k, line),
            share);
      }
    }
  }

  private int cell(int column, int row) {
    int k = row * columns + column;
    if (cell[k] < 0) {
      cell[k] = cells++;
    }
    return cell[k];
  }

  private void link(int a, int b, double share) {
    if (links == from.length) {
      from = Arrays.copyOf(from, links * 2);
      to = Arrays.copyOf(to, links * 2);
      open = Arrays.copyOf(open, links * 2);
    }
    from[links] = a;
    to[links] = b;
    open[links] = share;
    links++;
  }

  /** Marks the cells whose middle lies in a disc, at least the one nearest to its middle. */
  void mark(double x, double y, double radius, int mark, int[] marks) {
    int reach = (int) Math.ceil(radius / h) + 1;
    int ci = (int) Math.floor((x - x0) / h);
    int cj = (int) Math.floor((y - y0) / h);
    int best = -1;
    double bestSquare = Double.POSITIVE_INFINITY;
    for (int i = Math.max(0, ci - reach); i <= Math.min(columns - 1, ci + reach); i++) {
      for (int j = Math.max(0, cj - reach); j <= Math.min(rows - 1, cj + reach); j++) {
        int c = cell[j * columns + i];
        double dx = x0 + (i + 0.5) * h - x;
        double dy = y0 + (j + 0.5) * h - y;
        double square = dx * dx + dy * dy;
        if (c >= 0 && square <= radius * radius) {
          marks[c] = mark;
        }
        if (c >= 0 && square < bestSquare) {
          bestSquare = square;
          best = c;
        }
      }
    }
    if (best >= 0) {
      marks[best] = mark;
    }
  }
}
