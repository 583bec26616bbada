package etchloom.write;

import etchloom.geometry.Grid;

/**
 * Numbers as text, printed from whole steps: no locale, no exponent, no {@code -0}, a point and at
 * least one decimal.
 */
final class Numbers {
  private static final int MM_DECIMALS = 6;
  private static final int RATIO_DECIMALS = 12;
  private static final double RATIO_STEPS = 1e12;

  private Numbers() {}

  /** Millimetres from nanometres: {@code 12.5}, {@code -0.000001}, {@code 3.0}. */
  static String mm(long nm) {
    return fixed(nm, MM_DECIMALS);
  }

  /** A size in mm, rounded to the nanometre. */
  static String mm(double mm) {
    return mm(Grid.nm(finite(mm)));
  }

  /** A pure number to 12 decimals. */
  static String ratio(double value) {
    return fixed(Math.round(finite(value) * RATIO_STEPS), RATIO_DECIMALS);
  }

  /** Whole micrometres from nanometres, halves away from zero. */
  static long micrometres(long nm) {
    long half = (Math.abs(nm) + 500) / 1000;
    return nm < 0 ? -half : half;
  }

  /** A whole number of {@code 10^-decimals} steps, end zeros left out but one. */
  static String fixed(long steps, int decimals) {
    String digits = Long.toString(Math.abs(steps));
    StringBuilder s = new StringBuilder(digits.length() + decimals + 3);
    if (steps < 0) {
      s.append('-');
    }
    int whole = digits.length() - decimals;
    if (whole > 0) {
      s.append(digits, 0, whole).append('.').append(digits, whole, digits.length());
    } else {
      s.append("0.").append("0".repeat(-whole)).append(digits);
    }
    int end = s.length();
    while (s.charAt(end - 1) == '0' && s.charAt(end - 2) != '.') {
      end--;
    }
    s.setLength(end);
    return s.toString();
  }

  /** A whole number with leading zeros. */
  static String padded(long value, int digits) {
    String s = Long.toString(value);
    return "0".repeat(Math.max(0, digits - s.length())) + s;
  }

  private static double finite(double v) {
    if (!Double.isFinite(v)) {
      throw new IllegalArgumentException("not a finite number: " + v);
    }
    return v;
  }
}
