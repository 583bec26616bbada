package etchloom.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/**
 * Sector-shaped spirals of any number of turns, side by side, as a board for measuring growth: the
 * turns of the design page without eye vias and rim.
 */
final class Wedges {
  private final double half;
  private final double inner;
  private final double outer;
  private final double track;
  private final double space;
  private final double r;

  private Wedges(int coils, double inner, double outer, double track, double space) {
    this.half = Math.PI / coils;
    this.inner = inner;
    this.outer = outer;
    this.track = track;
    this.space = space;
    this.r = Math.max(track, (track + space) / 2);
  }

  /** Fills the layers of a board with coils of equal track and space. */
  static Boards board(
      int coils, int layers, int turns, double innerMm, double outerMm, double pitchMm) {
    Wedges w = new Wedges(coils, innerMm, outerMm, pitchMm / 2, pitchMm / 2);
    Path path = w.spiral(turns);
    Boards b = new Boards();
    b.layers = layers;
    double edge = outerMm * 1.4;
    b.profile = List.of(Path.circle(Point.ORIGIN, edge), Path.circle(Point.ORIGIN, innerMm / 2));
    for (int layer = 1; layer <= layers; layer++) {
      for (int c = 0; c < coils; c++) {
        Path turned = path.rotated(2 * Math.PI * c / coils);
        int from = b.bare(layer, turned.start(), w.track);
        int to = b.bare(layer, turned.end(), w.track);
        b.track(layer, w.track, turned, from, to, "UVW".substring(c % 3, c % 3 + 1), c + 1);
      }
    }
    return b;
  }

  private double side(int i) {
    return (space + track) / 2 + i * (track + space);
  }

  private double out(int i) {
    return outer - track / 2 - i * (track + space);
  }

  private double in(int i) {
    return inner + track / 2 + i * (track + space);
  }

  /** Foot of a point on the side at distance {@code d} from the ray at {@code +half}. */
  private Point foot(Point p, double d) {
    Point ray = Point.polar(1, half);
    Point right = new Point(ray.y(), -ray.x());
    return ray.times(p.dot(ray)).plus(right.times(d));
  }

  private Path spiral(int turns) {
    List<Segment> s = new ArrayList<>();
    Point at = Point.polar(out(0), -half / 2);
    for (int i = 0; i < turns; i++) {
      double d = side(i);
      Point corner = Point.polar(out(i) - r, half - Math.asin((d + r) / (out(i) - r)));
      at = arc(s, at, Point.polar(out(i), corner.angleRad()), Point.ORIGIN, true);
      at = arc(s, at, foot(corner, d), corner, true);
      if (d + r < (in(i) + r) * Math.sin(half)) {
        Point c = Point.polar(in(i) + r, half - Math.asin((d + r) / (in(i) + r)));
        at = line(s, at, foot(c, d));
        at = arc(s, at, Point.polar(in(i), c.angleRad()), c, true);
        at = arc(s, at, at.mirrored(), Point.ORIGIN, false);
        at = arc(s, at, foot(c, d).mirrored(), c.mirrored(), true);
      } else {
        Point c = new Point((d + r) / Math.sin(half), 0);
        at = line(s, at, foot(c, d));
        at = arc(s, at, at.mirrored(), c, true);
      }
      Point next = Point.polar(out(i + 1) - r, half - Math.asin((d + r) / (out(i + 1) - r)));
      at = line(s, at, foot(next, d).mirrored());
      if (i + 1 < turns) {
        at = arc(s, at, Point.polar(out(i + 1), -next.angleRad()), next.mirrored(), true);
      }
    }
    return new Path(s);
  }

  private static Point arc(List<Segment> s, Point from, Point to, Point centre, boolean ccw) {
    s.add(new Arc(from, to, centre, ccw));
    return to;
  }

  private static Point line(List<Segment> s, Point from, Point to) {
    s.add(new Line(from, to));
    return to;
  }
}
