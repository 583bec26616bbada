package etchloom.proof.image;

import etchloom.geometry.Path;
import java.util.List;

/**
 * The shape of an aperture about its origin, transforms applied. A round hole of {@code
 * holeDiameterMm}, 0 for none, is open: what lies under it shows through and is not erased.
 */
public sealed interface ApertureShape {
  record Circle(double diameterMm, double holeDiameterMm) implements ApertureShape {}

  /**
   * @param rotationRad counter-clockwise about the centre
   */
  record Rectangle(double widthMm, double heightMm, double rotationRad, double holeDiameterMm)
      implements ApertureShape {}

  /** A rectangle whose shorter sides are half circles. */
  record Obround(double widthMm, double heightMm, double rotationRad, double holeDiameterMm)
      implements ApertureShape {}

  /**
   * @param outerDiameterMm of the circle through the corners
   * @param rotationRad direction of one corner seen from the centre
   */
  record RegularPolygon(
      double outerDiameterMm, int vertices, double rotationRad, double holeDiameterMm)
      implements ApertureShape {}

  /**
   * A macro: parts laid on each other in order. A part that is not exposed erases the parts before
   * it, and nothing else of the layer.
   */
  record Composite(String macro, List<Part> parts) implements ApertureShape {
    public Composite {
      parts = List.copyOf(parts);
    }
  }

  /**
   * @param outline closed
   * @param holes closed, inside the outline; open, not erasing
   */
  record Part(boolean exposed, Path outline, List<Path> holes) {
    public Part {
      holes = List.copyOf(holes);
    }
  }
}
