package etchloom.survey;

import etchloom.spec.FabRules;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * The rules that variants are held against, by the name that a spec gives them.
 *
 * @param forced stands for every spec's own {@code fab} where given
 * @param rules by name, in a fixed order
 */
public record Shelf(Optional<String> forced, Map<String, Rules> rules) {
  public Shelf {
    rules = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(rules));
  }

  /**
   * @param text the rules as read
   * @param file name of the copy beside the variants; empty for a built-in class
   */
  public record Rules(FabRules fab, String text, String file) {}

  Rules of(String name) {
    Rules found = rules.get(forced.orElse(name));
    if (found == null) {
      throw new IllegalStateException("no rules named " + name);
    }
    return found;
  }

  /** What a variant's file says for its {@code fab}, two folders deep. */
  String nameIn(String name) {
    Rules found = of(name);
    return found.file().isEmpty() ? forced.orElse(name) : "../" + found.file();
  }
}
