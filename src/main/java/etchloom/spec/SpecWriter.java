package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.Staged;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlText;
import java.util.Map;
import java.util.Optional;

/** Writes a spec with some keys set anew as a file of its own. */
public final class SpecWriter {
  private SpecWriter() {}

  /**
   * The spec as YAML text, keys in their order, comments left out; what {@link SpecReader#read}
   * makes of it is what it makes of the original with the same overrides. The spec itself is not
   * checked here.
   *
   * @param overrides as for {@link SpecReader#read(String, byte[], Map)}
   */
  public static Staged<String> toYaml(
      String fileName, byte[] bytes, Map<String, String> overrides) {
    Findings findings = new Findings();
    Optional<Mapping> root = SpecReader.tree(fileName, bytes, overrides, findings);
    return root.isEmpty()
        ? Staged.failed(findings.sorted())
        : findings.staged(() -> YamlText.of(root.get()));
  }
}
