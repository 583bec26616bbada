package etchloom.proof.read;

import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;

/** Arcs of drill programs, by radius (XNC, less than half a turn) or by centre (older). */
record NcArcs(Reading reading, boolean counterClockwise, int line) {
  List<Segment> byRadius(Point from, Point to, double radiusMm) throws UnreadableFile {
    Point chord = to.minus(from);
    double half = chord.norm() / 2;
    if (!(half > 0 && radiusMm >= half - GerberArcs.REFUSED_MM)) {
      throw wrong(
          "no arc of radius "
              + (Double.isNaN(radiusMm) ? "?" : Shown.mm(radiusMm))
              + " mm leads over "
              + Shown.mm(2 * half)
              + " mm");
    }
    double height = Math.sqrt(Math.max(0, radiusMm * radiusMm - half * half));
    double side = (counterClockwise ? height : -height) / (2 * half);
    Point middle = from.plus(to).times(0.5);
    Point centre = middle.plus(new Point(-chord.y() * side, chord.x() * side));
    return List.of(Arcs.between(from, to, centre, counterClockwise));
  }

  List<Segment> byCentre(Point from, Point to, Point centre) throws UnreadableFile {
    double r0 = from.distanceTo(centre);
    double r1 = to.distanceTo(centre);
    if (!(r0 > 0 && r1 > 0 && Math.abs(r0 - r1) <= GerberArcs.REFUSED_MM)) {
      throw wrong(
          "the arc's radius is "
              + Shown.mm(r0)
              + " mm at the start, "
              + Shown.mm(r1)
              + " at the end");
    }
    return from.equals(to)
        ? Arcs.fullTurn(from, centre, counterClockwise)
        : List.of(Arcs.between(from, to, centre, counterClockwise));
  }

  private UnreadableFile wrong(String reason) {
    return reading.fail(line, "arc-radius", reason);
  }
}
