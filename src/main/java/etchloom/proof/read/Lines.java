package etchloom.proof.read;

/** Cuts a file into lines, whatever ends them: LF, CR LF or CR. */
final class Lines {
  private final byte[] bytes;
  private int pos;

  /** The line is {@code bytes[from .. to)}, blanks at its ends left out. */
  int from;

  int to;

  /** Its number, from 1. */
  int line;

  Lines(byte[] bytes) {
    this.bytes = bytes;
  }

  byte[] bytes() {
    return bytes;
  }

  boolean next() {
    if (pos >= bytes.length) {
      return false;
    }
    int i = pos;
    while (i < bytes.length && bytes[i] != '\n' && bytes[i] != '\r') {
      i++;
    }
    from = pos;
    to = i;
    boolean pair = i + 1 < bytes.length && bytes[i] == '\r' && bytes[i + 1] == '\n';
    pos = i + (pair ? 2 : 1);
    line++;
    return true;
  }

  /** Leaves out blanks at both ends. */
  void strip() {
    while (to > from && blank(bytes[to - 1])) {
      to--;
    }
    while (from < to && blank(bytes[from])) {
      from++;
    }
  }

  private static boolean blank(byte b) {
    return b == ' ' || b == '\t';
  }

  boolean is(String text) {
    return to - from == text.length() && starts(text);
  }

  boolean starts(String text) {
    if (to - from < text.length()) {
      return false;
    }
    for (int i = 0; i < text.length(); i++) {
      if (bytes[from + i] != text.charAt(i)) {
        return false;
      }
    }
    return true;
  }

  String text() {
    return AttributeStore.decode(bytes, from, to);
  }

  String shown() {
    return "'" + GerberLexer.printable(bytes, from, to) + "'";
  }
}
