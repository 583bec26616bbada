package etchloom.spec;

import etchloom.spec.Spec.Holes;
import etchloom.units.Dimension;

/** The mounting holes' keys as read. */
record HolesDraft(
    Section section, int count, double diameter, double circle, double start, double keepOut) {

  static HolesDraft read(Section s) {
    int count = s.count("count", 1, Limits.HOLES_MAX, false).required();
    double diameter = s.length("diameter", Limits.SCREW_HOLE).required();
    double circle = s.length("circle", Limits.DIAMETER).required();
    double start = s.number("start", Dimension.ANGLE, Limits.ANY_ANGLE).or(0);
    double keepOut = s.length("keep-out", Limits.DIAMETER).or(2 * diameter);
    s.close();
    HolesDraft draft = new HolesDraft(s, count, diameter, circle, start, keepOut);
    draft.check();
    return draft;
  }

  private void check() {
    if (keepOut < diameter) {
      section.error(
          Codes.HOLES,
          "keep-out",
          Show.mm(keepOut) + " is less than the hole itself, " + Show.mm(diameter));
    }
    if (count > 1 && circle * Math.sin(Math.PI / count) <= diameter) {
      section.error(
          Codes.HOLES,
          "count",
          count
              + " holes of "
              + Show.mm(diameter)
              + " run into each other on a circle of "
              + Show.mm(circle));
    }
  }

  /** The holes against the board's edge, its bore and the coils. */
  void checkPlace(double boardDiameter, double bore, CoilDraft coil) {
    double out = (circle + diameter) / 2;
    double in = (circle - diameter) / 2;
    if (out >= boardDiameter / 2) {
      section.error(
          Codes.HOLES,
          "circle",
          "the holes reach out to radius "
              + Show.mm(out)
              + ", the board ends at "
              + Show.mm(boardDiameter / 2));
    } else if (bore > 0 && in <= bore / 2) {
      section.error(
          Codes.HOLES,
          "circle",
          "the holes reach in to radius "
              + Show.mm(in)
              + ", the bore ends at "
              + Show.mm(bore / 2));
    } else if (out > coil.innerRadius() && in < coil.outerRadius()) {
      section.error(
          Codes.HOLES,
          "circle",
          "the holes lie between radius "
              + Show.mm(in)
              + " and "
              + Show.mm(out)
              + ", in the coils, which lie between "
              + Show.mm(coil.innerRadius())
              + " and "
              + Show.mm(coil.outerRadius()));
    }
  }

  Holes build() {
    return new Holes(count, diameter, circle, start, keepOut);
  }
}
