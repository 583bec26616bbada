package etchloom.diagnostic;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Diagnostics as text for people:
 *
 * <pre>
 * pump.yaml:14:10: error[out-of-range]: coil.space: 0 mm is too small: ...
 *   14 |   space: 0 mm
 *      |          ^^^^
 *   hint: ...
 * </pre>
 *
 * <p>The source line is shown as it stands, but cut to a window round the place where it is long,
 * and with characters that could steer a terminal replaced.
 */
public final class DiagnosticText {
  private DiagnosticText() {}

  /** Longest piece of a source line that is shown, in characters. */
  private static final int WINDOW = 100;

  /** How much of a long line is shown before the marked place. */
  private static final int BEFORE = 40;

  private static final char UNPRINTABLE = '\ufffd';

  /** All of them in order of place, each followed by a line end. */
  public static String text(List<Diagnostic> diagnostics) {
    StringBuilder out = new StringBuilder();
    for (Diagnostic d : sorted(diagnostics)) {
      full(out, d);
    }
    return out.toString();
  }

  /** One line a diagnostic, for programs that read the list: place, severity, code, message. */
  public static String lines(List<Diagnostic> diagnostics) {
    StringBuilder out = new StringBuilder();
    for (Diagnostic d : sorted(diagnostics)) {
      out.append(headline(d)).append('\n');
    }
    return out.toString();
  }

  /**
   * Files in the order in which they first occur, in each errors before warnings, which may only
   * follow from them; then line, then column; else as they came.
   */
  public static List<Diagnostic> sorted(List<Diagnostic> diagnostics) {
    Map<String, Integer> files = new LinkedHashMap<>();
    for (Diagnostic d : diagnostics) {
      files.putIfAbsent(d.where().file(), files.size());
    }
    List<Diagnostic> all = new ArrayList<>(diagnostics);
    all.sort(
        Comparator.<Diagnostic>comparingInt(d -> files.get(d.where().file()))
            .thenComparing(Diagnostic::severity)
            .thenComparingInt(d -> d.where().line())
            .thenComparingInt(d -> d.where().column()));
    return all;
  }

  private static void full(StringBuilder out, Diagnostic d) {
    out.append(headline(d)).append('\n');
    SourceSpan at = d.where();
    if (at.line() > 0 && !at.text().isBlank()) {
      excerpt(out, at);
    }
    for (String hint : d.hints()) {
      out.append("  hint: ").append(printable(hint)).append('\n');
    }
  }

  private static String headline(Diagnostic d) {
    StringBuilder s = new StringBuilder(printable(d.where().file()));
    if (d.where().line() > 0) {
      s.append(':').append(d.where().line());
      if (d.where().column() > 0) {
        s.append(':').append(d.where().column());
      }
    }
    s.append(": ").append(d.severity() == Severity.ERROR ? "error" : "warning");
    s.append('[').append(d.code()).append("]: ");
    if (!d.key().isEmpty()) {
      s.append(printable(d.key())).append(": ");
    }
    return s.append(printable(d.message())).toString();
  }

  private static void excerpt(StringBuilder out, SourceSpan at) {
    int[] line = at.text().codePoints().toArray(); // columns count code points, not chars
    int mark = Math.min(Math.max(at.column() - 1, 0), line.length);
    int from = line.length <= WINDOW ? 0 : Math.max(0, mark - BEFORE);
    int to = Math.min(line.length, from + WINDOW);
    String number = Integer.toString(at.line());
    out.append("  ").append(number).append(" | ");
    out.append(from > 0 ? "..." : "");
    append(out, line, from, to);
    out.append(to < line.length ? "..." : "").append('\n');
    if (at.column() > 0) {
      out.append("  ").append(" ".repeat(number.length())).append(" | ");
      out.append(from > 0 ? "   " : "");
      for (int i = from; i < mark; i++) {
        out.append(line[i] == '\t' ? '\t' : ' '); // so that the caret stands right at any tab width
      }
      int marked = Math.max(1, Math.min(at.length(), to - mark));
      out.append("^".repeat(marked)).append('\n');
    }
  }

  private static void append(StringBuilder out, int[] line, int from, int to) {
    for (int i = from; i < to; i++) {
      out.appendCodePoint(line[i] == '\t' || isPrintable(line[i]) ? line[i] : UNPRINTABLE);
    }
  }

  /** Messages quote what was found, so they are made safe for a terminal here, once for all. */
  private static String printable(String s) {
    StringBuilder out = new StringBuilder(s.length());
    s.codePoints().forEach(c -> out.appendCodePoint(isPrintable(c) ? c : UNPRINTABLE));
    return out.toString();
  }

  /** Neither a control character nor one that turns the writing direction or hides. */
  private static boolean isPrintable(int c) {
    return switch (Character.getType(c)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR,
          Character.UNASSIGNED ->
          false;
      default -> true;
    };
  }
}
