package etchloom.proof.read;

import etchloom.geometry.Point;
import java.math.BigDecimal;
import java.math.RoundingMode;

/** What messages show: numbers with at most six decimals, no exponent, whatever the locale. */
final class Shown {
  private Shown() {}

  /** Longer messages are cut: what a file holds may be megabytes long. */
  private static final int LONGEST = 300;

  /** A message that may hold foreign text: nothing that moves the cursor, and not too long. */
  static String clean(String message) {
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < Math.min(message.length(), LONGEST); i++) {
      char c = message.charAt(i);
      int type = Character.getType(c);
      boolean hidden =
          type == Character.CONTROL
              || type == Character.FORMAT
              || type == Character.LINE_SEPARATOR
              || type == Character.PARAGRAPH_SEPARATOR;
      out.append(hidden ? '?' : c);
    }
    return message.length() > LONGEST ? out + "…" : out.toString();
  }

  static String mm(double v) {
    BigDecimal d = BigDecimal.valueOf(v).setScale(6, RoundingMode.HALF_UP).stripTrailingZeros();
    return d.signum() == 0 ? "0" : d.toPlainString();
  }

  static String point(Point p) {
    return "(" + mm(p.x()) + ", " + mm(p.y()) + ") mm";
  }
}
