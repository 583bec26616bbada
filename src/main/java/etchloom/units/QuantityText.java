package etchloom.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;

/** Quantities as a file must have them: the shortest text that reads back as the same double. */
public final class QuantityText {
  private QuantityText() {}

  /** Fewer digits than this are always enough for a number that was written by hand. */
  private static final int FIRST_DIGITS = 15;

  /** Any double reads back from this many. */
  private static final int LAST_DIGITS = 17;

  /** Longer numbers are written with an exponent. */
  private static final int LONGEST_PLAIN = 24;

  /** Digits kept while a unit's factor is divided out, well beyond a double's. */
  private static final MathContext WORKING = new MathContext(30, RoundingMode.HALF_EVEN);

  /**
   * A value with its unit, {@code 0.2 mm}. Where no decimal in that unit reads back as exactly this
   * value, as may happen with the factors that hold π, the unit without a factor stands in ({@code
   * rad}, {@code rad/s}; a bare number for a ratio).
   *
   * @param base in the dimension's base unit; finite
   * @param symbol the unit to write
   */
  public static String of(double base, Dimension dimension, String symbol) {
    requireFinite(base);
    Unit unit = unit(dimension, symbol);
    return exact(base, dimension, unit)
        .or(() -> exact(base, dimension, plainUnit(dimension, unit)))
        .orElseThrow(() -> new IllegalStateException(base + " cannot be written in " + symbol));
  }

  /** A number without a unit. */
  public static String bare(double value) {
    requireFinite(value);
    for (int digits = FIRST_DIGITS; digits < LAST_DIGITS; digits++) {
      String text = number(new BigDecimal(value), digits);
      if (Quantity.readBare(text).value() == value) {
        return text;
      }
    }
    return number(new BigDecimal(value), LAST_DIGITS);
  }

  private static Optional<String> exact(double base, Dimension dimension, Unit unit) {
    BigDecimal written =
        new BigDecimal(base)
            .divide(new BigDecimal(unit.scale()), WORKING)
            .subtract(unit.offset())
            .divide(unit.factor(), WORKING);
    for (int digits = FIRST_DIGITS; digits <= LAST_DIGITS; digits++) {
      String number = number(written, digits);
      String text = unit.symbol().isEmpty() ? number : number + " " + unit.symbol();
      if (Quantity.read(text, dimension).value() == base) {
        return Optional.of(text);
      }
    }
    return Optional.empty();
  }

  private static String number(BigDecimal value, int digits) {
    BigDecimal rounded = value.round(new MathContext(digits, RoundingMode.HALF_EVEN));
    if (rounded.signum() == 0) {
      return "0";
    }
    BigDecimal stripped = rounded.stripTrailingZeros();
    String plain = stripped.toPlainString();
    return plain.length() <= LONGEST_PLAIN ? plain : stripped.toString();
  }

  private static Unit unit(Dimension dimension, String symbol) {
    return dimension
        .unit(symbol)
        .orElseThrow(() -> new IllegalArgumentException(symbol + " is no unit of " + dimension));
  }

  private static Unit plainUnit(Dimension dimension, Unit wanted) {
    if (dimension.bareAllowed()) {
      return Unit.exact("", "1");
    }
    if (dimension == Dimension.COPPER) { // an ounce is no millimetre
      return wanted;
    }
    return dimension.units().stream()
        .filter(u -> u.scale() == 1 && u.factor().compareTo(BigDecimal.ONE) == 0)
        .findFirst()
        .orElse(wanted);
  }

  private static void requireFinite(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("a number to write must be finite, got " + value);
    }
  }
}
