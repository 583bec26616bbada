package etchloom.geometry;

/**
 * The smallest distance between two shapes, and where it is.
 *
 * @param distanceMm never negative; 0 where they touch or cross
 * @param onFirst a point of the first shape
 * @param onSecond a point of the second shape
 */
public record Nearest(double distanceMm, Point onFirst, Point onSecond) {
  /** The same with the two shapes in the other order. */
  public Nearest swapped() {
    return new Nearest(distanceMm, onSecond, onFirst);
  }

  /** The point half-way between the two. */
  public Point middle() {
    return onFirst.plus(onSecond).times(0.5);
  }
}
