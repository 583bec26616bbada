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
    StringBuilder s = new StringBuilder(24);
    fixed(s, steps, decimals);
    return s.toString();
  }

  /** As {@link #mm(long)}, at the end of a text in the making. */
  static void mm(StringBuilder to, long nm) {
    fixed(to, nm, MM_DECIMALS);
  }

  /** Half of a whole number of nanometres, as mm: a radius from a diameter. */
  static void half(StringBuilder to, long nm) {
    fixed(to, 5 * nm, MM_DECIMALS + 1);
  }

  /** As {@link #ratio}, at the end of a text in the making. */
  static void ratio(StringBuilder to, double value) {
    fixed(to, Math.round(finite(value) * RATIO_STEPS), RATIO_DECIMALS);
  }

  /** As {@link #fixed(long, int)}, at the end of a text in the making. */
  static void fixed(StringBuilder to, long steps, int decimals) {
    long unit = 1;
    for (int i = 0; i < decimals; i++) {
      unit *= 10;
    }
    long size = Math.abs(steps);
    if (steps < 0) {
      to.append('-');
    }
    to.append(size / unit).append('.');
    long rest = size % unit;
    do {
      unit /= 10;
      to.append((char) ('0' + rest / unit));
      rest %= unit;
    } while (rest != 0);
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
