package etchloom.electric.machine;

import etchloom.electric.machine.Ledger.Given;
import etchloom.electric.machine.circuit.Circuit;
import etchloom.electric.machine.drive.CurrentLoop;
import etchloom.electric.machine.drive.Generator;
import etchloom.electric.machine.drive.TorqueSpeed;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What a drive needs to know, and what a generator gives. */
final class DriveStage {
  /** Peak between terminals from which a sensorless drive sees the rotor (common practice), V. */
  static final double SENSE_VOLT = 0.5;

  private static final double RPM = 30 / Math.PI;

  private final Setting s;
  private final Optional<Linked> linked;
  private final HeatStage heat;

  DriveStage(Setting s, Optional<Linked> linked, HeatStage heat) {
    this.s = s;
    this.linked = linked;
    this.heat = heat;
  }

  DriveFigures figures() {
    Circuit c = s.circuit();
    Spec.Duty d = s.duty();
    OptionalDouble hertz =
        s.ledger().has("drive.electricalHz", s.speed())
            ? OptionalDouble.of(c.electricalRadPerSecond(s.radPerSecond()) / (2 * Math.PI))
            : OptionalDouble.empty();
    Optional<CurrentLoop> loop =
        s.ledger().has("drive.proportionalGain", Given.of("duty.switching", d.bandwidthHertz()))
            ? Optional.of(CurrentLoop.of(c, d.bandwidthHertz().getAsDouble()))
            : Optional.empty();
    s.ledger().has("drive.rippleAmperePeakToPeak", s.bus(), s.switching());
    return new DriveFigures(
        c.polePairs(),
        c.lineOhm(20),
        c.lineHenry(),
        hertz,
        c.windingHenry() / c.windingOhm20(),
        of(s.ripple().map(r -> r.amperePeakToPeak(heat.thermal().hotC()))),
        series(),
        of(loop.map(CurrentLoop::proportionalGain)),
        of(loop.map(CurrentLoop::integralGain)),
        of(loop.map(CurrentLoop::bandwidthHertz)),
        speedLimit(),
        linked.isPresent() ? OptionalDouble.of(RPM * senseRadPerSecond()) : OptionalDouble.empty(),
        SENSE_VOLT,
        torqueSpeed());
  }

  private OptionalDouble series() {
    return s.ledger()
            .has("drive.seriesInductanceForRippleHenry", s.bus(), s.switching(), s.current())
        ? OptionalDouble.of(
            s.ripple()
                .orElseThrow()
                .seriesHenry(
                    s.circuit().lineAmpere(s.duty().currentAmpereRms().getAsDouble()),
                    heat.thermal().hotC()))
        : OptionalDouble.empty();
  }

  private double senseRadPerSecond() {
    double peak = s.circuit().terminalShare() * s.circuit().polePairs() * linked.get().fluxWeber();
    return SENSE_VOLT / peak;
  }

  private OptionalDouble speedLimit() {
    if (linked.isEmpty() || !s.ledger().has("drive.speedLimitRpm", s.bus())) {
      return OptionalDouble.empty();
    }
    double top =
        TorqueSpeed.noLoadRadPerSecond(
            s.circuit(), linked.get().fluxWeber(), s.duty().busVolt().getAsDouble());
    if (!s.duty().generator() && s.radPerSecond() > top) {
      s.ledger()
          .caution(
              "emf-above-bus",
              "at "
                  + Numbers.fixed(RPM * s.radPerSecond(), 0)
                  + " rpm the back-EMF is higher than the bus, which it reaches at "
                  + Numbers.fixed(RPM * top, 0)
                  + " rpm: the drive cannot push current, and its diodes feed the bus");
    }
    return OptionalDouble.of(RPM * top);
  }

  private List<TorqueSpeed.Point> torqueSpeed() {
    if (linked.isEmpty() || !s.ledger().has("drive.torqueSpeed", s.bus())) {
      return List.of();
    }
    Optional<TorqueSpeed> line = line();
    if (line.isEmpty()) {
      s.ledger().absent("drive.torqueSpeed", "duty.current");
    }
    return line.map(TorqueSpeed::line).orElse(List.of());
  }

  /**
   * The limits: the duty's current, else what heat allows; the bus, else none. Empty without field
   * or current.
   */
  Optional<TorqueSpeed> line() {
    OptionalDouble stated = s.duty().currentAmpereRms();
    OptionalDouble ampere = stated.isPresent() ? stated : heat.thermal().maxContinuousAmpereRms();
    if (linked.isEmpty() || ampere.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new TorqueSpeed(
            s.circuit(),
            linked.get().fluxWeber(),
            heat.thermal().hotC(),
            ampere.getAsDouble(),
            s.duty().busVolt().orElse(Double.POSITIVE_INFINITY),
            heat.drag()));
  }

  /**
   * What current of one winding the bus drives, A rms, copper hot: at the duty's speed against the
   * magnets, or, where one of them is not known, at most, at standstill.
   */
  OptionalDouble drivenAmpere() {
    OptionalDouble bus = s.duty().busVolt();
    if (bus.isEmpty()) {
      return OptionalDouble.empty();
    }
    double peak =
        new TorqueSpeed(
                s.circuit(),
                linked.map(Linked::fluxWeber).orElse(0.0),
                heat.thermal().hotC(),
                Double.POSITIVE_INFINITY,
                bus.getAsDouble(),
                w -> 0)
            .amperePeakByVoltage(drivenSpeedKnown() ? s.radPerSecond() : 0);
    return OptionalDouble.of(peak / (Math.sqrt(2) * s.circuit().lineAmpere(1)));
  }

  boolean drivenSpeedKnown() {
    return linked.isPresent() && s.duty().speedRadPerSecond().isPresent();
  }

  Optional<GeneratorFigures> generator() {
    if (!s.duty().generator() || linked.isEmpty() || !s.ledger().has("generator", s.speed())) {
      return Optional.empty();
    }
    double open = Generator.openVoltRms(s.circuit(), linked.get().fluxWeber(), s.radPerSecond());
    if (!s.ledger().has("generator.powerWatt", Given.of("duty.load", s.duty().loadOhm()))) {
      OptionalDouble none = OptionalDouble.empty();
      return Optional.of(new GeneratorFigures(open, none, none, none, none, none));
    }
    Generator g =
        new Generator(
            s.circuit(),
            linked.get().fluxWeber(),
            s.radPerSecond(),
            s.duty().loadOhm().getAsDouble());
    double t = heat.thermal().hotC();
    double load = g.loadWatt(t);
    double shaft = load + heat.losses().totalWatt(t);
    return Optional.of(
        new GeneratorFigures(
            open,
            OptionalDouble.of(g.loadVoltRms(t)),
            OptionalDouble.of(g.ampereRms(t)),
            OptionalDouble.of(load),
            OptionalDouble.of(load / shaft),
            OptionalDouble.of(shaft / s.radPerSecond())));
  }

  private static OptionalDouble of(Optional<Double> v) {
    return v.isPresent() ? OptionalDouble.of(v.get()) : OptionalDouble.empty();
  }
}
