package etchloom.receive;

import etchloom.diagnostic.Diagnostic;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a file of readings holds.
 *
 * @param leadOhm what the measuring leads have, already taken off the readings
 * @param faults the rows that could not be taken, each by its line
 */
public record Readings(List<Reading> all, double leadOhm, List<Diagnostic> faults) {
  public Readings {
    all = List.copyOf(all);
    faults = List.copyOf(faults);
  }

  /** The readings of each board, boards in the order in which they first occur. */
  Map<String, List<Reading>> byBoard() {
    Map<String, List<Reading>> out = new LinkedHashMap<>();
    for (Reading r : all) {
      out.computeIfAbsent(r.board(), b -> new ArrayList<>()).add(r);
    }
    return out;
  }
}
