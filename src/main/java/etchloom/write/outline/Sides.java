package etchloom.write.outline;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.BitSet;
import java.util.List;

/**
 * The right side of a track: its centre line shifted by half a width, without the ends. Pieces that
 * follow each other are joined: smoothly, round the outside of a corner, or cut back inside one.
 */
final class Sides {
  /** Shifted ends this near are one corner of a smooth track, mm; rounding sets them apart. */
  private static final double SMOOTH_MM = 3e-5;

  private final double half;
  private final List<Edge> out;
  private final BitSet loose;

  /**
   * @param loose is told of pieces whose sides may cross those of the piece before: where they meet
   *     at a corner with an arc, or the joint could not be made
   */
  Sides(double half, List<Edge> out, BitSet loose) {
    this.half = half;
    this.out = out;
    this.loose = loose;
  }

  /**
   * @param shapes the numbers of the track's pieces, one for each segment
   */
  void add(List<Segment> path, int[] shapes) {
    Edge before = null;
    for (int i = 0; i < path.size(); i++) {
      Edge e = shifted(path.get(i), shapes[i]);
      if (before != null && e != null) {
        join(before, e, path.get(i).start());
      } else if (i > 0) {
        loose.set(Math.max(shapes[i - 1], shapes[i]));
      }
      if (e != null) {
        out.add(e);
      }
      before = e;
    }
  }

  /** Null where an arc bends to the right more sharply than half the width. */
  private Edge shifted(Segment s, int shape) {
    return s.match(l -> shifted(l, shape), a -> shifted(a, shape));
  }

  private Edge shifted(Line l, int shape) {
    Point u = l.end().minus(l.start());
    Point right = new Point(u.y(), -u.x()).times(half / Edge.apart(l.start(), l.end()));
    return Edge.line(shape, l.start().plus(right), l.end().plus(right));
  }

  private Edge shifted(Arc a, int shape) {
    double k = a.counterClockwise() ? half : -half;
    Point from = a.start().minus(a.centre());
    Point to = a.end().minus(a.centre());
    double r0 = Edge.apart(a.start(), a.centre());
    double r1 = Edge.apart(a.end(), a.centre());
    if (r0 + k <= Edge.SAME_MM) {
      return null;
    }
    return Edge.arc(
        shape,
        a.start().plus(from.times(k / r0)),
        a.end().plus(to.times(k / r1)),
        a.centre(),
        a.counterClockwise());
  }

  private void join(Edge a, Edge b, Point corner) {
    if (Edge.apart(a.end, b.start) <= SMOOTH_MM) {
      Point middle = a.end.plus(b.start).times(0.5);
      a.end = middle;
      b.start = middle;
      return;
    }
    int later = Math.max(a.shape, b.shape);
    loose.set(later, loose.get(later) || a.isArc() || b.isArc());
    boolean leftTurn = a.end.minus(corner).cross(b.start.minus(corner)) > 0;
    if (leftTurn) {
      out.add(Edge.arc(a.shape, /* start= */ a.end, /* end= */ b.start, corner, true));
      return;
    }
    // Inside a corner the sides run into each other: both end where they cross.
    Point best = null;
    for (Point p : Crossings.of(a, b)) {
      if (best == null || Edge.apart(p, corner) < Edge.apart(best, corner)) {
        best = p;
      }
    }
    if (best == null) {
      loose.set(later);
      return;
    }
    a.end = best;
    b.start = best;
  }
}
