package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import etchloom.units.Dimension;
import etchloom.units.Quantity;
import etchloom.units.Unit;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Says in plain words why a quantity could not be read, and how to write it. */
final class QuantityFault {
  private QuantityFault() {}

  static void report(
      Findings findings,
      SourceSpan where,
      String path,
      String key,
      String text,
      Quantity q,
      Dimension dimension,
      Range range) {
    String units = Show.units(dimension.units());
    String wanted = dimension.phrase() + " in " + units + ", " + range.text();
    String example = q.number() + " " + likelyUnit(q, dimension, range);
    String found = Show.found(text) + " was found; ";
    switch (q.fault()) {
      case MISSING_UNIT ->
          findings.error(
              Codes.MISSING_UNIT,
              where,
              path,
              "the unit is missing; write for example `" + example + "` (" + units + ")");
      case SPACING ->
          findings.error(
              Codes.UNIT_SPACE,
              where,
              path,
              found + "exactly one space belongs between number and unit",
              "write `" + line(key, q.number() + " " + q.unit()) + "`");
      case WRONG_UNIT ->
          findings.error(
              Codes.WRONG_UNIT,
              where,
              path,
              found + "this key takes " + wanted,
              meant(q.unit(), dimension)
                  .map(u -> "did you mean `" + line(key, q.number() + " " + u) + "`?")
                  .stream()
                  .toArray(String[]::new));
      case DECIMAL_COMMA ->
          findings.error(
              Codes.NOT_A_NUMBER, where, path, found + "the decimal sign is a point, not a comma");
      case NOT_FINITE ->
          findings.error(
              Codes.NOT_A_NUMBER, where, path, found + "a finite number belongs here: " + wanted);
      default ->
          findings.error(Codes.NOT_A_NUMBER, where, path, found + "this key takes " + wanted);
    }
  }

  /** The first unit that makes the number a value which the key takes. */
  private static String likelyUnit(Quantity q, Dimension dimension, Range range) {
    if (dimension == Dimension.COPPER) { // nobody orders 35 oz
      return Limits.WEIGHT.holds(Quantity.read(q.number() + " oz", dimension).value())
          ? "oz"
          : "um";
    }
    return dimension.units().stream()
        .map(Unit::symbol)
        .filter(u -> range.holds(Quantity.read(q.number() + " " + u, dimension).value()))
        .findFirst()
        .orElse(dimension.units().get(0).symbol());
  }

  private static String line(String key, String value) {
    return key + ": " + value;
  }

  /**
   * The unit that differs only in case, in spaces, in a degree sign or in the sign for ohm; else
   * the nearest.
   */
  private static Optional<String> meant(String unit, Dimension dimension) {
    String plain = plain(unit);
    List<String> symbols = dimension.units().stream().map(Unit::symbol).toList();
    return symbols.stream()
        .filter(symbol -> plain(symbol).equals(plain))
        .findFirst()
        .or(() -> Suggest.nearest(unit, symbols));
  }

  private static String plain(String unit) {
    String s = unit.toLowerCase(Locale.ROOT).replace("\u03c9", "ohm");
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < s.length(); i++) {
      char c = s.charAt(i);
      if (c != ' ' && c != '\u00b0' && c != '.' && c != '*' && c != '\u00b7') {
        out.append(c);
      }
    }
    return out.toString();
  }
}
