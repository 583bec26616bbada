package etchloom.proof.copper;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.plane.EdgeSet;
import java.util.List;

/**
 * The outline of a round pen drawn along a path, as one ring.
 *
 * <p>The ring is the convolution of the path, walked there and back, with the pen's circle: at a
 * corner's outside it turns about the corner forwards, at its inside backwards. Its winding number
 * at a point is the number of stretches of the path within the pen's radius of it, so it is at
 * least 1 on all that the pen covers and 0 elsewhere, however the path crosses or touches itself.
 *
 * <p>Source: L. Guibas, L. Ramshaw, J. Stolfi, "A kinetic framework for computational geometry",
 * 24th FOCS (1983), convolution of tracings.
 */
final class PenTour {
  private final RingPen pen;
  private final EdgeSet out;
  private final double radius;
  private final List<Segment> pieces;
  private final double[] turn;

  private PenTour(RingPen pen, List<Segment> pieces, double radiusNm) {
    this.pen = pen;
    this.out = pen.edges();
    this.pieces = pieces;
    this.radius = radiusNm;
    turn = new double[pieces.size()];
    for (int i = 0; i + 1 < turn.length; i++) {
      Point a = pieces.get(i).tangent(1);
      Point b = pieces.get(i + 1).tangent(0);
      turn[i] = Math.atan2(a.cross(b), a.dot(b));
    }
  }

  /**
   * @param diameterNm nothing is drawn for 0
   */
  static void draw(RingPen pen, Path path, double diameterNm, int weight) {
    if (!(diameterNm > 0)) {
      return;
    }
    List<Segment> pieces = path.segments().stream().filter(PenTour::moves).toList();
    if (pieces.isEmpty()) {
      Point p = path.start();
      pen.circle(p.x() * RingPen.NM, p.y() * RingPen.NM, diameterNm / 2, weight);
      return;
    }
    new PenTour(pen, pieces, diameterNm / 2).tour(weight);
  }

  private static boolean moves(Segment s) {
    return s.lengthMm() > 1e-9;
  }

  private void tour(int weight) {
    int n = pieces.size();
    Point right = rightOf(pieces.get(0).tangent(0));
    Point start = pieces.get(0).start();
    out.begin(nm(start.x(), right.x()), nm(start.y(), right.y()), weight);
    for (int i = 0; i < n; i++) {
      Segment s = pieces.get(i);
      beside(s);
      turnAbout(s.end(), s.tangent(1), i + 1 < n ? turn[i] : Math.PI);
    }
    for (int i = n - 1; i >= 0; i--) {
      Segment s = pieces.get(i).reversed();
      beside(s);
      turnAbout(s.end(), s.tangent(1), i > 0 ? -turn[i - 1] : Math.PI);
    }
    out.close(EdgeSet.STRAIGHT);
  }

  /** Along the right-hand side of a piece, from the point beside its start. */
  private void beside(Segment s) {
    Point right = rightOf(s.tangent(1));
    double x = nm(s.end().x(), right.x());
    double y = nm(s.end().y(), right.y());
    if (s instanceof Arc a) {
      double side = a.counterClockwise() ? radius : -radius;
      double r = a.radiusMm() * RingPen.NM + side;
      // Inside a pen wider than the arc the side runs on the far half of a smaller circle.
      double from = r < 0 ? a.startRad() + Math.PI : a.startRad();
      Point c = a.centre();
      pen.arcTo(c.x() * RingPen.NM, c.y() * RingPen.NM, Math.abs(r), from, a.sweepRad(), x, y);
    } else {
      out.to(x, y, EdgeSet.STRAIGHT);
    }
  }

  private void turnAbout(Point p, Point tangent, double angle) {
    Point from = rightOf(tangent);
    Point to = from.rotated(angle);
    pen.arcTo(
        p.x() * RingPen.NM,
        p.y() * RingPen.NM,
        radius,
        from.angleRad(),
        angle,
        nm(p.x(), to.x()),
        nm(p.y(), to.y()));
  }

  private double nm(double mm, double normal) {
    return mm * RingPen.NM + radius * normal;
  }

  private static Point rightOf(Point tangent) {
    return new Point(tangent.y(), -tangent.x());
  }
}
