package etchloom.proof.copper;

import etchloom.geometry.Point;

/** Grid steps to millimetres. */
final class Place {
  private Place() {}

  static Point mm(double xNm, double yNm) {
    return new Point(xNm / RingPen.NM, yNm / RingPen.NM);
  }

  static int nm(double mm) {
    return (int) Math.rint(mm * RingPen.NM);
  }

  /** {@code (18.204, 3.310) mm}. */
  static String text(Point p) {
    return String.format(java.util.Locale.ROOT, "(%.3f, %.3f) mm", p.x() + 0.0, p.y() + 0.0);
  }
}
