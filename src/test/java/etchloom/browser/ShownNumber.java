package etchloom.browser;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A number as a person reads it, with its prefix and to its last digit.
 *
 * @param value in the unit without a prefix
 * @param half of its last digit
 */
record ShownNumber(double value, double half, String unit) {
  private static final Pattern FORM = Pattern.compile("(-?)([0-9]+)(?:\\.([0-9]+))? ?(.*)");
  private static final Pattern WORDS = Pattern.compile("^(at most |at least |at |Coil )");
  private static final String PREFIXES = "pn\u00b5mkMG";
  private static final double[] POWERS = {1e-12, 1e-9, 1e-6, 1e-3, 1e3, 1e6, 1e9};

  private static final List<String> UNITS =
      List.of(
          "",
          "%",
          "\u00b0",
          "\u00b0C",
          "rpm",
          "rpm/V",
          "mm",
          "mm\u00b2",
          "\u03a9",
          "H",
          "Wb",
          "V",
          "V s/rad",
          "A",
          "W",
          "N",
          "N m",
          "N m/A",
          "N m/\u221aW",
          "Hz",
          "s",
          "Pa",
          "V/A",
          "V/(A s)",
          "m");

  /**
   * @throws IllegalArgumentException if it is none, or of an unknown unit
   */
  static ShownNumber of(String text) {
    Matcher m = FORM.matcher(WORDS.matcher(text).replaceFirst(""));
    if (!m.matches()) {
      throw new IllegalArgumentException("no number: " + text);
    }
    double power = 1;
    String unit = m.group(4);
    if (!UNITS.contains(unit)) {
      int i = PREFIXES.indexOf(unit.charAt(0));
      unit = unit.substring(1);
      if (i < 0 || !UNITS.contains(unit)) {
        throw new IllegalArgumentException("unknown unit: " + text);
      }
      power = POWERS[i];
    }
    if (unit.equals("m")) {
      // Lengths are in mm throughout.
      unit = "mm";
      power *= 1000;
    }
    String fraction = m.group(3) == null ? "" : m.group(3);
    double number = Double.parseDouble(m.group(2) + "." + (fraction.isEmpty() ? "0" : fraction));
    double last = Math.pow(10, -fraction.length());
    if (fraction.isEmpty()) {
      // 265300 may stand for 265319: noughts at the end of four digits or more are not told.
      for (String s = m.group(2); s.length() > 4 && s.endsWith("0"); last *= 10) {
        s = s.substring(0, s.length() - 1);
      }
    }
    return new ShownNumber(
        (m.group(1).isEmpty() ? 1 : -1) * number * power, last * power / 2, unit);
  }

  boolean shows(double exact) {
    return Math.abs(value - exact) <= half * (1 + 1e-6) + 1e-12 * Math.abs(exact);
  }
}
