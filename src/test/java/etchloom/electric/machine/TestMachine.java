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
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** A test's spec, drawn, with words of it replaced. */
public record TestMachine(
    Spec spec, FabRules fab, Assembly assembly, ResistanceFigures resistance) {
  /** Invented values, of the size that such boards have. */
  public static final InductanceValues INDUCTANCE =
      new InductanceValues(1.2e-3, -0.06e-3, 1.26e-3, 2.52e-3);

  /**
   * A spec of the tests' own, so that its duty stays as the tests expect it.
   *
   * @param replacements pairs: what to find, which must be there, and what to put in its place
   */
  public static TestMachine of(String name, String... replacements) {
    return drawn(name, text(name), replacements);
  }

  /** A shipped template. */
  public static TestMachine template(String name, String... replacements) {
    String text = new String(Templates.bytes(name), StandardCharsets.UTF_8);
    return drawn(name, text, replacements);
  }

  static String text(String name) {
    try (InputStream in = TestMachine.class.getResourceAsStream("/machines/" + name + ".yaml")) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static TestMachine drawn(String template, String text, String... replacements) {
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
