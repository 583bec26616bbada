package etchloom.electric.resistance;

import java.util.List;
import java.util.Optional;

/**
 * Resistances at 20 °C, Ω, each level apart from the others.
 *
 * @param coilLayers the first coil's spirals, L1 first
 * @param copperLayers all tracks of each layer, L1 first
 * @param coils every coil, by number
 * @param coilOhm the first coil from start to finish, its vias included
 * @param phases each phase from its entry to its exit (see {@link Chains})
 * @param terminals each pair of terminals that copper joins, in the order of the marks
 * @param imbalancePercent largest less smallest over the mean, of the terminal pairs without a star
 *     point
 * @param pairs each pair's own limits, as in {@code worst}; empty where that is
 * @param worst limits where every tolerance is at its end; empty where a track could be etched away
 * @param rss limits where the tolerances' single effects add up as root of the sum of squares
 */
public record ResistanceFigures(
    List<CoilLayer> coilLayers,
    List<CopperLayer> copperLayers,
    List<CoilOhm> coils,
    double coilOhm,
    List<PhaseOhm> phases,
    List<TerminalOhm> terminals,
    double imbalancePercent,
    List<PairOhm> pairs,
    Optional<Limits> worst,
    Optional<Limits> rss) {
  public ResistanceFigures {
    coilLayers = List.copyOf(coilLayers);
    copperLayers = List.copyOf(copperLayers);
    coils = List.copyOf(coils);
    phases = List.copyOf(phases);
    terminals = List.copyOf(terminals);
    pairs = List.copyOf(pairs);
  }

  public record CoilLayer(int layer, double lengthMm, double ohm) {}

  public record CopperLayer(int layer, double trackLengthMm) {}

  /**
   * One coil from its start to its finish.
   *
   * @param lengthMm of all its tracks
   */
  public record CoilOhm(int number, double lengthMm, double ohm) {}

  public record PhaseOhm(String mark, double ohm) {}

  public record TerminalOhm(String from, String to, double ohm) {
    /** {@code U1-V1}, as reports have it. */
    public String key() {
      return from + "-" + to;
    }
  }

  /** What a pair of terminals has, and may have with every tolerance at its end, Ω. */
  public record PairOhm(String key, double expectedOhm, double leastOhm, double greatestOhm) {}

  /** The smallest and the largest value of any pair of terminals, Ω. */
  public record Limits(double minTerminalOhm, double maxTerminalOhm) {}

  /** The same copper's terminal values at another temperature, °C. */
  public List<TerminalOhm> hotTerminals(double tempC) {
    double k = Copper.factor(tempC);
    return terminals.stream().map(t -> new TerminalOhm(t.from(), t.to(), k * t.ohm())).toList();
  }

  /** Mean resistance between terminals without a star point, Ω at 20 °C. */
  public double meanTerminalOhm() {
    return lineToLine(terminals).stream().mapToDouble(TerminalOhm::ohm).average().orElseThrow();
  }

  /** Mean resistance of a phase, Ω at 20 °C. */
  public double meanPhaseOhm() {
    return phases.stream().mapToDouble(PhaseOhm::ohm).average().orElseThrow();
  }

  /** The pairs that do not end at a star point; all of them should there be no other. */
  public static List<TerminalOhm> lineToLine(List<TerminalOhm> all) {
    List<TerminalOhm> some =
        all.stream().filter(t -> !t.from().endsWith("N") && !t.to().endsWith("N")).toList();
    return some.isEmpty() ? all : some;
  }
}
