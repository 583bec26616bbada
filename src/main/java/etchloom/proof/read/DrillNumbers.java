package etchloom.proof.read;

import java.nio.charset.StandardCharsets;
import java.util.Locale;

/** Unit and number format of an NC drill file. */
final class DrillNumbers {
  private static final double INCH_MM = 25.4;

  private final Reading reading;
  private double unitMm;
  private boolean leadingKept;
  private boolean zerosSaid;
  private int integers;
  private int decimals;
  private boolean digitsSaid;

  DrillNumbers(Reading reading) {
    this.reading = reading;
  }

  /** Obeys {@code METRIC}, {@code INCH,LZ}, {@code METRIC,TZ,000.00}. */
  void unit(String text, int line) throws UnreadableFile {
    String[] parts = text.toUpperCase(Locale.ROOT).split(",");
    set(parts[0].equals("INCH"), line);
    for (int i = 1; i < parts.length; i++) {
      String p = parts[i].strip();
      if (p.equals("LZ") || p.equals("TZ")) {
        zeros(p.equals("LZ"), line);
      } else if (p.matches("0{1,6}\\.0{1,6}")) {
        int point = p.indexOf('.');
        digits(point, p.length() - point - 1);
      } else {
        throw reading.fail(line, "drill-format", "cannot read the unit line '" + text + "'");
      }
    }
  }

  void set(boolean inch, int line) throws UnreadableFile {
    double mm = inch ? INCH_MM : 1;
    if (unitMm != 0 && unitMm != mm) {
      throw reading.fail(line, "unit", "the unit changes within the file");
    }
    unitMm = mm;
    if (!digitsSaid) {
      integers = inch ? 2 : 3;
      decimals = inch ? 4 : 3;
    }
  }

  private void zeros(boolean lz, int line) {
    leadingKept = lz;
    zerosSaid = true;
    reading.warnOnce(
        line, "drill-format", "zero suppression is not part of the exchange format (XNC)");
  }

  /** Obeys the customary comments on the number format: {@code FILE_FORMAT=4:4}. */
  void comment(String text) {
    int at = text.startsWith("FILE_FORMAT=") ? 12 : text.startsWith("FORMAT={") ? 8 : text.length();
    boolean two = text.length() >= at + 3 && text.charAt(at + 1) == ':';
    if (two && place(text.charAt(at)) && place(text.charAt(at + 2))) {
      digits(text.charAt(at) - '0', text.charAt(at + 2) - '0');
    }
  }

  private static boolean place(char c) {
    return c >= '1' && c <= '6';
  }

  /** Integer and decimal places of numbers without a point. */
  private void digits(int ints, int decs) {
    integers = ints;
    decimals = decs;
    digitsSaid = true;
  }

  /**
   * A length in mm.
   *
   * @param b the text of the number is {@code b[from .. to)}
   */
  double mm(byte[] b, int from, int to, int line) throws UnreadableFile {
    if (unitMm == 0) {
      throw reading.fail(line, "unit", "METRIC or INCH is not said before the first number");
    }
    boolean point = false;
    for (int i = from; i < to; i++) {
      point |= b[i] == '.';
    }
    double v = Decimals.parse(b, from, to).orElse(Double.NaN);
    if (!point && !Double.isNaN(v)) {
      v = suppressed(v, b, from, to, line);
    }
    v *= unitMm;
    if (!(Math.abs(v) <= Reading.MAX_MM)) {
      String text = new String(b, from, Math.min(to - from, 40), StandardCharsets.ISO_8859_1);
      throw reading.fail(line, "syntax", "'" + text + "' is no length");
    }
    return v;
  }

  private double suppressed(double digits, byte[] b, int from, int to, int line) {
    if (!zerosSaid) {
      reading.warn(
          line,
          "drill-format",
          "a number without decimal point and no word on zeros; taken as "
              + integers
              + "."
              + decimals
              + " digits, leading zeros left out");
    }
    int count = to - from - (b[from] == '-' || b[from] == '+' ? 1 : 0);
    int scale = leadingKept ? count - integers : decimals;
    return scale >= 0
        ? digits / Decimals.power(Math.min(scale, 18))
        : digits * Decimals.power(Math.min(-scale, 18));
  }
}
