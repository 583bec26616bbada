package etchloom.survey;

import etchloom.report.JsonTree;
import etchloom.report.Text;
import etchloom.report.TextTable;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** How the best of a search got better from trial to trial. */
final class Best {
  private static final int DIGITS = 5;
  private static final int ROOM = TextTable.COLUMNS - 2;

  private final Goal goal;
  private final List<Row> steps = new ArrayList<>();
  private Optional<Double> own = Optional.empty();
  private boolean begun;
  private List<Span> spans = List.of();

  Best(Goal goal) {
    this.goal = goal;
  }

  /** The spec as it stands, to compare with. */
  void begin(Row row, List<Span> ranges) {
    own = goal.value(row);
    begun = true;
    spans = List.copyOf(ranges);
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
    table(name).forEach(l -> out.append("  ").append(l).append('\n'));
    StringBuilder words = new StringBuilder(name).append(": ").append(number(last()));
    if (own.isPresent()) {
      words.append(", against ").append(number(own.get())).append(" of the spec as it stands");
      words.append(share(last() - own.get(), Math.abs(own.get())));
    } else if (begun) {
      words.append("; the spec as it stands breaks a rule or condition");
    }
    Row best = steps.get(steps.size() - 1);
    words.append("; its spec is variants/").append(best.variant()).append(".yaml");
    wrapped(out, words.toString());
    List<String> ends = atTheEnd(best);
    if (!ends.isEmpty()) {
      wrapped(out, "at the end of its range: " + String.join(", ", ends));
    }
    return out.toString();
  }

  /** A line for each step: trial, value, and as many of the keys as there is room for. */
  private List<String> table(String name) {
    List<List<String>> rows = new ArrayList<>();
    List<String> head = new ArrayList<>(List.of("trial", FigureName.brief(name)));
    head.addAll(KeyNames.inShort(spans.stream().map(Span::key).toList()));
    rows.add(head);
    for (Row r : steps) {
      String value = number(goal.value(r).orElseThrow());
      List<String> row = new ArrayList<>(List.of(Long.toString(r.variant()), value));
      spans.forEach(s -> row.add(Text.safe(r.values().getOrDefault(s.key(), ""))));
      rows.add(row);
    }
    TextTable table = new TextTable(rows);
    while (table.width() > ROOM) {
      table = table.without(table.rows().get(0).size() - 1);
    }
    return table.lines(c -> true);
  }

  private static void wrapped(StringBuilder out, String words) {
    Text.wrap(words, TextTable.COLUMNS).forEach(l -> out.append(l).append('\n'));
  }

  private static String share(double more, double of) {
    if (of == 0) {
      return "";
    }
    double percent = 100 * more / of;
    return " (" + (percent > 0 ? "+" : "") + Numbers.fixed(percent, 1) + " %)";
  }

  /** Keys whose range may be too narrow. */
  private List<String> atTheEnd(Row best) {
    return spans.stream()
        .filter(
            s -> {
              String value = best.values().get(s.key());
              return s.value(0).equals(value) || s.value(1).equals(value);
            })
        .map(Span::key)
        .toList();
  }

  /** For programs. */
  JsonTree json() {
    JsonTree out = new JsonTree().put("key", goal.ranking().name().name());
    out.put("best", goal.ranking().low() ? "low" : "high").put("ownValue", own);
    if (!steps.isEmpty()) {
      Row best = steps.get(steps.size() - 1);
      out.put("bestValue", last()).put("bestVariant", best.variant());
      out.putTexts("atTheEndOfItsRange", atTheEnd(best));
    }
    return out.putObjects(
        "improvements",
        steps.stream()
            .map(
                r ->
                    new JsonTree()
                        .put("variant", r.variant())
                        .put("value", goal.value(r).orElseThrow()))
            .toList());
  }
}
