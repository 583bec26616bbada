package etchloom.spec;

import etchloom.units.Numbers;
import etchloom.units.Unit;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;

/** Values as messages show them. */
final class Show {
  private Show() {}

  private static final int LONGEST = 48;

  /** What was found, in quotes, cut short where it is long. */
  static String found(String text) {
    return "'" + cut(text).replace("\t", "\\t").replace("\n", "\\n") + "'";
  }

  /** Cut short where it is long. */
  static String cut(String text) {
    int n = text.codePointCount(0, text.length());
    return n <= LONGEST ? text : text.substring(0, text.offsetByCodePoints(0, LONGEST)) + "...";
  }

  /** A length in mm to the nanometre. */
  static String mm(double value) {
    return Numbers.trimmed(value, 6) + " mm";
  }

  static String degrees(double rad) {
    return Numbers.trimmed(Math.toDegrees(rad), 4) + " deg";
  }

  static String celsius(double value) {
    return Numbers.trimmed(value, 2) + " C";
  }

  /** {@code a, b or c}. */
  static String oneOf(Collection<String> words) {
    return list(words, " or ");
  }

  /** {@code a, b and c}. */
  static String allOf(Collection<String> words) {
    return list(words, " and ");
  }

  private static String list(Collection<String> words, String last) {
    List<String> all = new ArrayList<>(words);
    int n = all.size();
    return n < 2
        ? String.join("", all)
        : String.join(", ", all.subList(0, n - 1)) + last + all.get(n - 1);
  }

  /** The units' symbols; the one with a Greek letter looks like its neighbour and is left out. */
  static String units(Collection<Unit> units) {
    return oneOf(units.stream().map(Unit::symbol).filter(s -> !s.startsWith("\u03bc")).toList());
  }
}
