package etchloom.board;

import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;

/** The board's edge: a circle, or a circle with a tab, and the bore. Lines and arcs only. */
final class BoardEdge {
  /** Largest radius of the corner between board and tab; a usual cutter goes round it. */
  private static final double CORNER_MM = 1;

  private static final double LONGEST_RAD = Math.PI / 2;

  private BoardEdge() {}

  /** Closed paths, the outer edge first, counter-clockwise. */
  static List<Path> of(Spec.Board b) {
    double radius = b.diameterMm() / 2;
    List<Path> out = new ArrayList<>();
    out.add(b.tab().map(t -> tabbed(radius, t)).orElse(Path.circle(Point.ORIGIN, radius)));
    if (b.boreMm() > 0) {
      out.add(Path.circle(Point.ORIGIN, b.boreMm() / 2));
    }
    return out;
  }

  /**
   * Drawn with the tab along the x axis and turned. The corners at its root are rounded: an arc
   * that touches the circle from outside and the tab's side.
   */
  private static Path tabbed(double radiusMm, Spec.Tab tab) {
    double half = tab.widthMm() / 2;
    double end = radiusMm + tab.lengthMm();
    double corner = Math.min(CORNER_MM, tab.lengthMm() / 2);
    double reach = radiusMm + corner;
    if (half + corner >= radiusMm) {
      // Hardly narrower than the board: no room to round its root.
      corner = 0;
      reach = radiusMm;
    }
    double x = Math.sqrt(reach * reach - (half + corner) * (half + corner));
    Point centre = new Point(x, half + corner);
    Point onCircle = corner > 0 ? Point.polar(radiusMm, centre.angleRad()) : centre;
    PathBuilder p = new PathBuilder(onCircle);
    double from = centre.angleRad();
    double sweep = 2 * Math.PI - 2 * from;
    int pieces = (int) Math.ceil(sweep / LONGEST_RAD);
    for (int i = 1; i < pieces; i++) {
      p.arcTo(Point.polar(radiusMm, from + sweep * i / pieces), Point.ORIGIN, true);
    }
    p.arcTo(onCircle.mirrored(), Point.ORIGIN, true);
    p.arcTo(new Point(x, -half), centre.mirrored(), false);
    p.lineTo(new Point(end, -half)).lineTo(new Point(end, half)).lineTo(new Point(x, half));
    p.arcTo(onCircle, centre, false);
    return p.build().rotated(tab.angleRad());
  }
}
