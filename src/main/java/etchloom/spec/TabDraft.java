package etchloom.spec;

import etchloom.spec.Spec.Tab;
import etchloom.units.Dimension;
import java.util.OptionalDouble;

/** The keys of a tab on the board's edge, as read; by default it stands at the terminals' start. */
record TabDraft(Section section, OptionalDouble stated, double width, double length) {
  private static final double SAME_RAD = 1e-9;

  static TabDraft read(Section s) {
    OptionalDouble angle = s.number("angle", Dimension.ANGLE, Limits.ANY_ANGLE).optional();
    double width = s.length("width", Limits.TAB).required();
    double length = s.length("length", Limits.TAB).required();
    s.close();
    return new TabDraft(s, angle, width, length);
  }

  /** The tab within the board, and the terminals on the tab. */
  void checkPlace(double boardDiameter, TerminalsDraft terminals) {
    if (width >= boardDiameter) {
      section.error(
          Codes.BOARD,
          "width",
          Show.mm(width) + " is not less than board.diameter, " + Show.mm(boardDiameter));
    }
    double off = Math.IEEEremainder(angle(terminals) - terminals.start(), 2 * Math.PI);
    if (terminals.placed() && Math.abs(off) > SAME_RAD) {
      section.error(
          Codes.KEY_CONFLICT,
          "angle",
          "the terminals stand on the tab, and board.terminals.start puts them elsewhere: give one"
              + " of the two");
    }
  }

  /** Where the tab and the terminals' row stand. */
  double angle(TerminalsDraft terminals) {
    return stated.orElse(terminals.start());
  }

  Tab build(TerminalsDraft terminals) {
    return new Tab(angle(terminals), width, length);
  }
}
