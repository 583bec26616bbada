package etchloom.rim;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The terminals' places: a straight row across the radius at {@code start}, as far out as its end
 * pads and holes keep the edge rules.
 *
 * @param spots in counter-clockwise order
 * @param distanceMm of the row from the shaft
 */
record TerminalRow(List<Spot> spots, double distanceMm) {
  TerminalRow {
    spots = List.copyOf(spots);
  }

  record Spot(String mark, Point at) {}

  /**
   * @param reachMm greatest distance of a terminal's centre from the shaft
   * @return empty where the row is longer than the board is wide
   */
  static Optional<TerminalRow> place(
      List<String> marks, double startRad, double pitchMm, double reachMm) {
    double half = (marks.size() - 1) * pitchMm / 2;
    if (!(reachMm > half)) {
      return Optional.empty();
    }
    double out = Math.sqrt(reachMm * reachMm - half * half);
    Point radial = Point.polar(1, startRad);
    Point along = new Point(-radial.y(), radial.x());
    List<Spot> spots = new ArrayList<>();
    for (int i = 0; i < marks.size(); i++) {
      Point at = radial.times(out).plus(along.times(i * pitchMm - half));
      spots.add(new Spot(marks.get(i), at));
    }
    return Optional.of(new TerminalRow(spots, out));
  }

  Spot spot(String mark) {
    return spots.stream().filter(s -> s.mark().equals(mark)).findFirst().orElseThrow();
  }
}
