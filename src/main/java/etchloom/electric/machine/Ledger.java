package etchloom.electric.machine;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Collects what is absent and what the reader must be told. */
final class Ledger {
  private final List<Absent> absent = new ArrayList<>();
  private final List<Caution> cautions = new ArrayList<>();

  /** An input by its key, and whether the spec gives it. */
  record Given(String key, boolean present) {
    static Given of(String key, OptionalDouble value) {
      return new Given(key, value.isPresent());
    }
  }

  /** Whether all inputs of a figure are there; notes each that is not. */
  boolean has(String figure, Given... inputs) {
    boolean all = true;
    for (Given g : inputs) {
      if (!g.present()) {
        absent(figure, g.key());
        all = false;
      }
    }
    return all;
  }

  void absent(String figure, String key) {
    Absent a = new Absent(figure, key);
    if (!absent.contains(a)) {
      absent.add(a);
    }
  }

  void caution(String code, String message) {
    cautions.add(new Caution(code, message));
  }

  List<Absent> absent() {
    return absent;
  }

  List<Caution> cautions() {
    return cautions;
  }
}
