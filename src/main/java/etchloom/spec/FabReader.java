package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlFile;
import etchloom.spec.yaml.YamlNode.Mapping;
import java.util.Optional;

/** Reads a fab's rules file, with the same care and the same bounds as {@link SpecReader}. */
public final class FabReader {
  private FabReader() {}

  static final String VERSION_KEY = "etchloom-fab";

  /** Reads a rules file's bytes; {@code fileName} is for messages only. */
  public static Staged<FabRules> read(String fileName, byte[] bytes) {
    Findings findings = new Findings();
    Optional<Mapping> root = YamlFile.read(fileName, bytes, findings);
    return root.isEmpty()
        ? Staged.failed(findings.sorted())
        : check(fileName, root.get(), findings);
  }

  /** A built-in class. */
  public static FabRules builtIn(String name) {
    Staged<FabRules> read = read(name + ".yaml", Templates.fabBytes(name));
    return read.value()
        .orElseThrow(() -> new IllegalStateException("fab class " + name + ": " + read));
  }

  private static Staged<FabRules> check(String fileName, Mapping root, Findings findings) {
    Section top = Section.top(findings, fileName, root);
    if (!FormatVersion.check(top, VERSION_KEY, SpecReader.VERSION_KEY, "a spec")) {
      return Staged.failed(findings.sorted());
    }
    FabRules rules = FabDraft.read(top);
    return findings.staged(() -> rules);
  }
}
