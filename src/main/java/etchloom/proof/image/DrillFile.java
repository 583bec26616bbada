package etchloom.proof.image;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Map;

/**
 * A drill file, NC or Gerber.
 *
 * @param fromLayer first copper layer of the span, from 1; 0 when the file does not say
 * @param toLayer last copper layer of the span; 0 when the file does not say
 */
public record DrillFile(
    String fileName,
    Plating plating,
    int fromLayer,
    int toLayer,
    Map<String, List<String>> fileAttributes,
    List<DrilledHole> holes,
    List<Slot> slots,
    List<ReadWarning> warnings) {
  public DrillFile {
    holes = List.copyOf(holes);
    slots = List.copyOf(slots);
    warnings = List.copyOf(warnings);
  }

  /**
   * @param diameterMm finished
   * @param plating of this hole; that of the file where the tool says nothing
   * @param function such as {@code ViaDrill}; empty when the file does not say
   * @param nets fields of {@code .N}, as in {@link Attributes#nets}
   */
  public record DrilledHole(
      Point at,
      double diameterMm,
      Plating plating,
      String function,
      List<String> nets,
      int tool,
      int line) {}

  /**
   * A routed or nibbled slot.
   *
   * @param path the centre line of the cutter
   * @param widthMm finished width, the cutter's diameter
   */
  public record Slot(
      Path path,
      double widthMm,
      Plating plating,
      String function,
      List<String> nets,
      int tool,
      int line) {}
}
