package etchloom.rules;

import etchloom.rules.Verdicts.Measured;
import java.util.List;
import java.util.Locale;

/**
 * {@code voltage}: the gap between two pieces of copper against the voltage between them, by
 * IPC-2221 table 6-1.
 */
final class VoltageRule implements LayerRule {
  @Override
  public List<PairWatch> watches(Layer layer, Verdicts verdicts) {
    return layer.board().potentials().fullVolt().isEmpty()
        ? List.of()
        : List.of(new Watch(layer, verdicts));
  }

  /** The column for two things on a layer. */
  static Spacing2221 column(Layer layer, boolean bothBare) {
    if (!layer.outer()) {
      return Spacing2221.B1;
    }
    return bothBare ? Spacing2221.A6 : Spacing2221.B4;
  }

  static String words(String things, double volt, Spacing2221 column) {
    return String.format(Locale.ROOT, "%s: %.3g V, column %s", things, volt, column);
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
      mostMm =
          Math.max(
              column(layer, false).requiredMm(full),
              layer.outer() ? Spacing2221.A6.requiredMm(full) : 0);
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
      Exposure bare = layer.board().exposure();
      boolean bothBare = bare.bare(layer.number(), c.p()) && bare.bare(layer.number(), c.q());
      Spacing2221 column = column(layer, bothBare);
      double volt = layer.board().potentials().volt(c.p(), c.q());
      double required = column.requiredMm(volt);
      double margin = c.gapMm() - required;
      if (margin < -Board.SLACK_MM || margin < leastMarginMm) {
        leastMarginMm = Math.min(leastMarginMm, margin);
        verdicts.add(
            Measured.atLeast(
                    RuleName.VOLTAGE,
                    layer.number(),
                    c.at(),
                    c.gapMm(),
                    required,
                    () -> words(layer.words(c.p(), c.q()), volt, column))
                .byMargin()
                .ids(c.first(), c.second()));
      }
    }
  }
}
