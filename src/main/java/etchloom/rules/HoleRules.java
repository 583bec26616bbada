package etchloom.rules;

import etchloom.artwork.Joint;
import etchloom.rules.Verdicts.Measured;
import etchloom.spec.FabRules;

/**
 * {@code ring}, {@code hole} and {@code aspect}: every plated hole by itself. Holes are finished
 * holes, as the spec page has it.
 */
final class HoleRules implements Rule {
  @Override
  public void check(Board board, Verdicts verdicts) {
    FabRules fab = board.fab();
    double thickness = board.artwork().stackup().thicknessMm();
    for (Joint j : board.artwork().joints()) {
      if (j.hole().isEmpty()) {
        continue;
      }
      double hole = j.hole().get();
      Words what = Words.of(LayerCopper.jointWords(j));
      double ring = j.terminal() ? fab.ring().terminalMm() : fab.ring().viaMm();
      verdicts.add(
          Measured.atLeast(RuleName.RING, 0, j.at(), (j.padMm() - hole) / 2, ring, what)
              .ids(j.id(), 0));
      verdicts.add(
          Measured.atLeast(RuleName.HOLE, 0, j.at(), hole, fab.hole().minMm(), what)
              .ids(j.id(), 0));
      verdicts.add(
          Measured.atMost(RuleName.ASPECT, j.at(), thickness / hole, fab.hole().aspect(), "1", what)
              .ids(j.id(), 0));
    }
  }
}
