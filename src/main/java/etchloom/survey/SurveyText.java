package etchloom.survey;

import etchloom.report.Text;
import etchloom.report.TextTable;
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

  /** A reason is cut to what is left of the line, but not below this. */
  private static final int REASON = 16;

  /** A value may be any text. */
  private static final int VALUE = 20;

  private SurveyText() {}

  static String text(Plan plan, Summary s, String where) {
    StringBuilder out = new StringBuilder();
    List<Row> rows = s.top();
    Map<String, FigureName> figures = figures(s, rows);
    List<List<String>> cells = new ArrayList<>();
    List<String> head = new ArrayList<>(List.of("variant"));
    head.addAll(KeyNames.inShort(plan.axes().stream().map(Axis::key).toList()));
    figures.keySet().forEach(f -> head.add(FigureName.brief(f)));
    head.add("rules");
    cells.add(head);
    rows.forEach(r -> cells.add(cells(plan, r, figures)));
    TextTable table = fitting(new TextTable(cells), plan.axes().size(), s.listing().names().size());
    table.lines(c -> c < table.rows().get(0).size() - 1).forEach(l -> out.append(l).append('\n'));
    if (s.kept() > rows.size()) {
      out.append("... ").append(s.kept() - rows.size()).append(" more\n");
    }
    out.append('\n');
    Text.wrap(counts(plan, s), TextTable.COLUMNS).forEach(l -> out.append(l).append('\n'));
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

  /** What was not drawn has no figures: the reason takes their place. */
  private static List<String> cells(Plan plan, Row row, Map<String, FigureName> figures) {
    List<String> out = new ArrayList<>(List.of(Long.toString(row.variant())));
    plan.axes()
        .forEach(a -> out.add(Text.cut(Text.safe(row.values().getOrDefault(a.key(), "")), VALUE)));
    if (!row.figures().isEmpty()) {
      figures.values().forEach(n -> out.add(n.in(row.figures()).map(SurveyText::shown).orElse("")));
    }
    out.add(row.passed() ? "kept" : Text.safe(row.reason()));
    return out;
  }

  private static String shown(Object value) {
    return value instanceof Double d ? Numbers.significant(d, DIGITS) : String.valueOf(value);
  }

  /**
   * Leaves out what does not fit: the usual figures from the last on, then keys, and only then what
   * was asked for.
   */
  private static TextTable fitting(TextTable all, int keys, int asked) {
    TextTable table = all;
    int usual = all.rows().get(0).size() - 2 - keys - asked;
    for (int left = usual + keys + asked; left > 1 && tooWide(table); left--) {
      boolean isKey = left <= keys + asked && left > asked;
      table = table.without(isKey ? left - asked : left);
    }
    return table.cut(REASON);
  }

  private static boolean tooWide(TextTable table) {
    return table.cut(REASON).width() > TextTable.COLUMNS;
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
