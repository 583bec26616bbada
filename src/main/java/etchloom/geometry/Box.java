package etchloom.geometry;

/** An axis-parallel box, mm. */
public record Box(double minX, double minY, double maxX, double maxY) {
  /** The smallest box round a piece, arcs that bulge beyond their ends included. */
  public static Box of(Segment s) {
    double[] b = new double[4];
    ShapeBounds.box(s, 0, b, 0);
    return new Box(b[0], b[1], b[2], b[3]);
  }

  public Box join(Box o) {
    return new Box(
        Math.min(minX, o.minX),
        Math.min(minY, o.minY),
        Math.max(maxX, o.maxX),
        Math.max(maxY, o.maxY));
  }

  public double widthMm() {
    return maxX - minX;
  }

  public double heightMm() {
    return maxY - minY;
  }
}
