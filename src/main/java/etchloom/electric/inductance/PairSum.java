package etchloom.electric.inductance;

import etchloom.electric.field.GaussRule;

/**
 * Neumann's integral over pairs of straight bars, {@code ∬ dl·dl' / r}, mm, each weighted with both
 * currents. The magnetic constant over 4π makes it an inductance.
 *
 * <p>Pairs three times the longer bar's size apart: the integral's expansion to second order in the
 * bars' lengths, widths and thicknesses. Down to one and a quarter times: to fourth order in the
 * lengths. A single pair is then off by 2e-3 at worst, where both are in line, and sums over
 * directions by much less. Nearer ones: bars whose sideways distance hardly changes along them in
 * closed form, others with the closed form of the longer bar's potential and Gauss's rule along the
 * shorter.
 *
 * <p>Near bars couple as the mean of two pairs of filaments, at the distances whose geometric mean
 * and mean square are those of the two sections. The first is exact for long bars (and keeps a bar
 * apart from itself and from the next one of the same run), the second makes the far pairs'
 * expansion go on from there without a step, and gives short bars their ends.
 *
 * <p>Sources: F. E. Neumann 1845; closed forms of parallel filaments as in E. B. Rosa, "The self
 * and mutual inductances of linear conductors", Bulletin of the Bureau of Standards 4 (1908).
 */
final class PairSum {
  /** Square of how many sizes apart the expansion to fourth order holds. */
  private static final double APART = 1.25 * 1.25;

  /** Square of how many sizes apart the expansion to second order holds. */
  private static final double FAR = 3 * 3;

  /** Sideways change over mean distance up to which bars count as parallel. */
  private static final double PARALLEL = 0.01;

  /** Length of the shorter bar over the distance from which the closed form is the cheaper way. */
  private static final double CLOSED_FORM_FROM = 1.2;

  private static final GaussRule[] RULES = {
    new GaussRule(1),
    new GaussRule(2),
    new GaussRule(3),
    new GaussRule(5),
    new GaussRule(8),
    new GaussRule(16)
  };

  private static final double[] RULE_UP_TO = {0.2, 0.65, 1.4, 3, 6};

  private final Pieces a;
  private final Pieces b;
  private final Mirror mirror;
  private final Distances distances;

  PairSum(Pieces a, Pieces b, Mirror mirror, Distances distances) {
    this.a = a;
    this.b = b;
    this.mirror = mirror;
    this.distances = distances;
  }

  /** All pairs of a range of the one with a range of the other. */
  double block(int aFrom, int aTo, int bFrom, int bTo) {
    double sum = 0;
    for (int i = aFrom; i < aTo; i++) {
      sum += row(i, bFrom, bTo);
    }
    return sum;
  }

  /** All pairs within a range, each both ways, and each bar with itself; for a sum of one body. */
  double within(int from, int to) {
    double sum = 0;
    for (int i = from; i < to; i++) {
      sum += near(i, i) * a.ampere[i] * a.ampere[i] + 2 * row(i, i + 1, to);
    }
    return sum;
  }

  private double row(int i, int from, int to) {
    double x = a.x[i];
    double y = a.y[i];
    double z = a.height[i];
    double jx = a.jx[i];
    double jy = a.jy[i];
    double reach = a.reach[i];
    double qxx = a.qxx[i];
    double qxy = a.qxy[i];
    double qyy = a.qyy[i];
    double qzz = a.qzz[i];
    double sum = 0;
    for (int j = from; j < to; j++) {
      double dx = b.x[j] - x;
      double dy = b.y[j] - y;
      double dz = mirror.heightMm(b.height[j]) - z;
      double r2 = dx * dx + dy * dy + dz * dz;
      double size2 = Math.max(reach, b.reach[j]);
      if (r2 > APART * size2) {
        double xx = qxx + b.qxx[j];
        double yy = qyy + b.qyy[j];
        double zz = qzz + b.qzz[j];
        double q = dx * (dx * xx + 2 * dy * (qxy + b.qxy[j])) + dy * dy * yy + dz * dz * zz;
        double inverse = 1 / r2;
        double shape = 1 + (3 * q * inverse - xx - yy - zz) * inverse;
        if (r2 < FAR * size2) {
          shape += fourth(i, j, dx, dy, inverse);
        }
        sum += (jx * b.jx[j] + jy * b.jy[j]) * shape * Math.sqrt(inverse);
      } else {
        sum += a.ampere[i] * b.ampere[j] * near(i, j);
      }
    }
    return sum;
  }

  /** What the lengths add to a pair's shape in fourth order. */
  private double fourth(int i, int j, double dx, double dy, double inverse) {
    double a2 = a.length[i] * a.length[i] * inverse;
    double b2 = b.length[j] * b.length[j] * inverse;
    double ca = a.ux[i] * dx + a.uy[i] * dy;
    double cb = b.ux[j] * dx + b.uy[j] * dy;
    double cos = a.ux[i] * b.ux[j] + a.uy[i] * b.uy[j];
    double mixed = ca * cb * inverse;
    ca *= ca * inverse;
    cb *= cb * inverse;
    double alongA = (35 * ca - 30) * ca + 3;
    double alongB = (35 * cb - 30) * cb + 3;
    double both = (35 * mixed - 20 * cos) * mixed - 5 * (ca + cb) + 1 + 2 * cos * cos;
    return (a2 * a2 * alongA + b2 * b2 * alongB) / 640 + a2 * b2 * both / 192;
  }

  /** The integral of two bars of one ampere each, at any distance. */
  double near(int i, int j) {
    double cos = a.ux[i] * b.ux[j] + a.uy[i] * b.uy[j];
    if (Math.abs(cos) < 1e-12) {
      return 0;
    }
    double sin = a.ux[i] * b.uy[j] - a.uy[i] * b.ux[j];
    double dx = b.x[j] - a.x[i];
    double dy = b.y[j] - a.y[i];
    int sa = a.section[i];
    int sb = b.section[j];
    return a.length[i] >= b.length[j]
        ? bars(cos, sin, dx, dy, a.ux[i], a.uy[i], a.length[i], b.length[j], sa, sb)
        : bars(cos, -sin, -dx, -dy, b.ux[j], b.uy[j], b.length[j], a.length[i], sa, sb);
  }

  /**
   * @param sin of the angle from the longer to the shorter
   * @param dx from the longer's middle to the shorter's
   */
  private double bars(
      double cos,
      double sin,
      double dx,
      double dy,
      double ux,
      double uy,
      double longer,
      double shorter,
      int sa,
      int sb) {
    double along = dx * ux + dy * uy;
    double aside = ux * dy - uy * dx;
    double sideways = Math.abs(sin) * shorter / 2;
    double ratio = shorter / apart(along, aside, cos * shorter / 2, sideways, longer / 2, sa, sb);
    double square = distances.squaredMm2(sa, sb, aside);
    double mean = distances.meanSquareMm2(sa, sb, aside);
    boolean even = sideways * sideways < PARALLEL * PARALLEL * square;
    if (even && ratio > CLOSED_FORM_FROM) {
      return cos * parallel(along, longer, shorter, square, mean);
    }
    int r = 0;
    while (r < RULE_UP_TO.length && ratio > RULE_UP_TO[r]) {
      r++;
    }
    GaussRule rule = RULES[r];
    double sum = 0;
    for (int g = 0; g < rule.size(); g++) {
      double t = shorter / 2 * rule.node(g);
      if (!even) {
        square = distances.squaredMm2(sa, sb, aside + t * sin);
        mean = distances.meanSquareMm2(sa, sb, aside + t * sin);
      }
      sum += rule.weight(g) * potential(along + t * cos, longer / 2, square, mean);
    }
    return cos * shorter / 2 * sum;
  }

  /** About how near the shorter bar comes to the longer, mm. */
  private double apart(
      double along, double aside, double reach, double sideways, double half, int sa, int sb) {
    double beyond = Math.max(0, Math.abs(along) - Math.abs(reach) - half);
    double off = Math.max(0, Math.abs(aside) - sideways);
    return Math.sqrt(beyond * beyond + distances.meanSquareMm2(sa, sb, off));
  }

  /**
   * Integral of 1/r along a line from −half to half, seen from a point, as the mean of two lines at
   * the distances that have the given geometric mean and mean square.
   */
  private static double potential(double along, double half, double square, double mean) {
    double root = Math.sqrt(Math.max(0, mean * mean - square * square));
    double from = -half - along;
    double to = half - along;
    if (to < 0) {
      double swap = -to;
      to = -from;
      from = swap;
    }
    double f2 = from * from + mean;
    double t2 = to * to + mean;
    double far = (to + Math.sqrt(t2 + root)) * (to + Math.sqrt(t2 - root));
    double near = Math.sqrt(f2 + root);
    double other = Math.sqrt(f2 - root);
    return from < 0
        ? Math.log(far * (near - from) * (other - from) / (square * square)) / 2
        : Math.log(far / ((near + from) * (other + from))) / 2;
  }

  /**
   * Two parallel bars.
   *
   * @param along how much further on the second's middle lies than the first's
   * @param square of the geometric mean distance
   * @param mean of the square of the distance
   */
  static double parallel(double along, double length1, double length2, double square, double mean) {
    double root = Math.sqrt(Math.max(0, mean * mean - square * square));
    double sum = (length1 + length2) / 2;
    double difference = (length1 - length2) / 2;
    return twice(along + sum, square, mean, root)
        - twice(along + difference, square, mean, root)
        - twice(along - difference, square, mean, root)
        + twice(along - sum, square, mean, root);
  }

  /** The integral's own integral over both lengths, the mean of two lines. */
  private static double twice(double t, double square, double mean, double root) {
    double u = Math.abs(t);
    double u2 = u * u + mean;
    double r = Math.sqrt(u2 + root);
    double s = Math.sqrt(u2 - root);
    return (u * Math.log((u + r) * (u + s) / square) - r - s) / 2;
  }
}
