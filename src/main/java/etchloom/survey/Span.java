package etchloom.survey;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * A key of the spec and the range in which its best value is sought.
 *
 * @param low in {@code unit}
 * @param high in {@code unit}, more than {@code low}
 * @param unit empty for a number without one
 * @param whole whether only whole numbers will do
 */
public record Span(String key, BigDecimal low, BigDecimal high, String unit, boolean whole) {
  /** Values are rounded to a decimal step of at most this share of the range. */
  private static final double STEP = 1e-3;

  /**
   * The value at a share of the range, as a spec file has it. Whole numbers have equal stretches.
   *
   * @param share from 0 to 1; beyond is taken as the end
   */
  String value(double share) {
    double x = Math.max(0, Math.min(1, share));
    BigDecimal more = high.subtract(low);
    if (whole) {
      long n = more.longValueExact() + 1;
      long k = Math.min(n - 1, (long) (x * n));
      return low.add(BigDecimal.valueOf(k)).toBigInteger().toString();
    }
    BigDecimal at = low.add(more.multiply(new BigDecimal(x)));
    int decimals = (int) Math.ceil(-Math.log10(more.doubleValue() * STEP));
    BigDecimal rounded = at.setScale(decimals, RoundingMode.HALF_EVEN).max(low).min(high);
    String number = rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    return unit.isEmpty() ? number : number + " " + unit;
  }

  /** The share at which a number lies; beyond 0 to 1 where it is outside. */
  double share(double number) {
    double size = high.subtract(low).doubleValue();
    return whole
        ? (number - low.doubleValue() + 0.5) / (size + 1)
        : (number - low.doubleValue()) / size;
  }

  /** A share so far that the value changes: one for whole numbers, else a part of the range. */
  double move(double part) {
    return whole ? 1 / (high.subtract(low).doubleValue() + 1) : part;
  }

  /** As it was typed. */
  String text() {
    return low.toPlainString() + ".." + high.toPlainString() + unit;
  }
}
