package etchloom.units;

import java.math.BigDecimal;

/**
 * A unit as it is written, and the way from it to its dimension's base unit: {@code base = (value ·
 * factor + offset) · scale}. Factor and offset are exact decimals, so that 35 um is the double
 * nearest to 0.035 mm and not a rounding error beside it; {@code scale} holds what no decimal can,
 * the factors with π.
 *
 * @param symbol as written after the number
 */
public record Unit(String symbol, BigDecimal factor, BigDecimal offset, double scale) {
  static Unit exact(String symbol, String factor) {
    return new Unit(symbol, new BigDecimal(factor), BigDecimal.ZERO, 1);
  }

  static Unit shifted(String symbol, String offset) {
    return new Unit(symbol, BigDecimal.ONE, new BigDecimal(offset), 1);
  }

  static Unit scaled(String symbol, double scale) {
    return new Unit(symbol, BigDecimal.ONE, BigDecimal.ZERO, scale);
  }

  /** The value in the base unit; may be infinite where the text holds a number beyond a double. */
  double toBase(BigDecimal value) {
    double exact = value.multiply(factor).add(offset).doubleValue();
    return scale == 1 ? exact : exact * scale;
  }
}
