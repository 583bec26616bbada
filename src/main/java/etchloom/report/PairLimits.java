package etchloom.report;

import etchloom.artwork.Artwork;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.electric.resistance.Variation;
import etchloom.spec.FabRules;
import java.util.ArrayList;
import java.util.List;

/**
 * What a delivered board may show between two terminals, Ω at 20 °C: every tolerance of the fab at
 * its end at once, for each pair by itself, since a pair with the star point has half of the
 * others'.
 */
record PairLimits(String pair, double expected, double least, double greatest) {

  /** All pairs, the star point's too; none where the tolerances could etch a track away. */
  static List<PairLimits> of(Results r) {
    return of(r.artwork(), r.fab().tolerance(), r.resistance());
  }

  private static List<PairLimits> of(Artwork art, FabRules.Tolerance t, ResistanceFigures figures) {
    if (figures.worst().isEmpty()) {
      return List.of();
    }
    Variation fat = new Variation(1 + t.track(), 1 + t.copper(), 1 + t.plating());
    Variation thin = new Variation(1 - t.track(), 1 - t.copper(), 1 - t.plating());
    List<TerminalOhm> low = Resistance.terminals(art, fat);
    List<TerminalOhm> high = Resistance.terminals(art, thin);
    List<PairLimits> out = new ArrayList<>();
    for (int i = 0; i < figures.terminals().size(); i++) {
      TerminalOhm nominal = figures.terminals().get(i);
      out.add(new PairLimits(nominal.key(), nominal.ohm(), low.get(i).ohm(), high.get(i).ohm()));
    }
    return out;
  }

  /** The same without the star point's pairs. */
  static List<PairLimits> lines(Results r) {
    return lines(r.artwork(), r.fab().tolerance(), r.resistance());
  }

  static List<PairLimits> lines(Artwork art, FabRules.Tolerance t, ResistanceFigures figures) {
    List<String> keys =
        ResistanceFigures.lineToLine(figures.terminals()).stream().map(TerminalOhm::key).toList();
    return of(art, t, figures).stream().filter(p -> keys.contains(p.pair())).toList();
  }

  /** {@code 32.97 ohm to 61.95 ohm}: from the least to the greatest of some pairs. */
  static String span(List<PairLimits> pairs) {
    double least = pairs.stream().mapToDouble(PairLimits::least).min().orElseThrow();
    double greatest = pairs.stream().mapToDouble(PairLimits::greatest).max().orElseThrow();
    return OrderLines.ohm(least) + " to " + OrderLines.ohm(greatest);
  }
}
