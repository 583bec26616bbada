package etchloom.electric.inductance;

import etchloom.electric.field.IronPlanes;
import java.util.List;
import java.util.function.Function;

/**
 * Sums over the images behind ideal, endless iron planes.
 *
 * <p>One plane makes one image. Two make pairs without end, the m-th pair about m gaps away, upside
 * down for odd m. From far away a closed conductor is a dipole, so the pairs fall off as 1/m³ and
 * then as 1/m⁵, with factors of their own for odd and even m: the rest is summed with the factors
 * that the last two pairs of either kind give, and pairs are added until the whole changes by less
 * than {@value #RESIDUAL} of its largest value.
 */
final class ImageSeries {
  private static final double RESIDUAL = 1e-5;
  private static final int LEAST_PAIRS = 6;

  /** Enough for a winding two hundred times as wide as the gap. */
  private static final int MOST_PAIRS = 400;

  /** From here on the rest is an integral. */
  private static final int FAR = 2000;

  private ImageSeries() {}

  /**
   * @param size how many values a sum has
   * @param sum the values summed over the images given
   */
  static double[] sum(IronPlanes iron, int size, Function<List<Mirror>, double[]> sum) {
    if (!iron.endless()) {
      double[] none = new double[size];
      if (iron.aboveMm().isPresent()) {
        return sum.apply(List.of(new Mirror(-1, 2 * iron.aboveMm().getAsDouble())));
      }
      return iron.belowMm().isPresent()
          ? sum.apply(List.of(new Mirror(-1, 2 * iron.belowMm().getAsDouble())))
          : none;
    }
    double above = iron.aboveMm().getAsDouble();
    double below = iron.belowMm().getAsDouble();
    double gap = above - below;
    if (!(gap > 0)) {
      throw new IllegalArgumentException("no gap between iron at " + above + " and " + below);
    }
    return new Pairs(size).sum(above + below, gap, sum);
  }

  /** The pairs so far. */
  private static final class Pairs {
    private final double[][] last = new double[4][];
    private double[] total;

    Pairs(int size) {
      total = new double[size];
    }

    double[] sum(double middleTwice, double gap, Function<List<Mirror>, double[]> sum) {
      double[] before = total;
      for (int m = 1; m <= MOST_PAIRS; m++) {
        boolean odd = m % 2 == 1;
        double shift = odd ? middleTwice : 0;
        int sign = odd ? -1 : 1;
        double[] pair =
            sum.apply(
                List.of(new Mirror(sign, shift + m * gap), new Mirror(sign, shift - m * gap)));
        System.arraycopy(last, 0, last, 1, 3);
        last[0] = pair;
        total = plus(total, pair);
        if (m >= 4) {
          double[] whole = plus(total, rest(m));
          if (m >= LEAST_PAIRS && odd && change(whole, before) < RESIDUAL) {
            return whole;
          }
          before = odd ? whole : before;
        }
      }
      return before;
    }

    private double[] rest(int m) {
      double[] out = new double[total.length];
      for (int i = 0; i < out.length; i++) {
        out[i] = rest(last[0][i], last[2][i], m) + rest(last[1][i], last[3][i], m - 1);
      }
      return out;
    }

    /** All pairs of the same kind after pair k, given that and the one of its kind before it. */
    private static double rest(double at, double twoBefore, int k) {
      double k2 = (double) k * k;
      double j2 = (k - 2.0) * (k - 2.0);
      double cubeAt = at * k * k2;
      double cubeBefore = twoBefore * (k - 2) * j2;
      double fifth = (cubeBefore - cubeAt) / (1 / j2 - 1 / k2);
      double third = cubeAt - fifth / k2;
      double sum = 0;
      int n = k + 2;
      for (; n <= FAR; n += 2) {
        double n2 = (double) n * n;
        sum += (third + fifth / n2) / (n * n2);
      }
      double edge = n - 1.0;
      return sum + third / (4 * edge * edge);
    }

    private static double[] plus(double[] a, double[] b) {
      double[] out = new double[a.length];
      for (int i = 0; i < out.length; i++) {
        out[i] = a[i] + b[i];
      }
      return out;
    }

    private static double change(double[] now, double[] before) {
      double most = 0;
      double largest = 0;
      for (int i = 0; i < now.length; i++) {
        most = Math.max(most, Math.abs(now[i] - before[i]));
        largest = Math.max(largest, Math.abs(now[i]));
      }
      return largest == 0 ? 0 : most / largest;
    }
  }
}
