package etchloom.electric.machine.spread;

import etchloom.artwork.Artwork;
import etchloom.electric.machine.spread.SpreadFigures.Share;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.FabRules;
import java.util.Arrays;
import java.util.Optional;
import java.util.Random;

/**
 * Works out the spread of a board's figures.
 *
 * <p>The model: a fab's tolerance is a limit that three standard deviations reach. Each layer draws
 * its own track width and copper, each board its own plating. Within one board, one coil's copper
 * on a layer departs from its layer's by {@link #LOCAL} of that, and only these local differences
 * unbalance the phases. The split is our own assumption; no standard states one.
 */
public final class Spread {
  /** Share of a tolerance that is left between places on one layer of one board. */
  public static final double LOCAL = 0.25;

  /** Random boards drawn. */
  public static final int BOARDS = 1000;

  private static final long SEED = 20210409;
  private static final double KEPT = 0.95;

  private final PairParts parts;
  private final FabRules.Tolerance tolerance;
  private final ResistanceFigures resistance;
  private final Optional<double[]> torquePerMm;
  private final double[] copperMm;

  private Spread(
      Artwork artwork,
      FabRules.Tolerance tolerance,
      ResistanceFigures resistance,
      Optional<double[]> torquePerMm) {
    parts = PairParts.of(artwork);
    this.tolerance = tolerance;
    this.resistance = resistance;
    this.torquePerMm = torquePerMm;
    copperMm = new double[artwork.layers()];
    for (int i = 0; i < copperMm.length; i++) {
      copperMm[i] = artwork.stackup().copper().get(i).thicknessMm();
    }
  }

  /**
   * All shares; resistance's are absent where a tolerance could etch a track away.
   *
   * @param torquePerMm relative change of the torque per ampere with each layer's copper thickness,
   *     1/mm; empty without a rotor
   */
  public static SpreadFigures of(
      Artwork artwork,
      FabRules.Tolerance tolerance,
      ResistanceFigures resistance,
      Optional<double[]> torquePerMm) {
    return new Spread(artwork, tolerance, resistance, torquePerMm).figures();
  }

  private SpreadFigures figures() {
    boolean safe = resistance.worst().isPresent() && resistance.rss().isPresent();
    Draws d = draw(safe);
    Share terminal = safe ? terminal(d) : Share.ABSENT;
    Share imbalance = safe ? imbalance(d) : Share.ABSENT;
    return new SpreadFigures(
        terminal, torquePerMm.map(t -> torque(t, d)).orElse(Share.ABSENT), imbalance);
  }

  private record Draws(double[] terminal, double[] torque, double[] imbalance) {}

  private Draws draw(boolean safe) {
    Draws out = new Draws(new double[BOARDS], new double[BOARDS], new double[BOARDS]);
    Random random = new Random(SEED);
    int n = parts.groups().size();
    double[] factor = new double[n];
    double[] track = new double[copperMm.length];
    double[] copper = new double[copperMm.length];
    double whole = Math.sqrt(1 - LOCAL * LOCAL) / 3;
    for (int board = 0; board < BOARDS; board++) {
      double moved = 0;
      for (int l = 0; l < copper.length; l++) {
        track[l] = tolerance.track() * whole * random.nextGaussian();
        copper[l] = limited(tolerance.copper() * whole * random.nextGaussian(), tolerance.copper());
        moved += torquePerMm.isPresent() ? torquePerMm.get()[l] * copperMm[l] * copper[l] : 0;
      }
      double plating =
          1 + limited(tolerance.plating() / 3 * random.nextGaussian(), tolerance.plating());
      for (int g = 0; g < n; g++) {
        int layer = parts.groups().get(g).layer();
        if (layer == 0) {
          factor[g] = safe ? parts.factor(g, 1, 1, plating) : 1;
          continue;
        }
        double t = track[layer - 1] + tolerance.track() * LOCAL / 3 * random.nextGaussian();
        double c = copper[layer - 1] + tolerance.copper() * LOCAL / 3 * random.nextGaussian();
        double tt = 1 + limited(t, tolerance.track());
        double cc = 1 + limited(c, tolerance.copper());
        factor[g] = safe ? parts.factor(g, tt, cc, 1) : 1;
      }
      out.torque()[board] = Math.abs(moved);
      out.terminal()[board] = farthest(factor);
      out.imbalance()[board] = imbalanceOf(factor);
    }
    return out;
  }

  private static double limited(double x, double limit) {
    return Math.max(-limit, Math.min(limit, x));
  }

  private double farthest(double[] factor) {
    double most = 0;
    for (int p = 0; p < parts.pairs(); p++) {
      most = Math.max(most, Math.abs(parts.ohm(p, factor) / nominal(p) - 1));
    }
    return most;
  }

  private double nominal(int pair) {
    double sum = 0;
    for (int g = 0; g < parts.groups().size(); g++) {
      sum += parts.ohm(pair, g);
    }
    return sum;
  }

  private double imbalanceOf(double[] factor) {
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    double sum = 0;
    for (int p = 0; p < parts.pairs(); p++) {
      double ohm = parts.ohm(p, factor);
      least = Math.min(least, ohm);
      most = Math.max(most, ohm);
      sum += ohm;
    }
    return (most - least) / (sum / parts.pairs());
  }

  private Share terminal(Draws d) {
    double mean = resistance.meanTerminalOhm();
    return Share.of(
        percent(farther(resistance.worst().orElseThrow(), mean)),
        percent(farther(resistance.rss().orElseThrow(), mean)),
        percent(kept(d.terminal())));
  }

  private static double farther(ResistanceFigures.Limits limits, double mean) {
    return Math.max(limits.maxTerminalOhm() / mean - 1, 1 - limits.minTerminalOhm() / mean);
  }

  private Share torque(double[] perMm, Draws d) {
    double worst = 0;
    double squares = 0;
    for (int l = 0; l < perMm.length; l++) {
      double one = perMm[l] * copperMm[l] * tolerance.copper();
      worst += Math.abs(one);
      squares += one * one;
    }
    return Share.of(percent(worst), percent(Math.sqrt(squares)), percent(kept(d.torque())));
  }

  private Share imbalance(Draws d) {
    return Share.of(
        percent(worstImbalance()), percent(rssImbalance()), percent(kept(d.imbalance())));
  }

  /** One phase's coils at one end of the local tolerance, all others at the other end. */
  private double worstImbalance() {
    double worst = 0;
    for (String phase : parts.groups().stream().map(PairParts.Group::phase).distinct().toList()) {
      for (int side = -1; side <= 1; side += 2) {
        double[] factor = new double[parts.groups().size()];
        for (int g = 0; g < factor.length; g++) {
          PairParts.Group group = parts.groups().get(g);
          int way = group.phase().equals(phase) ? side : -side;
          double t = group.coil() == 0 ? 0 : way * LOCAL * tolerance.track();
          double c = group.coil() == 0 ? 0 : way * LOCAL * tolerance.copper();
          factor[g] = parts.factor(g, 1 + t, 1 + c, 1);
        }
        worst = Math.max(worst, imbalanceOf(factor));
      }
    }
    return worst;
  }

  private double rssImbalance() {
    double most = 0;
    for (int p = 0; p < parts.pairs(); p++) {
      for (int q = 0; q < p; q++) {
        double squares = 0;
        for (int g = 0; g < parts.groups().size(); g++) {
          if (parts.groups().get(g).layer() > 0) {
            double off = parts.ohm(p, g) - parts.ohm(q, g);
            double t = parts.factor(g, 1 - LOCAL * tolerance.track(), 1, 1) - 1;
            double c = parts.factor(g, 1, 1 - LOCAL * tolerance.copper(), 1) - 1;
            squares += off * off * (t * t + c * c);
          }
        }
        double apart = Math.abs(nominal(p) - nominal(q)) + Math.sqrt(squares);
        most = Math.max(most, apart / ((nominal(p) + nominal(q)) / 2));
      }
    }
    return most;
  }

  private static double kept(double[] sizes) {
    double[] sorted = sizes.clone();
    Arrays.sort(sorted);
    return sorted[(int) Math.ceil(KEPT * sorted.length) - 1];
  }

  private static double percent(double share) {
    return 100 * share;
  }
}
