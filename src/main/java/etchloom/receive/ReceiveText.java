package etchloom.receive;

import etchloom.report.Text;
import java.util.ArrayList;
import java.util.List;

/** The result as a table for the terminal. */
public final class ReceiveText {
  private static final int NAME_MAX = 24;

  private ReceiveText() {}

  public static String text(Outcome o) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(Shown.HEAD);
    o.boards().forEach(v -> rows.add(safe(Shown.row(v))));
    int[] width = new int[Shown.HEAD.size()];
    for (List<String> row : rows) {
      for (int c = 0; c < width.length; c++) {
        width[c] = Math.max(width[c], Text.columns(row.get(c)));
      }
    }
    StringBuilder out = new StringBuilder();
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int c = 0; c < width.length; c++) {
        boolean number = c >= 3 && c <= 5;
        String cell = row.get(c);
        line.append(number ? Text.right(cell, width[c]) : Text.left(cell, width[c])).append("  ");
      }
      out.append(line.toString().stripTrailing()).append('\n');
    }
    out.append('\n').append(Shown.counts(o)).append('\n');
    Shown.spread(o.batch()).ifPresent(s -> out.append(s).append('\n'));
    return out.toString();
  }

  private static List<String> safe(List<String> row) {
    return row.stream()
        .map(s -> Text.cut(Text.safe(s), s.equals(row.get(0)) ? NAME_MAX : 200))
        .toList();
  }
}
