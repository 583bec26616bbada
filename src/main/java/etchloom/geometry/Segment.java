package etchloom.geometry;

import java.util.function.Function;
import java.util.function.UnaryOperator;

/** One piece of a centre line, walked from start to end. Lengths in mm, angles in rad, y up. */
public sealed interface Segment permits Line, Arc {
  Point start();

  Point end();

  double lengthMm();

  /** The same piece walked from end to start. */
  Segment reversed();

  /** The point at the share {@code t} of the length, 0 the start, 1 the end. */
  Point at(double t);

  /** The piece between the shares {@code from} and {@code to} of the length, {@code from < to}. */
  Segment part(double from, double to);

  /** The unit tangent in the walking direction at the share {@code t} of the length. */
  Point tangent(double t);

  /** Turned counter-clockwise about the origin. */
  Segment rotated(double rad);

  /** Mirrored in the x axis; an arc changes its direction. */
  Segment mirrored();

  /** Every stored point replaced; the map must keep lengths and orientation (to rounding). */
  Segment mapped(UnaryOperator<Point> map);

  /** Calls exactly one function; a third kind of segment then fails to compile at every caller. */
  <R> R match(Function<Line, R> line, Function<Arc, R> arc);
}
