package etchloom.geometry;

/** The one nanometre grid on which finished artwork stands. */
public final class Grid {
  /** Steps to a millimetre. */
  public static final long PER_MM = 1_000_000L;

  private Grid() {}

  /** The nearest grid step, halves away from zero, so that mirrored figures round alike. */
  public static long nm(double mm) {
    long steps = (long) Math.floor(Math.abs(mm) * PER_MM + 0.5);
    return mm < 0 ? -steps : steps;
  }

  /** A grid step as the nearest double in mm; {@link #nm} gives the same step back. */
  public static double mm(long nm) {
    return nm / (double) PER_MM;
  }

  public static Point snap(Point p) {
    return new Point(mm(nm(p.x())), mm(nm(p.y())));
  }
}
