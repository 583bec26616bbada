package etchloom.proof.read;

/** One record of a netlist, its columns counted from 1 as the standard does. */
final class Card {
  private final String text;

  Card(String text) {
    this.text = text;
  }

  /** Columns {@code first} to {@code last}, as far as the record goes, blanks cut off. */
  String columns(int first, int last) {
    return raw(first, last).strip();
  }

  String raw(int first, int last) {
    int from = Math.min(first - 1, text.length());
    return text.substring(from, Math.max(from, Math.min(last, text.length())));
  }

  char column(int at) {
    return at <= text.length() ? text.charAt(at - 1) : ' ';
  }

  String rest(int first) {
    return raw(first, Integer.MAX_VALUE);
  }

  int length() {
    return text.length();
  }

  /** The digits as a number, a sign before them or a blank for plus; -1 when they are none. */
  static long digits(String s) {
    long v = 0;
    for (int i = 0; i < s.length(); i++) {
      if (!Decimals.digit(s.charAt(i)) || s.length() > 12) {
        return -1;
      }
      v = 10 * v + s.charAt(i) - '0';
    }
    return s.isEmpty() ? -1 : v;
  }
}
