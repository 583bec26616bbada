package etchloom.proof.read;

import etchloom.geometry.Point;
import java.math.BigDecimal;
import java.math.RoundingMode;

/** Numbers in messages: at most six decimals, no exponent, whatever the locale. */
final class Shown {
  private Shown() {}

  static String mm(double v) {
    BigDecimal d = BigDecimal.valueOf(v).setScale(6, RoundingMode.HALF_UP).stripTrailingZeros();
    return d.signum() == 0 ? "0" : d.toPlainString();
  }

  static String point(Point p) {
    return "(" + mm(p.x()) + ", " + mm(p.y()) + ") mm";
  }
}
