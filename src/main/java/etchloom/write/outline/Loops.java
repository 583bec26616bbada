package etchloom.write.outline;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;

/** Joins edges end to end into closed paths, in the order in which they came. */
final class Loops {
  /** Longest stretch that a tangent leaves in doubt, mm: a few sqrt(8 r · 20 nm). */
  private static final double FLAT_MM = 0.03;

  private final Corners corners = new Corners();
  private final List<Edge> edges = new ArrayList<>();

  /** By edge: its corners, and the edge that came before it from the same first corner, or -1. */
  private int[] from = new int[256];

  private int[] to = new int[256];
  private int[] before = new int[256];

  /** By corner: the edge that came last of those that leave it, or -1. */
  private int[] leaving = new int[256];

  private final BitSet used = new BitSet();

  void add(Edge e) {
    int n = edges.size();
    boolean goesOn = n > 0 && e.start.equals(edges.get(n - 1).end);
    int first = goesOn ? to[n - 1] : corner(e.start);
    int second = corner(e.end);
    if (first == second || known(first, second, e)) {
      return;
    }
    if (n == from.length) {
      from = Arrays.copyOf(from, 2 * n);
      to = Arrays.copyOf(to, 2 * n);
      before = Arrays.copyOf(before, 2 * n);
    }
    from[n] = first;
    to[n] = second;
    before[n] = leaving[first];
    leaving[first] = n;
    edges.add(e);
  }

  private int corner(Point p) {
    int known = corners.count();
    int c = corners.at(p);
    if (c == leaving.length) {
      leaving = Arrays.copyOf(leaving, 2 * c);
    }
    if (c == known) {
      leaving[c] = -1;
    }
    return c;
  }

  /** Two edges between the same corners by the same way are one. */
  private boolean known(int first, int second, Edge e) {
    for (int i = leaving[first]; i >= 0; i = before[i]) {
      if (to[i] == second && Edge.same(edges.get(i).middle(), e.middle())) {
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
    int[] surplus = new int[corners.count()];
    for (int e = 0; e < edges.size(); e++) {
      surplus[from[e]]++;
      surplus[to[e]]--;
    }
    for (int e = 0; e < edges.size(); e++) {
      if (surplus[from[e]] > 0
          && surplus[to[e]] < 0
          && Edge.apart(corners.point(from[e]), corners.point(to[e])) <= FLAT_MM) {
        used.set(e);
        surplus[from[e]]--;
        surplus[to[e]]++;
      }
    }
    return Arrays.stream(surplus).allMatch(s -> s == 0);
  }

  /** The closed paths; empty where edges are left over. */
  Optional<List<Path>> close() {
    if (!balance()) {
      return Optional.empty();
    }
    List<Path> out = new ArrayList<>();
    for (int first = 0; first < edges.size(); first++) {
      if (!used.get(first)) {
        List<Segment> loop = loop(first);
        if (loop.size() > 1) {
          out.add(new Path(loop));
        }
      }
    }
    return Optional.of(out);
  }

  private List<Segment> loop(int first) {
    List<Segment> loop = new ArrayList<>();
    int e = first;
    while (true) {
      used.set(e);
      segment(e, loop);
      int at = to[e];
      if (at == from[first]) {
        return loop;
      }
      e = leaving[at];
      while (used.get(e)) {
        e = before[e];
      }
    }
  }

  /** An arc that goes on along the circle of the one before it is made one with it. */
  private void segment(int edge, List<Segment> out) {
    Edge e = edges.get(edge);
    Point start = corners.point(from[edge]);
    Point end = corners.point(to[edge]);
    if (start.equals(end)) {
      return;
    }
    if (!e.isArc()) {
      out.add(new Line(start, end));
      return;
    }
    Arc arc = new Arc(start, end, e.centre, e.turn > 0);
    if (!out.isEmpty() && out.get(out.size() - 1) instanceof Arc last && oneCircle(last, arc)) {
      out.set(out.size() - 1, new Arc(last.start(), end, e.centre, e.turn > 0));
    } else {
      out.add(arc);
    }
  }

  /** Whether two arcs lie on one circle and make no more than half of it together. */
  private static boolean oneCircle(Arc a, Arc b) {
    if (!a.centre().equals(b.centre()) || a.counterClockwise() != b.counterClockwise()) {
      return false;
    }
    Point u = a.start().minus(a.centre());
    Point v = b.end().minus(a.centre());
    double side = u.cross(v);
    // Each is at most half a turn; together too, exactly when the end is still on the near side.
    return a.counterClockwise() ? side > 0 : side < 0;
  }
}
