package etchloom.write.outline;

import etchloom.geometry.Arc;
import etchloom.geometry.Grid;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Joins edges end to end into closed paths, in the order in which they came. */
final class Loops {
  private record Cell(long x, long y) {}

  private final Map<Cell, List<Integer>> cells = new HashMap<>();
  private final List<Point> corners = new ArrayList<>();
  private final List<List<Integer>> leaving = new ArrayList<>();
  private final List<Edge> edges = new ArrayList<>();
  private final List<Integer> ends = new ArrayList<>();
  private Point lastEnd = new Point(Double.NaN, Double.NaN);

  void add(Edge e) {
    int from = e.start == lastEnd ? ends.get(ends.size() - 1) : corner(e.start);
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

  private boolean balanced() {
    int[] balance = new int[corners.size()];
    for (int i = 0; i < corners.size(); i++) {
      balance[i] = leaving.get(i).size();
    }
    for (int to : ends) {
      balance[to]--;
    }
    return Arrays.stream(balance).allMatch(b -> b == 0);
  }

  /** The closed paths; empty where edges are left over. */
  Optional<List<Path>> close() {
    if (!balanced()) {
      return Optional.empty();
    }
    boolean[] used = new boolean[edges.size()];
    int[] next = new int[corners.size()];
    List<Path> out = new ArrayList<>();
    for (int first = 0; first < edges.size(); first++) {
      if (!used[first]) {
        List<Segment> loop = new ArrayList<>();
        int start = corner(edges.get(first).start);
        int at = start;
        int e = first;
        do {
          used[e] = true;
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

  private int leave(int corner, boolean[] used, int[] next) {
    List<Integer> list = leaving.get(corner);
    while (next[corner] < list.size() && used[list.get(next[corner])]) {
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
