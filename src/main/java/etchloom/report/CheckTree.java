package etchloom.report;

import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import java.util.List;

/**
 * {@code check} of the report; {@code minima} holds the tightest place of every rule. Findings that
 * are no lengths carry {@code measured}, {@code required} and {@code unit} in place of the keys in
 * mm; {@code notes} says, among others, where a rule is broken at more places than are listed.
 */
final class CheckTree {
  /** The report's key for each rule whose minimum it tells. */
  private enum Minimum {
    TRACK("track", "track"),
    SPACE("space", "space"),
    RING("ring", "ring"),
    HOLE_GAP("hole-gap", "holeGap"),
    EDGE("edge", "edge");

    private final String rule;
    private final String key;

    Minimum(String rule, String key) {
      this.rule = rule;
      this.key = key;
    }
  }

  private CheckTree() {}

  static JsonTree of(RuleReport r) {
    JsonTree minimum = new JsonTree();
    for (Minimum m : Minimum.values()) {
      minimum(r, m.rule).ifPresent(f -> minimum.put(m.key, f.measured()));
    }
    return new JsonTree()
        .put("passed", r.passed())
        .put("minimum", minimum)
        .putObjects("minima", r.minima().stream().map(CheckTree::finding).toList())
        .putObjects("findings", r.findings().stream().map(CheckTree::finding).toList())
        .putTexts("notes", List.copyOf(r.notes()));
  }

  private static java.util.Optional<Finding> minimum(RuleReport r, String rule) {
    return r.minima().stream().filter(f -> f.rule().equals(rule)).findFirst();
  }

  private static JsonTree finding(Finding f) {
    JsonTree out = new JsonTree().put("rule", f.rule());
    if (!f.layer().isEmpty()) {
      out.put("layer", f.layer());
    }
    out.put("xMm", f.at().x()).put("yMm", f.at().y());
    if (f.unit().equals("mm")) {
      out.put("measuredMm", f.measured()).put("requiredMm", f.required());
    } else {
      out.put("measured", f.measured()).put("required", f.required()).put("unit", f.unit());
    }
    return out.put("what", f.what());
  }
}
