package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;

/** Area and inside of closed paths, arcs exact. */
final class Contours {
  private Contours() {}

  /** Area in mm², positive for a path that runs counter-clockwise. */
  static double signedAreaMm2(Path path) {
    // Seen from the first point, so that a contour far from the origin loses no digits.
    Point o = path.start();
    double twice = 0;
    for (Segment s : path.segments()) {
      twice += s.start().minus(o).cross(s.end().minus(o));
      if (s instanceof Arc a) {
        double sweep = a.sweepRad();
        double r = a.radiusMm();
        twice += r * r * (sweep - Math.sin(sweep));
      }
    }
    return twice / 2;
  }

  /**
   * Whether a point lies inside a closed path, by even and odd; points on the path go either way.
   *
   * @param pieces all of the path, or those that a ray from the point to the right may meet
   */
  static boolean inside(List<Segment> pieces, Point p) {
    boolean in = false;
    for (Segment s : pieces) {
      in ^= s instanceof Arc a ? crosses(a, p) : crosses(s.start(), s.end(), p);
    }
    return in;
  }

  /** Whether a ray to the right of p meets the line an odd number of times. */
  private static boolean crosses(Point a, Point b, Point p) {
    if (a.y() <= p.y() == b.y() <= p.y()) {
      return false;
    }
    double x = a.x() + (p.y() - a.y()) / (b.y() - a.y()) * (b.x() - a.x());
    return x > p.x();
  }

  /** Cut at its top and bottom, between which y only rises or falls. */
  private static boolean crosses(Arc a, Point p) {
    double r = a.radiusMm();
    double reach = r + 2 * Arc.RADIUS_SLACK_MM;
    if (Math.abs(p.y() - a.centre().y()) > reach || p.x() > a.centre().x() + reach) {
      return false;
    }
    boolean in = false;
    double from = a.startRad();
    double sweep = a.sweepRad();
    double at = from;
    double lastY = a.start().y();
    double end = from + sweep;
    double step = Math.signum(sweep);
    while (at != end) {
      // The next multiple of a half turn past π/2 in the walking direction.
      double turns = (at - Math.PI / 2) / Math.PI * step;
      double next = (Math.floor(turns + 1e-12) + 1) * Math.PI * step + Math.PI / 2;
      boolean last = (next - end) * step >= 0;
      next = last ? end : next;
      double y = last ? a.end().y() : a.centre().y() + r * Math.sin(next);
      if (lastY <= p.y() != y <= p.y()) {
        double dy = p.y() - a.centre().y();
        double dx = Math.sqrt(Math.max(0, r * r - dy * dy));
        boolean right = Math.cos((at + next) / 2) > 0;
        in ^= a.centre().x() + (right ? dx : -dx) > p.x();
      }
      at = next;
      lastY = y;
    }
    return in;
  }
}
