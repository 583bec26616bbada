package etchloom.rim;

import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;

/**
 * The bend of a terminal's lead: radially out to a lane, round the shaft along it, and radially on.
 * Both corners are rounded by the track's width, or by less where there is no room.
 */
record LeadBend(double trackMm, double laneMm, Point start, Point end, double turnRad) {

  void addTo(PathBuilder path) {
    double from = start.angleRad();
    double to = from + turnRad;
    double way = Math.signum(turnRad);
    double inner = inner();
    double outer = outer();
    double rise = laneMm - inner;
    double fall = laneMm + outer;
    // Centres: inside the lane for the first corner, outside for the second.
    double a = from + way * Math.asin(inner / rise);
    double b = to - way * Math.asin(outer / fall);
    if (inner > 0) {
      path.lineTo(Point.polar(Math.sqrt(rise * rise - inner * inner), from));
      path.arcTo(Point.polar(laneMm, a), Point.polar(rise, a), way > 0);
    } else {
      path.lineTo(Point.polar(laneMm, from));
    }
    path.arcTo(Point.polar(laneMm, b), Point.ORIGIN, way > 0);
    if (outer > 0) {
      Point foot = Point.polar(Math.sqrt(fall * fall - outer * outer), to);
      path.arcTo(foot, Point.polar(fall, b), way < 0);
    }
  }

  private double inner() {
    return room(laneMm - start.norm());
  }

  private double outer() {
    return room(end.norm() - laneMm);
  }

  /**
   * A corner may take half of the lane's run and of the straight piece beside it. Tighter than half
   * the track's width its inner side would fold over itself: then it stays sharp.
   */
  private double room(double straightMm) {
    double run = laneMm * Math.abs(turnRad);
    double r = Math.min(trackMm, Math.min(straightMm / 2, run / 4));
    return r >= trackMm / 2 ? r : 0;
  }
}
