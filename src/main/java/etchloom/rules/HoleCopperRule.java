package etchloom.rules;

import etchloom.artwork.Joint;
import etchloom.rules.Verdicts.Measured;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code hole-copper} for plated holes: from a hole's edge to copper that does not belong to it.
 *
 * <p>What belongs to a hole is told as for the space: what its pad's tracks lead to within the
 * neighbours' length. A hole stands in the middle of its pad, so its distance to anything is the
 * pad's and the ring's together.
 */
final class HoleCopperRule implements LayerRule {
  @Override
  public List<PairWatch> watches(Layer layer, Verdicts verdicts) {
    double[] ringMm = new double[layer.board().artwork().joints().size()];
    double leastRing = Double.POSITIVE_INFINITY;
    for (Joint j : layer.board().artwork().joints()) {
      ringMm[j.id()] = Double.NaN;
      if (j.hole().isPresent() && j.on(layer.number())) {
        ringMm[j.id()] = (j.padMm() - j.hole().get()) / 2;
        leastRing = Math.min(leastRing, ringMm[j.id()]);
      }
    }
    List<PairWatch> out = new ArrayList<>(1);
    if (Double.isFinite(leastRing)) {
      out.add(new Watch(layer, ringMm, leastRing, verdicts));
    }
    return out;
  }

  private static final class Watch implements PairWatch {
    private final Layer layer;
    private final double[] ringMm;
    private final double leastRingMm;
    private final double requiredMm;
    private final Verdicts verdicts;
    private double bestMm = Double.POSITIVE_INFINITY;

    Watch(Layer layer, double[] ringMm, double leastRingMm, Verdicts verdicts) {
      this.layer = layer;
      this.ringMm = ringMm;
      this.leastRingMm = leastRingMm;
      this.requiredMm = layer.board().fab().hole().copperGapMm();
      this.verdicts = verdicts;
    }

    @Override
    public double wantedMm() {
      return Math.max(requiredMm, bestMm - Board.SLACK_MM) - leastRingMm;
    }

    @Override
    public void see(Close c) {
      see(c, c.p(), c.q());
      see(c, c.q(), c.p());
    }

    private void see(Close c, Piece hole, Piece other) {
      if (!hole.isPad() || Double.isNaN(ringMm[hole.joint()])) {
        return;
      }
      double gap = c.gapMm() + ringMm[hole.joint()];
      boolean broken = gap < requiredMm - Board.SLACK_MM;
      if (broken || (!c.bend() && gap < bestMm)) {
        bestMm = Math.min(bestMm, gap);
        verdicts.add(
            Measured.atLeast(
                    RuleName.HOLE_COPPER,
                    layer.number(),
                    c.at(),
                    gap,
                    requiredMm,
                    Words.of("hole of ", layer.words(hole, other)))
                .ids(c.first(), c.second()));
      }
    }
  }
}
