package etchloom.report;

import etchloom.report.Figure.Group;
import etchloom.report.Figure.Shown;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The whole electrical report for the terminal, within 80 columns: every figure with its basis, and
 * what is lacking with the key that brings it. It ends as {@link Summary} does.
 */
public final class ReportText {
  private static final int LABEL = 42;

  private ReportText() {}

  /**
   * @param colour whether the terminal takes colours and its user wants them
   * @return lines, each with its end
   */
  public static String text(Results r, boolean colour) {
    Map<String, Object> figures = ReportJson.figures(r);
    Page page = new Page(colour);
    Summary.board(page, r);
    Figures.shown(figures).forEach((group, rows) -> group(page, group, rows));
    lacking(page, Absent.of(r, figures));
    Summary.rules(page, r.rules(), r.rules().notes());
    Summary.end(page, r, figures, Optional.empty());
    return page.text();
  }

  private static void group(Page page, Group group, List<Shown> rows) {
    page.blank();
    page.heading(group.title());
    for (int i = 0; i < rows.size(); i++) {
      Shown s = rows.get(i);
      page.pair(s.label(), s.value(), LABEL);
      boolean last = i == rows.size() - 1 || rows.get(i + 1).basis() != s.basis();
      if (last) {
        page.indented("basis: " + s.basis().line());
      }
    }
  }

  private static void lacking(Page page, List<Absent> absent) {
    if (absent.isEmpty()) {
      return;
    }
    page.blank();
    page.heading("Not in this report");
    for (Absent a : absent) {
      String what = String.join(", ", a.figures());
      page.indented(
          a.keys().isEmpty()
              ? "not worked out for this board: " + what
              : "add " + a.keyWords() + " for: " + what);
    }
  }
}
