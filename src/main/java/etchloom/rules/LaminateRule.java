package etchloom.rules;

import etchloom.geometry.Point;
import etchloom.rules.Verdicts.Measured;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.Optional;

/**
 * {@code laminate}: its glass transition must lie well above the hottest copper.
 *
 * <p>Near the glass transition the laminate softens and expands several times faster through its
 * thickness, which tears plated holes. Twenty-five kelvin apart is common practice (from memory; no
 * standard fixes it).
 */
final class LaminateRule implements Rule {
  static final double MARGIN_KELVIN = 25;

  /** What common epoxy-glass laminates are rated for by UL 746E and UL 796 (from memory). */
  static final double USUAL_RATING_C = 130;

  @Override
  public void check(Board board, Verdicts verdicts) {
    Optional<Spec.Duty> duty = board.spec().duty();
    if (duty.isEmpty()) {
      verdicts.note(
          "laminate: without duty.copper-limit nothing says how hot the copper may get, so"
              + " board.laminate.tg is not checked");
      return;
    }
    double limit = duty.get().copperLimitC();
    double tg = board.spec().board().laminateTgC();
    double required = limit + MARGIN_KELVIN;
    String what =
        "glass transition of the laminate; duty.copper-limit is "
            + Numbers.trimmed(limit, 1)
            + " C, and "
            + Numbers.trimmed(MARGIN_KELVIN, 1)
            + " K more are needed";
    verdicts.add(
        new Measured(
            RuleName.LAMINATE,
            0,
            Point.ORIGIN,
            tg,
            required,
            "C",
            tg >= required - 1e-9,
            tg - required,
            0,
            0,
            Words.of(what)));
    if (limit > USUAL_RATING_C) {
      verdicts.note(
          "laminate: common epoxy-glass laminates are rated for "
              + Numbers.trimmed(USUAL_RATING_C, 1)
              + " C in lasting use, whatever their glass transition; for a duty.copper-limit of "
              + Numbers.trimmed(limit, 1)
              + " C ask for one that is rated for it");
    }
  }
}
