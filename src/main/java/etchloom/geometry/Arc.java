package etchloom.geometry;

import java.util.function.Function;
import java.util.function.UnaryOperator;

/**
 * A circular piece, less than a full turn, kept by its three points so that rounding to a grid
 * never opens a joint.
 *
 * <p>The radius is that of the start; the end's may differ by the rounding of the grid (3 nm) and
 * no more than {@link #RADIUS_SLACK_MM}.
 */
public record Arc(Point start, Point end, Point centre, boolean counterClockwise)
    implements Segment {
  /** How far the radii of start and end may differ, mm: far above rounding, far below a track. */
  public static final double RADIUS_SLACK_MM = 1e-4;

  public Arc {
    double r0 = start.distanceTo(centre);
    double r1 = end.distanceTo(centre);
    if (!(r0 > 0 && Math.abs(r0 - r1) <= RADIUS_SLACK_MM)) {
      throw new IllegalArgumentException(
          "arc ends disagree: radius " + r0 + " mm at the start, " + r1 + " mm at the end");
    }
  }

  /**
   * @param sweepRad signed, positive counter-clockwise, not 0, less than a full turn
   */
  public static Arc of(Point centre, double radiusMm, double startRad, double sweepRad) {
    if (!(Math.abs(sweepRad) < 2 * Math.PI && sweepRad != 0)) {
      throw new IllegalArgumentException("arc sweep must be within a turn, got " + sweepRad);
    }
    return new Arc(
        centre.plus(Point.polar(radiusMm, startRad)),
        centre.plus(Point.polar(radiusMm, startRad + sweepRad)),
        centre,
        sweepRad > 0);
  }

  public double radiusMm() {
    return start.distanceTo(centre);
  }

  /** Direction of the start seen from the centre, rad. */
  public double startRad() {
    return start.minus(centre).angleRad();
  }

  /** Signed, positive counter-clockwise, in (-2π, 2π); start equal to end is an empty sweep. */
  public double sweepRad() {
    Point a = start.minus(centre);
    Point b = end.minus(centre);
    double s = Math.atan2(a.cross(b), a.dot(b));
    if (counterClockwise) {
      return s < 0 ? s + 2 * Math.PI : s;
    }
    return s > 0 ? s - 2 * Math.PI : s;
  }

  @Override
  public double lengthMm() {
    return radiusMm() * Math.abs(sweepRad());
  }

  @Override
  public Arc reversed() {
    return new Arc(end, start, centre, !counterClockwise);
  }

  @Override
  public Point at(double t) {
    if (t == 0) {
      return start;
    }
    if (t == 1) {
      return end;
    }
    return centre.plus(start.minus(centre).rotated(t * sweepRad()));
  }

  @Override
  public Arc part(double from, double to) {
    return new Arc(at(from), at(to), centre, counterClockwise);
  }

  @Override
  public Point tangent(double t) {
    Point r = at(t).minus(centre);
    double k = (counterClockwise ? 1 : -1) / r.norm();
    return new Point(-r.y() * k, r.x() * k);
  }

  @Override
  public Arc rotated(double rad) {
    return new Arc(start.rotated(rad), end.rotated(rad), centre.rotated(rad), counterClockwise);
  }

  @Override
  public Arc mirrored() {
    return new Arc(start.mirrored(), end.mirrored(), centre.mirrored(), !counterClockwise);
  }

  @Override
  public Arc mapped(UnaryOperator<Point> map) {
    return new Arc(map.apply(start), map.apply(end), map.apply(centre), counterClockwise);
  }

  @Override
  public <R> R match(Function<Line, R> line, Function<Arc, R> arc) {
    return arc.apply(this);
  }
}
