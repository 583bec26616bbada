package etchloom.rim;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The terminals' places: a straight row across the radius at {@code start}, as far out as its end
 * pads and holes keep the edge rules of the round board, or of the tab's end.
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
   * On the round board.
   *
   * @param reachMm greatest distance of a terminal's centre from the shaft
   * @return empty where the row is longer than the board is wide
   */
  static Optional<TerminalRow> place(
      List<String> marks, double startRad, double pitchMm, double reachMm) {
    double half = halfMm(marks, pitchMm);
    return reachMm > half
        ? Optional.of(at(marks, startRad, pitchMm, Math.sqrt(reachMm * reachMm - half * half)))
        : Optional.empty();
  }

  /** At a distance from the shaft. */
  static TerminalRow at(List<String> marks, double startRad, double pitchMm, double distanceMm) {
    double half = halfMm(marks, pitchMm);
    Point radial = Point.polar(1, startRad);
    Point along = new Point(-radial.y(), radial.x());
    List<Spot> spots = new ArrayList<>();
    for (int i = 0; i < marks.size(); i++) {
      Point at = radial.times(distanceMm).plus(along.times(i * pitchMm - half));
      spots.add(new Spot(marks.get(i), at));
    }
    return new TerminalRow(spots, distanceMm);
  }

  /** Half of the row, from its middle to its last terminal's. */
  static double halfMm(List<String> marks, double pitchMm) {
    return (marks.size() - 1) * pitchMm / 2;
  }

  Spot spot(String mark) {
    return spots.stream().filter(s -> s.mark().equals(mark)).findFirst().orElseThrow();
  }
}
