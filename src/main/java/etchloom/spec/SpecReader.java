package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlFile;
import etchloom.spec.yaml.YamlTree;
import java.util.Map;

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
    return read(fileName, bytes, Map.of());
  }

  /**
   * Reads a spec with some keys set anew, as a survey does.
   *
   * @param overrides full key path to value as text, {@code coil.track} to {@code 0.2mm}; the unit
   *     may follow its number without a space. A key that is absent is added with its groups. A
   *     fault of such a value has the text {@code coil.track=0.2mm on the command line} for its
   *     file, and no line; a fault elsewhere that only these values bring about has a hint that
   *     names them
   */
  public static Staged<SpecFile> read(
      String fileName, byte[] bytes, Map<String, String> overrides) {
    Findings findings = new Findings();
    Staged<SpecFile> read =
        YamlFile.read(fileName, bytes, VERSION_KEY + ": 1", findings)
            .map(tree -> check(fileName, new Overrides(findings).apply(tree, overrides), findings))
            .orElseGet(() -> Staged.failed(findings.sorted()));
    return read.value().isPresent() || overrides.isEmpty()
        ? read
        : Overrides.blame(read, read(fileName, bytes), overrides);
  }

  private static Staged<SpecFile> check(String fileName, YamlTree tree, Findings findings) {
    Section top = Section.top(findings, tree);
    if (!FormatVersion.check(top, VERSION_KEY, FabReader.VERSION_KEY, "a fab rules file")) {
      return Staged.failed(findings.sorted());
    }
    SpecDraft draft = SpecDraft.read(top);
    return findings.staged(() -> new SpecFile(draft.build(), KeyPlaces.of(fileName, tree.root())));
  }
}
