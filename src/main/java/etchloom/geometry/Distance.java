package etchloom.geometry;

/**
 * Smallest distance between lines, arcs and points, and the pair of points where it is.
 *
 * <p>Closed form, no iteration: at the nearest pair each point is either an end of its piece or
 * stands on a normal that both pieces share. The normals of an arc pass through its centre, so they
 * are: between two arcs the line of centres, between an arc and a line the perpendicular from the
 * centre. Ends, shared normals and crossings are all tried and the best is kept; each trial is a
 * true pair of points, so rounding (about 1e-15 of the coordinates) can never make a distance too
 * small by more than itself, and degenerate cases (concentric, tangent, parallel, empty) need no
 * branch of their own: their minimum is also reached at an end.
 *
 * <p>Where several pairs are equally near, which of them is given is fixed but not specified. A
 * line whose ends are equal is a point. An arc counts as a piece of the circle through its start;
 * where the end is off that circle ({@link Arc#RADIUS_SLACK_MM}), so is the result near the end.
 * Constant time.
 */
public final class Distance {
  private Distance() {}

  /** From a point to a piece. */
  public static Nearest between(Point p, Segment s) {
    Trial t = new Trial();
    pointTo(t, p, s, false);
    return t.best();
  }

  /** Between two pieces. */
  public static Nearest between(Segment a, Segment b) {
    return search(a, b).best();
  }

  /** Whether two pieces are further apart than the limit (mm), a limit below 0 always exceeded. */
  public static boolean exceeds(Segment a, Segment b, double limitMm) {
    return limitMm < 0 || search(a, b).best2 > limitMm * limitMm;
  }

  private static Trial search(Segment a, Segment b) {
    Trial t = new Trial();
    pointTo(t, a.start(), b, false);
    pointTo(t, a.end(), b, false);
    pointTo(t, b.start(), a, true);
    pointTo(t, b.end(), a, true);
    if (a instanceof Line la) {
      if (b instanceof Line lb) {
        lines(t, la, lb);
      } else {
        lineArc(t, la, (Arc) b, false);
      }
    } else if (b instanceof Line lb) {
      lineArc(t, lb, (Arc) a, true);
    } else {
      arcs(t, (Arc) a, (Arc) b);
    }
    return t;
  }

  private static void pointTo(Trial t, Point p, Segment s, boolean swap) {
    if (s instanceof Line l) {
      pointLine(t, p, l, swap);
    } else {
      pointArc(t, p, (Arc) s, swap);
    }
  }

  private static void pointLine(Trial t, Point p, Line l, boolean swap) {
    double ux = l.end().x() - l.start().x();
    double uy = l.end().y() - l.start().y();
    double uu = ux * ux + uy * uy;
    double along = ux * (p.x() - l.start().x()) + uy * (p.y() - l.start().y());
    if (!(along > 0)) {
      t.offer(p.x(), p.y(), l.start().x(), l.start().y(), swap);
    } else if (along >= uu) {
      t.offer(p.x(), p.y(), l.end().x(), l.end().y(), swap);
    } else {
      double k = along / uu;
      t.offer(p.x(), p.y(), l.start().x() + k * ux, l.start().y() + k * uy, swap);
    }
  }

  private static void pointArc(Trial t, Point p, Arc a, boolean swap) {
    t.offer(p.x(), p.y(), a.start().x(), a.start().y(), swap);
    t.offer(p.x(), p.y(), a.end().x(), a.end().y(), swap);
    double vx = p.x() - a.centre().x();
    double vy = p.y() - a.centre().y();
    double v = Math.sqrt(vx * vx + vy * vy);
    // At the centre every point of the arc is equally near, the ends among them.
    if (v > 0 && sweeps(a, vx, vy)) {
      double k = radius(a) / v;
      t.offer(p.x(), p.y(), a.centre().x() + k * vx, a.centre().y() + k * vy, swap);
    }
  }

  /** The crossing of two lines; where they do not cross an end is nearest. */
  private static void lines(Trial t, Line a, Line b) {
    double ux = a.end().x() - a.start().x();
    double uy = a.end().y() - a.start().y();
    double vx = b.end().x() - b.start().x();
    double vy = b.end().y() - b.start().y();
    double wx = b.start().x() - a.start().x();
    double wy = b.start().y() - a.start().y();
    double det = ux * vy - uy * vx;
    double s = (wx * vy - wy * vx) / det;
    double r = (wx * uy - wy * ux) / det;
    // Parallel lines divide by 0: the comparisons below are then false, as they must be.
    if (s >= 0 && s <= 1 && r >= 0 && r <= 1) {
      t.offer(
          a.start().x() + s * ux,
          a.start().y() + s * uy,
          b.start().x() + r * vx,
          b.start().y() + r * vy,
          false);
    }
  }

  /** Crossings and the shared normal; {@code swap}: the arc is the first shape. */
  private static void lineArc(Trial t, Line l, Arc a, boolean swap) {
    double cx = a.centre().x();
    double cy = a.centre().y();
    double ux = l.end().x() - l.start().x();
    double uy = l.end().y() - l.start().y();
    double uu = ux * ux + uy * uy;
    if (!(uu > 0)) {
      return;
    }
    double k = (ux * (cx - l.start().x()) + uy * (cy - l.start().y())) / uu;
    double fx = l.start().x() + k * ux;
    double fy = l.start().y() + k * uy;
    double r = radius(a);
    double nx = fx - cx;
    double ny = fy - cy;
    double n = Math.sqrt(nx * nx + ny * ny);
    if (k > 0 && k < 1 && n > 0 && sweeps(a, nx, ny)) {
      t.offer(fx, fy, cx + nx * r / n, cy + ny * r / n, swap);
    }
    if (n < r) {
      double half = Math.sqrt((r - n) * (r + n) / uu);
      crossing(t, l, a, k - half, swap);
      crossing(t, l, a, k + half, swap);
    }
  }

  private static void crossing(Trial t, Line l, Arc a, double k, boolean swap) {
    if (!(k >= 0 && k <= 1)) {
      return;
    }
    double x = l.start().x() + k * (l.end().x() - l.start().x());
    double y = l.start().y() + k * (l.end().y() - l.start().y());
    if (sweeps(a, x - a.centre().x(), y - a.centre().y())) {
      t.offer(x, y, x, y, swap);
    }
  }

  private static void arcs(Trial t, Arc a, Arc b) {
    double dx = b.centre().x() - a.centre().x();
    double dy = b.centre().y() - a.centre().y();
    double d = Math.sqrt(dx * dx + dy * dy);
    if (!(d > 0)) {
      return;
    }
    dx /= d;
    dy /= d;
    normal(t, a, dx, dy, b, -dx, -dy);
    normal(t, a, dx, dy, b, dx, dy);
    normal(t, a, -dx, -dy, b, -dx, -dy);
    normal(t, a, -dx, -dy, b, dx, dy);
    double ra = radius(a);
    double rb = radius(b);
    double along = (d + (ra - rb) * (ra + rb) / d) / 2;
    double across2 = (ra - along) * (ra + along);
    if (across2 > 0) {
      double across = Math.sqrt(across2);
      crossing(t, a, along * dx - across * dy, along * dy + across * dx, b);
      crossing(t, a, along * dx + across * dy, along * dy - across * dx, b);
    }
  }

  /** The points of two arcs in given unit directions from their centres, if both are there. */
  private static void normal(Trial t, Arc a, double ax, double ay, Arc b, double bx, double by) {
    if (sweeps(a, ax, ay) && sweeps(b, bx, by)) {
      double ra = radius(a);
      double rb = radius(b);
      t.offer(
          a.centre().x() + ra * ax,
          a.centre().y() + ra * ay,
          b.centre().x() + rb * bx,
          b.centre().y() + rb * by,
          false);
    }
  }

  /** A crossing of two circles, given from the centre of {@code a}, if both arcs pass it. */
  private static void crossing(Trial t, Arc a, double vx, double vy, Arc b) {
    double x = a.centre().x() + vx;
    double y = a.centre().y() + vy;
    if (sweeps(a, vx, vy) && sweeps(b, x - b.centre().x(), y - b.centre().y())) {
      t.offer(x, y, x, y, false);
    }
  }

  private static double radius(Arc a) {
    double x = a.start().x() - a.centre().x();
    double y = a.start().y() - a.centre().y();
    return Math.sqrt(x * x + y * y);
  }

  /**
   * Whether the arc passes the direction (vx, vy) seen from its centre, by signs of cross products:
   * no angle is formed, so nothing wraps.
   */
  static boolean sweeps(Arc arc, double vx, double vy) {
    Point from = arc.counterClockwise() ? arc.start() : arc.end();
    Point to = arc.counterClockwise() ? arc.end() : arc.start();
    double ax = from.x() - arc.centre().x();
    double ay = from.y() - arc.centre().y();
    double bx = to.x() - arc.centre().x();
    double by = to.y() - arc.centre().y();
    double fromTo = ax * by - ay * bx;
    double fromV = ax * vy - ay * vx;
    double vTo = vx * by - vy * bx;
    // For a very small sweep or gap the opposite direction has the same signs, to rounding.
    double middle = vx * (ax + bx) + vy * (ay + by);
    boolean sameSide =
        middle >= -1e-9 * (Math.abs(vx) + Math.abs(vy)) * (Math.abs(ax) + Math.abs(ay));
    if (fromTo < 0) {
      return !(fromV < 0 && vTo < 0 && sameSide);
    }
    return fromV >= 0 && vTo >= 0 && sameSide;
  }

  /** The best pair so far. */
  private static final class Trial {
    private double best2 = Double.POSITIVE_INFINITY;
    private double ax;
    private double ay;
    private double bx;
    private double by;

    void offer(double px, double py, double qx, double qy, boolean swap) {
      double dx = px - qx;
      double dy = py - qy;
      double d2 = dx * dx + dy * dy;
      if (d2 < best2) {
        best2 = d2;
        ax = swap ? qx : px;
        ay = swap ? qy : py;
        bx = swap ? px : qx;
        by = swap ? py : qy;
      }
    }

    Nearest best() {
      return new Nearest(Math.sqrt(best2), new Point(ax, ay), new Point(bx, by));
    }
  }
}
