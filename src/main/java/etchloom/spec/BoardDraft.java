package etchloom.spec;

import etchloom.spec.Spec.Board;
import etchloom.units.Dimension;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The board's keys as read; a faulty length is NaN, a faulty count {@link CountField#FAULTY}. */
record BoardDraft(
    Section section,
    int layers,
    double thickness,
    CopperDraft copper,
    List<Double> stackup,
    double diameter,
    double bore,
    Optional<HolesDraft> holes,
    TerminalsDraft terminals,
    Optional<TabDraft> tab,
    boolean starPointOut,
    String finish,
    String mask,
    double laminateTg) {

  static final Map<String, Boolean> STAR_POINT =
      Words.of("inside", false).and("terminal", true).map();

  private static final double LAMINATE_TG_C = 150;

  static BoardDraft read(Section s) {
    int layers = s.count("layers", Limits.LAYERS_MIN, Limits.LAYERS_MAX, true).required();
    BoardDraft draft =
        new BoardDraft(
            s,
            layers,
            s.length("thickness", Limits.BOARD_THICKNESS).required(),
            CopperDraft.read(s, layers),
            s.numbers("stackup", Dimension.LENGTH, Limits.DIELECTRIC),
            s.length("diameter", Limits.DIAMETER).required(),
            s.length("bore", Limits.DIAMETER_OR_NONE).or(0),
            s.optionalGroup("holes").map(HolesDraft::read),
            s.optionalGroup("terminals").map(TerminalsDraft::read).orElse(TerminalsDraft.DEFAULT),
            s.optionalGroup("tab").map(TabDraft::read),
            s.word("star-point", STAR_POINT).or(false),
            Titles.plain(s, "finish", "a finish, such as ENIG").orElse("ENIG"),
            Titles.plain(s, "mask", "a colour, such as green").orElse("green"),
            s.optionalGroup("laminate").map(BoardDraft::glassTransition).orElse(LAMINATE_TG_C));
    s.close();
    draft.checkBore();
    draft.checkStackup();
    draft.tab().ifPresent(t -> t.checkPlace(draft.diameter(), draft.terminals()));
    return draft;
  }

  private static double glassTransition(Section s) {
    double tg = s.number("tg", Dimension.TEMPERATURE, Limits.TEMPERATURES).or(LAMINATE_TG_C);
    s.close();
    return tg;
  }

  private void checkBore() {
    if (bore >= diameter) {
      section.error(
          Codes.BOARD,
          "bore",
          Show.mm(bore) + " is not less than the board's diameter, " + Show.mm(diameter));
    }
  }

  private void checkStackup() {
    if (stackup.isEmpty() || layers == CountField.FAULTY) {
      return;
    }
    if (stackup.size() != layers - 1) {
      section.error(
          Codes.STACKUP,
          "stackup",
          layers
              + " layers have "
              + (layers - 1)
              + " dielectrics between them; the list has "
              + stackup.size());
      return;
    }
    StackupSum sum = StackupSum.of(stackup, copper.totalMm(layers), thickness);
    if (!sum.fits()) {
      section.error(Codes.STACKUP, "stackup", sum.message("board.thickness"));
    }
  }

  Board build() {
    return new Board(
        layers,
        thickness,
        copper.outer(),
        copper.inner(),
        stackup,
        diameter,
        bore,
        holes.map(HolesDraft::build),
        terminals.build(tab.map(t -> t.angle(terminals)).orElse(terminals.start())),
        starPointOut,
        finish,
        mask,
        laminateTg,
        tab.map(t -> t.build(terminals)));
  }
}
