package etchloom.electric.inductance;

/**
 * Geometric mean distances: the distance at which two thin filaments couple as two long parallel
 * bars do whose current is even over their sections.
 *
 * <p>Source of the idea: Maxwell, Treatise, vol. II, art. 691; the closed forms below are the
 * integrals themselves, held against Maxwell's and Lyle's figures by tests.
 */
final class MeanDistance {
  private MeanDistance() {}

  /**
   * Natural logarithm of the mean distance of two rectangles with parallel sides; also of a
   * rectangle from itself.
   *
   * <p>Sixteen values of the logarithm's fourfold integral. They cancel as the fourth power of
   * distance over size: keep the distance below some tens of the smaller rectangle's sides.
   *
   * @param x distance of their centres along the widths, mm
   * @param z distance of their centres along the thicknesses, mm
   */
  static double lnRectangles(
      double x, double z, double width1, double thick1, double width2, double thick2) {
    // A scale near the sizes keeps the logarithms small.
    double unit = Math.max(Math.max(width1, width2), Math.max(thick1, thick2));
    double sum = 0;
    for (int i = 0; i < 4; i++) {
      double px = (x + corner(i, width1, width2)) / unit;
      for (int k = 0; k < 4; k++) {
        double pz = (z + corner(k, thick1, thick2)) / unit;
        sum += sign(i) * sign(k) * integral(px, pz);
      }
    }
    double area1 = width1 * thick1 / (unit * unit);
    double area2 = width2 * thick2 / (unit * unit);
    return Math.log(unit) - 25.0 / 12 + sum / (area1 * area2);
  }

  private static double corner(int i, double a, double b) {
    return ((i & 1) == 0 ? a : -a) / 2 + ((i & 2) == 0 ? b : -b) / 2;
  }

  private static int sign(int i) {
    return i == 0 || i == 3 ? 1 : -1;
  }

  /** The integral, twice along x and twice along z, of ln √(x² + z²), less a term in x² z². */
  private static double integral(double x, double z) {
    double x2 = x * x;
    double z2 = z * z;
    if (x2 + z2 == 0) {
      return 0;
    }
    double log = (x2 * z2 / 4 - (x2 * x2 + z2 * z2) / 24) * Math.log(x2 + z2);
    double angle = x == 0 || z == 0 ? 0 : Math.atan(z / x);
    double other = x == 0 || z == 0 ? 0 : Math.copySign(Math.PI / 2, x * z) - angle;
    return (log + x2 * x * z / 3 * angle + x * z2 * z / 3 * other) / 2;
  }

  /**
   * Mean distance of a ring-shaped section from itself, mm: a via's barrel.
   *
   * <p>Source: Maxwell, Treatise, vol. II, art. 692, the annulus (recalled); from e^(-1/4) of the
   * radius for a full circle to the radius itself for a thin wall.
   */
  static double annulusMm(double outerRadiusMm, double innerRadiusMm) {
    double o = outerRadiusMm * outerRadiusMm;
    double i = innerRadiusMm * innerRadiusMm;
    double ratio =
        i == 0 ? 0 : i * i / ((o - i) * (o - i)) * Math.log(outerRadiusMm / innerRadiusMm);
    return outerRadiusMm * Math.exp(-ratio + (3 * i - o) / (4 * (o - i)));
  }
}
