package etchloom.proof.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;

/** Puts the corners of a ring where its true curves cross. */
final class Corners {
  /** Curves that meet at a flatter angle have no sharp crossing. */
  private static final double LEAST_SINE = 0.05;

  /** The direction of a shorter line is that of rounding. */
  private static final double SHORT_MM = 1e-3;

  /** Crossings of chords are no farther off, at the flattest angle. */
  private static final double MOST_MM = 0.05;

  private Corners() {}

  /** The ring's pieces in order, each replaced by one between the new corners. */
  static void sharpen(List<Segment> ring) {
    int n = ring.size();
    Point[] corner = new Point[n];
    for (int i = 0; i < n; i++) {
      corner[i] = crossing(ring.get(i), ring.get((i + 1) % n));
    }
    for (int i = 0; i < n; i++) {
      Point from = corner[(i + n - 1) % n];
      Point to = corner[i];
      Segment s = ring.get(i);
      if (from != null || to != null) {
        ring.set(i, between(s, from == null ? s.start() : from, to == null ? s.end() : to));
      }
    }
  }

  private static Segment between(Segment s, Point from, Point to) {
    return s.match(
        l -> new Line(from, to),
        a -> {
          Arc b = new Arc(from, to, a.centre(), a.counterClockwise());
          // A short arc whose ends changed places would run all the way round.
          return Math.abs(b.sweepRad() - a.sweepRad()) < 1 ? b : a;
        });
  }

  /** Where two curves cross near the end of the first; null where they do not cross sharply. */
  private static Point crossing(Segment s, Segment t) {
    if (s.lengthMm() < SHORT_MM || t.lengthMm() < SHORT_MM) {
      return null;
    }
    Point p = s.end().plus(t.start()).times(0.5);
    Point at = p;
    for (int k = 0; k < 4; k++) {
      Point m = normal(s, at);
      Point n = normal(t, at);
      double det = m.cross(n);
      if (Math.abs(det) < LEAST_SINE) {
        return null;
      }
      double f = off(s, at);
      double g = off(t, at);
      // m·d = -f and n·d = -g
      Point d = new Point((-f * n.y() + g * m.y()) / det, (-g * m.x() + f * n.x()) / det);
      at = at.plus(d);
    }
    return at.distanceTo(p) <= MOST_MM ? at : null;
  }

  private static Point normal(Segment s, Point at) {
    return s.match(
        l -> {
          Point u = l.end().minus(l.start()).times(1 / l.lengthMm());
          return new Point(-u.y(), u.x());
        },
        a -> at.minus(a.centre()).times(1 / at.distanceTo(a.centre())));
  }

  /** Signed distance from the curve, along its normal. */
  private static double off(Segment s, Point at) {
    return s.match(
        l -> normal(l, at).dot(at.minus(l.start())), a -> at.distanceTo(a.centre()) - a.radiusMm());
  }
}
