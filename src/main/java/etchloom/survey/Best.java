package etchloom.survey;

import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** How the best of a search got better from trial to trial. */
final class Best {
  private static final int DIGITS = 5;

  private final Goal goal;
  private final List<Row> steps = new ArrayList<>();
  private Optional<Double> own = Optional.empty();
  private boolean begun;

  Best(Goal goal) {
    this.goal = goal;
  }

  /** The spec as it stands, to compare with. */
  void begin(Row row) {
    own = goal.value(row);
    begun = true;
  }

  void add(Row row) {
    Optional<Double> value = goal.value(row);
    if (value.isPresent() && (steps.isEmpty() || goal.ranking().better(value.get(), last()))) {
      steps.add(row);
    }
  }

  private double last() {
    return goal.value(steps.get(steps.size() - 1)).orElseThrow();
  }

  String words() {
    return steps.isEmpty() ? "" : "best " + number(last());
  }

  private static String number(double value) {
    return Numbers.significant(value, DIGITS);
  }

  /** The steps, and the best against the spec as it stands. */
  String text() {
    StringBuilder out = new StringBuilder("How the best improved:\n");
    if (steps.isEmpty()) {
      return "No trial kept every rule and condition.\n";
    }
    String name = goal.ranking().name().name();
    for (Row r : steps) {
      out.append("  trial ").append(r.variant()).append(": ");
      out.append(number(goal.value(r).orElseThrow()));
      for (Map.Entry<String, String> e : r.values().entrySet()) {
        out.append(", ").append(e.getKey()).append(' ').append(e.getValue());
      }
      out.append('\n');
    }
    out.append(name).append(": ").append(number(last()));
    if (own.isPresent()) {
      double share = 100 * (last() / own.get() - 1);
      out.append(", against ").append(number(own.get())).append(" of the spec as it stands (");
      out.append(share > 0 ? "+" : "").append(Numbers.fixed(share, 1)).append(" %)");
    } else if (begun) {
      out.append("; the spec as it stands breaks a rule or condition");
    }
    Row best = steps.get(steps.size() - 1);
    return out.append("; its spec is variants/")
        .append(best.variant())
        .append(".yaml\n")
        .toString();
  }
}
