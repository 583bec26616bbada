package etchloom.write.outline;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/**
 * A piece of a shape's boundary, walked with the copper at its left; a line, or an arc of at most
 * half a turn.
 */
final class Edge {
  /** Ends this near count as one point, mm: above all rounding, far below any copper. */
  static final double SAME_MM = 5e-5;

  final int shape;
  Point start;
  Point end;

  /** Of an arc; of a line the origin, unused. */
  final Point centre;

  /** 1 counter-clockwise, -1 clockwise, 0 a line. */
  final int turn;

  private final List<Cut> cuts = new ArrayList<>(0);

  private Edge(int shape, Point start, Point end, Point centre, int turn) {
    this.shape = shape;
    this.start = start;
    this.end = end;
    this.centre = centre;
    this.turn = turn;
  }

  /** A place where another edge meets this one, by its way from the start: rad, or mm on a line. */
  record Cut(double way, Point at) {}

  static Edge line(int shape, Point start, Point end) {
    return new Edge(shape, start, end, Point.ORIGIN, 0);
  }

  static Edge arc(int shape, Point start, Point end, Point centre, boolean counterClockwise) {
    return new Edge(shape, start, end, centre, counterClockwise ? 1 : -1);
  }

  boolean isArc() {
    return turn != 0;
  }

  double radius() {
    return apart(start, centre);
  }

  /** Distance of two points, mm; several times as fast as one that minds overflow. */
  static double apart(Point p, Point q) {
    double dx = p.x() - q.x();
    double dy = p.y() - q.y();
    return Math.sqrt(dx * dx + dy * dy);
  }

  /** Whether two points count as one. */
  static boolean same(Point p, Point q) {
    double dx = p.x() - q.x();
    double dy = p.y() - q.y();
    return dx * dx + dy * dy <= SAME_MM * SAME_MM;
  }

  /** The whole way: the sweep of an arc in rad, never negative, or a line's length in mm. */
  double length() {
    return isArc() ? way(end) : apart(start, end);
  }

  /**
   * How far along the edge a point lies: rad in [0, 2π) on an arc, mm on a line. An end that
   * rounding has put a hair before the start is at 0.
   */
  double way(Point p) {
    if (!isArc()) {
      double length = apart(start, end);
      return length > 0 ? p.minus(start).dot(end.minus(start)) / length : 0;
    }
    Point a = start.minus(centre);
    Point b = p.minus(centre);
    double s = turn * Math.atan2(a.cross(b), a.dot(b));
    double hair = SAME_MM / radius();
    return s >= 0 ? s : s > -hair ? 0 : s + 2 * Math.PI;
  }

  Point at(double way) {
    if (isArc()) {
      return centre.plus(start.minus(centre).rotated(turn * way));
    }
    double length = apart(start, end);
    return length > 0 ? start.plus(end.minus(start).times(way / length)) : start;
  }

  /** Whether a point of the edge's line or circle lies between its ends, they included. */
  boolean spans(Point p) {
    if (same(p, start) || same(p, end)) {
      return true;
    }
    double w = way(p);
    return w >= 0 && w <= length();
  }

  /** Whether a point lies on the edge, to {@link #SAME_MM}. */
  boolean holds(Point p) {
    double off;
    if (isArc()) {
      off = Math.abs(apart(p, centre) - radius());
    } else {
      Point u = end.minus(start);
      double length = apart(start, end);
      off = length > 0 ? Math.abs(u.cross(p.minus(start))) / length : apart(p, start);
    }
    return off <= SAME_MM && spans(p);
  }

  void cut(Point p) {
    if (!same(p, start) && !same(p, end)) {
      cuts.add(new Cut(way(p), p));
    }
  }

  boolean isCut() {
    return !cuts.isEmpty();
  }

  /** The edge in parts from cut to cut; parts of no length are left out. */
  List<Edge> parts() {
    if (cuts.isEmpty()) {
      return !same(start, end) ? List.of(this) : List.of();
    }
    cuts.sort(java.util.Comparator.comparingDouble(Cut::way));
    List<Edge> out = new ArrayList<>(cuts.size() + 1);
    Point from = start;
    for (Cut c : cuts) {
      if (!same(from, c.at)) {
        out.add(new Edge(shape, from, c.at, centre, turn));
        from = c.at;
      }
    }
    if (!same(from, end)) {
      out.add(new Edge(shape, from, end, centre, turn));
    }
    return out;
  }

  Point middle() {
    return at(length() / 2);
  }
}
