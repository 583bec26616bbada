package etchloom.report;

import etchloom.artwork.Artwork;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.winding.Winding;

/**
 * All that a report is made of. What is not known is empty, and the report says so; nothing is ever
 * put in its place.
 *
 * @param toolVersion as in {@code 0.1.0}
 * @param fab the rules the board was held against
 * @param artwork before rounding to the grid
 */
public record Results(
    String toolVersion,
    Spec spec,
    FabRules fab,
    Artwork artwork,
    Winding winding,
    RuleReport rules,
    ResistanceFigures resistance) {

  /** What every run has. */
  public static Results of(
      String toolVersion,
      Spec spec,
      FabRules fab,
      Artwork artwork,
      Winding winding,
      RuleReport rules,
      ResistanceFigures resistance) {
    return new Results(toolVersion, spec, fab, artwork, winding, rules, resistance);
  }

  /** Plated holes less terminals. */
  long vias() {
    return artwork.joints().stream().filter(j -> j.hole().isPresent() && !j.terminal()).count();
  }
}
