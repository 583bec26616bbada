package etchloom.report;

import java.util.List;
import java.util.Set;

/** HTML under construction. All text is escaped; only {@link #raw} takes markup. */
public final class Html {
  private static final Set<String> INLINE = Set.of("a", "em", "strong", "span");

  private final StringBuilder out = new StringBuilder();

  /**
   * @param attributes as they stand in the tag, {@code class="n"}; never from the user
   */
  public Html open(String tag, String... attributes) {
    out.append('<').append(tag);
    for (String a : attributes) {
      out.append(' ').append(a);
    }
    out.append('>');
    return this;
  }

  /** A line end follows, but not inside a line of text. */
  public Html close(String tag) {
    out.append("</").append(tag).append(INLINE.contains(tag) ? ">" : ">\n");
    return this;
  }

  public Html element(String tag, String text, String... attributes) {
    return open(tag, attributes).text(text).close(tag);
  }

  public Html text(String text) {
    out.append(escaped(text));
    return this;
  }

  public Html raw(String markup) {
    out.append(markup);
    return this;
  }

  /** A table whose first column heads its rows; columns from the second on hold numbers. */
  public Html table(String caption, List<String> head, List<List<String>> rows, int numbers) {
    return table("", caption, head, rows, numbers);
  }

  /** The same for a page without a script: keys reach the table always, so that they scroll it. */
  public Html reachableTable(
      String caption, List<String> head, List<List<String>> rows, int numbers) {
    String label = " tabindex=\"0\" role=\"region\" aria-label=\"" + escaped(caption) + "\"";
    return table(label, caption, head, rows, numbers);
  }

  private Html table(
      String reach, String caption, List<String> head, List<List<String>> rows, int numbers) {
    raw("<div class=\"scroll\"" + reach + ">").open("table").element("caption", caption);
    open("thead").open("tr");
    for (int c = 0; c < head.size(); c++) {
      element("th", head.get(c), cell(c, numbers, "scope=\"col\""));
    }
    close("tr").close("thead").open("tbody");
    for (List<String> row : rows) {
      open("tr").element("th", row.get(0), "scope=\"row\"");
      for (int c = 1; c < row.size(); c++) {
        element("td", Words.symbols(row.get(c)), cell(c, numbers));
      }
      close("tr");
    }
    return close("tbody").close("table").close("div");
  }

  private static String[] cell(int column, int numbers, String... more) {
    if (column < 1 || column > numbers) {
      return more;
    }
    String[] out = new String[more.length + 1];
    System.arraycopy(more, 0, out, 0, more.length);
    out[more.length] = "class=\"n\"";
    return out;
  }

  /** Safe as content and inside quotes; characters that XML forbids become {@code ?}. */
  public static String escaped(String s) {
    StringBuilder b = new StringBuilder(s.length() + 16);
    for (int c : Text.safe(s).codePoints().toArray()) {
      switch (c) {
        case '&' -> b.append("&amp;");
        case '<' -> b.append("&lt;");
        case '>' -> b.append("&gt;");
        case '"' -> b.append("&quot;");
        case '\'' -> b.append("&#39;");
        default -> b.appendCodePoint(c);
      }
    }
    return b.toString();
  }

  @Override
  public String toString() {
    return out.toString();
  }
}
