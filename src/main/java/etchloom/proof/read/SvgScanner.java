package etchloom.proof.read;

/** Steps through the numbers and letters of an SVG attribute. */
final class SvgScanner {
  private final String text;
  private final Reading reading;
  private final int line;
  private int pos;

  SvgScanner(String text, Reading reading, int line) {
    this.text = text;
    this.reading = reading;
    this.line = line;
  }

  /** The next character that is neither blank nor comma; 0 at the end. */
  char peek() {
    while (pos < text.length() && " \t\r\n\f,".indexOf(text.charAt(pos)) >= 0) {
      pos++;
    }
    return pos < text.length() ? text.charAt(pos) : 0;
  }

  char take() {
    char c = peek();
    pos++;
    return c;
  }

  boolean atNumber() {
    char c = peek();
    return Decimals.digit(c) || c == '-' || c == '+' || c == '.';
  }

  /** One digit, 0 or 1, which may stand next to the number after it. */
  boolean flag() throws UnreadableFile {
    char c = take();
    if (c != '0' && c != '1') {
      throw wrong("a flag, 0 or 1,");
    }
    return c == '1';
  }

  double number() throws UnreadableFile {
    peek();
    int from = pos;
    sign();
    boolean point = false;
    while (pos < text.length()
        && (Decimals.digit(text.charAt(pos)) || (text.charAt(pos) == '.' && !point))) {
      point |= text.charAt(pos) == '.';
      pos++;
    }
    if (pos + 1 < text.length() && "eE".indexOf(text.charAt(pos)) >= 0) {
      char next = text.charAt(pos + 1);
      if (Decimals.digit(next) || next == '-' || next == '+') {
        pos++;
        sign();
        while (pos < text.length() && Decimals.digit(text.charAt(pos))) {
          pos++;
        }
      }
    }
    double v = Decimals.parseFloating(text.substring(from, pos)).orElse(Double.NaN);
    if (!(Math.abs(v) <= 1e9)) {
      pos = from;
      throw wrong("a number");
    }
    return v;
  }

  private void sign() {
    if (pos < text.length() && "+-".indexOf(text.charAt(pos)) >= 0) {
      pos++;
    }
  }

  /** The letters from here on, such as a function's name. */
  String word() {
    peek();
    int from = pos;
    while (pos < text.length() && Character.isLetter(text.charAt(pos))) {
      pos++;
    }
    return text.substring(from, pos);
  }

  UnreadableFile wrong(String wanted) {
    int from = Math.min(Math.max(0, pos - 1), text.length());
    return reading.fail(
        line,
        "svg",
        wanted + " is wanted at '" + GerberLexer.printable(text.substring(from)) + "'");
  }
}
