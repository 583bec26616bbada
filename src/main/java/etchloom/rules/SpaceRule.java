package etchloom.rules;

import etchloom.rules.Verdicts.Measured;
import java.util.List;

/**
 * {@code space}: the gap between any two pieces of copper on a layer, whatever their nets, for a
 * winding is one net and a short between its turns is still a short.
 */
final class SpaceRule implements LayerRule {
  @Override
  public List<PairWatch> watches(Layer layer, Verdicts verdicts) {
    return layer.row().isEmpty()
        ? List.of()
        : List.of(new Watch(layer, layer.row().get().spaceMm(), verdicts));
  }

  private static final class Watch implements PairWatch {
    private final Layer layer;
    private final double requiredMm;
    private final Verdicts verdicts;
    private final Gaps drawn;
    private final double drawnMm;
    private double bestMm = Double.POSITIVE_INFINITY;

    Watch(Layer layer, double requiredMm, Verdicts verdicts) {
      this.layer = layer;
      this.requiredMm = requiredMm;
      this.verdicts = verdicts;
      this.drawnMm = Math.max(requiredMm, layer.board().spec().coil().spaceMm());
      this.drawn = new Gaps(layer.copper().walk(), drawnMm);
    }

    @Override
    public double wantedMm() {
      return Math.max(requiredMm, bestMm - Board.SLACK_MM);
    }

    @Override
    public void see(Close c) {
      boolean broken = c.gapMm() < requiredMm - Board.SLACK_MM;
      if (broken || (!c.bend() && c.gapMm() < bestMm && apart(c))) {
        bestMm = Math.min(bestMm, c.gapMm());
        verdicts.add(
            Measured.atLeast(
                    RuleName.SPACE,
                    layer.number(),
                    c.at(),
                    c.gapMm(),
                    requiredMm,
                    layer.words(c.p(), c.q()))
                .ids(c.first(), c.second()));
      }
    }

    /**
     * Whether a gap that is kept says something about the spacing, and not only that the copper
     * turns there as tightly as the space it is drawn with allows.
     */
    private boolean apart(Close c) {
      Gaps.Gap g = drawn.gap(c.p(), c.q(), c.gapMm() + Board.SLACK_MM, drawnMm - Board.SLACK_MM);
      return g != null && !g.bend();
    }
  }
}
