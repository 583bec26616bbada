package etchloom.electric.machine.spread;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Stackup;
import etchloom.electric.machine.spread.SpreadFigures.Share;
import etchloom.spec.FabRules;
import java.util.List;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;

/** Works out the spread of a board's figures by the model in {@link Tolerances}. */
public final class Spread {
  private static final double PERCENT = 100;

  private final PairParts pairs;
  private final Tolerances tol;

  private Spread(PairParts pairs, Tolerances tol) {
    this.pairs = pairs;
    this.tol = tol;
  }

  /**
   * All shares; resistance's are absent where a tolerance could etch a track away.
   *
   * @param torquePerMm relative change of the torque per ampere with each layer's copper thickness,
   *     1/mm; empty without a rotor
   */
  public static SpreadFigures of(
      Artwork artwork, FabRules.Tolerance tolerance, Optional<double[]> torquePerMm) {
    double[] perCopper = new double[artwork.layers()];
    for (int i = 0; i < perCopper.length; i++) {
      double mm = artwork.stackup().copper().get(i).thicknessMm();
      perCopper[i] = torquePerMm.isPresent() ? torquePerMm.get()[i] * mm : 0;
    }
    Tolerances tol = Tolerances.of(tolerance);
    PairParts pairs = PairParts.of(artwork);
    boolean kept = tracksRemain(artwork, tol);
    RandomBoards boards = new RandomBoards(pairs, tol, perCopper, kept);
    Spread s = new Spread(pairs, tol);
    return new SpreadFigures(
        kept ? s.terminal(boards.terminal()) : Share.ABSENT,
        torquePerMm.isPresent() ? s.torque(perCopper, boards.torque()) : Share.ABSENT,
        kept ? s.imbalance(boards.imbalance()) : Share.ABSENT,
        kept ? boards.bins() : List.of());
  }

  /** Whether every track has copper left at the thin end of all tolerances. */
  private static boolean tracksRemain(Artwork artwork, Tolerances tol) {
    if (tol.copper() >= 1 || tol.plating() >= 1) {
      return false;
    }
    for (Conductor c : artwork.conductors()) {
      Stackup.Copper copper = artwork.stackup().copper().get(c.layer() - 1);
      if (!(c.widthMm() * (1 - tol.track()) > copper.undercutMm())) {
        return false;
      }
    }
    return true;
  }

  private Share terminal(double monteCarlo) {
    double thin = farthest(-tol.track(), -tol.copper(), -tol.plating());
    double fat = farthest(tol.track(), tol.copper(), tol.plating());
    double squares = 0;
    for (double[] one :
        new double[][] {{tol.track(), 0, 0}, {0, tol.copper(), 0}, {0, 0, tol.plating()}}) {
      // Thin copper moves a resistance farther than fat copper.
      double d = farthest(-one[0], -one[1], -one[2]);
      squares += d * d;
    }
    return share(Math.max(thin, fat), Math.sqrt(squares), monteCarlo);
  }

  private double farthest(double track, double copper, double plating) {
    return pairs.farthest(factors(g -> track, g -> copper, g -> plating));
  }

  private double[] factors(
      IntToDoubleFunction track, IntToDoubleFunction copper, IntToDoubleFunction plating) {
    double[] out = new double[pairs.groups().size()];
    for (int g = 0; g < out.length; g++) {
      out[g] =
          pairs.factor(
              g,
              1 + track.applyAsDouble(g),
              1 + copper.applyAsDouble(g),
              1 + plating.applyAsDouble(g));
    }
    return out;
  }

  private Share torque(double[] perCopper, double monteCarlo) {
    double worst = 0;
    double squares = 0;
    for (double p : perCopper) {
      worst += Math.abs(p * tol.copper());
      squares += p * tol.copper() * p * tol.copper();
    }
    return share(worst, Math.sqrt(squares), monteCarlo);
  }

  private Share imbalance(double monteCarlo) {
    return share(worstImbalance(), rssImbalance(), monteCarlo);
  }

  /** One phase's coils at one end of the local tolerance, all others at the other end. */
  private double worstImbalance() {
    double worst = 0;
    for (String phase : pairs.groups().stream().map(PairParts.Group::phase).distinct().toList()) {
      for (int side = -1; side <= 1; side += 2) {
        double end = side * Tolerances.LOCAL;
        IntToDoubleFunction way =
            g -> {
              PairParts.Group group = pairs.groups().get(g);
              return group.coil() == 0 ? 0 : group.phase().equals(phase) ? end : -end;
            };
        double[] factor =
            factors(
                g -> way.applyAsDouble(g) * tol.track(),
                g -> way.applyAsDouble(g) * tol.copper(),
                g -> 0);
        worst = Math.max(worst, pairs.imbalance(factor));
      }
    }
    return worst;
  }

  private double rssImbalance() {
    double most = 0;
    for (int p = 0; p < pairs.pairs(); p++) {
      for (int q = 0; q < p; q++) {
        double squares = 0;
        for (int g = 0; g < pairs.groups().size(); g++) {
          if (pairs.groups().get(g).layer() > 0) {
            double off = pairs.ohm(p, g) - pairs.ohm(q, g);
            double t = pairs.factor(g, 1 - Tolerances.LOCAL * tol.track(), 1, 1) - 1;
            double c = pairs.factor(g, 1, 1 - Tolerances.LOCAL * tol.copper(), 1) - 1;
            squares += off * off * (t * t + c * c);
          }
        }
        double apart = Math.abs(pairs.nominal(p) - pairs.nominal(q)) + Math.sqrt(squares);
        most = Math.max(most, apart / ((pairs.nominal(p) + pairs.nominal(q)) / 2));
      }
    }
    return most;
  }

  private static Share share(double worst, double rss, double monteCarlo95) {
    return Share.of(PERCENT * worst, PERCENT * rss, PERCENT * monteCarlo95);
  }
}
