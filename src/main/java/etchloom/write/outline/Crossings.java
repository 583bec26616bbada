package etchloom.write.outline;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/** Where two edges meet, in closed form; curves that run into each other meet nowhere. */
final class Crossings {
  private Crossings() {}

  /** The points that both edges hold. */
  static List<Point> of(Edge a, Edge b) {
    List<Point> out = new ArrayList<>(2);
    for (Point p : onWhole(a, b)) {
      if (a.spans(p) && b.spans(p)) {
        out.add(p);
      }
    }
    return out;
  }

  private static List<Point> onWhole(Edge a, Edge b) {
    if (a.isArc()) {
      return b.isArc() ? circles(a, b) : lineCircle(b, a);
    }
    return b.isArc() ? lineCircle(a, b) : lines(a, b);
  }

  private static List<Point> lines(Edge a, Edge b) {
    Point u = a.end.minus(a.start);
    Point v = b.end.minus(b.start);
    double det = u.cross(v);
    if (det == 0) {
      return List.of();
    }
    return List.of(a.start.plus(u.times(b.start.minus(a.start).cross(v) / det)));
  }

  private static List<Point> lineCircle(Edge l, Edge c) {
    Point u = l.end.minus(l.start);
    double length = Edge.apart(l.start, l.end);
    if (!(length > 0)) {
      return List.of();
    }
    u = u.times(1 / length);
    Point w = c.centre.minus(l.start);
    double off = u.cross(w);
    double r = c.radius();
    double half2 = (r - off) * (r + off);
    if (!(half2 > 0)) {
      return List.of();
    }
    double half = Math.sqrt(half2);
    Point foot = l.start.plus(u.times(u.dot(w)));
    return List.of(foot.minus(u.times(half)), foot.plus(u.times(half)));
  }

  private static List<Point> circles(Edge a, Edge b) {
    Point d = b.centre.minus(a.centre);
    double dd = d.dot(d);
    double ra = a.radius();
    double rb = b.radius();
    double k = (dd + (ra - rb) * (ra + rb)) / (2 * dd);
    double high2 = ra * ra / dd - k * k;
    if (!(high2 > 0)) { // also when the centres are one: NaN
      return List.of();
    }
    Point foot = a.centre.plus(d.times(k));
    Point up = new Point(-d.y(), d.x()).times(Math.sqrt(high2));
    return List.of(foot.plus(up), foot.minus(up));
  }
}
