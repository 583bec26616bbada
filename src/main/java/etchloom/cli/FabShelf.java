package etchloom.cli;

import etchloom.diagnostic.Staged;
import etchloom.spec.FabReader;
import etchloom.spec.FabRules;
import etchloom.spec.Templates;
import etchloom.survey.Shelf;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** All rules that a survey's variants may name, read once. */
final class FabShelf {
  private FabShelf() {}

  /**
   * @param varied the values of a varied {@code fab}; empty where it is not varied
   */
  static Shelf of(InputFiles.Inputs in, Optional<String> option, List<String> varied) {
    if (varied.isEmpty()) {
      String file = InputFiles.isPath(in.fabName()) ? "fab.yaml" : "";
      Shelf.Rules own = new Shelf.Rules(in.fab(), in.fabText(), file);
      return new Shelf(option, Map.of(in.fabName(), own));
    }
    if (option.isPresent()) {
      throw BadInput.of("--fab", "usage", "--fab and --vary fab=... exclude each other");
    }
    Map<String, Shelf.Rules> all = new LinkedHashMap<>();
    for (String name : varied) {
      String file = InputFiles.isPath(name) ? "fab-" + (all.size() + 1) + ".yaml" : "";
      all.put(name, rules(in.specPath(), name, file));
    }
    all.putIfAbsent(in.fabName(), rules(in.specPath(), in.fabName(), "fab.yaml"));
    return new Shelf(Optional.empty(), all);
  }

  private static Shelf.Rules rules(Path spec, String name, String file) {
    if (!InputFiles.isPath(name)) {
      if (!Templates.fabNames().contains(name)) {
        throw BadInput.of(
            "--vary fab=" + name,
            "unknown-fab",
            "there is no such fab class; there are " + String.join(", ", Templates.fabNames()));
      }
      String text = new String(Templates.fabBytes(name), StandardCharsets.UTF_8);
      return new Shelf.Rules(FabReader.builtIn(name), text, "");
    }
    Path base = Optional.ofNullable(spec.toAbsolutePath().getParent()).orElse(spec);
    Path path = base.resolve(InputFiles.path(name));
    byte[] bytes = InputFiles.bytes(path, path.toString(), "rules file");
    Staged<FabRules> read = FabReader.read(path.toString(), bytes);
    FabRules fab = read.value().orElseThrow(() -> new BadInput(read.diagnostics()));
    return new Shelf.Rules(fab, new String(bytes, StandardCharsets.UTF_8), file);
  }
}
