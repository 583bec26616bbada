package etchloom.proof.plane;

/** Distances to the straight edges of a figure, nm. */
final class Distance {
  private Distance() {}

  static double pointToEdge(Figure f, int e, double x, double y) {
    return pointToEdge(f.fromX(e), f.fromY(e), f.toX(e), f.toY(e), x, y);
  }

  static double pointToEdge(double ax, double ay, double bx, double by, double x, double y) {
    double ux = bx - ax;
    double uy = by - ay;
    double vx = x - ax;
    double vy = y - ay;
    double t = Math.max(0, Math.min(1, (vx * ux + vy * uy) / (ux * ux + uy * uy)));
    double dx = vx - t * ux;
    double dy = vy - t * uy;
    return Math.sqrt(dx * dx + dy * dy);
  }
}
