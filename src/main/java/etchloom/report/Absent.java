package etchloom.report;

import etchloom.report.Figure.Group;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Figures that a report lacks.
 *
 * @param keys what to add to the spec; empty where no key would bring them
 * @param figures what is lacking, a group of figures each
 */
record Absent(List<String> keys, List<String> figures) {
  Absent {
    keys = List.copyOf(keys);
    figures = List.copyOf(figures);
  }

  /** Figures that lack the same keys together, in the report's order; those without a key last. */
  static List<Absent> of(Results r, Map<String, Object> figures) {
    Map<List<String>, Map<Group, List<String>>> lacking = new LinkedHashMap<>();
    Map<Group, Integer> sizes = new LinkedHashMap<>();
    for (Figure f : Figures.all()) {
      if (!f.applies().test(r)) {
        continue;
      }
      sizes.merge(f.group(), 1, Integer::sum);
      if (f.missing(figures)) {
        List<String> keys =
            f.needs().stream().filter(n -> !n.given(r.spec())).map(SpecKey::words).toList();
        lacking
            .computeIfAbsent(keys, k -> new LinkedHashMap<>())
            .computeIfAbsent(f.group(), g -> new ArrayList<>())
            .add(f.label());
      }
    }
    Map<Group, List<String>> unknown = lacking.remove(List.<String>of());
    List<Absent> out = new ArrayList<>();
    lacking.forEach((keys, groups) -> out.add(new Absent(keys, names(groups, sizes))));
    if (unknown != null) {
      out.add(new Absent(List.of(), names(unknown, sizes)));
    }
    return out;
  }

  private static List<String> names(Map<Group, List<String>> groups, Map<Group, Integer> sizes) {
    List<String> out = new ArrayList<>();
    groups.forEach(
        (g, labels) -> {
          boolean whole = labels.size() == sizes.get(g);
          String name = g.title().toLowerCase(Locale.ROOT);
          out.add(whole ? name : name + " (" + String.join(", ", labels) + ")");
        });
    return out;
  }

  /** {@code rotor.magnet and rotor.air-gap}. */
  String keyWords() {
    int n = keys.size();
    return n < 2
        ? String.join("", keys)
        : String.join(", ", keys.subList(0, n - 1)) + " and " + keys.get(n - 1);
  }
}
