package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.units.Quantity;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * Reads {@code KEY=VALUES}: a list {@code 0.15mm,0.2mm} or {@code star,delta}, whole numbers {@code
 * 4..13}, a range in equal steps {@code 0.15mm..0.3mm/5} with both ends, or several of these with
 * commas between.
 */
public final class AxisReader {
  /** Values of one key; a survey of more would not end. */
  static final int MOST = 100_000;

  private static final String DOTS = "..";

  /** Enough that steps of a tenth or a thousandth come out as typed. */
  private static final MathContext DIGITS = new MathContext(12, RoundingMode.HALF_EVEN);

  private final String text;
  private final Set<String> values = new LinkedHashSet<>();

  private AxisReader(String text) {
    this.text = text;
  }

  /** One key with its values; each value once. */
  public static Staged<Axis> read(String text) {
    AxisReader r = new AxisReader(text);
    try {
      return Staged.of(r.axis());
    } catch (Wrong e) {
      return Staged.failed(
          List.of(Diagnostic.error("values", SourceSpan.ofFile(text), "", e.getMessage(), HINT)));
    }
  }

  private static final String HINT =
      "KEY=a,b,c or KEY=4..13 or KEY=0.15mm..0.3mm/5 (five steps, both ends included)";

  /** Ends the reading; never leaves this class. */
  private static final class Wrong extends Exception {
    private static final long serialVersionUID = 1L;

    Wrong(String message) {
      super(message, null, false, false);
    }
  }

  private Axis axis() throws Wrong {
    int at = text.indexOf('=');
    String key = at < 0 ? "" : text.substring(0, at).strip();
    if (key.isEmpty()) {
      throw new Wrong("a key and its values are wanted");
    }
    for (String item : text.substring(at + 1).split(",", -1)) {
      add(item.strip());
    }
    return new Axis(key, List.copyOf(values));
  }

  private void add(String item) throws Wrong {
    if (item.isEmpty()) {
      throw new Wrong("a value is missing");
    }
    int dots = item.indexOf(DOTS);
    if (dots > 0 && Quantity.numberEnd(item.substring(0, dots), 0) > 0) {
      range(item.substring(0, dots).strip(), item.substring(dots + DOTS.length()).strip());
    } else {
      put(Quantity.spaced(item));
    }
  }

  private void put(String value) throws Wrong {
    if (values.size() >= MOST) {
      throw new Wrong("there are more than " + MOST + " values");
    }
    if (!values.add(value)) {
      throw new Wrong("the value " + value + " is there twice");
    }
  }

  private void range(String low, String rest) throws Wrong {
    int slash = rest.lastIndexOf('/');
    boolean unit = slash > 0 && rest.startsWith("m2K", slash + 1); // W/m2K has a slash of its own
    Bound lo = bound(low);
    Bound hi = bound(slash < 0 || unit ? rest : rest.substring(0, slash).strip());
    String symbol = hi.unit();
    if (!lo.unit().isEmpty() && !lo.unit().equals(symbol)) {
      throw new Wrong("both ends need the same unit, found " + lo.unit() + " and " + symbol);
    }
    if (lo.value().compareTo(hi.value()) >= 0) {
      throw new Wrong("a range goes from a lower to a higher value");
    }
    if (slash >= 0 && !unit) {
      steps(lo.value(), hi.value(), count(rest.substring(slash + 1).strip()), symbol);
    } else if (symbol.isEmpty() && whole(lo.value()) && whole(hi.value())) {
      BigDecimal more = hi.value().subtract(lo.value());
      if (more.compareTo(BigDecimal.valueOf(MOST)) >= 0) {
        throw new Wrong("there are more than " + MOST + " values");
      }
      steps(lo.value(), hi.value(), more.intValueExact(), symbol);
    } else {
      throw new Wrong("a range of other than whole numbers needs its steps, as in .../5");
    }
  }

  private void steps(BigDecimal lo, BigDecimal hi, int n, String unit) throws Wrong {
    BigDecimal more = hi.subtract(lo);
    for (int k = 0; k <= n; k++) {
      BigDecimal part = more.multiply(BigDecimal.valueOf(k)).divide(BigDecimal.valueOf(n), DIGITS);
      BigDecimal value = lo.add(part).round(DIGITS);
      String number = value.signum() == 0 ? "0" : value.stripTrailingZeros().toPlainString();
      put(unit.isEmpty() ? number : number + " " + unit);
    }
  }

  private int count(String digits) throws Wrong {
    boolean number = !digits.isEmpty() && digits.chars().allMatch(c -> c >= '0' && c <= '9');
    if (!number || digits.length() > 6 || digits.equals("0") || Integer.parseInt(digits) >= MOST) {
      throw new Wrong("the number of steps after the stroke is 1 to " + (MOST - 1));
    }
    return Integer.parseInt(digits);
  }

  private record Bound(BigDecimal value, String unit) {}

  private static Bound bound(String text) throws Wrong {
    int end = Quantity.numberEnd(text, 0);
    if (end == 0 || end > 40) {
      throw new Wrong("'" + text + "' is no end of a range");
    }
    BigDecimal value = new BigDecimal(text.substring(0, end));
    if (Math.abs((long) value.scale() - value.precision()) > 30) {
      throw new Wrong("'" + text + "' is no end of a range");
    }
    String spaced = Quantity.spaced(text);
    return new Bound(value, spaced.substring(Quantity.numberEnd(spaced, 0)).strip());
  }

  private static boolean whole(BigDecimal value) {
    return value.stripTrailingZeros().scale() <= 0;
  }
}
