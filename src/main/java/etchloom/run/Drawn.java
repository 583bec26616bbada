package etchloom.run;

import etchloom.board.Assembly;
import etchloom.report.Results;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;

/** What one run came to: the board, what its copper does, and whether it may be made. */
public record Drawn(Laid laid, Electrics electrics, RuleReport rules) {
  public Spec spec() {
    return laid.spec();
  }

  public FabRules fab() {
    return laid.fab();
  }

  public Assembly assembly() {
    return laid.assembly();
  }

  /** All that a report is made of, but the proof of written files. */
  public Results results(String toolVersion) {
    return Results.of(
            toolVersion,
            spec(),
            fab(),
            assembly().artwork(),
            assembly().winding(),
            rules,
            electrics.resistance())
        .withElectrics(electrics.inductance(), electrics.machine());
  }
}
