package etchloom.cli;

import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.diagnostic.Staged;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleContext;
import etchloom.rules.RuleReport;

/** The one way through: from checked inputs to the board, its rule check and its figures. */
final class Pipeline {
  private Pipeline() {}

  /** What one run came to. */
  record Drawn(
      InputFiles.Inputs inputs,
      Assembly assembly,
      RuleReport rules,
      ResistanceFigures resistance) {}

  /**
   * @param draft whether the board is to be marked as one that breaks rules
   * @throws BadInput where the spec cannot be drawn
   */
  static Drawn run(InputFiles.Inputs in, boolean draft) {
    Staged<Assembly> staged =
        Assembler.assemble(in.file().spec(), in.fab(), in.file().positions(), draft);
    Assembly assembly = staged.value().orElseThrow(() -> new BadInput(staged.diagnostics()));
    ResistanceFigures resistance = Resistance.of(assembly.artwork(), in.fab().tolerance());
    RuleReport rules =
        RuleCheck.check(assembly.artwork(), in.file().spec(), in.fab(), RuleContext.NONE);
    return new Drawn(in, assembly, rules, resistance);
  }
}
