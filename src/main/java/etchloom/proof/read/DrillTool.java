package etchloom.proof.read;

import etchloom.proof.image.Plating;
import java.util.List;

/** A tool of a drill file and what its attributes say. */
record DrillTool(int number, double diameterMm, Plating plating, String function) {
  /**
   * @param aperFunction fields of {@code .AperFunction}: {@code Plated, PTH, ViaDrill} in NC files,
   *     {@code ViaDrill} in Gerber files
   */
  static DrillTool of(int number, double diameterMm, Plating otherwise, List<String> aperFunction) {
    String first = aperFunction.isEmpty() ? "" : aperFunction.get(0);
    Plating said = plating(first);
    if (said == Plating.UNKNOWN) {
      return new DrillTool(number, diameterMm, otherwise, first);
    }
    return new DrillTool(
        number, diameterMm, said, aperFunction.size() > 2 ? aperFunction.get(2) : "");
  }

  /** What the first field of a file or tool function says. */
  static Plating plating(String word) {
    return switch (word) {
      case "Plated" -> Plating.PLATED;
      case "NonPlated" -> Plating.NON_PLATED;
      case "MixedPlating" -> Plating.MIXED;
      default -> Plating.UNKNOWN;
    };
  }

  /** A hole is one or the other, so a mixed file says nothing of it. */
  static Plating ofHole(Plating file) {
    return file == Plating.MIXED ? Plating.UNKNOWN : file;
  }
}
