package etchloom.spec;

import etchloom.units.Dimension;
import etchloom.units.Quantity;

/**
 * The values that a key takes.
 *
 * @param minimum smallest, in the dimension's base unit
 * @param open whether the minimum itself is left out
 * @param maximum largest, in the base unit
 * @param text for messages, in the units in which the range was written
 */
record Range(double minimum, boolean open, double maximum, String text) {
  /** Both ends allowed. */
  static Range of(Dimension dimension, String minimum, String maximum) {
    String text = minimum + " to " + maximum;
    return new Range(value(minimum, dimension), false, value(maximum, dimension), text);
  }

  /** More than the minimum, up to the maximum. */
  static Range above(Dimension dimension, String minimum, String maximum) {
    String text = "more than " + minimum + ", at most " + maximum;
    return new Range(value(minimum, dimension), true, value(maximum, dimension), text);
  }

  boolean holds(double value) {
    return (open ? value > minimum : value >= minimum) && value <= maximum;
  }

  private static double value(String text, Dimension dimension) {
    Quantity q = Quantity.read(text, dimension);
    if (!q.ok()) {
      throw new IllegalArgumentException("limit '" + text + "' is no " + dimension);
    }
    return q.value();
  }
}
