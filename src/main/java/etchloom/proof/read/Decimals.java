package etchloom.proof.read;

import java.nio.charset.StandardCharsets;
import java.util.OptionalDouble;

/** Decimal numbers out of bytes, without a string for each. */
final class Decimals {
  private static final double[] POWERS = new double[19];

  static {
    POWERS[0] = 1;
    for (int i = 1; i < POWERS.length; i++) {
      POWERS[i] = POWERS[i - 1] * 10;
    }
  }

  private Decimals() {}

  /** Ten to a power from 0 to 18, exact. */
  static double power(int n) {
    return POWERS[n];
  }

  static boolean digit(int c) {
    return c >= '0' && c <= '9';
  }

  /**
   * The number that fills the whole range: sign, digits, at most one point, no exponent. Rounded to
   * the nearest double; empty when the range holds anything else or more than 40 characters.
   */
  static OptionalDouble parse(byte[] b, int from, int to) {
    int i = from;
    boolean negative = false;
    if (i < to && (b[i] == '-' || b[i] == '+')) {
      negative = b[i] == '-';
      i++;
    }
    long mantissa = 0;
    int digits = 0;
    int point = -1;
    for (int k = i; k < to; k++) {
      if (digit(b[k])) {
        mantissa = digits < 18 ? mantissa * 10 + (b[k] - '0') : mantissa;
        digits++;
      } else if (b[k] == '.' && point < 0) {
        point = k;
      } else {
        return OptionalDouble.empty();
      }
    }
    if (digits == 0 || to - from > 40) {
      return OptionalDouble.empty();
    }
    int decimals = point < 0 ? 0 : to - point - 1;
    double v =
        digits <= 15
            ? mantissa / POWERS[decimals]
            : Math.abs(
                Double.parseDouble(new String(b, from, to - from, StandardCharsets.US_ASCII)));
    return OptionalDouble.of(negative && v != 0 ? -v : v);
  }

  /** As {@link #parse(byte[], int, int)}, an exponent allowed, blanks around it cut off. */
  static OptionalDouble parseFloating(String text) {
    String s = text.strip();
    if (s.isEmpty() || s.length() > 60) {
      return OptionalDouble.empty();
    }
    for (int i = 0; i < s.length(); i++) {
      char c = s.charAt(i);
      if (!digit(c) && c != '.' && c != '-' && c != '+' && c != 'e' && c != 'E') {
        return OptionalDouble.empty();
      }
    }
    try {
      double v = Double.parseDouble(s);
      return Double.isFinite(v) ? OptionalDouble.of(v + 0.0) : OptionalDouble.empty();
    } catch (NumberFormatException e) {
      return OptionalDouble.empty();
    }
  }
}
