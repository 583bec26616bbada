package etchloom.proof.image;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;

/**
 * The drawn entities of a DXF file, lengths in mm.
 *
 * @param version the value of {@code $ACADVER}, {@code AC1015}; empty when the file gives none
 * @param layers the names of the layer table, in its order
 */
public record DxfFile(
    String fileName,
    String version,
    List<String> layers,
    List<Entity> entities,
    List<ReadWarning> warnings) {
  public DxfFile {
    layers = List.copyOf(layers);
    entities = List.copyOf(entities);
    warnings = List.copyOf(warnings);
  }

  /** Something drawn, by the layer it stands on and the line of the file where it starts. */
  public sealed interface Entity {
    String layer();

    int line();
  }

  /**
   * A polyline of either kind, a LINE or an ARC; bulges are arcs.
   *
   * @param path closed exactly when {@code closed}
   * @param widthMm constant width; 0 for a bare line
   */
  public record Polyline(String layer, Path path, double widthMm, boolean closed, int line)
      implements Entity {}

  public record Circle(String layer, Point centre, double radiusMm, int line) implements Entity {}

  public record Text(
      String layer, Point at, double heightMm, double rotationRad, String text, int line)
      implements Entity {}
}
