package etchloom.spec;

import etchloom.spec.Spec.Connection;
import etchloom.spec.Spec.Winding;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The winding's keys as read; a faulty count is {@link CountField#FAULTY}. */
record WindingDraft(
    Section section, int phases, int coils, Optional<Connection> connection, int paths) {

  private static final Map<String, Connection> CONNECTIONS =
      Words.of("star", Connection.STAR)
          .and("delta", Connection.DELTA)
          .and("open", Connection.OPEN)
          .map();

  /** The connections of each number of phases; two phases in star need the star point out. */
  private static final Map<Integer, List<Connection>> TABLE = table();

  private static Map<Integer, List<Connection>> table() {
    Map<Integer, List<Connection>> t = new LinkedHashMap<>();
    t.put(1, List.of(Connection.OPEN));
    t.put(2, List.of(Connection.OPEN, Connection.STAR));
    t.put(3, List.of(Connection.STAR, Connection.DELTA, Connection.OPEN));
    t.put(5, List.of(Connection.STAR, Connection.OPEN));
    t.put(6, List.of(Connection.STAR, Connection.OPEN));
    return t;
  }

  static WindingDraft read(Section s) {
    int phases = phases(s);
    int coils = s.count("coils", 1, Limits.COILS_MAX, false).required();
    Optional<Connection> connection = s.word("connection", CONNECTIONS).required();
    int paths = s.count("parallel-paths", 1, Limits.PATHS_MAX, false).or(1);
    s.close();
    WindingDraft draft = new WindingDraft(s, phases, coils, connection, paths);
    draft.check();
    return draft;
  }

  private static int phases(Section s) {
    int phases = s.count("phases", 1, 6, false).required();
    if (phases != CountField.FAULTY && !TABLE.containsKey(phases)) {
      s.error(Codes.OUT_OF_RANGE, "phases", phases + " was found; allowed is 1, 2, 3, 5 or 6");
      return CountField.FAULTY;
    }
    return phases;
  }

  private void check() {
    if (phases == CountField.FAULTY) {
      return;
    }
    if (connection.isPresent() && !TABLE.get(phases).contains(connection.get())) {
      String allowed = Show.oneOf(TABLE.get(phases).stream().map(WindingDraft::word).toList());
      section.error(
          Codes.CONNECTION,
          "connection",
          phases
              + " phases cannot be joined in "
              + word(connection.get())
              + "; allowed is "
              + allowed);
    }
    if (coils == CountField.FAULTY) {
      return;
    }
    if (coils % phases != 0) {
      int down = Math.max(phases, coils - coils % phases);
      section.error(
          Codes.COIL_COUNT,
          "coils",
          coils
              + " coils cannot be dealt out evenly to "
              + phases
              + " phases; the nearest counts are "
              + (down < coils ? down + " and " : "")
              + (coils - coils % phases + phases));
    } else if (paths != CountField.FAULTY && coils / phases % paths != 0) {
      section.error(
          Codes.COIL_COUNT,
          "parallel-paths",
          "the "
              + coils / phases
              + " coils of a phase cannot be dealt out evenly to "
              + paths
              + " paths");
    }
  }

  static String word(Connection c) {
    return Words.wordFor(CONNECTIONS, c);
  }

  Winding build() {
    return new Winding(phases, coils, connection.orElseThrow(), paths);
  }
}
