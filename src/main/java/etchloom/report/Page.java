package etchloom.report;

import java.util.List;
import java.util.function.Function;

/** Lines of a terminal page under construction, none wider than {@link #COLUMNS}. */
final class Page {
  static final int COLUMNS = 80;

  private static final int LABEL = 14;
  private static final int NUMBER = 14;
  private static final String GAP = "  ";
  private static final String BOLD = "\u001b[1m";
  private static final String GREEN = "\u001b[32m";
  private static final String RED = "\u001b[31m";
  private static final String PLAIN = "\u001b[0m";

  private final StringBuilder out = new StringBuilder();
  private final boolean colour;

  Page(boolean colour) {
    this.colour = colour;
  }

  void blank() {
    out.append('\n');
  }

  void heading(String s) {
    Text.wrap(Text.safe(s), COLUMNS).forEach(l -> line(painted(l, BOLD)));
  }

  /** A label and its text, wrapped and indented. */
  void item(String label, String text) {
    List<String> lines = Text.wrap(Text.safe(text), COLUMNS - LABEL);
    for (int i = 0; i < lines.size(); i++) {
      line(Text.left(i == 0 ? label : "", LABEL) + lines.get(i));
    }
  }

  /** A label and a value, side by side. */
  void pair(String label, String value, int labelColumns) {
    line("  " + Text.left(Text.cut(label, labelColumns - 1), labelColumns) + value);
  }

  /** A paragraph, wrapped and set in. */
  void indented(String text) {
    Text.wrap(Text.safe(text), COLUMNS - 2).forEach(l -> line("  " + l));
  }

  /** A label and short texts side by side, in columns of the same width. */
  <T> void cells(String label, List<T> values, Function<T, String> text) {
    List<String> cells = values.stream().map(text).toList();
    int width = cells.stream().mapToInt(Text::columns).max().orElse(0) + GAP.length();
    int each = Math.max(1, (COLUMNS - LABEL + GAP.length()) / width);
    for (int i = 0; i < cells.size(); i += each) {
      StringBuilder s = new StringBuilder(Text.left(i == 0 ? label : "", LABEL));
      cells
          .subList(i, Math.min(cells.size(), i + each))
          .forEach(c -> s.append(Text.left(c, width)));
      line(s.toString());
    }
  }

  /** A row of the rules' table. */
  void row(String name, String measured, String required, String where) {
    line(
        Text.left(name, LABEL)
            + Text.right(measured, NUMBER - 2)
            + Text.right(required, NUMBER + 3)
            + GAP
            + where);
  }

  void good(String word, String text) {
    verdict(word, text, GREEN);
  }

  void bad(String word, String text) {
    verdict(word, text, RED);
  }

  private void verdict(String word, String text, String paint) {
    List<String> lines = Text.wrap(word + ": " + Text.safe(text), COLUMNS);
    line(painted(word, BOLD + paint) + lines.get(0).substring(word.length()));
    lines.subList(1, lines.size()).forEach(this::line);
  }

  private String painted(String s, String paint) {
    return colour ? paint + s + PLAIN : s;
  }

  private void line(String s) {
    out.append(s.stripTrailing()).append('\n');
  }

  String text() {
    return out.toString();
  }
}
