package etchloom.spec;

import java.util.Optional;

/**
 * A word or text key as found.
 *
 * @param value empty where the key is absent or faulty
 */
record WordField<E>(
    Section section, String key, boolean present, Optional<E> value, String wanted) {
  /** Empty where absent or faulty; absent is reported. */
  Optional<E> required() {
    section.missing(key, wanted);
    return value;
  }

  /** The default where the key is absent, and also where it is faulty, which is reported. */
  E or(E absent) {
    return value.orElse(absent);
  }
}
