package etchloom.electric.inductance;

import etchloom.artwork.Artwork;
import etchloom.electric.field.IronPlanes;
import etchloom.spec.Spec;
import etchloom.units.Constants;
import java.util.List;
import java.util.Optional;

/** Works out a board's inductances from its own conductors. */
public final class Inductance {
  private static final double MM_TO_M = 1e-3;

  private Inductance() {}

  /**
   * All figures.
   *
   * <p>Error against the model of even current about 3e-4 of a phase's self-inductance: arcs as
   * chords 1e-4, near pairs 1e-4, far clusters 5e-5, images 1e-5. Cost grows about as the number of
   * filaments.
   *
   * @param connection how the terminals are wired
   * @param iron planes of ideal iron, the copper between them
   * @throws IllegalArgumentException if there is no coil or phase, a plane stands in the copper, or
   *     a track is etched away
   * @throws IllegalStateException if a phase or coil is not one piece
   */
  public static InductanceFigures of(Artwork artwork, Spec.Connection connection, IronPlanes iron) {
    BoardCopper copper = new BoardCopper(artwork);
    copper.requireClearOf(iron);
    if (artwork.coils().isEmpty() || artwork.phases().isEmpty()) {
      throw new IllegalArgumentException("a board without coils or phases has no inductance");
    }
    Flow flow = Flow.of(artwork);
    double[] mm = couplings(flow, copper, iron, Repeats.of(flow));
    double scale = Constants.MU_0 / (4 * Math.PI) * MM_TO_M;
    int phases = flow.phases().size();
    double[][] henry = new double[phases][phases];
    for (int p = 0; p < phases; p++) {
      for (int q = 0; q < phases; q++) {
        henry[p][q] = scale * mm[1 + p * phases + q];
        if (!(Math.abs(henry[p][q]) < Double.POSITIVE_INFINITY)) {
          throw new IllegalStateException("phases " + p + " and " + q + ": " + henry[p][q] + " H");
        }
      }
    }
    PhaseMatrix matrix = new PhaseMatrix(henry);
    return new InductanceFigures(
        scale * mm[0],
        matrix.rows(),
        matrix.self(),
        matrix.mutual(),
        matrix.synchronous(),
        matrix.terminal(connection));
  }

  /**
   * The first coil with itself, then the phases with each other row by row, mm.
   *
   * @param repeats empty for the longer way, phase by phase
   */
  static double[] couplings(
      Flow flow, BoardCopper copper, IronPlanes iron, Optional<Repeats> repeats) {
    PhaseBodies open = bodies(flow, copper, repeats, false);
    double[] out = sum(open, copper, List.of(Mirror.NONE));
    addBarrels(flow, copper, out);
    if (iron.aboveMm().isPresent() || iron.belowMm().isPresent()) {
      PhaseBodies closed = bodies(flow, copper, repeats, true);
      double[] images = ImageSeries.sum(iron, out.length, mirrors -> sum(closed, copper, mirrors));
      for (int i = 0; i < out.length; i++) {
        out[i] += images[i];
      }
    }
    return out;
  }

  private static PhaseBodies bodies(
      Flow flow, BoardCopper copper, Optional<Repeats> repeats, boolean closed) {
    return repeats.isPresent()
        ? PhaseBodies.repeated(flow, copper, repeats.get(), closed)
        : PhaseBodies.whole(flow, copper, closed);
  }

  private static double[] sum(PhaseBodies bodies, BoardCopper copper, List<Mirror> mirrors) {
    Sums sums = new Sums();
    for (Mirror m : mirrors) {
      bodies.ask(sums, m, new Distances(copper.sections(), m));
    }
    double[] answers = sums.run();
    double[] out = new double[bodies.wanted()];
    int at = 0;
    for (int i = 0; i < mirrors.size(); i++) {
      at = bodies.add(answers, at, out);
    }
    return out;
  }

  private static void addBarrels(Flow flow, BoardCopper copper, double[] out) {
    List<Barrel> coil = copper.barrels(flow.coil());
    out[0] += Barrel.coupling(coil, coil);
    List<List<Barrel>> phases = flow.phases().stream().map(copper::barrels).toList();
    int n = phases.size();
    for (int p = 0; p < n; p++) {
      for (int q = p; q < n; q++) {
        double mm = Barrel.coupling(phases.get(p), phases.get(q));
        out[1 + p * n + q] += mm;
        if (p != q) {
          out[1 + q * n + p] += mm;
        }
      }
    }
  }
}
