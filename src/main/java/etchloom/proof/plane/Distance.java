package etchloom.proof.plane;

/** Distances to the straight edges of a figure, nm. */
final class Distance {
  private Distance() {}

  static double pointToEdge(Figure f, int e, double x, double y) {
    double ux = (double) f.toX(e) - f.fromX(e);
    double uy = (double) f.toY(e) - f.fromY(e);
    double vx = x - f.fromX(e);
    double vy = y - f.fromY(e);
    double t = Math.max(0, Math.min(1, (vx * ux + vy * uy) / (ux * ux + uy * uy)));
    return Math.hypot(vx - t * ux, vy - t * uy);
  }
}
