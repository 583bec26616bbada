package etchloom.proof.copper;

import etchloom.geometry.Point;
import etchloom.proof.plane.EdgeSet;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.Overlay;

/** A rectangle drawn along a straight line, the deprecated square pen. */
final class BoxPen {
  private BoxPen() {}

  /** The rectangle at both ends and, on each of its sides, the strip that the side sweeps. */
  static void draw(EdgeSet out, EdgeSet box, Point from, Point to) {
    int fx = (int) Math.rint(from.x() * RingPen.NM);
    int fy = (int) Math.rint(from.y() * RingPen.NM);
    int dx = (int) Math.rint(to.x() * RingPen.NM) - fx;
    int dy = (int) Math.rint(to.y() * RingPen.NM) - fy;
    out.addAll(box, fx, fy, 1);
    out.addAll(box, fx + dx, fy + dy, 1);
    Figure sides = Overlay.union(box);
    for (int e = 0; e < sides.edges(); e++) {
      double ux = (double) sides.toX(e) - sides.fromX(e);
      double uy = (double) sides.toY(e) - sides.fromY(e);
      int w = ux * dy - uy * dx > 0 ? 1 : -1;
      out.begin(fx + sides.fromX(e), fy + sides.fromY(e), w);
      out.to(fx + sides.toX(e), fy + sides.toY(e), EdgeSet.STRAIGHT);
      out.to(fx + dx + sides.toX(e), fy + dy + sides.toY(e), EdgeSet.STRAIGHT);
      out.to(fx + dx + sides.fromX(e), fy + dy + sides.fromY(e), EdgeSet.STRAIGHT);
      out.close(EdgeSet.STRAIGHT);
    }
  }
}
