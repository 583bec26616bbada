package etchloom.proof.read;

import java.util.Map;
import java.util.OptionalDouble;

/**
 * Arithmetic of aperture macros: {@code + - x /}, brackets, signs and variables {@code $n}; a
 * variable never set is 0.
 */
final class MacroExpression {
  /** Brackets within brackets; keeps hostile files off the end of the stack. */
  private static final int MAX_DEPTH = 50;

  private final byte[] text;
  private final int end;
  private final Map<Integer, Double> variables;
  private final Reading reading;
  private final int line;
  private int pos;
  private int depth;

  private MacroExpression(
      byte[] text, int from, int to, Map<Integer, Double> variables, Reading reading, int line) {
    this.text = text;
    this.pos = from;
    this.end = to;
    this.variables = variables;
    this.reading = reading;
    this.line = line;
  }

  /**
   * @throws UnreadableFile when the text is no expression, or its value is not finite or beyond
   *     {@link Reading#MAX_MM}
   */
  static double value(
      byte[] text, int from, int to, Map<Integer, Double> variables, Reading reading, int line)
      throws UnreadableFile {
    MacroExpression e = new MacroExpression(text, from, to, variables, reading, line);
    double v = e.sum();
    if (e.peek() != -1) {
      throw e.wrong();
    }
    if (!(Math.abs(v) <= Reading.MAX_MM)) {
      throw reading.fail(line, "macro-value", "a macro value comes to " + v);
    }
    return v;
  }

  private int peek() {
    while (pos < end && text[pos] == ' ') {
      pos++;
    }
    return pos < end ? text[pos] : -1;
  }

  private double sum() throws UnreadableFile {
    double v = product();
    while (true) {
      int c = peek();
      if (c == '+') {
        pos++;
        v += product();
      } else if (c == '-') {
        pos++;
        v -= product();
      } else {
        return v;
      }
    }
  }

  private double product() throws UnreadableFile {
    double v = factor();
    while (true) {
      int c = peek();
      if (c == 'x' || c == 'X') {
        pos++;
        v *= factor();
      } else if (c == '/') {
        pos++;
        double by = factor();
        if (by == 0) {
          throw reading.fail(line, "macro-value", "a macro divides by 0");
        }
        v /= by;
      } else {
        return v;
      }
    }
  }

  private double factor() throws UnreadableFile {
    double sign = 1;
    int c = peek();
    while (c == '-' || c == '+') {
      sign = c == '-' ? -sign : sign;
      pos++;
      c = peek();
    }
    return sign * bare(c);
  }

  private double bare(int c) throws UnreadableFile {
    if (c == '(') {
      if (++depth > MAX_DEPTH) {
        throw reading.fail(line, "too-large", "more than " + MAX_DEPTH + " brackets in brackets");
      }
      pos++;
      double v = sum();
      if (peek() != ')') {
        throw wrong();
      }
      pos++;
      depth--;
      return v;
    }
    boolean variable = c == '$';
    pos += variable ? 1 : 0;
    int start = pos;
    while (pos < end && (Decimals.digit(text[pos]) || text[pos] == '.')) {
      pos++;
    }
    OptionalDouble number = Decimals.parse(text, start, pos);
    if (number.isEmpty()) {
      throw wrong();
    }
    return variable
        ? variables.getOrDefault((int) number.getAsDouble(), 0.0)
        : number.getAsDouble();
  }

  private UnreadableFile wrong() {
    return reading.fail(
        line,
        "macro-syntax",
        "cannot read the macro expression at '" + GerberLexer.printable(text, pos, end) + "'");
  }
}
