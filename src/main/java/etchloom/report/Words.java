package etchloom.report;

import java.util.Locale;

/** Small turns of phrase. */
final class Words {
  private Words() {}

  static String capital(String s) {
    return s.isEmpty() ? s : s.substring(0, 1).toUpperCase(Locale.ROOT) + s.substring(1);
  }

  /** {@code 1 turn}, {@code 2 turns}. */
  static String count(long n, String word) {
    return n + " " + word + (n == 1 ? "" : "s");
  }
}
