package etchloom.coil;

import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;

/** A round part of a turn's centre line, walked counter-clockwise. Lengths in mm. */
record Bend(Point centre, double radiusMm) {
  Point at(double rad) {
    return centre.plus(Point.polar(radiusMm, rad));
  }

  /** Its innermost point, towards the shaft. */
  Point inner() {
    return centre.plus(new Point(-radiusMm, 0));
  }

  /** Its outermost point, away from the shaft. */
  Point outer() {
    return centre.plus(new Point(radiusMm, 0));
  }

  Point left() {
    return centre.plus(new Point(0, radiusMm));
  }

  Point right() {
    return centre.plus(new Point(0, -radiusMm));
  }

  void to(Point end, PathBuilder path) {
    path.arcTo(end, centre, true);
  }
}
