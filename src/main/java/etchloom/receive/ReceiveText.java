package etchloom.receive;

import etchloom.report.Text;
import etchloom.report.TextTable;
import java.util.ArrayList;
import java.util.List;

/** The result as a table for the terminal. */
public final class ReceiveText {
  private static final int NAME_MAX = 20;

  /** Of a cause below its board. */
  private static final int INDENT = 7;

  private ReceiveText() {}

  /** Causes stand in the last column, or each in a line of its own where that is too wide. */
  public static String text(Outcome o) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(Shown.HEAD);
    o.boards().forEach(v -> rows.add(safe(Shown.row(v))));
    int causes = Shown.HEAD.size() - 1;
    TextTable whole = new TextTable(rows);
    boolean fits = whole.width() <= TextTable.COLUMNS;
    List<String> lines = (fits ? whole : whole.without(causes)).lines(c -> c >= 3 && c <= 5);
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < lines.size(); i++) {
      out.append(lines.get(i)).append('\n');
      String cause = rows.get(i).get(causes);
      if (!fits && i > 0 && !cause.isEmpty()) {
        wrapped(out, "likely " + cause, INDENT);
      }
    }
    out.append('\n').append(Shown.counts(o)).append('\n');
    Shown.spread(o.batch()).ifPresent(s -> wrapped(out, s, 0));
    return out.toString();
  }

  private static void wrapped(StringBuilder out, String words, int indent) {
    Text.wrap(words, TextTable.COLUMNS - indent)
        .forEach(l -> out.append(" ".repeat(indent)).append(l).append('\n'));
  }

  private static List<String> safe(List<String> row) {
    return row.stream()
        .map(s -> Text.cut(Text.safe(s), s.equals(row.get(0)) ? NAME_MAX : 200))
        .toList();
  }
}
