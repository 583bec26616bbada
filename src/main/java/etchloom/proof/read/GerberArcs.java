package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;

/** Circular draws, multi-quadrant (G75) and the deprecated single-quadrant (G74). Section 4.7. */
final class GerberArcs {
  /** Radii of start and end may differ by so many steps of the coordinates: rounding alone. */
  private static final double SLACK_STEPS = 3;

  /** Below this the difference of the radii is rounding whatever the coordinate format, mm. */
  private static final double SLACK_MM = 1e-4;

  /** Beyond this no reading of the arc is safe, mm: a tenth of the narrowest common track. */
  static final double REFUSED_MM = 0.01;

  /** A single-quadrant arc may pass 90° by this much, rad, for rounding. */
  private static final double QUADRANT_SLACK_RAD = 0.01;

  private final Reading reading;
  private final GerberFormat format;
  private boolean set;
  private boolean single;

  GerberArcs(Reading reading, GerberFormat format) {
    this.reading = reading;
    this.format = format;
  }

  void quadrants(boolean singleQuadrant) {
    set = true;
    single = singleQuadrant;
  }

  /** The arc from (x, y) to (toX, toY), all in coordinate steps. */
  List<Segment> segments(long x, long y, long toX, long toY, long i, long j, boolean ccw, int line)
      throws UnreadableFile {
    if (!set) {
      throw reading.fail(line, "no-arc-mode", "an arc before G75; readers differ on what it is");
    }
    if (single) {
      return singleQuadrant(x, y, toX, toY, i, j, ccw, line);
    }
    Point start = format.point(x, y);
    Point centre = format.point(x + i, y + j);
    if (i == 0 && j == 0) {
      if (x == toX && y == toY) {
        return List.of(new Line(start, start));
      }
      throw reading.fail(line, "arc-radius", "the arc has no radius: I and J are 0");
    }
    if (x == toX && y == toY) {
      return Arcs.fullTurn(start, centre, ccw);
    }
    Point end = format.point(toX, toY);
    checkRadii(start, end, centre, line);
    return List.of(Arcs.between(start, end, centre, ccw));
  }

  private void checkRadii(Point start, Point end, Point centre, int line) throws UnreadableFile {
    double r0 = start.distanceTo(centre);
    double r1 = end.distanceTo(centre);
    double off = Math.abs(r0 - r1);
    double rounding = Math.max(SLACK_MM, SLACK_STEPS * format.stepMm());
    if (off <= rounding && r1 > 0) {
      return;
    }
    String radii =
        "the arc's radius is " + Shown.mm(r0) + " mm at the start, " + Shown.mm(r1) + " at the end";
    if (off > Math.max(rounding, REFUSED_MM) || r1 == 0) {
      throw reading.fail(line, "arc-radius", radii);
    }
    reading.warn(line, "arc-radius", radii + "; its centre is moved");
  }

  /** I and J have no sign here: of the four centres the one that gives at most a quarter turn. */
  private List<Segment> singleQuadrant(
      long x, long y, long toX, long toY, long i, long j, boolean ccw, int line)
      throws UnreadableFile {
    reading.warnOnce(line, "deprecated", "single-quadrant arcs (G74) are deprecated");
    Point start = format.point(x, y);
    if (x == toX && y == toY) {
      return List.of(new Line(start, start));
    }
    Point end = format.point(toX, toY);
    double best = Double.POSITIVE_INFINITY;
    Point centre = start;
    for (int k = 0; k < 4; k++) {
      Point c = format.point(x + (k % 2 == 0 ? i : -i), y + (k < 2 ? j : -j));
      Point a = start.minus(c);
      Point b = end.minus(c);
      double turn = Math.atan2(a.cross(b), a.dot(b)) * (ccw ? 1 : -1);
      double off = Math.abs(a.norm() - b.norm());
      if (turn > 0 && turn <= Math.PI / 2 + QUADRANT_SLACK_RAD && off < best) {
        best = off;
        centre = c;
      }
    }
    if (best == Double.POSITIVE_INFINITY) {
      throw reading.fail(line, "arc-radius", "no centre gives an arc within one quadrant");
    }
    checkRadii(start, end, centre, line);
    return List.of(Arcs.between(start, end, centre, ccw));
  }
}
