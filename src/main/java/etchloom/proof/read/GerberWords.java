package etchloom.proof.read;

/** The commands outside {@code %} signs: G, D and M codes and the operations. */
final class GerberWords {
  private static final int MAX_DIGITS = 15;

  private final Reading reading;
  private final GerberFormat format;
  private final GerberPlotter plotter;
  private final AttributeStore attributes;
  private final GerberLexer lexer;

  private byte[] text = new byte[0];
  private int pos;
  private int end;
  private int line;

  /** The number last read, and its digits. */
  private long number;

  private int digits;

  private boolean ended;
  private int lastOperation;

  GerberWords(
      Reading reading,
      GerberFormat format,
      GerberPlotter plotter,
      AttributeStore attributes,
      GerberLexer lexer) {
    this.reading = reading;
    this.format = format;
    this.plotter = plotter;
    this.attributes = attributes;
    this.lexer = lexer;
  }

  /** True after M02. */
  boolean ended() {
    return ended;
  }

  /** Obeys the lexer's block. */
  void word() throws UnreadableFile {
    text = lexer.text;
    pos = lexer.from;
    end = lexer.to;
    line = lexer.line;
    if (pos == end) {
      reading.warnOnce(line, "empty-command", "an empty command");
      return;
    }
    long x = plotter.x();
    long y = plotter.y();
    long i = 0;
    long j = 0;
    boolean coordinates = false;
    int d = -1;
    while (pos < end) {
      byte letter = text[pos++];
      switch (letter) {
        case 'G' -> {
          if (general()) {
            return;
          }
        }
        case 'X' -> {
          x = coordinate();
          coordinates = true;
        }
        case 'Y' -> {
          y = coordinate();
          coordinates = true;
        }
        case 'I' -> i = coordinate();
        case 'J' -> j = coordinate();
        case 'D' -> d = code('D');
        case 'M' -> miscellaneous();
        case 'N' -> {
          integer('N');
          reading.warnOnce(line, "deprecated", "sequence numbers (N) are deprecated");
        }
        case ' ', '\t' -> reading.warnOnce(line, "syntax", "blanks within a command");
        default -> throw wrong();
      }
    }
    operate(d, coordinates, x, y, i, j);
  }

  private UnreadableFile wrong() {
    return reading.fail(line, "syntax", "cannot read the command " + lexer.shown());
  }

  private void operate(int d, boolean coordinates, long x, long y, long i, long j)
      throws UnreadableFile {
    int op = d;
    if (d < 0) {
      if (!coordinates) {
        return;
      }
      if (lastOperation != 1) {
        throw reading.fail(line, "no-operation", "coordinates without D01, D02 or D03");
      }
      reading.warnOnce(line, "deprecated", "a draw without its D01 is deprecated");
      op = 1;
    }
    if (op >= 10) {
      if (coordinates) {
        throw wrong();
      }
      plotter.select(op, line);
      return;
    }
    format.mustBeSet(line);
    switch (op) {
      case 1 -> plotter.draw(x, y, i, j, line);
      case 2 -> plotter.move(x, y);
      case 3 -> plotter.flash(x, y, line);
      default -> throw reading.fail(line, "unknown-command", "there is no operation D0" + op);
    }
    lastOperation = op;
  }

  /** A G code; true when the rest of the block is a comment. */
  private boolean general() throws UnreadableFile {
    int g = code('G');
    switch (g) {
      case 1 -> mode(GerberPlotter.Mode.LINE);
      case 2 -> mode(GerberPlotter.Mode.CLOCKWISE);
      case 3 -> mode(GerberPlotter.Mode.COUNTER_CLOCKWISE);
      case 4 -> {
        comment();
        return true;
      }
      case 36 -> plotter.openRegion(line);
      case 37 -> plotter.closeRegion(line);
      case 74, 75 -> plotter.arcs().quadrants(g == 74);
      case 54, 55 -> deprecated(g);
      case 70, 71 -> {
        deprecated(g);
        format.unit(g == 70, line);
      }
      case 90 -> deprecated(g);
      case 91 ->
          throw reading.fail(line, "incremental", "incremental coordinates (G91) are not read");
      case 0 -> {
        deprecated(g);
        mode(GerberPlotter.Mode.LINE);
      }
      default -> throw reading.fail(line, "unknown-command", "unknown command G" + g);
    }
    return false;
  }

  private void mode(GerberPlotter.Mode mode) {
    plotter.mode(mode);
    if (pos < end) {
      reading.warnOnce(line, "deprecated", "a plot mode and an operation in one command");
    }
  }

  private void deprecated(int g) {
    reading.warnOnce(line, "deprecated", "G" + (g < 10 ? "0" : "") + g + " is deprecated");
  }

  /** Attributes may hide in comments, for the sake of older readers. */
  private void comment() throws UnreadableFile {
    while (pos < end && text[pos] == ' ') {
      pos++;
    }
    if (end - pos > 4 && text[pos] == '#' && text[pos + 1] == '@' && text[pos + 2] == '!') {
      attributes.command(AttributeStore.decode(text, pos + 3, end).strip(), line);
    }
  }

  private void miscellaneous() throws UnreadableFile {
    int m = code('M');
    switch (m) {
      case 2 -> ended = true;
      case 0 -> {
        reading.warnOnce(line, "deprecated", "M00 is deprecated; taken as the end");
        ended = true;
      }
      case 1 -> reading.warnOnce(line, "deprecated", "M01 is deprecated and does nothing");
      default -> throw reading.fail(line, "unknown-command", "unknown command M" + m);
    }
  }

  private int code(char letter) throws UnreadableFile {
    integer(letter);
    if (number < 0 || number > Integer.MAX_VALUE) {
      throw wrong();
    }
    return (int) number;
  }

  private long coordinate() throws UnreadableFile {
    integer('X');
    format.mustBeSet(line);
    return format.steps(number, digits, line);
  }

  private void integer(char letter) throws UnreadableFile {
    boolean negative = false;
    if (pos < end && (text[pos] == '-' || text[pos] == '+')) {
      negative = text[pos++] == '-';
    }
    int start = pos;
    long v = 0;
    while (pos < end && Decimals.digit(text[pos]) && pos - start < MAX_DIGITS) {
      v = v * 10 + (text[pos++] - '0');
    }
    digits = pos - start;
    number = negative ? -v : v;
    boolean point = pos < end && text[pos] == '.';
    if (digits == 0 || point || (pos < end && Decimals.digit(text[pos]))) {
      String what = point ? "a decimal point in " : "no number after " + letter + " in ";
      throw reading.fail(line, "syntax", what + lexer.shown());
    }
  }
}
