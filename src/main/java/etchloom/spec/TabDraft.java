package etchloom.spec;

/** The keys of a tab on the board's edge, as read: it stands out at the terminals' angle. */
record TabDraft(Section section, double width, double length) {
  static TabDraft read(Section s) {
    double width = s.length("width", Limits.TAB).required();
    double length = s.length("length", Limits.TAB).required();
    s.close();
    return new TabDraft(s, width, length);
  }

  void checkPlace(double boardDiameter) {
    if (width >= boardDiameter) {
      section.error(
          Codes.BOARD,
          "width",
          Show.mm(width) + " is not less than board.diameter, " + Show.mm(boardDiameter));
    }
  }
}
