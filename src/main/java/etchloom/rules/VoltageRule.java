package etchloom.rules;

import etchloom.rules.Verdicts.Measured;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code voltage}: the gap between two pieces of copper against the voltage between them, by
 * IPC-2221 table 6-1.
 */
final class VoltageRule implements LayerRule {
  @Override
  public List<PairWatch> watches(Layer layer, Verdicts verdicts) {
    return on(layer) ? List.of(new Watch(layer, verdicts)) : List.of();
  }

  /** Bare pads between themselves: few, and the column asks for much more than under the mask. */
  @Override
  public void check(Layer layer, Verdicts verdicts) {
    List<Piece> pieces = layer.copper().pieces();
    Gaps gaps = new Gaps(layer.copper().walk(), layer.board().spaceMm(layer.number()));
    List<Integer> bare = on(layer) ? bare(layer, pieces) : List.of();
    for (int a = 0; a < bare.size(); a++) {
      for (int b = a + 1; b < bare.size(); b++) {
        Piece p = pieces.get(bare.get(a));
        Piece q = pieces.get(bare.get(b));
        Gaps.Gap g = gaps.gap(p, q, Double.POSITIVE_INFINITY, 0);
        if (g != null && !g.bend()) {
          double gap = g.centres().distanceMm() - p.fatMm() - q.fatMm();
          Close c = new Close(bare.get(a), bare.get(b), p, q, gap, g.centres(), false);
          add(layer, verdicts, c, layer.board().potentials().volt(p, q), Spacing2221.A6);
        }
      }
    }
  }

  private static List<Integer> bare(Layer layer, List<Piece> pieces) {
    List<Integer> out = new ArrayList<>();
    for (int i = 0; i < pieces.size(); i++) {
      if (layer.board().exposure().bare(layer.number(), pieces.get(i))) {
        out.add(i);
      }
    }
    return out;
  }

  private static boolean on(Layer layer) {
    return layer.board().potentials().fullVolt().isPresent();
  }

  private static void add(
      Layer layer, Verdicts verdicts, Close c, double volt, Spacing2221 column) {
    verdicts.add(
        Measured.atLeast(
                RuleName.VOLTAGE,
                layer.number(),
                c.at(),
                c.gapMm(),
                column.requiredMm(volt),
                words(layer.words(c.p(), c.q()), volt, column))
            .byMargin()
            .ids(c.first(), c.second()));
  }

  /** The column for two things on a layer. */
  static Spacing2221 column(Layer layer, boolean bothBare) {
    if (!layer.outer()) {
      return Spacing2221.B1;
    }
    return bothBare ? Spacing2221.A6 : Spacing2221.B4;
  }

  static Words words(Words things, double volt, Spacing2221 column) {
    return Words.of(things, ": ", Numbers.significant(volt, 3), " V, column ", column);
  }

  private static final class Watch implements PairWatch {
    private final Layer layer;
    private final Verdicts verdicts;
    private final double mostMm;
    private double leastMarginMm = Double.POSITIVE_INFINITY;

    Watch(Layer layer, Verdicts verdicts) {
      this.layer = layer;
      this.verdicts = verdicts;
      double full = layer.board().potentials().fullVolt().orElse(0);
      mostMm = column(layer, false).requiredMm(full);
    }

    @Override
    public double wantedMm() {
      return mostMm + Math.max(0, leastMarginMm - Board.SLACK_MM);
    }

    /** Where near places break the rule there is no end of the far ones that do. */
    @Override
    public boolean more(double searchedMm) {
      return leastMarginMm >= -Board.SLACK_MM && wantedMm() > searchedMm;
    }

    @Override
    public void see(Close c) {
      if (c.bend()) {
        return;
      }
      Spacing2221 column = column(layer, false);
      double volt = layer.board().potentials().volt(c.p(), c.q());
      double required = column.requiredMm(volt);
      double margin = c.gapMm() - required;
      if (margin < -Board.SLACK_MM || margin < leastMarginMm) {
        leastMarginMm = Math.min(leastMarginMm, margin);
        add(layer, verdicts, c, volt, column);
      }
    }
  }
}
