package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;

/** Arcs from what files give of them, where the radii of start and end seldom agree exactly. */
final class Arcs {
  private Arcs() {}

  /**
   * An arc through both ends. Where the radii differ by more than {@link Arc#RADIUS_SLACK_MM} the
   * centre moves to the nearest point that is as far from one end as from the other, so the ends
   * stand. An arc with an end on its centre, or whose radius is beyond the reach of doubles, is the
   * straight line.
   */
  static Segment between(Point start, Point end, Point centre, boolean counterClockwise) {
    double r0 = start.distanceTo(centre);
    double r1 = end.distanceTo(centre);
    if (!(r0 > 0 && r1 > 0)) {
      return new Line(start, end);
    }
    if (Math.abs(r0 - r1) <= Arc.RADIUS_SLACK_MM) {
      return new Arc(start, end, centre, counterClockwise);
    }
    Point chord = end.minus(start);
    Point middle = start.plus(end).times(0.5);
    Point u = chord.times(1 / chord.norm());
    Point from = centre.minus(middle);
    Point moved = middle.plus(from.minus(u.times(from.dot(u))));
    double off = Math.abs(start.distanceTo(moved) - end.distanceTo(moved));
    return off <= Arc.RADIUS_SLACK_MM && start.distanceTo(moved) > 0
        ? new Arc(start, end, moved, counterClockwise)
        : new Line(start, end);
  }

  /** A full turn from a point back to itself, as two half circles. */
  static List<Segment> fullTurn(Point start, Point centre, boolean counterClockwise) {
    Point opposite = centre.plus(centre.minus(start));
    return List.of(
        between(start, opposite, centre, counterClockwise),
        between(opposite, start, centre, counterClockwise));
  }

  /**
   * The arc a DXF bulge stands for.
   *
   * @param bulge tan of a quarter of the sweep, positive counter-clockwise; next to 0 is the line
   */
  static Segment ofBulge(Point start, Point end, double bulge) {
    if (Math.abs(bulge) < 1e-8) {
      return new Line(start, end);
    }
    Point chord = end.minus(start);
    double k = (1 - bulge * bulge) / (4 * bulge);
    Point centre = start.plus(chord.times(0.5)).plus(new Point(-chord.y() * k, chord.x() * k));
    return between(start, end, centre, bulge > 0);
  }
}
