package etchloom.electric.machine;

import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import java.nio.charset.StandardCharsets;

/** A shipped template, drawn, with words of its spec replaced. */
public record TestMachine(
    Spec spec, FabRules fab, Assembly assembly, ResistanceFigures resistance) {
  /** Invented values, of the size that such boards have. */
  public static final InductanceValues INDUCTANCE =
      new InductanceValues(1.2e-3, -0.06e-3, 1.26e-3, 2.52e-3);

  /**
   * @param replacements pairs: what to find, which must be there, and what to put in its place
   */
  public static TestMachine of(String template, String... replacements) {
    String text = new String(Templates.bytes(template), StandardCharsets.UTF_8);
    for (int i = 0; i < replacements.length; i += 2) {
      if (!text.contains(replacements[i])) {
        throw new IllegalArgumentException(template + " has no '" + replacements[i] + "'");
      }
      text = text.replace(replacements[i], replacements[i + 1]);
    }
    var read = SpecReader.read(template + ".yaml", text.getBytes(StandardCharsets.UTF_8));
    SpecFile file =
        read.value().orElseThrow(() -> new IllegalArgumentException("" + read.diagnostics()));
    FabRules fab = FabReader.builtIn(file.spec().fab());
    var drawn = Assembler.assemble(file.spec(), fab, file.positions());
    Assembly assembly =
        drawn.value().orElseThrow(() -> new IllegalArgumentException("" + drawn.diagnostics()));
    return new TestMachine(
        file.spec(), fab, assembly, Resistance.of(assembly.artwork(), fab.tolerance()));
  }

  public MachineFigures figures() {
    return figures(INDUCTANCE);
  }

  public MachineFigures figures(InductanceValues inductance) {
    return Machine.of(assembly.artwork(), spec, fab, assembly.winding(), resistance, inductance);
  }
}
