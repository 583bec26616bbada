package etchloom.electric.field;

/**
 * Solid angles of flat figures, sr. Positive for a point on the side from which the outline runs
 * counter-clockwise; a point in the figure's own plane counts as just on that side.
 */
final class SolidAngles {
  private SolidAngles() {}

  /**
   * A triangle, by A. Van Oosterom and J. Strackee, IEEE Transactions on Biomedical Engineering 30
   * (1983) 125; exact. The corners are given relative to the point, all at the depth {@code d}
   * below it.
   */
  static double triangle(
      double ax, double ay, double bx, double by, double cx, double cy, double d) {
    double a = Math.sqrt(ax * ax + ay * ay + d * d);
    double b = Math.sqrt(bx * bx + by * by + d * d);
    double c = Math.sqrt(cx * cx + cy * cy + d * d);
    return triangle(ax, ay, a, bx, by, b, cx, cy, c, d);
  }

  private static double triangle(
      double ax,
      double ay,
      double a,
      double bx,
      double by,
      double b,
      double cx,
      double cy,
      double c,
      double d) {
    double up = d * ((bx - ax) * (cy - ay) - (by - ay) * (cx - ax));
    double dd = d * d;
    double ab = ax * bx + ay * by + dd;
    double bc = bx * cx + by * cy + dd;
    double ca = cx * ax + cy * ay + dd;
    return 2 * Math.atan2(up, a * b * c + ab * c + bc * a + ca * b);
  }

  /**
   * A closed polygon, fanned from a point in its inside so that no triangle turns over.
   *
   * @param xy corners x0, y0, x1, y1, … counter-clockwise, mm
   * @param fanX a point that sees every side from the inside, mm
   * @param x the point's place, mm
   * @param d the point's height over the polygon, mm, may be negative
   */
  static double polygon(double[] xy, double fanX, double fanY, double x, double y, double d) {
    double fx = fanX - x;
    double fy = fanY - y;
    double f = Math.sqrt(fx * fx + fy * fy + d * d);
    int n = xy.length;
    double ax = xy[n - 2] - x;
    double ay = xy[n - 1] - y;
    double a = Math.sqrt(ax * ax + ay * ay + d * d);
    double sum = 0;
    for (int i = 0; i < n; i += 2) {
      double bx = xy[i] - x;
      double by = xy[i + 1] - y;
      double b = Math.sqrt(bx * bx + by * by + d * d);
      sum += triangle(fx, fy, f, ax, ay, a, bx, by, b, d);
      ax = bx;
      ay = by;
      a = b;
    }
    return sum;
  }

  /**
   * A disc, by complete elliptic integrals; exact to rounding (1e-14 sr).
   *
   * <p>Source: F. Paxton, "Solid angle calculation for a circular disk", Review of Scientific
   * Instruments 30 (1959) 254, with his integrals of the first and third kind drawn into one of
   * Bulirsch's; recalled, and held against the polygon by a test.
   *
   * @param radiusMm the disc's radius, positive
   * @param offMm distance of the point from the disc's axis, not negative
   * @param d the point's height over the disc, mm, may be negative
   */
  static double disc(double radiusMm, double offMm, double d) {
    double h = Math.abs(d);
    double sign = d < 0 ? -1 : 1;
    double sum = offMm + radiusMm;
    double s = (offMm - radiusMm) / sum;
    double far = Math.sqrt(sum * sum + h * h);
    double inside = s < 0 ? 2 * Math.PI : 0;
    if (h < 1e-12 * radiusMm) {
      return sign * inside;
    }
    double near = offMm - radiusMm;
    double kc = Math.sqrt(near * near + h * h) / far;
    if (Math.abs(s) < 1e-9) {
      // On the rim's cylinder the third kind's term is a jump of ±π/2 over its factor.
      return sign * (Math.PI - 2 * h / far * Elliptic.cel(kc, 1, 1, 1));
    }
    return sign * (inside - 2 * h / far * (1 - s) * Elliptic.cel(kc, s * s, 1, -s));
  }
}
