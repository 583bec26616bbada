package etchloom.geometry;

/** A point or vector of the plane, mm, x right, y up. */
public record Point(double x, double y) {
  public static final Point ORIGIN = new Point(0, 0);

  public static Point polar(double radiusMm, double angleRad) {
    return new Point(radiusMm * Math.cos(angleRad), radiusMm * Math.sin(angleRad));
  }

  public Point plus(Point o) {
    return new Point(x + o.x, y + o.y);
  }

  public Point minus(Point o) {
    return new Point(x - o.x, y - o.y);
  }

  public Point times(double k) {
    return new Point(k * x, k * y);
  }

  public double dot(Point o) {
    return x * o.x + y * o.y;
  }

  /** The z component of the cross product; positive when {@code o} lies counter-clockwise. */
  public double cross(Point o) {
    return x * o.y - y * o.x;
  }

  /**
   * Distance from the origin, mm: for lengths of a board, whose squares are far from the limits.
   */
  public double norm() {
    return Math.sqrt(x * x + y * y);
  }

  public double distanceTo(Point o) {
    double dx = x - o.x;
    double dy = y - o.y;
    return Math.sqrt(dx * dx + dy * dy);
  }

  /** Direction seen from the origin, rad, in (-π, π]. */
  public double angleRad() {
    return Math.atan2(y, x);
  }

  /** Turned counter-clockwise about the origin. */
  public Point rotated(double rad) {
    double c = Math.cos(rad);
    double s = Math.sin(rad);
    return new Point(c * x - s * y, s * x + c * y);
  }

  /** Mirrored in the x axis. */
  public Point mirrored() {
    return new Point(x, -y);
  }
}
