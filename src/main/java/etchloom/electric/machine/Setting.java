package etchloom.electric.machine;

import etchloom.artwork.Artwork;
import etchloom.electric.machine.Ledger.Given;
import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.machine.drive.Ripple;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.winding.Winding;
import java.util.Optional;
import java.util.OptionalDouble;

/** All that the stages work on. */
record Setting(
    Artwork artwork,
    Spec spec,
    FabRules fab,
    Winding winding,
    Circuit circuit,
    Spec.Duty duty,
    Ledger ledger) {
  /** The defaults of the format, for a spec without a duty. */
  private static final Spec.Duty NO_DUTY =
      new Spec.Duty(
          false,
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          25,
          105,
          12);

  static Setting of(
      Artwork artwork,
      Spec spec,
      FabRules fab,
      Winding winding,
      ResistanceFigures resistance,
      InductanceValues inductance) {
    Spec.Connection connection = spec.winding().connection();
    double mutuals = (winding.phases() - 1) * inductance.phaseMutualHenry();
    Circuit circuit =
        new Circuit(
            winding.phases(),
            connection,
            spec.rotor().poles() / 2,
            Circuit.windingOhm(connection, resistance.meanTerminalOhm()),
            inductance.synchronousHenry(),
            Ripple.henry(
                winding.phases(),
                connection,
                inductance.phaseSelfHenry(),
                inductance.synchronousHenry(),
                inductance.terminalHenry()),
            inductance.phaseSelfHenry() + mutuals);
    Spec.Duty duty = spec.duty().orElse(NO_DUTY);
    return new Setting(artwork, spec, fab, winding, circuit, duty, new Ledger());
  }

  /** The drive's ripple, where bus and switching frequency are known. */
  Optional<Ripple> ripple() {
    return duty.busVolt().isPresent() && duty.switchingHertz().isPresent()
        ? Optional.of(
            new Ripple(circuit, duty.busVolt().getAsDouble(), duty.switchingHertz().getAsDouble()))
        : Optional.empty();
  }

  Given speed() {
    return Given.of("duty.speed", duty.speedRadPerSecond());
  }

  Given current() {
    return Given.of("duty.current", duty.currentAmpereRms());
  }

  Given bus() {
    return Given.of("duty.bus", duty.busVolt());
  }

  Given switching() {
    return Given.of("duty.switching", duty.switchingHertz());
  }

  /** Of the shaft, rad/s; 0 where the duty states no speed. */
  double radPerSecond() {
    return duty.speedRadPerSecond().orElse(0);
  }
}
