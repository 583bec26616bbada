package etchloom.run;

import etchloom.board.Assembler;
import etchloom.diagnostic.Staged;
import etchloom.electric.resistance.Resistance;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleReport;
import etchloom.spec.FabRules;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import java.util.function.DoubleConsumer;

/** The one way through: from a spec and its rules to the board, its figures and its rule check. */
public final class Pipeline {
  private Pipeline() {}

  /**
   * @param positions where the spec's keys stand, for what it may have to say about them
   * @param draft whether the board is to be marked as one that breaks rules
   * @return no value where the spec cannot be drawn; broken rules are in the value's report
   */
  public static Staged<Drawn> run(Spec spec, FabRules fab, Positions positions, boolean draft) {
    return lay(spec, fab, positions, draft).map(Pipeline::judge);
  }

  /** The way's first half: the board is drawn. Parameters as for {@link #run}. */
  public static Staged<Laid> lay(Spec spec, FabRules fab, Positions positions, boolean draft) {
    return Assembler.assemble(spec, fab, positions, draft)
        .map(board -> new Laid(spec, fab, board, Resistance.of(board.artwork(), fab.tolerance())));
  }

  /** The second half: what the drawn copper does, and whether it may be made. */
  public static Drawn judge(Laid laid) {
    return judge(laid, share -> {});
  }

  /**
   * @param done is told what share of the work is done, as it usually is in time on a large board
   */
  public static Drawn judge(Laid laid, DoubleConsumer done) {
    Electrics electrics = Electrics.of(laid, done);
    RuleReport rules =
        RuleCheck.check(
            laid.assembly().artwork(), laid.spec(), laid.fab(), electrics.rules(laid.spec()));
    return new Drawn(laid, electrics, rules);
  }
}
