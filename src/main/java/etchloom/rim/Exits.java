package etchloom.rim;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Where the terminals' links leave the rings: for each terminal an angle as near to it as may be,
 * in the terminals' order, clear of all other radials.
 *
 * <p>A link may leave at an angle of its own pins: then it shares that radial's via.
 */
final class Exits {
  /** Bounds the search; places further from the row are of no use while nearer ones are free. */
  private static final int MOST_PLACES = 400;

  private Exits() {}

  /**
   * One terminal.
   *
   * @param angleRad the terminal's own angle
   * @param own angles of its link's radials
   */
  record Wish(double angleRad, List<Double> own) {}

  /**
   * @param wishes in counter-clockwise order
   * @param radials all radials' angles
   * @param clearRad least angle between a drop and any other radial or drop
   * @param middleRad the terminal row's middle; angles are taken within a half turn of it
   * @return the exits' angles in the wishes' order, or empty where there is no room
   */
  static Optional<List<Double>> choose(
      List<Wish> wishes, List<Double> radials, double clearRad, double middleRad) {
    double[] places = places(wishes, radials, clearRad, middleRad);
    int n = wishes.size();
    int m = places.length;
    double[][] cost = new double[n][m];
    int[][] from = new int[n][m];
    for (int i = 0; i < n; i++) {
      for (int k = 0; k < m; k++) {
        cost[i][k] = Double.POSITIVE_INFINITY;
        if (!allowed(wishes.get(i), places[k], radials, clearRad, middleRad)) {
          continue;
        }
        double here = Math.abs(places[k] - Angles.signed(wishes.get(i).angleRad() - middleRad));
        if (i == 0) {
          cost[i][k] = here;
          continue;
        }
        for (int j = 0; j < k && places[j] <= places[k] - clearRad + Angles.SAME; j++) {
          if (cost[i - 1][j] + here < cost[i][k] - Angles.SAME) {
            cost[i][k] = cost[i - 1][j] + here;
            from[i][k] = j;
          }
        }
      }
    }
    return walkBack(places, cost, from, middleRad);
  }

  private static Optional<List<Double>> walkBack(
      double[] places, double[][] cost, int[][] from, double middleRad) {
    int n = cost.length;
    int at = -1;
    for (int k = 0; k < places.length; k++) {
      if (at < 0 || cost[n - 1][k] < cost[n - 1][at] - Angles.SAME) {
        at = k;
      }
    }
    if (at < 0 || Double.isInfinite(cost[n - 1][at])) {
      return Optional.empty();
    }
    Double[] out = new Double[n];
    for (int i = n - 1; i >= 0; i--) {
      out[i] = Angles.positive(places[at] + middleRad);
      at = from[i][at];
    }
    return Optional.of(Arrays.asList(out));
  }

  /** Places worth trying, relative to the middle, ascending. */
  private static double[] places(
      List<Wish> wishes, List<Double> radials, double clearRad, double middleRad) {
    List<Double> out = new ArrayList<>();
    double[] sorted =
        radials.stream().mapToDouble(a -> Angles.signed(a - middleRad)).sorted().toArray();
    for (int i = 0; i < sorted.length; i++) {
      double low = sorted[i] + clearRad;
      double next = i + 1 < sorted.length ? sorted[i + 1] : sorted[0] + 2 * Math.PI;
      double high = next - clearRad;
      out.add(sorted[i]);
      if (low > high + Angles.SAME) {
        continue;
      }
      for (int k = 0; k < wishes.size() && low + k * clearRad <= high + Angles.SAME; k++) {
        out.add(low + k * clearRad);
        out.add(high - k * clearRad);
      }
      for (Wish w : wishes) {
        double wish = Angles.signed(w.angleRad() - middleRad);
        if (wish >= low && wish <= high) {
          out.add(wish);
          for (int k = 1; k < wishes.size(); k++) {
            out.add(wish + k * clearRad);
            out.add(wish - k * clearRad);
          }
        }
      }
    }
    Stream<Double> near =
        out.stream()
            .filter(a -> a > -Math.PI && a <= Math.PI)
            .sorted(Comparator.comparingDouble(Math::abs))
            .limit(MOST_PLACES);
    Stream<Double> own =
        wishes.stream().flatMap(w -> w.own().stream()).map(a -> Angles.signed(a - middleRad));
    return Stream.concat(near, own).mapToDouble(Double::doubleValue).sorted().distinct().toArray();
  }

  private static boolean allowed(
      Wish wish, double place, List<Double> radials, double clearRad, double middleRad) {
    for (double r : radials) {
      double off = Math.abs(Angles.signed(r - middleRad - place));
      if (off < clearRad - Angles.SAME) {
        boolean own =
            off <= Angles.SAME
                && wish.own().stream().anyMatch(o -> Math.abs(Angles.signed(o - r)) <= Angles.SAME);
        if (!own) {
          return false;
        }
      }
    }
    return true;
  }
}
