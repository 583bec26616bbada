package etchloom.units;

import java.math.BigDecimal;

/**
 * A number with its unit as read from text such as {@code 0.2 mm}, or the reason why it could not
 * be read.
 *
 * @param value in the dimension's base unit (mm, rad, rad/s, SI, C); NaN exactly when there is a
 *     fault
 * @param fault what is wrong, {@link Fault#NONE} if nothing
 * @param number the number as written, empty if there is none
 * @param unit the unit as written, empty if there is none
 */
public record Quantity(double value, Fault fault, String number, String unit) {

  /** What can be wrong with a quantity's text. */
  public enum Fault {
    NONE,
    /** Does not begin with a number. */
    NOT_A_NUMBER,
    /** A number written as infinity or NaN, or beyond what can be held. */
    NOT_FINITE,
    /** A comma where the decimal point belongs. */
    DECIMAL_COMMA,
    MISSING_UNIT,
    WRONG_UNIT,
    /** Number and unit are right, but not parted by exactly one space. */
    SPACING
  }

  /** Longer numbers than this are refused unread: nobody means them, and big decimals cost time. */
  static final int MAX_NUMBER_LENGTH = 40;

  /**
   * Beyond this a number of {@link #MAX_NUMBER_LENGTH} digits is nought or infinite as a double,
   * and a big decimal would spend its time on zeros.
   */
  private static final int MAX_EXPONENT = 400;

  public boolean ok() {
    return fault == Fault.NONE;
  }

  /** Reads a quantity as a file must have it: exactly one space between number and unit. */
  public static Quantity read(String text, Dimension dimension) {
    int end = numberEnd(text, 0);
    if (end == 0) {
      return failed(Fault.NOT_A_NUMBER, "", "", text);
    }
    String number = text.substring(0, end);
    String rest = text.substring(end);
    String unit = collapse(rest);
    if (unit.startsWith(",") && unit.length() > 1 && isDigit(unit.charAt(1))) {
      return new Quantity(Double.NaN, Fault.DECIMAL_COMMA, number, "");
    }
    if (number.length() > MAX_NUMBER_LENGTH) {
      return new Quantity(Double.NaN, Fault.NOT_FINITE, number, unit);
    }
    if (unit.isEmpty()) {
      return dimension.bareAllowed()
          ? of(number, Unit.exact("", "1"))
          : new Quantity(Double.NaN, Fault.MISSING_UNIT, number, "");
    }
    return dimension
        .unit(unit)
        .map(u -> rest.equals(" " + u.symbol()) ? of(number, u) : spacing(number, u))
        .orElseGet(() -> new Quantity(Double.NaN, Fault.WRONG_UNIT, number, unit));
  }

  /** Reads a bare number, as for a density or an etch factor. */
  public static Quantity readBare(String text) {
    int end = numberEnd(text, 0);
    if (end == 0) {
      return failed(Fault.NOT_A_NUMBER, "", "", text);
    }
    String number = text.substring(0, end);
    String rest = text.substring(end);
    if (rest.startsWith(",")) {
      return new Quantity(Double.NaN, Fault.DECIMAL_COMMA, number, "");
    }
    if (!rest.isEmpty()) {
      return new Quantity(Double.NaN, Fault.WRONG_UNIT, number, collapse(rest));
    }
    if (number.length() > MAX_NUMBER_LENGTH) {
      return new Quantity(Double.NaN, Fault.NOT_FINITE, number, "");
    }
    return of(number, Unit.exact("", "1"));
  }

  /**
   * Puts the one space between a number and the known unit that follows it, as {@link #read} wants
   * it; for values from a command line, where {@code 0.2mm} is allowed. Any other text comes back
   * as it is.
   */
  public static String spaced(String text) {
    int end = numberEnd(text, 0);
    if (end == 0) {
      return text;
    }
    String unit = collapse(text.substring(end));
    return Dimension.anyHas(unit) ? text.substring(0, end) + " " + unit : text;
  }

  /**
   * Where a number ends that starts at {@code from}: an optional sign, digits with an optional
   * point, an optional exponent (YAML 1.2 core schema, section 10.3.2). Gives {@code from} where no
   * number starts there.
   */
  public static int numberEnd(String text, int from) {
    int i = from;
    if (i < text.length() && (text.charAt(i) == '-' || text.charAt(i) == '+')) {
      i++;
    }
    int whole = digitsEnd(text, i);
    int end = whole;
    int digits = whole - i;
    if (whole < text.length() && text.charAt(whole) == '.') {
      int fraction = digitsEnd(text, whole + 1);
      digits += fraction - whole - 1;
      end = fraction;
    }
    if (digits == 0) {
      return from;
    }
    return exponentEnd(text, end);
  }

  private static int exponentEnd(String text, int end) {
    if (end < text.length() && (text.charAt(end) == 'e' || text.charAt(end) == 'E')) {
      int i = end + 1;
      if (i < text.length() && (text.charAt(i) == '-' || text.charAt(i) == '+')) {
        i++;
      }
      int stop = digitsEnd(text, i);
      return stop > i ? stop : end;
    }
    return end;
  }

  private static int digitsEnd(String text, int from) {
    int i = from;
    while (i < text.length() && isDigit(text.charAt(i))) {
      i++;
    }
    return i;
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }

  private static Quantity of(String number, Unit unit) {
    double value = unit.toBase(decimal(number));
    return Double.isFinite(value)
        ? new Quantity(value + 0.0, Fault.NONE, number, unit.symbol()) // + 0.0: no negative zero
        : new Quantity(Double.NaN, Fault.NOT_FINITE, number, unit.symbol());
  }

  /** Nought for what is far below any double, infinity's stand-in for what is far above. */
  private static BigDecimal decimal(String number) {
    int e = Math.max(number.indexOf('e'), number.indexOf('E'));
    if (e < 0) {
      return new BigDecimal(number);
    }
    String mantissa = number.substring(0, e);
    BigDecimal digits = new BigDecimal(mantissa);
    String exponent = number.substring(e + 1);
    boolean down = exponent.startsWith("-");
    int value = exponent(exponent);
    if (digits.signum() == 0 || (down && value > MAX_EXPONENT)) {
      return BigDecimal.ZERO;
    }
    return digits.scaleByPowerOfTen(down ? -value : Math.min(value, MAX_EXPONENT));
  }

  /** The digits' value without the sign; beyond {@link #MAX_EXPONENT} one more than that. */
  private static int exponent(String text) {
    int value = 0;
    for (int i = 0; i < text.length(); i++) {
      if (isDigit(text.charAt(i))) {
        value = Math.min(MAX_EXPONENT + 1, value * 10 + text.charAt(i) - '0');
      }
    }
    return value;
  }

  private static Quantity spacing(String number, Unit unit) {
    return new Quantity(Double.NaN, Fault.SPACING, number, unit.symbol());
  }

  private static Quantity failed(Fault fault, String number, String unit, String text) {
    return new Quantity(Double.NaN, namesInfinity(text) ? Fault.NOT_FINITE : fault, number, unit);
  }

  /** White space at the ends gone, inner runs as one space; a hard space counts as white space. */
  private static String collapse(String unit) {
    StringBuilder s = new StringBuilder();
    for (int i = 0; i < unit.length(); i++) {
      char c = unit.charAt(i);
      boolean space = Character.isWhitespace(c) || Character.isSpaceChar(c);
      if (!space) {
        s.append(c);
      } else if (!s.isEmpty() && s.charAt(s.length() - 1) != ' ') {
        s.append(' ');
      }
    }
    return s.toString().strip();
  }

  private static boolean namesInfinity(String text) {
    int i = 0;
    while (i < text.length() && "+-.".indexOf(text.charAt(i)) >= 0) {
      i++;
    }
    return text.regionMatches(true, i, "nan", 0, 3) || text.regionMatches(true, i, "inf", 0, 3);
  }
}
