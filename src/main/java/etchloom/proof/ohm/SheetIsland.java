package etchloom.proof.ohm;

import etchloom.geometry.Point;
import etchloom.proof.plane.Figure;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;

/**
 * A piece of copper of any shape as conductances between its contacts, each a disc of one
 * potential: the potential in the sheet, solved on square cells.
 *
 * <p>The cells are about an eighth of the copper's mean width and of the smallest contact, coarser
 * where that would be too many. A second solution on cells half as large again tells the error: the
 * difference of the two.
 */
final class SheetIsland {
  private static final double CELLS_ACROSS = 8;
  private static final int MOST_CELLS = 200_000;
  private static final long MOST_BOXES = 12_000_000;
  private static final long MOST_VALUES = 8_000_000;
  private static final double COARSER = 1.5;

  /** Cells that no contact reaches are held by next to nothing. */
  private static final double LEAK = 1e-9;

  private final Figure f;
  private final int[] edges;
  private final List<Contact> contacts;
  private final double[] box = {1e9, 1e9, -1e9, -1e9};
  private final double cellMm;

  record Contact(Point at, double radiusMm) {}

  /**
   * @param squares conductances in units of one over the sheet's resistance, by pairs of contacts
   * @param error largest share by which they may be off
   */
  record Solution(double[][] squares, double error) {}

  private SheetIsland(Figure f, int island, List<Contact> contacts) {
    this.f = f;
    this.contacts = contacts;
    edges = IntStream.range(0, f.edges()).filter(e -> f.island(f.ring(e)) == island).toArray();
    double area = 0;
    double length = 0;
    for (int e : edges) {
      double x = f.fromX(e) * 1e-6;
      double y = f.fromY(e) * 1e-6;
      box[0] = Math.min(box[0], x);
      box[1] = Math.min(box[1], y);
      box[2] = Math.max(box[2], x);
      box[3] = Math.max(box[3], y);
      double ux = f.toX(e) * 1e-6;
      double uy = f.toY(e) * 1e-6;
      area += (x * uy - ux * y) / 2;
      length += Math.hypot(ux - x, uy - y);
    }
    double across = 2 * area / length / CELLS_ACROSS;
    for (Contact c : contacts) {
      across = c.radiusMm() > 0 ? Math.min(across, 2 * c.radiusMm() / CELLS_ACROSS) : across;
    }
    double boxes = (box[2] - box[0]) * (box[3] - box[1]) / MOST_BOXES;
    cellMm = Math.max(across, Math.sqrt(Math.max(area / MOST_CELLS, boxes)));
  }

  static Solution solve(Figure f, int island, List<Contact> contacts) {
    SheetIsland s = new SheetIsland(f, island, contacts);
    double h = s.cellMm;
    double[][] fine = s.solve(h);
    while (fine.length == 0) {
      h *= 1.4;
      fine = s.solve(h);
    }
    double[][] coarse = s.solve(h * COARSER);
    double most = 0;
    double off = 0;
    for (int i = 0; i < fine.length; i++) {
      for (int j = 0; j < i; j++) {
        most = Math.max(most, fine[i][j]);
        off = Math.max(off, Math.abs(fine[i][j] - coarse[i][j]));
      }
    }
    return new Solution(fine, most == 0 ? 0 : off / most);
  }

  /** Conductances on cells of one size; empty where there would be too many values. */
  private double[][] solve(double h) {
    SheetGrid g = new SheetGrid(f, edges, box, h);
    int[] mark = new int[g.cells];
    Arrays.fill(mark, -1);
    for (int c = 0; c < contacts.size(); c++) {
      Contact k = contacts.get(c);
      g.mark(k.at().x(), k.at().y(), k.radiusMm(), c, mark);
    }
    int[] number = number(g, mark);
    int n = Arrays.stream(number).max().orElse(-1) + 1;
    int[] first = IntStream.range(0, n).toArray();
    for (int l = 0; l < g.links; l++) {
      int a = number[g.from[l]];
      int b = number[g.to[l]];
      if (a >= 0 && b >= 0) {
        first[Math.max(a, b)] = Math.min(first[Math.max(a, b)], Math.min(a, b));
      }
    }
    if (Skyline.size(first) > MOST_VALUES) {
      return new double[0][];
    }
    Skyline m = new Skyline(first);
    for (int i = 0; i < n; i++) {
      m.add(i, i, LEAK);
    }
    for (int l = 0; l < g.links; l++) {
      int a = number[g.from[l]];
      int b = number[g.to[l]];
      if (a >= 0) {
        m.add(a, a, g.open[l]);
      }
      if (b >= 0) {
        m.add(b, b, g.open[l]);
      }
      if (a >= 0 && b >= 0) {
        m.add(Math.max(a, b), Math.min(a, b), -g.open[l]);
      }
    }
    m.factor();
    return currents(g, mark, number, n, m);
  }

  /** Free cells in the order of a walk from the first contact, so that neighbours stay close. */
  private static int[] number(SheetGrid g, int[] mark) {
    int[] start = new int[g.cells + 1];
    for (int l = 0; l < g.links; l++) {
      start[g.from[l] + 1]++;
      start[g.to[l] + 1]++;
    }
    for (int c = 0; c < g.cells; c++) {
      start[c + 1] += start[c];
    }
    int[] next = Arrays.copyOf(start, start.length);
    int[] near = new int[2 * g.links];
    for (int l = 0; l < g.links; l++) {
      near[next[g.from[l]]++] = g.to[l];
      near[next[g.to[l]]++] = g.from[l];
    }
    int[] number = new int[g.cells];
    Arrays.fill(number, -1);
    boolean[] seen = new boolean[g.cells];
    int[] queue = new int[g.cells];
    int count = 0;
    int tail = 0;
    int head = 0;
    int cursor = 0;
    int root = 0;
    for (int c = g.cells - 1; c >= 0; c--) {
      root = mark[c] == 0 ? c : root;
    }
    while (cursor < g.cells) {
      if (!seen[root]) {
        seen[root] = true;
        queue[tail++] = root;
      }
      while (head < tail) {
        int c = queue[head++];
        if (mark[c] < 0) {
          number[c] = count++;
        }
        for (int k = start[c]; k < start[c + 1]; k++) {
          if (!seen[near[k]]) {
            seen[near[k]] = true;
            queue[tail++] = near[k];
          }
        }
      }
      root = cursor++; // whatever was not reached, in turn
    }
    return number;
  }

  /** What flows into each contact while one of them stands at 1 and the others at 0. */
  private double[][] currents(SheetGrid g, int[] mark, int[] number, int n, Skyline m) {
    int k = contacts.size();
    double[][] out = new double[k][k];
    for (int c = 0; c < k; c++) {
      double[] right = new double[n];
      for (int l = 0; l < g.links; l++) {
        int a = g.from[l];
        int b = g.to[l];
        if (mark[a] == c && number[b] >= 0) {
          right[number[b]] += g.open[l];
        }
        if (mark[b] == c && number[a] >= 0) {
          right[number[a]] += g.open[l];
        }
      }
      double[] v = m.solve(right);
      for (int l = 0; l < g.links; l++) {
        flow(g.from[l], g.to[l], g.open[l], c, mark, number, v, out);
        flow(g.to[l], g.from[l], g.open[l], c, mark, number, v, out);
      }
    }
    return out;
  }

  private static void flow(
      int a, int b, double open, int c, int[] mark, int[] number, double[] v, double[][] out) {
    if (mark[a] >= 0 && mark[a] != c) {
      double vb = mark[b] == c ? 1 : mark[b] >= 0 ? 0 : v[number[b]];
      out[mark[a]][c] += open * vb;
    }
  }
}
