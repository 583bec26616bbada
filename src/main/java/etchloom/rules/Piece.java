package etchloom.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;

/**
 * A piece of copper on one layer: a stretch of a track, or a pad (a line of no length).
 *
 * @param fatMm half the track's width, or the pad's radius
 * @param conductor of a track; -1 for a pad
 * @param segment place of the shape in the conductor's path; -1 for a pad
 * @param fromMm length of the conductor's path up to the start of the shape; 0 for a pad
 * @param toMm the same for its end
 * @param turnFromRad by how much the conductor's path has turned up to the start of the shape, left
 *     and right alike counted as positive, corners included; 0 for a pad
 * @param turnToRad the same for its end
 * @param joint of a pad; -1 for a track
 */
record Piece(
    Segment shape,
    double fatMm,
    int conductor,
    int segment,
    double fromMm,
    double toMm,
    int joint) {

  static Piece pad(Point at, double radiusMm, int joint) {
    return new Piece(new Line(at, at), radiusMm, -1, -1, 0, 0, joint);
  }

  boolean isPad() {
    return joint >= 0;
  }

  double lengthMm() {
    return toMm - fromMm;
  }

  /** The part between two lengths of the conductor's path. */
  Piece part(double startMm, double endMm) {
    double from = Math.max(0, (startMm - fromMm) / lengthMm());
    double to = Math.min(1, (endMm - fromMm) / lengthMm());
    return new Piece(shape.part(from, to), fatMm, conductor, segment, startMm, endMm, joint);
  }

  /** Length of the conductor's path up to a point of the shape. */
  double walkMm(Point p) {
    double share;
    if (shape instanceof Line l) {
      share = p.distanceTo(l.start()) / l.lengthMm();
    } else {
      Arc a = (Arc) shape;
      share = angle(a, p) / a.sweepRad();
    }
    // Not finite where the piece has no length.
    return fromMm + (share > 0 ? lengthMm() * Math.min(1, share) : 0);
  }

  /** Signed, from the start of the arc; for arcs of less than half a turn. */
  private static double angle(Arc a, Point p) {
    Point from = a.start().minus(a.centre());
    Point to = p.minus(a.centre());
    return Math.atan2(from.cross(to), from.dot(to));
  }
}
