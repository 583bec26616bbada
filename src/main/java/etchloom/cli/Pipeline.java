package etchloom.cli;

import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.report.Results;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleContext;
import etchloom.rules.RuleReport;
import java.util.ArrayList;
import java.util.List;

/** The one way through: from checked inputs to the board, its rule check and its figures. */
final class Pipeline {
  private Pipeline() {}

  /** What one run came to. */
  record Drawn(
      InputFiles.Inputs inputs,
      Assembly assembly,
      RuleReport rules,
      ResistanceFigures resistance,
      List<Diagnostic> warnings) {
    Drawn {
      warnings = List.copyOf(warnings);
    }

    Results results() {
      return Results.of(
          Version.TEXT,
          inputs.file().spec(),
          inputs.fab(),
          assembly.artwork(),
          assembly.winding(),
          rules,
          resistance);
    }
  }

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
    List<Diagnostic> warnings = new ArrayList<>(in.warnings());
    warnings.addAll(staged.diagnostics());
    return new Drawn(in, assembly, rules, resistance, warnings);
  }
}
