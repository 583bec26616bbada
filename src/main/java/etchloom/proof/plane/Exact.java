package etchloom.proof.plane;

/** Decisions about points of the grid, without rounding for coordinates within ±1 m. */
final class Exact {
  private Exact() {}

  static long cross(long ux, long uy, long vx, long vy) {
    return ux * vy - uy * vx;
  }

  /** +1 when p lies left of the line from a to b, -1 when right, 0 when on it. */
  static int side(int ax, int ay, int bx, int by, int px, int py) {
    return Long.signum(cross((long) bx - ax, (long) by - ay, (long) px - ax, (long) py - ay));
  }
}
