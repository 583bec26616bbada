package etchloom.report;

import java.util.Locale;

/** Small turns of phrase. */
final class Words {
  private Words() {}

  static String capital(String s) {
    return s.isEmpty() ? s : s.substring(0, 1).toUpperCase(Locale.ROOT) + s.substring(1);
  }

  /** Units as they are set in print, where a terminal has plain letters. */
  static String symbols(String value) {
    String shown = value.endsWith(" C") ? value.replace(" C", " \u00b0C") : value;
    return shown
        .replace(" ohm", " \u03a9")
        .replace(" mohm", " m\u03a9")
        .replace(" uohm", " \u00b5\u03a9")
        .replace(" kohm", " k\u03a9")
        .replace(" um", " \u00b5m")
        .replace(" uH", " \u00b5H")
        .replace(" uA", " \u00b5A")
        .replace(" uN", " \u00b5N")
        .replace(" uV", " \u00b5V")
        .replace(" uW", " \u00b5W")
        .replace(" us", " \u00b5s")
        .replace("sqrt(W)", "\u221aW");
  }

  /** {@code 1 turn}, {@code 2 turns}. */
  static String count(long n, String word) {
    return n + " " + word + (n == 1 ? "" : "s");
  }
}
