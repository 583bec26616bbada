package etchloom.spec;

import java.util.Optional;
import java.util.OptionalInt;

/**
 * A whole-number key as found.
 *
 * @param value empty where the key is absent or faulty
 */
record CountField(
    Section section, String key, boolean present, Optional<Integer> value, String wanted) {
  /** Stands for a faulty count while reading goes on; no count may be nought. */
  static final int FAULTY = 0;

  /** {@link #FAULTY} where absent or faulty; absent is reported. */
  int required() {
    section.missing(key, wanted);
    return value.orElse(FAULTY);
  }

  /** The default where the key is absent; {@link #FAULTY} where it is faulty. */
  int or(int absent) {
    return present ? value.orElse(FAULTY) : absent;
  }

  OptionalInt optional() {
    return value.map(OptionalInt::of).orElseGet(OptionalInt::empty);
  }
}
