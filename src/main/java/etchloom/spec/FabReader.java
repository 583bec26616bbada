package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlFile;
import etchloom.spec.yaml.YamlTree;

/** Reads a fab's rules file, with the same care and the same bounds as {@link SpecReader}. */
public final class FabReader {
  private FabReader() {}

  static final String VERSION_KEY = "etchloom-fab";

  /** Reads a rules file's bytes; {@code fileName} is for messages only. */
  public static Staged<FabRules> read(String fileName, byte[] bytes) {
    Findings findings = new Findings();
    return YamlFile.read(fileName, bytes, VERSION_KEY + ": 1", findings)
        .map(tree -> check(tree, findings))
        .orElseGet(() -> Staged.failed(findings.sorted()));
  }

  /**
   * Whether a {@code fab:} value, which holds a dot or a slash, names a rules file (relative to the
   * spec) rather than a built-in class.
   */
  public static boolean isPath(String fab) {
    return fab.indexOf('.') >= 0 || fab.indexOf('/') >= 0;
  }

  /** A built-in class. */
  public static FabRules builtIn(String name) {
    Staged<FabRules> read = read(name + ".yaml", Templates.fabBytes(name));
    return read.value()
        .orElseThrow(() -> new IllegalStateException("fab class " + name + ": " + read));
  }

  private static Staged<FabRules> check(YamlTree tree, Findings findings) {
    Section top = Section.top(findings, tree);
    if (!FormatVersion.check(top, VERSION_KEY, SpecReader.VERSION_KEY, "a spec")) {
      return Staged.failed(findings.sorted());
    }
    FabRules rules = FabDraft.read(top);
    return findings.staged(() -> rules);
  }
}
