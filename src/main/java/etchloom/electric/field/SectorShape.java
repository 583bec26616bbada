package etchloom.electric.field;

import java.util.Arrays;

/**
 * A magnet between two arcs about the shaft and two rays.
 *
 * <p>For the solid angle its arcs are drawn as chords that stray at most {@link #CHORD_MM} and keep
 * its area, so that a point a tenth of a millimetre off sees less than 1e-5 of a difference.
 */
final class SectorShape implements MagnetShape {
  /** Largest distance of a chord from its arc, mm. */
  static final double CHORD_MM = 2e-4;

  private final double innerMm;
  private final double outerMm;
  private final double spanRad;
  private final double[] corners;

  SectorShape(double innerMm, double outerMm, double spanRad) {
    this.innerMm = innerMm;
    this.outerMm = outerMm;
    this.spanRad = spanRad;
    corners = corners(innerMm, outerMm, spanRad);
  }

  private static double[] corners(double inner, double outer, double span) {
    double step = Math.sqrt(8 * CHORD_MM / outer);
    int n = (int) Math.min(2000, Math.max(8, Math.ceil(span / step)));
    double d = span / n;
    // Chords at this radius enclose the same area as the arc.
    double grow = Math.sqrt(d / Math.sin(d));
    double[] xy = new double[4 * (n + 1)];
    for (int i = 0; i <= n; i++) {
      double a = -span / 2 + i * d;
      double b = -a;
      xy[2 * i] = outer * grow * Math.cos(a);
      xy[2 * i + 1] = outer * grow * Math.sin(a);
      xy[2 * (n + 1 + i)] = inner * grow * Math.cos(b);
      xy[2 * (n + 1 + i) + 1] = inner * grow * Math.sin(b);
    }
    return xy;
  }

  double[] corners() {
    return Arrays.copyOf(corners, corners.length);
  }

  @Override
  public double solidAngle(double x, double y, double heightMm) {
    // Signed triangles add up from any fan point; the figure's middle keeps them small.
    return SolidAngles.polygon(corners, (innerMm + outerMm) / 2, 0, x, y, heightMm);
  }

  @Override
  public double[] breaksMm() {
    return new double[] {innerMm, outerMm};
  }

  @Override
  public double fromRad(double r) {
    return 0;
  }

  @Override
  public double toRad(double r) {
    return spanRad / 2;
  }

  @Override
  public double areaMm2() {
    return spanRad / 2 * (outerMm * outerMm - innerMm * innerMm);
  }

  @Override
  public double centroidMm() {
    double h = spanRad / 2;
    double cubes = outerMm * outerMm * outerMm - innerMm * innerMm * innerMm;
    return 2.0 / 3 * Math.sin(h) / h * cubes / (outerMm * outerMm - innerMm * innerMm);
  }

  @Override
  public double reachRad() {
    return spanRad / 2;
  }
}
