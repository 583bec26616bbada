package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.ApertureShape.Circle;
import etchloom.proof.image.ApertureShape.Composite;
import etchloom.proof.image.ApertureShape.Obround;
import etchloom.proof.image.ApertureShape.Part;
import etchloom.proof.image.ApertureShape.Rectangle;
import etchloom.proof.image.ApertureShape.RegularPolygon;
import java.util.ArrayList;
import java.util.List;

/**
 * Where a shape goes: mirrored in the y axis (x changes sign), then rotated counter-clockwise, then
 * scaled, then moved.
 */
record Placement(
    boolean mirrored, double angleRad, double cos, double sin, double scale, Point move) {
  static final Placement NONE = new Placement(false, 0, 1, 0, 1, Point.ORIGIN);

  /** Turns by a multiple of 90° are exact. */
  static Placement of(boolean mirrorX, boolean mirrorY, double angleDeg, double scale) {
    double deg = (angleDeg + (mirrorY ? 180 : 0)) % 360;
    double quarters = deg / 90;
    double rad = Math.toRadians(deg);
    if (quarters != Math.rint(quarters)) {
      return new Placement(
          mirrorX != mirrorY, rad, Math.cos(rad), Math.sin(rad), scale, Point.ORIGIN);
    }
    int q = Math.floorMod((int) quarters, 4);
    double c = q == 0 ? 1 : q == 2 ? -1 : 0;
    double s = q == 1 ? 1 : q == 3 ? -1 : 0;
    return new Placement(mirrorX != mirrorY, q * Math.PI / 2, c, s, scale, Point.ORIGIN);
  }

  Placement movedTo(Point to) {
    return new Placement(mirrored, angleRad, cos, sin, scale, to);
  }

  /** True when shapes keep their form and only move. */
  boolean onlyMoves() {
    return !mirrored && cos == 1 && scale == 1;
  }

  Point point(Point p) {
    double x = mirrored ? -p.x() : p.x();
    // Adding 0.0 turns -0.0 into 0.0, which records tell apart.
    return new Point(
        (x * cos - p.y() * sin) * scale + move.x() + 0.0,
        (x * sin + p.y() * cos) * scale + move.y() + 0.0);
  }

  Path path(Path path) {
    List<Segment> out = new ArrayList<>(path.segments().size());
    Point first = point(path.start());
    Point at = first;
    int last = path.segments().size() - 1;
    for (int i = 0; i <= last; i++) {
      Segment s = path.segments().get(i);
      Point from = at;
      Point to = i == last && path.closed() ? first : point(s.end());
      at = to;
      out.add(s.match(l -> new Line(from, to), a -> arc(a, from, to)));
    }
    return new Path(out);
  }

  private Segment arc(Arc a, Point from, Point to) {
    return Arcs.between(from, to, point(a.centre()), a.counterClockwise() != mirrored);
  }

  /** The shape mirrored, rotated and scaled; the move is left to the flash. */
  ApertureShape shape(ApertureShape shape) {
    if (onlyMoves()) {
      return shape;
    }
    if (shape instanceof Circle c) {
      return new Circle(c.diameterMm() * scale, c.holeDiameterMm() * scale);
    }
    if (shape instanceof Rectangle r) {
      double turn = turned(r.rotationRad());
      double w = r.widthMm() * scale;
      double h = r.heightMm() * scale;
      double hole = r.holeDiameterMm() * scale;
      return sideways(turn) ? new Rectangle(h, w, 0, hole) : new Rectangle(w, h, turn, hole);
    }
    if (shape instanceof Obround o) {
      double turn = turned(o.rotationRad());
      double w = o.widthMm() * scale;
      double h = o.heightMm() * scale;
      double hole = o.holeDiameterMm() * scale;
      return sideways(turn) ? new Obround(h, w, 0, hole) : new Obround(w, h, turn, hole);
    }
    if (shape instanceof RegularPolygon p) {
      double corner = (mirrored ? Math.PI - p.rotationRad() : p.rotationRad()) + angleRad;
      return new RegularPolygon(
          p.outerDiameterMm() * scale, p.vertices(), corner, p.holeDiameterMm() * scale);
    }
    Composite c = (Composite) shape;
    Placement still = movedTo(Point.ORIGIN);
    return new Composite(
        c.macro(),
        c.parts().stream()
            .map(
                p ->
                    new Part(
                        p.exposed(),
                        still.path(p.outline()),
                        p.holes().stream().map(still::path).toList()))
            .toList());
  }

  /** What a part weighs against {@link Reading#MAX_PIECES}. */
  static int pieces(Part part) {
    int sum = 1 + part.outline().segments().size();
    for (Path hole : part.holes()) {
      sum += hole.segments().size();
    }
    return sum;
  }

  /** As {@link #pieces(Part)}; a standard shape takes nothing beyond its flash. */
  static int pieces(ApertureShape shape) {
    return shape instanceof Composite c ? c.parts().stream().mapToInt(Placement::pieces).sum() : 0;
  }

  /** The rotation of a shape that looks the same after half a turn; 0 when it comes out upright. */
  private double turned(double rotationRad) {
    double turn = (mirrored ? -rotationRad : rotationRad) + angleRad;
    double halfTurns = turn / Math.PI;
    return Math.abs(halfTurns - Math.rint(halfTurns)) < 1e-12 ? 0 : turn;
  }

  private static boolean sideways(double turn) {
    double halfTurns = turn / Math.PI - 0.5;
    return Math.abs(halfTurns - Math.rint(halfTurns)) < 1e-12;
  }
}
