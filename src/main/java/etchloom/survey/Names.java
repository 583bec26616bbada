package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Holds names of figures against a report that has some. */
final class Names {
  private static final int SHOWN = 8;

  private Names() {}

  /** What is wrong with them; nothing where there is no report to tell. */
  static List<Diagnostic> check(
      String option, List<FigureName> names, Map<String, Object> figures) {
    List<Diagnostic> out = new ArrayList<>();
    if (!figures.isEmpty()) {
      names.forEach(n -> one(option, n, figures).ifPresent(out::add));
    }
    return out;
  }

  private static Optional<Diagnostic> one(
      String option, FigureName name, Map<String, Object> figures) {
    List<String> meanings = name.meanings(figures);
    if (meanings.size() == 1) {
      return Optional.empty();
    }
    SourceSpan where = SourceSpan.ofFile(option + " " + name.name());
    if (meanings.size() > 1) {
      String message = "this could be " + String.join(", ", meanings);
      return Optional.of(Diagnostic.error("figure", where, "", message));
    }
    String last = FigureName.brief(name.name()).toLowerCase(Locale.ROOT);
    String[] near =
        figures.keySet().stream()
            .filter(p -> near(FigureName.brief(p).toLowerCase(Locale.ROOT), last))
            .limit(SHOWN)
            .map(p -> "there is " + p)
            .toArray(String[]::new);
    String message = "the report has no such figure; the names are those of report.json";
    return Optional.of(Diagnostic.error("figure", where, "", message, near));
  }

  private static boolean near(String a, String b) {
    return a.contains(b) || b.contains(a) || distance(a, b) <= 1 + b.length() / 5;
  }

  /** Levenshtein's, over two rows. */
  private static int distance(String a, String b) {
    int[] above = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      above[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] row = new int[b.length() + 1];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = above[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        row[j] = Math.min(change, 1 + Math.min(above[j], row[j - 1]));
      }
      above = row;
    }
    return above[b.length()];
  }
}
