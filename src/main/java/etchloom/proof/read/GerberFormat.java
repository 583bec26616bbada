package etchloom.proof.read;

import etchloom.geometry.Point;

/** Unit and coordinate format of a Gerber file: FS and MO, and the deprecated G70 and G71. */
final class GerberFormat {
  private static final double INCH_MM = 25.4;

  private final Reading reading;
  private int integers;
  private int decimals = -1;
  private boolean trailingOmitted;
  private double unitMm;

  GerberFormat(Reading reading) {
    this.reading = reading;
  }

  /** Obeys {@code FSLAX46Y46}. */
  void fs(byte[] b, int from, int to, String shown, int line) throws UnreadableFile {
    int p = from + 2;
    boolean trailing = false;
    boolean notation = false;
    while (p < to && b[p] != 'X') {
      switch (b[p]) {
        case 'L' -> {}
        case 'T' -> trailing = true;
        case 'A' -> notation = true;
        case 'I' ->
            throw reading.fail(line, "incremental", "incremental coordinates (FS…I) are not read");
        case 'N', 'G' -> p++;
        default -> throw wrong(shown, line);
      }
      p++;
    }
    boolean shape = p + 6 <= to && b[p + 3] == 'Y' && b[p + 1] == b[p + 4] && b[p + 2] == b[p + 5];
    if (!shape || !octal(b[p + 1]) || !octal(b[p + 2]) || !notation) {
      throw wrong(shown, line);
    }
    set(b[p + 1] - '0', b[p + 2] - '0', trailing, line);
  }

  private static boolean octal(byte c) {
    return c >= '0' && c <= '7';
  }

  private UnreadableFile wrong(String shown, int line) {
    return reading.fail(
        line, "format", "cannot read the coordinate format " + shown + ", wanted FSLAX46Y46");
  }

  private void set(int ints, int decs, boolean trailing, int line) throws UnreadableFile {
    boolean same = ints == integers && decs == decimals && trailing == trailingOmitted;
    if (decimals >= 0 && !same) {
      throw reading.fail(line, "format", "the coordinate format is set twice, differently");
    }
    if (decimals >= 0) {
      reading.warn(line, "format-twice", "the coordinate format is set twice");
    }
    if (decs != 6) {
      reading.warn(
          line, "coordinate-format", "coordinates have " + decs + " decimals, the format wants 6");
    }
    if (trailing) {
      reading.warn(line, "deprecated", "omitting trailing zeros (FST) is deprecated");
    }
    integers = ints;
    decimals = decs;
    trailingOmitted = trailing;
  }

  void unit(boolean inch, int line) throws UnreadableFile {
    double mm = inch ? INCH_MM : 1;
    if (unitMm != 0 && unitMm != mm) {
      throw reading.fail(line, "unit", "the unit changes within the file");
    }
    unitMm = mm;
  }

  /** Length of one unit, mm. */
  double unitMm(int line) throws UnreadableFile {
    if (unitMm == 0) {
      throw reading.fail(line, "unit", "the unit (MO) is not set before it is needed");
    }
    return unitMm;
  }

  void mustBeSet(int line) throws UnreadableFile {
    if (decimals < 0) {
      throw reading.fail(
          line, "format", "the coordinate format (FS) is not set before it is needed");
    }
    unitMm(line);
  }

  /** The smallest step, mm. */
  double stepMm() {
    return unitMm / Decimals.power(decimals);
  }

  /**
   * A coordinate from its digits.
   *
   * @param value the digits as an integer
   * @param digits how many there are, for formats that omit trailing zeros
   */
  long steps(long value, int digits, int line) throws UnreadableFile {
    long v = value;
    if (trailingOmitted) {
      for (int i = digits; i < integers + decimals; i++) {
        v *= 10;
      }
    } else if (digits > integers + decimals && Math.abs(v) >= Decimals.power(integers + decimals)) {
      reading.warnOnce(
          line, "coordinate-digits", "a coordinate has more digits than the format allows");
    }
    if (!(Math.abs(v) * stepMm() <= Reading.MAX_MM)) {
      throw reading.fail(line, "coordinate-range", "a coordinate is beyond 1 km");
    }
    return v;
  }

  double mm(long steps) {
    double v = unitMm == INCH_MM ? steps * INCH_MM : steps;
    return v / Decimals.power(decimals);
  }

  Point point(long x, long y) {
    return new Point(mm(x), mm(y));
  }
}
