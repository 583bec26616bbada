package etchloom.board;

import etchloom.diagnostic.Diagnostic;
import etchloom.spec.Positions;
import java.util.ArrayList;
import java.util.List;

/** Collects what keeps a spec from being drawn, each with the key to change. */
final class Problems {
  private final Positions positions;
  private final List<Diagnostic> found = new ArrayList<>();

  Problems(Positions positions) {
    this.positions = positions;
  }

  void add(String code, String key, String message, String... hints) {
    found.add(Diagnostic.error(code, positions.at(key), key, message, hints));
  }

  boolean any() {
    return !found.isEmpty();
  }

  List<Diagnostic> list() {
    return List.copyOf(found);
  }
}
