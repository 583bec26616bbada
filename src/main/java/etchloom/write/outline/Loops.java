package etchloom.write.outline;

import etchloom.geometry.Arc;
import etchloom.geometry.Grid;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Joins edges end to end into closed paths, in the order in which they came. */
final class Loops {
  /** Longest stretch that a tangent leaves in doubt, mm: a few sqrt(8 r · 20 nm). */
  private static final double FLAT_MM = 0.03;

  private record Cell(long x, long y) {}

  private final Map<Cell, List<Integer>> cells = new HashMap<>();
  private final List<Point> corners = new ArrayList<>();
  private final List<List<Integer>> leaving = new ArrayList<>();
  private final List<Edge> edges = new ArrayList<>();
  private final List<Integer> ends = new ArrayList<>();
  private final BitSet dropped = new BitSet();
  private Point lastEnd = new Point(Double.NaN, Double.NaN);

  void add(Edge e) {
    int from = e.start.equals(lastEnd) ? ends.get(ends.size() - 1) : corner(e.start);
    int to = corner(e.end);
    if (from == to || known(from, to, e)) {
      return;
    }
    leaving.get(from).add(edges.size());
    edges.add(e);
    ends.add(to);
    lastEnd = e.end;
  }

  /** Two edges between the same corners by the same way are one. */
  private boolean known(int from, int to, Edge e) {
    for (int i : leaving.get(from)) {
      if (ends.get(i) == to && Edge.same(edges.get(i).middle(), e.middle())) {
        return true;
      }
    }
    return false;
  }

  /**
   * Where two shapes touch in a tangent, a short stretch lies so flat inside the other that it was
   * taken for boundary, though the boundary goes on along the other. It runs from a corner with one
   * edge too many leaving to one with one too many arriving: such edges are dropped.
   *
   * @return whether every corner then has as many edges leaving as arriving
   */
  private boolean balance() {
    int[] surplus = new int[corners.size()];
    for (int i = 0; i < surplus.length; i++) {
      surplus[i] = leaving.get(i).size();
    }
    for (int to : ends) {
      surplus[to]--;
    }
    for (int from = 0; from < surplus.length; from++) {
      for (int k = leaving.get(from).size() - 1; k >= 0 && surplus[from] > 0; k--) {
        int e = leaving.get(from).get(k);
        int to = ends.get(e);
        if (surplus[to] < 0 && Edge.apart(corners.get(from), corners.get(to)) <= FLAT_MM) {
          leaving.get(from).remove(k);
          dropped.set(e);
          surplus[from]--;
          surplus[to]++;
        }
      }
    }
    return Arrays.stream(surplus).allMatch(b -> b == 0);
  }

  /** The closed paths; empty where edges are left over. */
  Optional<List<Path>> close() {
    if (!balance()) {
      return Optional.empty();
    }
    BitSet used = dropped;
    int[] next = new int[corners.size()];
    List<Path> out = new ArrayList<>();
    for (int first = 0; first < edges.size(); first++) {
      if (!used.get(first)) {
        List<Segment> loop = new ArrayList<>();
        int start = corner(edges.get(first).start);
        int at = start;
        int e = first;
        do {
          used.set(e);
          int to = ends.get(e);
          segment(edges.get(e), corners.get(at), corners.get(to), loop);
          at = to;
          e = at == start ? -1 : leave(at, used, next);
        } while (e >= 0);
        if (loop.size() > 1) {
          out.add(new Path(loop));
        }
      }
    }
    return Optional.of(out);
  }

  private int leave(int corner, BitSet used, int[] next) {
    List<Integer> list = leaving.get(corner);
    while (next[corner] < list.size() && used.get(list.get(next[corner]))) {
      next[corner]++;
    }
    return list.get(next[corner]);
  }

  private static void segment(Edge e, Point from, Point to, List<Segment> out) {
    if (!from.equals(to)) {
      out.add(e.isArc() ? new Arc(from, to, e.centre, e.turn > 0) : new Line(from, to));
    }
  }

  /** The number of the corner at a point; points within {@link Edge#SAME_MM} share one. */
  private int corner(Point p) {
    long cx = (long) Math.floor(p.x() / Edge.SAME_MM);
    long cy = (long) Math.floor(p.y() / Edge.SAME_MM);
    for (long x = cx - 1; x <= cx + 1; x++) {
      for (long y = cy - 1; y <= cy + 1; y++) {
        for (int i : cells.getOrDefault(new Cell(x, y), List.of())) {
          if (Edge.same(corners.get(i), p)) {
            return i;
          }
        }
      }
    }
    cells.computeIfAbsent(new Cell(cx, cy), k -> new ArrayList<>(1)).add(corners.size());
    corners.add(Grid.snap(p));
    leaving.add(new ArrayList<>(1));
    return corners.size() - 1;
  }
}
