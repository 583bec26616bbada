package etchloom.receive;

import etchloom.artwork.Artwork;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.electric.resistance.Variation;
import etchloom.spec.FabRules;
import java.util.Arrays;
import java.util.List;

/**
 * The least and the most that a good board shows between each pair of terminals, Ω at 20 °C: all of
 * the fab's tolerances at their ends at once, as on the report's acceptance sheet. Infinite where
 * nothing joins the pair; the most is infinite too where the tolerances could etch a track away.
 */
record Limits(double[] least, double[] most) {

  /**
   * @param bounded whether every track has copper left at the thin end of all tolerances
   */
  static Limits of(Artwork artwork, FabRules.Tolerance t, boolean bounded, Pairs pairs) {
    Variation fat = new Variation(1 + t.track(), 1 + t.copper(), 1 + t.plating());
    Variation thin = new Variation(1 - t.track(), 1 - t.copper(), 1 - t.plating());
    double[] least = spread(Resistance.terminals(artwork, fat), pairs);
    double[] most = spread(bounded ? Resistance.terminals(artwork, thin) : List.of(), pairs);
    return new Limits(least, most);
  }

  private static double[] spread(List<TerminalOhm> some, Pairs pairs) {
    double[] out = new double[pairs.size()];
    Arrays.fill(out, Double.POSITIVE_INFINITY);
    some.forEach(t -> out[pairs.of(t.from(), t.to())] = t.ohm());
    return out;
  }
}
