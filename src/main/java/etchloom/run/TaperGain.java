package etchloom.run;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.electric.machine.InductanceValues;
import etchloom.electric.machine.Machine;
import etchloom.electric.machine.MachineFigures;
import etchloom.electric.machine.TaperFigures;
import etchloom.electric.machine.TaperFigures.Variant;
import etchloom.electric.resistance.Resistance;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.FabRules;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import java.util.Optional;
import java.util.OptionalDouble;

/** Holds a board whose tracks widen against the same turns in even tracks. */
final class TaperGain {
  private final Spec spec;
  private final FabRules fab;
  private final InductanceValues inductance;

  private TaperGain(Spec spec, FabRules fab, InductanceValues inductance) {
    this.spec = spec;
    this.fab = fab;
    this.inductance = inductance;
  }

  /**
   * @param inductance the board's own; the variants' does not touch what is compared
   * @return empty where the spec asks for no taper
   */
  static Optional<TaperFigures> of(Laid laid, MachineFigures machine, InductanceValues inductance) {
    Artwork artwork = laid.assembly().artwork();
    Spec spec = laid.spec();
    FabRules fab = laid.fab();
    if (!spec.coil().taper()) {
      return Optional.empty();
    }
    TaperGain gain = new TaperGain(spec, fab, inductance);
    double track = spec.coil().trackMm();
    int turns = artwork.turnsPerLayer();
    Conductor spiral = artwork.conductors().get(artwork.coils().get(0).conductors().get(0));
    OptionalDouble most = Assembler.widestTrackMm(spec, fab, turns);
    return gain.even(track, turns)
        .map(
            plain ->
                new TaperFigures(
                    spiral.widestMm(),
                    (int) Math.max(1, spiral.widthsMm().stream().distinct().count()),
                    variant(track, laid.resistance(), machine),
                    plain,
                    most.isPresent() ? gain.even(most.getAsDouble(), turns) : Optional.empty()));
  }

  /** Empty where no board can be drawn with such tracks. */
  private Optional<Variant> even(double trackMm, int turns) {
    Spec other = spec.withEvenTrack(trackMm, turns);
    return Assembler.assemble(other, fab, Positions.unknown("")).value().map(a -> solve(other, a));
  }

  private Variant solve(Spec other, Assembly a) {
    ResistanceFigures ohms = Resistance.of(a.artwork(), fab.tolerance());
    MachineFigures machine = Machine.of(a.artwork(), other, fab, a.winding(), ohms, inductance);
    return variant(other.coil().trackMm(), ohms, machine);
  }

  private static Variant variant(double trackMm, ResistanceFigures ohms, MachineFigures machine) {
    double most =
        ohms.terminals().stream()
            .mapToDouble(ResistanceFigures.TerminalOhm::ohm)
            .max()
            .orElseThrow();
    return new Variant(trackMm, most, machine.torque(), machine.loss().eddyWatt());
  }
}
