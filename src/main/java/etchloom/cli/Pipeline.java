package etchloom.cli;

import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import etchloom.report.Results;
import etchloom.rules.RuleCheck;
import etchloom.rules.RuleReport;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;

/** The one way through: from checked inputs to the board, its figures and its rule check. */
final class Pipeline {
  private Pipeline() {}

  /** What one run came to. */
  record Drawn(
      InputFiles.Inputs inputs,
      Assembly assembly,
      Electrics electrics,
      RuleReport rules,
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
              electrics.resistance())
          .withElectrics(electrics.inductance(), electrics.machine());
    }
  }

  /**
   * @param draft whether the board is to be marked as one that breaks rules
   * @throws BadInput where the spec cannot be drawn
   */
  static Drawn run(InputFiles.Inputs in, boolean draft) {
    Spec spec = in.file().spec();
    Staged<Assembly> staged = Assembler.assemble(spec, in.fab(), in.file().positions(), draft);
    Assembly assembly = staged.value().orElseThrow(() -> new BadInput(staged.diagnostics()));
    Electrics electrics = Electrics.of(assembly, spec, in.fab());
    RuleReport rules =
        RuleCheck.check(assembly.artwork(), spec, in.fab(), electrics.rules(spec));
    List<Diagnostic> warnings = new ArrayList<>(in.warnings());
    warnings.addAll(staged.diagnostics());
    return new Drawn(in, assembly, electrics, rules, warnings);
  }
}
