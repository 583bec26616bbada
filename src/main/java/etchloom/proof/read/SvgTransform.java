package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/** x' = a x + c y + e, y' = b x + d y + f; keeps circles circles. */
record SvgTransform(double a, double b, double c, double d, double e, double f) {
  /** Stretch that is still rounding of a similarity. */
  private static final double SLACK = 1e-9;

  static SvgTransform scale(double x, double y) {
    return new SvgTransform(x, 0, 0, y, 0, 0);
  }

  /** True when all lengths change by one factor. */
  boolean similar() {
    double s = a * a + b * b;
    double t = c * c + d * d;
    boolean even = Math.abs(s - t) <= SLACK * s && Math.abs(a * c + b * d) <= SLACK * s;
    return even && s >= 1e-18 && s <= 1e18 && Double.isFinite(e + f);
  }

  /** First {@code inner}, then this. */
  SvgTransform after(SvgTransform inner) {
    return new SvgTransform(
        a * inner.a + c * inner.b,
        b * inner.a + d * inner.b,
        a * inner.c + c * inner.d,
        b * inner.c + d * inner.d,
        a * inner.e + c * inner.f + e,
        b * inner.e + d * inner.f + f);
  }

  double factor() {
    return Math.hypot(a, b);
  }

  Point point(Point p) {
    // Adding 0.0 turns -0.0 into 0.0, which records tell apart.
    return new Point(a * p.x() + c * p.y() + e + 0.0, b * p.x() + d * p.y() + f + 0.0);
  }

  Path path(Path path) {
    boolean mirrored = a * d - b * c < 0;
    List<Segment> out = new ArrayList<>(path.segments().size());
    for (Segment s : path.segments()) {
      Point from = point(s.start());
      Point to = point(s.end());
      out.add(
          s instanceof Arc arc
              ? Arcs.between(from, to, point(arc.centre()), arc.counterClockwise() != mirrored)
              : new Line(from, to));
    }
    return new Path(out);
  }
}
