package etchloom.proof.read;

import java.util.OptionalDouble;

/** The group codes of a DXF file and their values, two lines each. */
final class DxfPairs {
  private final Lines lines;
  private final Reading reading;

  /** The group code. */
  int code;

  /** The line of the code, from 1. */
  int line;

  DxfPairs(byte[] bytes, Reading reading) {
    this.lines = new Lines(bytes);
    this.reading = reading;
  }

  /** Steps to the next pair, comments (999) left out; false at the end of the file. */
  boolean next() throws UnreadableFile {
    do {
      if (!lines.next()) {
        return false;
      }
      lines.strip();
      line = lines.line;
      OptionalDouble c = Decimals.parse(lines.bytes(), lines.from, lines.to);
      double v = c.orElse(Double.NaN);
      if (!(v >= -5 && v <= 1071 && v == Math.rint(v))) {
        throw reading.fail(line, "group-code", "a group code is wanted, not " + lines.shown());
      }
      code = (int) v;
      if (!lines.next()) {
        throw reading.fail(line, "truncated", "the file ends after the group code " + code);
      }
    } while (code == 999);
    return true;
  }

  boolean is(String value) {
    lines.strip();
    return lines.is(value);
  }

  String text() {
    return lines.text();
  }

  String shown() {
    return lines.shown();
  }

  /** The value as a number within what is drawn anywhere. */
  double number() throws UnreadableFile {
    lines.strip();
    double v =
        Decimals.parse(lines.bytes(), lines.from, lines.to)
            .orElseGet(() -> Decimals.parseFloating(lines.text()).orElse(Double.NaN));
    if (!(Math.abs(v) <= 1e12)) {
      throw reading.fail(line, "number", "a number is wanted, not " + lines.shown());
    }
    return v;
  }

  /** The value as a whole number. */
  int whole() throws UnreadableFile {
    double v = number();
    if (v != Math.rint(v) || Math.abs(v) > Integer.MAX_VALUE) {
      throw reading.fail(line, "number", "a whole number is wanted, not " + lines.shown());
    }
    return (int) v;
  }
}
