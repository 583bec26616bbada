package etchloom.spec;

import etchloom.units.Dimension;
import etchloom.units.Quantity;

/**
 * The values that a key takes.
 *
 * @param minimum smallest, in the dimension's base unit
 * @param maximum largest, in the base unit
 * @param text for messages, in the units in which the range was written
 */
record Range(double minimum, double maximum, String text) {
  /** Both ends are allowed. */
  static Range of(Dimension dimension, String minimum, String maximum) {
    String text = minimum + " to " + maximum;
    return new Range(value(minimum, dimension), value(maximum, dimension), text);
  }

  /** The same range in other words. */
  Range named(String words) {
    return new Range(minimum, maximum, words);
  }

  boolean holds(double value) {
    return value >= minimum && value <= maximum;
  }

  private static double value(String text, Dimension dimension) {
    Quantity q = Quantity.read(text, dimension);
    if (!q.ok()) {
      throw new IllegalArgumentException("limit '" + text + "' is no " + dimension);
    }
    return q.value();
  }
}
