package etchloom.proof.copper;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.plane.EdgeSet;

/**
 * Draws rings of lines and arcs into a set of edges; nm.
 *
 * <p>An arc becomes equal chords whose inner corners stand slightly outside it, so that the area
 * under the chords is that under the arc; chords and corners leave the arc by at most about the
 * chord error.
 */
final class RingPen {
  /** Nanometres to a millimetre. */
  static final double NM = 1e6;

  /** No chord spans more, rad, however small the circle: shapes keep their looks. */
  private static final double MAX_STEP_RAD = 0.6;

  private final EdgeSet out;
  private final double chordErrorNm;

  RingPen(EdgeSet out, double chordErrorMm) {
    this.out = out;
    this.chordErrorNm = chordErrorMm * NM;
  }

  EdgeSet edges() {
    return out;
  }

  /** A closed path as a ring, walked as it is. */
  void ring(Path closed, int weight) {
    out.begin(closed.start().x() * NM, closed.start().y() * NM, weight);
    for (Segment s : closed.segments()) {
      if (s instanceof Arc a) {
        arc(a);
      } else {
        out.to(s.end().x() * NM, s.end().y() * NM, EdgeSet.STRAIGHT);
      }
    }
    out.close(EdgeSet.STRAIGHT);
  }

  private void arc(Arc a) {
    arcTo(
        a.centre().x() * NM,
        a.centre().y() * NM,
        a.radiusMm() * NM,
        a.startRad(),
        a.sweepRad(),
        a.end().x() * NM,
        a.end().y() * NM);
  }

  void circle(double cx, double cy, double radius, int weight) {
    int n = Math.max(8, steps(radius, 2 * Math.PI));
    double step = 2 * Math.PI / n;
    double r = radius * Math.sqrt(step / Math.sin(step));
    int source = out.circle(cx, cy, radius);
    out.begin(cx + r, cy, weight);
    for (int i = 1; i < n; i++) {
      out.to(cx + r * Math.cos(i * step), cy + r * Math.sin(i * step), source);
    }
    out.close(source);
  }

  /** Goes on along a circle to a point given, which the sweep reaches to within rounding. */
  void arcTo(
      double cx, double cy, double radius, double start, double sweep, double endX, double endY) {
    int n = steps(radius, Math.abs(sweep));
    if (n == 0) {
      out.to(endX, endY, EdgeSet.STRAIGHT);
      return;
    }
    int source = out.circle(cx, cy, radius);
    double step = sweep / n;
    double r = innerRadius(radius, Math.abs(step), n);
    for (int i = 1; i < n; i++) {
      double t = start + i * step;
      out.to(cx + r * Math.cos(t), cy + r * Math.sin(t), source);
    }
    out.to(endX, endY, source);
  }

  /** Where the inner corners must stand for the area of n chords to be that of the sector. */
  private static double innerRadius(double radius, double step, int n) {
    if (n < 2) {
      return radius;
    }
    double s = Math.sin(step);
    if (n == 2) {
      return radius * step / s;
    }
    double a = (n - 2) * s;
    double b = 2 * s;
    return radius * (Math.sqrt(b * b + 4 * a * n * step) - b) / (2 * a);
  }

  private int steps(double radius, double sweep) {
    // Below the grid's step an arc is no more than its end.
    if (radius * sweep < 1) {
      return 0;
    }
    double step =
        radius > chordErrorNm
            ? Math.min(MAX_STEP_RAD, 2 * Math.acos(1 - chordErrorNm / radius))
            : MAX_STEP_RAD;
    return (int) Math.ceil(sweep / step);
  }

  static double areaSign(Path closed) {
    double sum = 0;
    Point o = closed.start();
    for (Segment s : closed.segments()) {
      sum += s.match(RingPen::nothing, RingPen::bow) + s.start().minus(o).cross(s.end().minus(o));
    }
    return sum;
  }

  private static double nothing(Line line) {
    return 0;
  }

  /** Twice the area between an arc and its chord, signed. */
  private static double bow(Arc a) {
    double t = a.sweepRad();
    return a.radiusMm() * a.radiusMm() * (t - Math.sin(t));
  }
}
