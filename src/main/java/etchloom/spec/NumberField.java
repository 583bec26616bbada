package etchloom.spec;

import java.util.OptionalDouble;

/**
 * A number key as found.
 *
 * @param value NaN where the key is absent or faulty
 * @param wanted what it takes, for the message when it is missing
 */
record NumberField(Section section, String key, boolean present, double value, String wanted) {
  /** NaN where absent or faulty; absent is reported. */
  double required() {
    section.missing(key, wanted);
    return value;
  }

  /** The default where the key is absent; NaN where it is faulty. */
  double or(double absent) {
    return present ? value : absent;
  }

  /** Empty where absent, NaN where faulty. */
  OptionalDouble optional() {
    return present ? OptionalDouble.of(value) : OptionalDouble.empty();
  }
}
