package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.units.Quantity;
import java.math.BigDecimal;
import java.util.List;

/** Reads {@code KEY=LOW..HIGH}; two whole numbers without a unit mean whole numbers only. */
public final class SpanReader {
  private static final String HINT = "coil.track=0.15mm..0.4mm or coil.turns=5..20";
  private static final int LONGEST = 30;

  private SpanReader() {}

  public static Staged<Span> read(String text) {
    int equals = text.indexOf('=');
    int dots = text.indexOf("..", equals);
    if (equals < 1 || dots < 0) {
      return failed(text, "a key and its range are wanted");
    }
    String low = text.substring(equals + 1, dots).strip();
    String high = text.substring(dots + 2).strip();
    int lowEnd = Quantity.numberEnd(low, 0);
    int highEnd = Quantity.numberEnd(high, 0);
    boolean numbers = lowEnd > 0 && highEnd > 0 && lowEnd < LONGEST && highEnd < LONGEST;
    if (!numbers || !small(low.substring(0, lowEnd)) || !small(high.substring(0, highEnd))) {
      return failed(text, "both ends of the range must be numbers");
    }
    String lowUnit = unit(low);
    String unit = unit(high);
    if (!lowUnit.isEmpty() && !lowUnit.equals(unit)) {
      return failed(text, "both ends need the same unit, found " + lowUnit + " and " + unit);
    }
    BigDecimal from = new BigDecimal(low.substring(0, lowEnd));
    BigDecimal to = new BigDecimal(high.substring(0, highEnd));
    if (from.compareTo(to) >= 0) {
      return failed(text, "a range goes from a lower to a higher value");
    }
    boolean whole = unit.isEmpty() && whole(from) && whole(to);
    return Staged.of(new Span(text.substring(0, equals).strip(), from, to, unit, whole));
  }

  private static String unit(String text) {
    String spaced = Quantity.spaced(text);
    return spaced.substring(Quantity.numberEnd(spaced, 0)).strip();
  }

  /** Exponents so large that the number could not be written out are none. */
  private static boolean small(String number) {
    double size = Math.abs(Double.parseDouble(number));
    return size < 1e12 && (size == 0 || size > 1e-12);
  }

  private static boolean whole(BigDecimal value) {
    return value.stripTrailingZeros().scale() <= 0;
  }

  private static Staged<Span> failed(String text, String message) {
    return Staged.failed(
        List.of(Diagnostic.error("range", SourceSpan.ofFile(text), "", message, HINT)));
  }
}
