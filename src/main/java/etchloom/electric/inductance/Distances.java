package etchloom.electric.inductance;

import java.util.List;

/**
 * Geometric mean distances between all cross-sections of a board, or between them and their images,
 * as functions of the sideways offset.
 *
 * <p>Near ones come from tables over the offset (closed form at the knots, cubic between them,
 * error of the logarithm below 1e-3 and that only inside one width), far ones from the second
 * moments of the sections: (w² − t²)/12 each, which leaves 1e-4 of the logarithm at three widths.
 */
final class Distances {
  private static final int REACH = 3;
  private static final int KNOTS_A_WIDTH = 16;

  private final int count;
  private final double[] height;
  private final double[] moment;
  private final double[] spread;
  private final double[] perMm;
  private final double[][] table;

  Distances(List<CrossSection> sections, Mirror mirror) {
    count = sections.size();
    height = new double[count * count];
    moment = new double[count * count];
    spread = new double[count * count];
    perMm = new double[count * count];
    table = new double[count * count][];
    for (int a = 0; a < count; a++) {
      for (int b = 0; b < count; b++) {
        fill(sections.get(a), sections.get(b), mirror, a * count + b);
      }
    }
  }

  private void fill(CrossSection a, CrossSection b, Mirror mirror, int at) {
    double dz = mirror.heightMm(b.heightMm()) - a.heightMm();
    double size = size(a, b);
    height[at] = dz;
    double across = (square(a.widthMm()) + square(b.widthMm())) / 12;
    double up = (square(a.thicknessMm()) + square(b.thicknessMm())) / 12;
    moment[at] = across - up;
    spread[at] = across + up;
    if (Math.abs(dz) >= REACH * size) {
      return;
    }
    perMm[at] = KNOTS_A_WIDTH / size;
    int other = at % count * count + at / count;
    boolean known = other < at && Math.abs(height[other]) == Math.abs(dz);
    table[at] = known ? table[other] : knots(a, b, dz, perMm[at]);
  }

  private static double size(CrossSection a, CrossSection b) {
    return Math.max(Math.max(a.widthMm(), b.widthMm()), Math.max(a.thicknessMm(), b.thicknessMm()));
  }

  /** What is to be added to the square of the distance; one knot before 0, two after the reach. */
  private static double[] knots(CrossSection a, CrossSection b, double dz, double perMm) {
    double[] out = new double[REACH * KNOTS_A_WIDTH + 3];
    for (int i = 1; i < out.length; i++) {
      double x = (i - 1) / perMm;
      double ln =
          MeanDistance.lnRectangles(
              x, dz, a.widthMm(), a.thicknessMm(), b.widthMm(), b.thicknessMm());
      out[i] = Math.exp(2 * ln) - x * x - dz * dz;
    }
    out[0] = out[2];
    return out;
  }

  private static double square(double x) {
    return x * x;
  }

  /** Height of section b over section a, mm. */
  double heightMm(int a, int b) {
    return height[a * count + b];
  }

  /** Mean of the square of the distance, mm², at a sideways distance of the centre lines. */
  double meanSquareMm2(int a, int b, double x) {
    int at = a * count + b;
    return x * x + height[at] * height[at] + spread[at];
  }

  /**
   * Square of the geometric mean distance, mm².
   *
   * @param x sideways distance of the centre lines, mm
   */
  double squaredMm2(int a, int b, double x) {
    int at = a * count + b;
    double dz = height[at];
    double square = x * x + dz * dz;
    double u = Math.abs(x) * perMm[at];
    if (perMm[at] == 0 || u >= REACH * KNOTS_A_WIDTH) {
      return square - moment[at] * (x * x - dz * dz) / square;
    }
    double[] knot = table[at];
    int i = (int) u;
    double t = u - i;
    double p0 = knot[i];
    double p1 = knot[i + 1];
    double p2 = knot[i + 2];
    double p3 = knot[i + 3];
    double c3 = p3 - p0 + 3 * (p1 - p2);
    double c2 = 2 * p0 - 5 * p1 + 4 * p2 - p3;
    return square + p1 + t / 2 * (p2 - p0 + t * (c2 + t * c3));
  }
}
