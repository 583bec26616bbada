package etchloom.report;

import etchloom.artwork.Artwork;
import etchloom.electric.inductance.InductanceFigures;
import etchloom.electric.machine.MachineFigures;
import etchloom.electric.machine.TaperFigures;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.proof.ProofReport;
import etchloom.report.area.CopperArea;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.winding.Winding;
import java.util.List;
import java.util.Optional;

/**
 * All that a report is made of. What is not known is empty, and the report says so; nothing is ever
 * put in its place.
 *
 * @param toolVersion as in {@code 0.1.0}
 * @param fab the rules the board was held against
 * @param artwork before rounding to the grid
 * @param copperAreaMm2 of each layer, L1 first
 * @param inductance empty where it was not worked out
 * @param machine what the machine does; empty where it was not worked out
 * @param taper what tracks that widen gain; empty where they do not
 * @param proof what the written files were found to say; empty where none were written
 */
public record Results(
    String toolVersion,
    Spec spec,
    FabRules fab,
    Artwork artwork,
    Winding winding,
    RuleReport rules,
    ResistanceFigures resistance,
    List<Double> copperAreaMm2,
    Optional<InductanceFigures> inductance,
    Optional<MachineFigures> machine,
    Optional<TaperFigures> taper,
    Optional<ProofReport> proof) {

  /** What every run has. */
  public static Results of(
      String toolVersion,
      Spec spec,
      FabRules fab,
      Artwork artwork,
      Winding winding,
      RuleReport rules,
      ResistanceFigures resistance) {
    return new Results(
        toolVersion,
        spec,
        fab,
        artwork,
        winding,
        rules,
        resistance,
        CopperArea.of(artwork, rules),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  /** The same with the winding's inductances and what the machine does. */
  public Results withElectrics(InductanceFigures henries, MachineFigures figures) {
    return with(Optional.of(henries), Optional.of(figures), taper, proof);
  }

  /** The same with what its tracks gain by widening. */
  public Results withTaper(Optional<TaperFigures> gain) {
    return with(inductance, machine, gain, proof);
  }

  /** The same with what reading the written files back has shown. */
  public Results withProof(ProofReport report) {
    return with(inductance, machine, taper, Optional.of(report));
  }

  private Results with(
      Optional<InductanceFigures> henries,
      Optional<MachineFigures> figures,
      Optional<TaperFigures> gain,
      Optional<ProofReport> report) {
    return new Results(
        toolVersion,
        spec,
        fab,
        artwork,
        winding,
        rules,
        resistance,
        copperAreaMm2,
        henries,
        figures,
        gain,
        report);
  }

  /** Plated holes less terminals. */
  long vias() {
    return artwork.joints().stream().filter(j -> j.hole().isPresent() && !j.terminal()).count();
  }
}
