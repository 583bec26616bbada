package etchloom.proof.image;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.function.Function;

/**
 * One thing drawn on a layer. Objects stand in drawing order: a dark one adds to the image, a clear
 * one takes away all that was drawn before it. Blocks and step-and-repeat are already expanded.
 */
public sealed interface DrawnObject {
  /** True when the object adds, false when it erases. */
  boolean dark();

  Attributes attributes();

  /** The line of the file where the object is made, from 1: of a chain the first draw. */
  int line();

  /** Calls exactly one function; a fourth kind then fails to compile at every caller. */
  <R> R match(Function<Stroke, R> stroke, Function<Flash, R> flash, Function<Region, R> region);

  /**
   * A pen drawn along a path.
   *
   * @param path draws that follow each other with the same pen and attributes, chained; a single
   *     line of no length is a dot, the image of the pen itself
   * @param pen a {@link ApertureShape.Circle} without hole, whose diameter may be 0 (no image, the
   *     centre line alone counts), or the deprecated {@link ApertureShape.Rectangle} without hole,
   *     which is only found on straight lines
   */
  record Stroke(Path path, ApertureShape pen, boolean dark, Attributes attributes, int line)
      implements DrawnObject {
    /** The pen's diameter; of a rectangle the smaller side. */
    public double widthMm() {
      return pen instanceof ApertureShape.Circle c
          ? c.diameterMm()
          : pen instanceof ApertureShape.Rectangle r ? Math.min(r.widthMm(), r.heightMm()) : 0;
    }

    @Override
    public <R> R match(
        Function<Stroke, R> stroke, Function<Flash, R> flash, Function<Region, R> region) {
      return stroke.apply(this);
    }
  }

  /**
   * An aperture put down at a point.
   *
   * @param aperture the aperture's number in the file
   * @param shape about the origin, mirrored, rotated and scaled already; to be moved by {@code at}
   */
  record Flash(
      Point at, ApertureShape shape, int aperture, boolean dark, Attributes attributes, int line)
      implements DrawnObject {
    @Override
    public <R> R match(
        Function<Stroke, R> stroke, Function<Flash, R> flash, Function<Region, R> region) {
      return flash.apply(this);
    }
  }

  /**
   * Filled contours.
   *
   * @param contours closed paths; each is filled by itself and the region is their union. A contour
   *     may hold cut-ins: two pieces that coincide in opposite directions and lead to a hole
   */
  record Region(List<Path> contours, boolean dark, Attributes attributes, int line)
      implements DrawnObject {
    public Region {
      contours = List.copyOf(contours);
    }

    @Override
    public <R> R match(
        Function<Stroke, R> stroke, Function<Flash, R> flash, Function<Region, R> region) {
      return region.apply(this);
    }
  }
}
