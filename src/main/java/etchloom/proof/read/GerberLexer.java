package etchloom.proof.read;

import java.nio.charset.StandardCharsets;

/**
 * Cuts a Gerber file into blocks: what stands before each {@code *}, and whether it stands between
 * {@code %} signs. Line breaks inside a block are taken out.
 */
final class GerberLexer {
  private final byte[] bytes;
  private final Reading reading;
  private int pos;
  private int lineAtPos = 1;
  private byte[] scratch = new byte[0];
  private boolean open;

  /** The block is {@code text[from .. to)}. */
  byte[] text = new byte[0];

  int from;
  int to;

  /** The line on which the block starts. */
  int line;

  /** True between {@code %} signs. */
  boolean extended;

  /** True for the first block after a {@code %}. */
  boolean first;

  /** Where the command starts in the file, its {@code %} included. */
  int commandStart;

  GerberLexer(byte[] bytes, Reading reading) {
    this.bytes = bytes;
    this.reading = reading;
  }

  /** Steps to the next block; false at the end of the file. */
  boolean next() throws UnreadableFile {
    first = false;
    while (true) {
      skipBlanks();
      if (pos == bytes.length) {
        if (open) {
          throw reading.fail(lineAtPos, "truncated", "the file ends inside a % command");
        }
        return false;
      }
      if (bytes[pos] != '%') {
        break;
      }
      if (!open) {
        commandStart = pos;
      }
      open = !open;
      first = open;
      pos++;
    }
    extended = open;
    if (!open) {
      commandStart = pos;
    }
    block();
    return true;
  }

  /** True when anything but blanks is left. */
  boolean more() {
    skipBlanks();
    return pos < bytes.length;
  }

  private void skipBlanks() {
    while (pos < bytes.length) {
      byte c = bytes[pos];
      if (c == '\n') {
        lineAtPos++;
      } else if (c != '\r' && c != ' ' && c != '\t') {
        return;
      }
      pos++;
    }
  }

  private void block() throws UnreadableFile {
    line = lineAtPos;
    int start = pos;
    int breaks = 0;
    int i = pos;
    while (i < bytes.length && bytes[i] != '*' && bytes[i] != '%') {
      byte c = bytes[i++];
      if (c == '\n') {
        lineAtPos++;
        breaks++;
      } else if (c == '\r') {
        breaks++;
      }
    }
    if (i == bytes.length) {
      throw reading.fail(line, "truncated", "the file ends inside the command " + shown(start, i));
    }
    if (bytes[i] == '%') {
      throw reading.fail(line, "syntax", "no * ends the command " + shown(start, i));
    }
    pos = i + 1;
    if (breaks == 0) {
      text = bytes;
      from = start;
      to = i;
    } else {
      joined(start, i);
    }
  }

  private void joined(int start, int end) {
    if (scratch.length < end - start) {
      scratch = new byte[Math.max(end - start, 2 * scratch.length)];
    }
    int n = 0;
    for (int i = start; i < end; i++) {
      if (bytes[i] != '\n' && bytes[i] != '\r') {
        scratch[n++] = bytes[i];
      }
    }
    text = scratch;
    from = 0;
    to = n;
  }

  /** The block for a message, cut short. */
  String shown() {
    return "'" + printable(text, from, to) + "'";
  }

  private String shown(int start, int end) {
    return "'" + printable(bytes, start, end) + "'";
  }

  static String printable(byte[] b, int from, int to) {
    int end = Math.min(to, from + 41);
    return printable(new String(b, from, end - from, StandardCharsets.ISO_8859_1));
  }

  /** Foreign text for a message: plain characters only, cut short. */
  static String printable(String s) {
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < Math.min(s.length(), 40); i++) {
      char c = s.charAt(i);
      out.append(c >= 32 && c < 127 ? c : '?');
    }
    return s.length() > 40 ? out + "…" : out.toString();
  }
}
