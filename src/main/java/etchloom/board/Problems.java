package etchloom.board;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Severity;
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

  /** Something the user should know, though the board can be drawn. */
  void warn(String code, String key, String message) {
    found.add(Diagnostic.warning(code, positions.at(key), key, message));
  }

  /** Whether anything keeps the board from being drawn. */
  boolean any() {
    return found.stream().anyMatch(d -> d.severity() == Severity.ERROR);
  }

  List<Diagnostic> list() {
    return List.copyOf(found);
  }
}
