package etchloom.run;

import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.diagnostic.Staged;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import etchloom.spec.Positions;
import etchloom.spec.Spec;

/** The one way through: from a spec and its rules to the board, its figures and its rule check. */
public final class Pipeline {
  private Pipeline() {}

  /**
   * @param positions where the spec's keys stand, for what it may have to say about them
   * @param draft whether the board is to be marked as one that breaks rules
   * @return no value where the spec cannot be drawn; broken rules are in the value's report
   */
  public static Staged<Drawn> run(Spec spec, FabRules fab, Positions positions, boolean draft) {
    Staged<Assembly> staged = Assembler.assemble(spec, fab, positions, draft);
    if (staged.value().isEmpty()) {
      return Staged.failed(staged.diagnostics());
    }
    Assembly assembly = staged.value().get();
    Electrics electrics = Electrics.of(assembly, spec, fab);
    RuleReport rules = RuleCheck.check(assembly.artwork(), spec, fab, electrics.rules(spec));
    return Staged.of(new Drawn(spec, fab, assembly, electrics, rules), staged.diagnostics());
  }
}
