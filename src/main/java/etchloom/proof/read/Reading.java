package etchloom.proof.read;

import etchloom.proof.image.ReadWarning;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** One file being read: its name, its warnings so far, and how much may still be made of it. */
final class Reading {
  /**
   * How many pieces one file may come to: each object, each line or arc of a path, each part of a
   * macro's shape and each attribute copied counts one. At some 100 bytes a piece this keeps even a
   * file made to explode within 400 MB; a large stator has a hundredth of it.
   */
  static final int MAX_PIECES = 3_000_000;

  /** Coordinates and sizes beyond this are refused, mm: far above any board, far below overflow. */
  static final double MAX_MM = 1e6;

  /** Warnings of one kind that are kept. */
  private static final int MAX_OF_A_KIND = 20;

  private final String file;
  private final List<ReadWarning> warnings = new ArrayList<>();
  private final Map<String, Integer> counts = new LinkedHashMap<>();
  private final Budget budget;

  /** How much has been made of one file, or of all files of a set together. */
  static final class Budget {
    private long pieces;
  }

  Reading(String file) {
    this(file, new Budget());
  }

  /** A file that shares what may be made with others. */
  Reading(String file, Budget budget) {
    this.file = file;
    this.budget = budget;
  }

  String file() {
    return file;
  }

  UnreadableFile fail(int line, String code, String reason) {
    return new UnreadableFile(file, line, code, Shown.clean(reason));
  }

  void warn(int line, String code, String message) {
    if (counts.merge(code, 1, Integer::sum) <= MAX_OF_A_KIND) {
      warnings.add(new ReadWarning(file, line, code, Shown.clean(message)));
    }
  }

  /** Warns at the first place only: for habits of a tool, which show on every line. */
  void warnOnce(int line, String code, String message) {
    if (counts.merge(code, 1, Integer::sum) == 1) {
      warnings.add(new ReadWarning(file, line, code, Shown.clean(message)));
    }
  }

  void charge(long more, int line) throws UnreadableFile {
    budget.pieces += more;
    if (budget.pieces > MAX_PIECES) {
      throw fail(line, "too-large", "the file comes to more than " + MAX_PIECES + " drawn pieces");
    }
  }

  List<ReadWarning> warnings() {
    return List.copyOf(warnings);
  }
}
