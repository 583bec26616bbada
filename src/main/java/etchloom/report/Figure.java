package etchloom.report;

import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/**
 * A figure of the report as people see it.
 *
 * @param path its key in {@code report.json}; {@code *} at the end stands for every key there
 * @param label {@code *} stands for the key that the path's {@code *} stands for
 * @param needs what the spec must give for it
 * @param applies whether a machine of this kind has such a figure at all
 */
record Figure(
    Group group,
    String path,
    String label,
    Form form,
    Basis basis,
    List<SpecKey> needs,
    Predicate<Results> applies) {
  Figure {
    needs = List.copyOf(needs);
  }

  /** Parts of the report, in its order. */
  enum Group {
    RESISTANCE("Resistance at 20 C"),
    INDUCTANCE("Inductance"),
    EMF("Back-EMF"),
    TORQUE("Torque"),
    TAPER("Tracks that widen, against even ones"),
    LOSS("Losses"),
    THERMAL("Temperature"),
    DRIVE("Drive"),
    GENERATOR("Generator"),
    SPREAD("Spread between boards"),
    ROTOR("Rotor");

    private final String title;

    Group(String title) {
      this.title = title;
    }

    String title() {
      return title;
    }
  }

  /** A figure with its value. */
  record Shown(String path, String label, String value, Basis basis) {}

  /** The values there are; none where the report has no such key. */
  List<Shown> shown(Map<String, Object> figures) {
    if (!path.endsWith("*")) {
      return figures.containsKey(path)
          ? List.of(new Shown(path, label, form.show(figures.get(path)), basis))
          : List.of();
    }
    String stem = path.substring(0, path.length() - 1);
    return figures.entrySet().stream()
        .filter(e -> e.getKey().startsWith(stem))
        .map(
            e ->
                new Shown(
                    e.getKey(),
                    label.replace("*", e.getKey().substring(stem.length())),
                    form.show(e.getValue()),
                    basis))
        .toList();
  }

  boolean missing(Map<String, Object> figures) {
    return shown(figures).isEmpty();
  }
}
