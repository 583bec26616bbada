package etchloom.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Numbers as text, the same on every machine: no locale, no exponent, no negative zero, always a
 * point. The binary value itself is rounded, half to even, so that no Java version's own shortest
 * text shines through. All methods refuse NaN and infinities.
 */
public final class Numbers {
  private Numbers() {}

  /** Beyond this many significant digits a double has nothing more to say. */
  private static final MathContext ALL_DIGITS = new MathContext(15, RoundingMode.HALF_EVEN);

  private static final String[] PREFIXES = {"p", "n", "u", "m", "", "k", "M", "G"};
  private static final int NO_PREFIX = 4;

  /** With exactly so many decimals: {@code fixed(2, 3)} is {@code 2.000}. */
  public static String fixed(double value, int decimals) {
    return text(exact(value).setScale(decimals, RoundingMode.HALF_EVEN));
  }

  /** With at most so many decimals, trailing zeros left out: {@code trimmed(0.2, 4)} is 0.2. */
  public static String trimmed(double value, int decimals) {
    return stripped(exact(value).setScale(decimals, RoundingMode.HALF_EVEN));
  }

  /**
   * With exactly so many significant digits, digits before the point never dropped but zeroed:
   * {@code significant(1234.5, 3)} is 1230, {@code significant(0.02, 3)} is 0.0200.
   */
  public static String significant(double value, int digits) {
    BigDecimal b = exact(value);
    if (b.signum() == 0) {
      return text(BigDecimal.ZERO.setScale(Math.max(0, digits - 1)));
    }
    BigDecimal rounded = b.round(new MathContext(digits, RoundingMode.HALF_EVEN));
    int scale = Math.max(0, digits - (rounded.precision() - rounded.scale()));
    return text(rounded.setScale(scale, RoundingMode.HALF_EVEN));
  }

  /** All that a double knows, to 15 significant digits, trailing zeros left out. */
  public static String plain(double value) {
    return stripped(exact(value).round(ALL_DIGITS));
  }

  /** The number nearest to it that has so many significant digits; zero stays zero. */
  public static double rounded(double value, int digits) {
    return exact(value).round(new MathContext(digits, RoundingMode.HALF_EVEN)).doubleValue();
  }

  /**
   * With the prefix that brings it between 1 and 1000, a space and the unit: {@code
   * engineering(4e-4, "H", 3)} is {@code 400 uH}. Prefixes p to G; beyond them the number grows or
   * shrinks. Micro is written {@code u}, as the spec does.
   */
  public static String engineering(double value, String unit, int digits) {
    BigDecimal b = exact(value);
    if (b.signum() == 0) {
      return significant(0, digits) + " " + unit;
    }
    BigDecimal rounded = b.round(new MathContext(digits, RoundingMode.HALF_EVEN));
    int exponent = rounded.precision() - rounded.scale() - 1;
    int step = Math.floorDiv(exponent, 3);
    step = Math.max(-NO_PREFIX, Math.min(PREFIXES.length - 1 - NO_PREFIX, step));
    BigDecimal mantissa = rounded.movePointLeft(3 * step);
    int scale = Math.max(0, digits - (mantissa.precision() - mantissa.scale()));
    return text(mantissa.setScale(scale, RoundingMode.HALF_EVEN))
        + " "
        + PREFIXES[step + NO_PREFIX]
        + unit;
  }

  /**
   * In one chosen unit with fixed decimals: {@code scaled(4e-4, 1e-3, "mH", 2)} is {@code 0.40 mH}.
   *
   * @param one what one of the unit is worth, in the value's own unit; positive
   */
  public static String scaled(double value, double one, String unit, int decimals) {
    return fixed(value / one, decimals) + " " + unit;
  }

  private static BigDecimal exact(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("a number to write must be finite, got " + value);
    }
    return new BigDecimal(value);
  }

  private static String stripped(BigDecimal b) {
    return b.signum() == 0 ? "0" : text(b.stripTrailingZeros());
  }

  /** BigDecimal has no negative zero, so neither has the text. */
  private static String text(BigDecimal b) {
    return b.toPlainString();
  }
}
