package etchloom.run;

import etchloom.board.Assembly;
import etchloom.electric.field.IronPlanes;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.inductance.Inductance;
import etchloom.electric.inductance.InductanceFigures;
import etchloom.electric.machine.InductanceValues;
import etchloom.electric.machine.Machine;
import etchloom.electric.machine.MachineFigures;
import etchloom.electric.machine.TaperFigures;
import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.rules.RuleContext;
import etchloom.spec.Spec;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleConsumer;

/** What the drawn copper does. */
public record Electrics(
    ResistanceFigures resistance,
    InductanceFigures inductance,
    MachineFigures machine,
    Optional<TaperFigures> taper) {

  /** Shares of the time that {@link Pipeline#judge} takes for a large board, by measurement. */
  private static final double INDUCTANCE = 0.55;

  private static final double MACHINE = 0.87;

  static Electrics of(Laid laid, DoubleConsumer done) {
    Assembly assembly = laid.assembly();
    Spec spec = laid.spec();
    InductanceFigures henries =
        Inductance.of(
            assembly.artwork(),
            spec.winding().connection(),
            iron(spec.rotor(), assembly.artwork().stackup().thicknessMm()));
    done.accept(INDUCTANCE);
    InductanceValues values =
        new InductanceValues(
            henries.phaseSelfHenry(),
            henries.phaseMutualHenry().orElse(0),
            henries.synchronousHenry(),
            henries.terminalHenry());
    MachineFigures machine =
        Machine.of(
            assembly.artwork(), spec, laid.fab(), assembly.winding(), laid.resistance(), values);
    Optional<TaperFigures> taper = TaperGain.of(laid, machine, values);
    done.accept(MACHINE);
    return new Electrics(laid.resistance(), henries, machine, taper);
  }

  /** The rotor's iron, as far as the spec tells where it is. */
  private static IronPlanes iron(Spec.Rotor rotor, double boardMm) {
    if (rotor.magnet().isPresent() && rotor.airGapMm().isPresent()) {
      return MagnetArray.of(rotor, boardMm).iron();
    }
    OptionalDouble gap = rotor.counterPlateGapMm();
    return gap.isPresent()
        ? new IronPlanes(
            OptionalDouble.empty(), OptionalDouble.of(-boardMm / 2 - gap.getAsDouble()))
        : IronPlanes.NONE;
  }

  /** What the rule check must know: the back-EMF between two terminals at the duty's speed. */
  RuleContext rules(Spec spec) {
    OptionalDouble speed =
        spec.duty().map(Spec.Duty::speedRadPerSecond).orElse(OptionalDouble.empty());
    if (machine.emf().isEmpty() || speed.isEmpty()) {
      return RuleContext.NONE;
    }
    double perSpeed =
        Circuit.greatestShare(spec.winding().phases(), spec.winding().connection())
            * machine.emf().get().phasePeakVoltSecondPerRadian();
    return new RuleContext(OptionalDouble.of(perSpeed * speed.getAsDouble()));
  }
}
