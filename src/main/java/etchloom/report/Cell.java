package etchloom.report;

import java.util.OptionalDouble;

/**
 * A cell of a table.
 *
 * @param key of its number in {@code report.json}, empty where it is none
 * @param exact the number itself, for a plot to read
 * @param over key of the number that {@code key}'s is shown as a share of, else empty
 * @param href where a link on it leads, else empty
 */
record Cell(String text, String key, OptionalDouble exact, String over, String href) {
  static Cell of(String text) {
    return new Cell(text, "", OptionalDouble.empty(), "", "");
  }

  static Cell of(String text, String key) {
    return new Cell(text, key, OptionalDouble.empty(), "", "");
  }

  /** A number that a plot reads; an empty one leaves a gap. */
  static Cell exact(String text, String key, OptionalDouble value) {
    return value.isPresent() ? new Cell(text, key, value, "", "") : of(text);
  }

  static Cell exact(String text, String key, double value) {
    return exact(text, key, OptionalDouble.of(value));
  }

  Cell shareOf(String other) {
    return new Cell(text, key, exact, other, href);
  }

  Cell to(String target) {
    return new Cell(text, key, exact, over, target);
  }
}
