package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlFile;
import etchloom.spec.yaml.YamlNode.Mapping;
import java.util.Optional;

/**
 * Reads a spec: every key's shape, unit and range, defaults, and whatever the keys can say about
 * each other without the fab's rules and without geometry. Reports all it finds in one run.
 *
 * <p>Inputs may be hostile: time and memory are bounded by {@link #MAX_BYTES}, nothing is thrown.
 */
public final class SpecReader {
  private SpecReader() {}

  /** Largest file that is read. A caller may stop reading the disk one byte beyond. */
  public static final int MAX_BYTES = YamlFile.MAX_BYTES;

  static final String VERSION_KEY = "etchloom";

  /** Reads a spec file's bytes; {@code fileName} is for messages only. */
  public static Staged<SpecFile> read(String fileName, byte[] bytes) {
    Findings findings = new Findings();
    Optional<Mapping> root = YamlFile.read(fileName, bytes, findings);
    return root.isEmpty()
        ? Staged.failed(findings.sorted())
        : check(fileName, root.get(), findings);
  }

  private static Staged<SpecFile> check(String fileName, Mapping root, Findings findings) {
    Section top = Section.top(findings, fileName, root);
    if (!FormatVersion.check(top, VERSION_KEY, FabReader.VERSION_KEY, "a fab rules file")) {
      return Staged.failed(findings.sorted());
    }
    SpecDraft draft = SpecDraft.read(top);
    return findings.staged(() -> new SpecFile(draft.build(), KeyPlaces.of(fileName, root)));
  }
}
