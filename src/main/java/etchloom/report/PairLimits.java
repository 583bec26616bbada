package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import java.util.List;

/**
 * What a delivered board may show between two terminals, Ω at 20 °C: every tolerance of the fab at
 * its end at once, for each pair by itself, since a pair with the star point has half of the
 * others'.
 */
record PairLimits(String pair, double expected, double least, double greatest) {

  /** All pairs, the star point's too; none where the tolerances could etch a track away. */
  static List<PairLimits> of(ResistanceFigures figures) {
    return figures.pairs().stream()
        .map(p -> new PairLimits(p.key(), p.expectedOhm(), p.leastOhm(), p.greatestOhm()))
        .toList();
  }

  /** The same without the star point's pairs. */
  static List<PairLimits> lines(ResistanceFigures figures) {
    List<String> keys =
        ResistanceFigures.lineToLine(figures.terminals()).stream().map(TerminalOhm::key).toList();
    return of(figures).stream().filter(p -> keys.contains(p.pair())).toList();
  }

  /** {@code 32.97 ohm to 61.95 ohm}: from the least to the greatest of some pairs. */
  static String span(List<PairLimits> pairs) {
    double least = pairs.stream().mapToDouble(PairLimits::least).min().orElseThrow();
    double greatest = pairs.stream().mapToDouble(PairLimits::greatest).max().orElseThrow();
    return OrderLines.ohm(least) + " to " + OrderLines.ohm(greatest);
  }
}
