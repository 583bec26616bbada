package etchloom.geometry;

import java.util.List;

/**
 * Lines and arcs of at most half a turn as columns of numbers, with cheap bounds on their
 * distances: a bound that costs a few multiplications decides most pairs of a large board.
 *
 * <p>Every shape lies in a strip along its chord, and within its own height of the chord itself.
 */
final class FlatShapes {
  /** Centres nearer than this count as one; twice as much is given away in the bounds. */
  private static final double SAME_CENTRE_MM = 1e-9;

  /** Bounds are kept this far from what they bound, against rounding. */
  private static final double ROUNDING_MM = 1e-9;

  /** Upper bound on an arc's length over its chord, up to a quarter turn: (π/4)·√2. */
  private static final double QUARTER_OVER_CHORD = 1.111;

  final double[] x0;
  final double[] y0;
  final double[] x1;
  final double[] y1;
  final double[] box;
  private final double[] cx;
  private final double[] cy;
  private final double[] r;
  private final double[] nx;
  private final double[] ny;
  private final double[] stripLo;
  private final double[] stripHi;
  private final double[] height;
  private final double[] bulgeX;
  private final double[] bulgeY;
  private final double[] slack;
  private final boolean[] low;

  /**
   * @param fatMm one entry a shape: by how much its box, and only that, is fattened
   */
  FlatShapes(List<? extends Segment> shapes, double[] fatMm) {
    int n = shapes.size();
    x0 = new double[n];
    y0 = new double[n];
    x1 = new double[n];
    y1 = new double[n];
    cx = new double[n];
    cy = new double[n];
    r = new double[n];
    nx = new double[n];
    ny = new double[n];
    stripLo = new double[n];
    stripHi = new double[n];
    height = new double[n];
    bulgeX = new double[n];
    bulgeY = new double[n];
    slack = new double[n];
    low = new boolean[n];
    box = new double[4 * n];
    for (int i = 0; i < n; i++) {
      put(i, shapes.get(i));
      ShapeBounds.box(shapes.get(i), fatMm[i], box, 4 * i);
    }
  }

  private void put(int i, Segment s) {
    Point a = s.start();
    Point b = s.end();
    x0[i] = a.x();
    y0[i] = a.y();
    x1[i] = b.x();
    y1[i] = b.y();
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double d = Math.sqrt(dx * dx + dy * dy);
    nx[i] = d > 0 ? -dy / d : 1;
    ny[i] = d > 0 ? dx / d : 0;
    double at = nx[i] * a.x() + ny[i] * a.y();
    stripLo[i] = at;
    stripHi[i] = at;
    if (s instanceof Arc arc) {
      double px = a.x() - arc.centre().x();
      double py = a.y() - arc.centre().y();
      cx[i] = arc.centre().x();
      cy[i] = arc.centre().y();
      r[i] = Math.sqrt(px * px + py * py);
      double mid = nx[i] * cx[i] + ny[i] * cy[i];
      // A counter-clockwise arc bulges to the right of its chord, against the normal.
      low[i] = arc.counterClockwise();
      if (low[i]) {
        stripLo[i] = Math.min(at, mid - r[i]);
      } else {
        stripHi[i] = Math.max(at, mid + r[i]);
      }
      double ex = b.x() - arc.centre().x();
      double ey = b.y() - arc.centre().y();
      slack[i] = Math.abs(Math.sqrt(ex * ex + ey * ey) - r[i]) + ROUNDING_MM;
      // Up to half a turn no point of the arc stands beyond its chord's ends.
      height[i] = stripHi[i] - stripLo[i];
      bulgeX[i] = (low[i] ? -height[i] : height[i]) * nx[i];
      bulgeY[i] = (low[i] ? -height[i] : height[i]) * ny[i];
      height[i] += slack[i];
      stripLo[i] -= slack[i];
      stripHi[i] += slack[i];
    }
  }

  /** Whether two shapes are surely further apart than the limit; false says nothing. */
  static boolean apart(FlatShapes a, int i, FlatShapes b, int j, double limitMm) {
    double limit = limitMm + ROUNDING_MM;
    if (outside(a, i, b, j, limit) || outside(b, j, a, i, limit)) {
      return true;
    }
    return (a.r[i] > 0 && offCircle(a, i, b, j, limit))
        || (b.r[j] > 0 && offCircle(b, j, a, i, limit));
  }

  /** Whether the second shape stays well inside or well outside the circle of the first, an arc. */
  private static boolean offCircle(FlatShapes a, int i, FlatShapes b, int j, double limit) {
    double x = a.cx[i];
    double y = a.cy[i];
    double gap = limit + a.slack[i];
    if (b.r[j] > 0 && Math.abs(x - b.cx[j]) <= SAME_CENTRE_MM) {
      if (Math.abs(y - b.cy[j]) <= SAME_CENTRE_MM) {
        return Math.abs(a.r[i] - b.r[j]) - b.slack[j] - 2 * SAME_CENTRE_MM > gap;
      }
    }
    gap += b.height[j];
    double inside = a.r[i] - gap;
    double ux = b.x0[j] - x;
    double uy = b.y0[j] - y;
    double vx = b.x1[j] - x;
    double vy = b.y1[j] - y;
    if (inside > 0 && ux * ux + uy * uy < inside * inside && vx * vx + vy * vy < inside * inside) {
      return true;
    }
    return b.toChord(x, y, j) - gap > a.r[i];
  }

  /**
   * Whether the second shape stays beside the first one's strip. An arc of up to half a turn lies
   * in the rectangle between its chord and the chord moved by its height towards its bulge.
   */
  private static boolean outside(FlatShapes a, int i, FlatShapes b, int j, double limit) {
    double u = a.nx[i];
    double v = a.ny[i];
    double p = u * b.x0[j] + v * b.y0[j];
    double q = u * b.x1[j] + v * b.y1[j];
    double bulge = u * b.bulgeX[j] + v * b.bulgeY[j];
    double gap = limit + b.slack[j];
    double lo = (p < q ? p : q) + (bulge < 0 ? bulge : 0);
    double hi = (p < q ? q : p) + (bulge > 0 ? bulge : 0);
    return lo - gap > a.stripHi[i] || hi + gap < a.stripLo[i];
  }

  /**
   * An upper bound, mm, on how far any point of shape {@code i} lies from shape {@code c}.
   *
   * <p>From a line or arc to a line: the distance from a convex set is greatest at the ends of a
   * line; an arc leaves its chord by no more than its height. Between concentric arcs: the
   * difference of the radii, and what stands beyond the other arc's ends.
   */
  double reach(int i, int c) {
    if (r[i] > 0
        && r[c] > 0
        && Math.abs(cx[i] - cx[c]) <= SAME_CENTRE_MM
        && Math.abs(cy[i] - cy[c]) <= SAME_CENTRE_MM) {
      double off = Math.abs(r[i] - r[c]) + slack[i] + slack[c] + 2 * SAME_CENTRE_MM;
      return off + beyond(i, c);
    }
    double a = toChord(x0[i], y0[i], c);
    double b = toChord(x1[i], y1[i], c);
    return height[i] + height[c] + Math.max(a, b) + ROUNDING_MM;
  }

  /**
   * How far the directions of arc {@code i} lead beyond the ends of the concentric arc {@code c}.
   */
  private double beyond(int i, int c) {
    double a = beyond(x0[i], y0[i], c);
    double b = beyond(x1[i], y1[i], c);
    double most = Math.max(a, b);
    if (a == 0 || b == 0 || beyond(x0[c], y0[c], i) == 0) {
      // They have directions in common: what stands beyond is farthest at an end.
      return most;
    }
    // No part is farther than half-way round from the one end to the other.
    double dx = x1[i] - x0[i];
    double dy = y1[i] - y0[i];
    double round = QUARTER_OVER_CHORD * Math.sqrt(dx * dx + dy * dy) * r[c] / r[i];
    return Math.max(most, (a + b + round) / 2);
  }

  /**
   * How far a point in the direction of {@code (x, y)}, on the circle of arc {@code c}, lies from
   * the arc: 0 where the arc passes it, else the way to the nearer end.
   */
  private double beyond(double x, double y, int c) {
    double px = x - cx[c];
    double py = y - cy[c];
    double k = r[c] / Math.sqrt(px * px + py * py);
    double qx = cx[c] + k * px;
    double qy = cy[c] + k * py;
    // On the circle the arc is what lies on its own side of the chord.
    double side = nx[c] * qx + ny[c] * qy - (nx[c] * x0[c] + ny[c] * y0[c]);
    if (low[c] ? side <= 0 : side >= 0) {
      return 0;
    }
    double ax = qx - x0[c];
    double ay = qy - y0[c];
    double bx = qx - x1[c];
    double by = qy - y1[c];
    return Math.sqrt(Math.min(ax * ax + ay * ay, bx * bx + by * by));
  }

  private double toChord(double x, double y, int c) {
    double ux = x1[c] - x0[c];
    double uy = y1[c] - y0[c];
    double uu = ux * ux + uy * uy;
    double wx = x - x0[c];
    double wy = y - y0[c];
    double k = uu > 0 ? Math.min(1, Math.max(0, (ux * wx + uy * wy) / uu)) : 0;
    double dx = wx - k * ux;
    double dy = wy - k * uy;
    return Math.sqrt(dx * dx + dy * dy);
  }
}
