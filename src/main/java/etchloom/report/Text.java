package etchloom.report;

import java.util.ArrayList;
import java.util.List;

/** Text for a terminal: safe to print, and measured in columns. */
public final class Text {
  private Text() {}

  /** Control characters and those that hide or turn the writing direction become {@code ?}. */
  public static String safe(String s) {
    StringBuilder out = new StringBuilder(s.length());
    s.codePoints().forEach(c -> out.appendCodePoint(printable(c) ? c : '?'));
    return out.toString();
  }

  private static boolean printable(int c) {
    return switch (Character.getType(c)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR,
          Character.PRIVATE_USE,
          Character.UNASSIGNED ->
          false;
      default -> true;
    };
  }

  /** Columns on a terminal: two for the wide scripts and pictures, none for combining marks. */
  public static int columns(String s) {
    return s.codePoints().map(Text::columns).sum();
  }

  private static int columns(int c) {
    int type = Character.getType(c);
    if (type == Character.NON_SPACING_MARK || type == Character.ENCLOSING_MARK) {
      return 0;
    }
    boolean wide =
        c >= 0x1100
            && (c <= 0x115f
                || (c >= 0x2e80 && c <= 0xa4cf)
                || (c >= 0xac00 && c <= 0xd7a3)
                || (c >= 0xf900 && c <= 0xfaff)
                || (c >= 0xfe30 && c <= 0xfe6f)
                || (c >= 0xff00 && c <= 0xff60)
                || (c >= 0xffe0 && c <= 0xffe6)
                || (c >= 0x1f000 && c <= 0x1faff)
                || c >= 0x20000);
    return wide ? 2 : 1;
  }

  /** Cut to so many columns, with {@code ...} where something is left out. */
  public static String cut(String s, int columns) {
    if (columns(s) <= columns) {
      return s;
    }
    StringBuilder out = new StringBuilder();
    int used = 3;
    for (int c : s.codePoints().toArray()) {
      used += columns(c);
      if (used > columns) {
        break;
      }
      out.appendCodePoint(c);
    }
    return out.append("...").toString();
  }

  /** Filled up with spaces on the right. */
  public static String left(String s, int columns) {
    return s + " ".repeat(Math.max(0, columns - columns(s)));
  }

  /** Filled up with spaces on the left. */
  public static String right(String s, int columns) {
    return " ".repeat(Math.max(0, columns - columns(s))) + s;
  }

  /** Broken between words; a word longer than a line is cut into pieces. */
  public static List<String> wrap(String s, int columns) {
    List<String> out = new ArrayList<>();
    String line = "";
    for (String word : s.split(" ", -1)) {
      String rest = word;
      while (columns(rest) > columns) {
        if (!line.isEmpty()) {
          out.add(line);
          line = "";
        }
        int n = fitting(rest, columns);
        out.add(rest.substring(0, n));
        rest = rest.substring(n);
      }
      String longer = line.isEmpty() ? rest : line + " " + rest;
      if (columns(longer) > columns) {
        out.add(line);
        line = rest;
      } else {
        line = longer;
      }
    }
    out.add(line);
    return out;
  }

  /** How many chars fit, at least one code point. */
  private static int fitting(String s, int columns) {
    int used = 0;
    int at = 0;
    while (at < s.length()) {
      int c = s.codePointAt(at);
      used += columns(c);
      if (used > columns && at > 0) {
        break;
      }
      at += Character.charCount(c);
    }
    return at;
  }
}
