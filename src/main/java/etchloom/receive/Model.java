package etchloom.receive;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.electric.machine.spread.SpreadFigures;
import etchloom.run.Drawn;
import etchloom.spec.FabRules;
import java.util.List;
import java.util.OptionalDouble;

/** All that the drawn board says about what its deliveries may and may not show. */
public final class Model {
  private final Pairs pairs;
  private final double[] sound;
  private final Limits limits;
  private final Parts parts;
  private final double copperUm;
  private final OptionalDouble predictedSpreadPercent;
  private final List<Suspect> breaks;
  private final List<Suspect> swaps;
  private final List<Suspect> shorts;
  private final List<Suspect> doubleBreaks;
  private final List<PhaseShift> shifts;

  Model(Artwork artwork, FabRules.Tolerance tolerance, boolean bounded, OptionalDouble spread) {
    pairs = new Pairs(marks(artwork));
    FaultBench bench = new FaultBench(artwork, pairs);
    sound = bench.sound();
    limits = Limits.of(artwork, tolerance, bounded, pairs);
    parts = Parts.of(artwork, tolerance, pairs);
    copperUm = 1000 * artwork.stackup().copper().get(0).thicknessMm();
    predictedSpreadPercent = spread;
    breaks = bench.breaks();
    swaps = bench.swaps();
    shorts = bench.shorts();
    doubleBreaks = bench.doubleBreaks();
    shifts = bench.shifts();
  }

  public static Model of(Drawn drawn) {
    SpreadFigures spread = drawn.electrics().machine().spread();
    return new Model(
        drawn.assembly().artwork(),
        drawn.fab().tolerance(),
        drawn.electrics().resistance().worst().isPresent(),
        spread.terminalOhmPercent().monteCarlo95());
  }

  private static List<String> marks(Artwork artwork) {
    return artwork.terminals().stream().map(Joint::mark).toList();
  }

  /** The terminals that readings may name. */
  public static List<String> marks(Drawn drawn) {
    return marks(drawn.assembly().artwork());
  }

  Pairs pairs() {
    return pairs;
  }

  /** Each pair as drawn, Ω at 20 °C; infinite where nothing joins it. */
  double[] sound() {
    return sound;
  }

  Limits limits() {
    return limits;
  }

  Parts parts() {
    return parts;
  }

  /** Finished copper of L1 as drawn. */
  double copperUm() {
    return copperUm;
  }

  OptionalDouble predictedSpreadPercent() {
    return predictedSpreadPercent;
  }

  List<Suspect> breaks() {
    return breaks;
  }

  List<Suspect> swaps() {
    return swaps;
  }

  List<Suspect> shorts() {
    return shorts;
  }

  List<Suspect> doubleBreaks() {
    return doubleBreaks;
  }

  List<PhaseShift> shifts() {
    return shifts;
  }
}
