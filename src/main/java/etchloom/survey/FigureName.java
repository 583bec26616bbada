package etchloom.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A figure as a user names it: its full path in {@code report.json}, or the end of one that fits no
 * other ({@code motorConstant}). The name of a group of numbers ({@code terminalOhm}) stands for
 * their mean, the star point's pairs left out.
 */
record FigureName(String name) {

  /** The value in one report; empty where it has none, or several by this name. */
  Optional<Object> in(Map<String, Object> figures) {
    Object exact = figures.get(name);
    if (exact != null) {
      return Optional.of(exact);
    }
    List<String> leaves = paths(figures, name);
    if (leaves.size() == 1) {
      return Optional.of(figures.get(leaves.get(0)));
    }
    List<String> groups = groups(figures);
    return leaves.isEmpty() && groups.size() == 1 ? mean(figures, groups.get(0)) : Optional.empty();
  }

  /** The paths that the name could mean, a group by its own; none where it is unknown. */
  List<String> meanings(Map<String, Object> figures) {
    if (figures.containsKey(name)) {
      return List.of(name);
    }
    List<String> leaves = paths(figures, name);
    return leaves.isEmpty() ? groups(figures) : leaves;
  }

  private static List<String> paths(Map<String, Object> figures, String name) {
    return figures.keySet().stream().filter(p -> p.endsWith("." + name)).toList();
  }

  private List<String> groups(Map<String, Object> figures) {
    List<String> out = new ArrayList<>();
    for (Map.Entry<String, Object> e : figures.entrySet()) {
      int dot = e.getKey().lastIndexOf('.');
      String group = dot < 0 ? "" : e.getKey().substring(0, dot);
      boolean meant = group.equals(name) || group.endsWith("." + name);
      if (meant && e.getValue() instanceof Number && !out.contains(group)) {
        out.add(group);
      }
    }
    return out;
  }

  private static Optional<Object> mean(Map<String, Object> figures, String group) {
    double lines = 0;
    int count = 0;
    double all = 0;
    int every = 0;
    for (Map.Entry<String, Object> e : figures.entrySet()) {
      boolean own = e.getKey().startsWith(group + ".");
      if (own
          && e.getKey().indexOf('.', group.length() + 1) < 0
          && e.getValue() instanceof Number n) {
        all += n.doubleValue();
        every++;
        if (!e.getKey().endsWith("N")) {
          lines += n.doubleValue();
          count++;
        }
      }
    }
    if (every == 0) {
      return Optional.empty();
    }
    return Optional.of(count > 0 ? lines / count : all / every);
  }

  /** The value as a number; empty where it is none. */
  Optional<Double> number(Map<String, Object> figures) {
    return in(figures).filter(v -> v instanceof Number).map(v -> ((Number) v).doubleValue());
  }

  /** The last word of a path, for headings. */
  static String brief(String path) {
    return path.substring(path.lastIndexOf('.') + 1);
  }
}
