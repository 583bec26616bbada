package etchloom.survey;

import etchloom.report.Text;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The first rows of a survey as a table for the terminal. */
final class SurveyText {
  /** Shown where they are known and nothing else is asked for. */
  private static final List<String> USUAL =
      List.of("geometry.turnsPerLayer", "terminalOhm", "torque.motorConstant", "thermal.copperC");

  private static final int DIGITS = 5;
  private static final int REASON = 60;

  private SurveyText() {}

  static String text(Plan plan, Summary s, String where) {
    StringBuilder out = new StringBuilder();
    List<Row> rows = s.top();
    Map<String, FigureName> figures = figures(s, rows);
    List<List<String>> cells = new ArrayList<>();
    List<String> head = new ArrayList<>(List.of("variant"));
    plan.axes().forEach(a -> head.add(a.key()));
    figures.keySet().forEach(f -> head.add(FigureName.brief(f)));
    head.add("rules");
    cells.add(head);
    rows.forEach(r -> cells.add(cells(plan, r, figures)));
    table(out, cells);
    if (s.kept() > rows.size()) {
      out.append("... ").append(s.kept() - rows.size()).append(" more\n");
    }
    out.append('\n').append(counts(plan, s)).append('\n');
    s.listing()
        .rank()
        .ifPresent(
            r ->
                out.append("best first by ")
                    .append(r.name().name())
                    .append(r.low() ? ", the smallest\n" : ", the largest\n"));
    return out.append(where).append('\n').toString();
  }

  private static Map<String, FigureName> figures(Summary s, List<Row> rows) {
    Map<String, FigureName> out = new LinkedHashMap<>();
    s.listing().names().forEach(n -> out.put(n.name(), n));
    for (String usual : USUAL) {
      FigureName n = new FigureName(usual);
      boolean known = rows.stream().anyMatch(r -> n.in(r.figures()).isPresent());
      boolean there =
          out.keySet().stream().anyMatch(k -> FigureName.brief(k).equals(FigureName.brief(usual)));
      if (known && !there) {
        out.put(usual, n);
      }
    }
    return out;
  }

  private static List<String> cells(Plan plan, Row row, Map<String, FigureName> figures) {
    List<String> out = new ArrayList<>(List.of(Long.toString(row.variant())));
    plan.axes().forEach(a -> out.add(row.values().getOrDefault(a.key(), "")));
    figures.values().forEach(n -> out.add(n.in(row.figures()).map(SurveyText::shown).orElse("")));
    out.add(row.passed() ? "kept" : Text.cut(Text.safe(row.reason()), REASON));
    return out;
  }

  private static String shown(Object value) {
    return value instanceof Double d ? Numbers.significant(d, DIGITS) : String.valueOf(value);
  }

  private static void table(StringBuilder out, List<List<String>> cells) {
    int n = cells.get(0).size();
    for (List<String> row : cells) {
      StringBuilder line = new StringBuilder();
      for (int c = 0; c < n; c++) {
        int at = c;
        int width = cells.stream().mapToInt(r -> Text.columns(r.get(at))).max().orElse(0);
        String cell = row.get(c);
        line.append(c == n - 1 ? Text.left(cell, width) : Text.right(cell, width)).append("  ");
      }
      out.append(line.toString().stripTrailing()).append('\n');
    }
  }

  private static String counts(Plan plan, Summary s) {
    String part = plan.part().equals(Part.WHOLE) ? "" : " in part " + plan.part();
    String keep =
        s.listing().keepText().isEmpty()
            ? ""
            : "; " + s.kept() + " with " + Text.safe(s.listing().keepText());
    String undrawn = s.undrawn() == 0 ? "" : "; " + s.undrawn() + " could not be drawn";
    return s.count()
        + (s.count() == 1 ? " variant" : " variants")
        + part
        + keep
        + "; "
        + s.passed()
        + (s.passed() == 1 ? " keeps" : " keep")
        + " every rule"
        + undrawn;
  }
}
