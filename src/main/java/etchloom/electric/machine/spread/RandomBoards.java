package etchloom.electric.machine.spread;

import etchloom.units.RoundStep;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

/** Seeded random boards: the same figures on every run and machine. */
final class RandomBoards {
  static final int BOARDS = 1000;

  private static final long SEED = 20210409;
  private static final double KEPT = 0.95;
  private static final int BINS = 25;

  private final double[] terminal = new double[BOARDS];
  private final double[] imbalance = new double[BOARDS];
  private final double[] mean = new double[BOARDS];
  private final double[] torque = new double[BOARDS];

  /**
   * @param resistance whether resistances are drawn too; not where a track may vanish
   * @param torquePerCopper relative change of the torque with each layer's relative change of
   *     copper
   */
  RandomBoards(PairParts pairs, Tolerances tol, double[] torquePerCopper, boolean resistance) {
    Random random = new Random(SEED);
    double[] factor = new double[pairs.groups().size()];
    double[] track = new double[torquePerCopper.length];
    double[] copper = new double[torquePerCopper.length];
    for (int board = 0; board < BOARDS; board++) {
      double moved = 0;
      for (int l = 0; l < copper.length; l++) {
        track[l] = tol.track() * Tolerances.LAYER_SIGMA * random.nextGaussian();
        double c = tol.copper() * Tolerances.LAYER_SIGMA * random.nextGaussian();
        copper[l] = within(c, tol.copper());
        moved += torquePerCopper[l] * copper[l];
      }
      double plating = 1 + within(tol.plating() / 3 * random.nextGaussian(), tol.plating());
      torque[board] = Math.abs(moved);
      if (resistance) {
        for (int g = 0; g < factor.length; g++) {
          factor[g] = factor(pairs, g, tol, track, copper, plating, random);
        }
        mean[board] = pairs.mean(factor);
        terminal[board] = pairs.farthest(factor);
        imbalance[board] = pairs.imbalance(factor);
      }
    }
  }

  private static double factor(
      PairParts pairs,
      int group,
      Tolerances tol,
      double[] track,
      double[] copper,
      double plating,
      Random random) {
    int layer = pairs.groups().get(group).layer();
    if (layer == 0) {
      return pairs.factor(group, 1, 1, plating);
    }
    double t = track[layer - 1] + tol.track() * Tolerances.LOCAL_SIGMA * random.nextGaussian();
    double c = copper[layer - 1] + tol.copper() * Tolerances.LOCAL_SIGMA * random.nextGaussian();
    return pairs.factor(group, 1 + within(t, tol.track()), 1 + within(c, tol.copper()), 1);
  }

  private static double within(double x, double limit) {
    return Math.max(-limit, Math.min(limit, x));
  }

  double terminal() {
    return kept(terminal);
  }

  /** Boards by their mean resistance between terminals, in bins of a round width. */
  List<SpreadFigures.Bin> bins() {
    double least = Arrays.stream(mean).min().orElseThrow();
    double most = Arrays.stream(mean).max().orElseThrow();
    if (!(most > least)) {
      return List.of(new SpreadFigures.Bin(least, most, BOARDS));
    }
    double width = RoundStep.atLeast((most - least) / BINS);
    long first = (long) Math.floor(least / width);
    int[] count = new int[(int) ((long) Math.floor(most / width) - first) + 1];
    for (double ohm : mean) {
      count[(int) ((long) Math.floor(ohm / width) - first)]++;
    }
    List<SpreadFigures.Bin> out = new ArrayList<>();
    for (int i = 0; i < count.length; i++) {
      out.add(new SpreadFigures.Bin((first + i) * width, (first + i + 1) * width, count[i]));
    }
    return out;
  }

  double imbalance() {
    return kept(imbalance);
  }

  double torque() {
    return kept(torque);
  }

  private static double kept(double[] sizes) {
    double[] sorted = sizes.clone();
    Arrays.sort(sorted);
    return sorted[(int) Math.ceil(KEPT * sorted.length) - 1];
  }
}
