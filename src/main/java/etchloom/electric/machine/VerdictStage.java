package etchloom.electric.machine;

import etchloom.electric.machine.Ledger.Given;
import etchloom.electric.machine.drive.TorqueSpeed;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Each demand of the duty against what the machine gives. */
final class VerdictStage {
  private static final double RPM = 30 / Math.PI;

  private final Setting s;
  private final DriveFigures drive;
  private final ThermalFigures thermal;
  private final DriveStage stage;
  private final Optional<TorqueSpeed> line;
  private final Optional<GeneratorFigures> generator;
  private final List<Need> needs = new ArrayList<>();

  VerdictStage(
      Setting s,
      DriveFigures drive,
      ThermalFigures thermal,
      DriveStage stage,
      Optional<GeneratorFigures> generator) {
    this.s = s;
    this.drive = drive;
    this.thermal = thermal;
    this.stage = stage;
    this.line = stage.line();
    this.generator = generator;
  }

  List<Need> needs() {
    if (s.duty().generator()) {
      load();
    } else {
      torque();
      speed();
      current();
    }
    copper();
    magnet();
    return needs;
  }

  private void torque() {
    Spec.Duty d = s.duty();
    boolean asked =
        s.ledger().has("verdict.duty.torque", Given.of("duty.torque", d.torqueNm()), s.speed());
    if (asked && line.isPresent()) {
      TorqueSpeed.Point p = line.get().at(s.radPerSecond());
      least(
          "torque at speed", "N m", d.torqueNm().getAsDouble(), p.newtonMetre(), p.limit().word());
    } else if (asked) {
      s.ledger().absent("verdict.duty.torque", "rotor.magnet");
    }
  }

  /**
   * The speed up to which the needed torque is there, or the no-load speed where none is needed.
   */
  private void speed() {
    if (drive.speedLimitRpm().isEmpty() || !s.ledger().has("verdict.duty.speed", s.speed())) {
      return;
    }
    double top = drive.speedLimitRpm().getAsDouble() / RPM;
    OptionalDouble torque = s.duty().torqueNm();
    String by = "voltage";
    if (torque.isPresent() && line.isPresent()) {
      TorqueSpeed t = line.get();
      double need = torque.getAsDouble();
      if (t.at(0).newtonMetre() < need) {
        by = t.at(0).limit().word();
        top = 0;
      } else {
        top = fastest(t, need, top);
      }
    }
    least("speed", "rpm", RPM * s.radPerSecond(), RPM * top, by);
  }

  /**
   * Whether the bus drives the duty's current at the duty's speed. Without that speed or magnets
   * only a current that it could not even drive at standstill is a fault.
   */
  private void current() {
    OptionalDouble current = s.duty().currentAmpereRms();
    OptionalDouble most = stage.drivenAmpere();
    if (current.isEmpty() || most.isEmpty()) {
      return;
    }
    double asked = current.getAsDouble();
    double got = most.getAsDouble();
    if (stage.drivenSpeedKnown() || got < asked) {
      least("current", "A", asked, got, "voltage");
    }
    if (got < asked) {
      s.ledger()
          .caution(
              "current-above-bus",
              "the bus drives no more than "
                  + Numbers.engineering(got, "A", 3)
                  + " rms through a winding"
                  + (stage.drivenSpeedKnown() ? " at the duty's speed" : " even at standstill")
                  + ", copper hot: copper loss and temperature are stated for the "
                  + Numbers.engineering(asked, "A", 3)
                  + " asked");
    }
  }

  /** The torque only falls with the speed. */
  private static double fastest(TorqueSpeed t, double newtonMetre, double top) {
    double low = 0;
    double high = top;
    for (int i = 0; i < 50; i++) {
      double mid = (low + high) / 2;
      if (t.at(mid).newtonMetre() >= newtonMetre) {
        low = mid;
      } else {
        high = mid;
      }
    }
    return low;
  }

  private void load() {
    OptionalDouble current = s.duty().currentAmpereRms();
    OptionalDouble got =
        generator.flatMap(g -> box(g.ampereRms())).stream()
            .mapToDouble(Double::doubleValue)
            .findFirst();
    if (current.isPresent() && got.isPresent()) {
      least("load current", "A", current.getAsDouble(), got.getAsDouble(), "load");
    }
  }

  private static Optional<Double> box(OptionalDouble v) {
    return v.isPresent() ? Optional.of(v.getAsDouble()) : Optional.empty();
  }

  private void copper() {
    if (thermal.stable().isEmpty()) {
      s.ledger().has("verdict.duty.copper", s.current());
      return;
    }
    double limit = s.duty().copperLimitC();
    boolean met = thermal.copperC().isPresent() && thermal.copperC().getAsDouble() <= limit;
    needs.add(new Need("copper temperature", "C", limit, thermal.copperC(), met, "cooling"));
  }

  private void magnet() {
    s.spec()
        .rotor()
        .magnet()
        .ifPresent(
            m ->
                needs.add(
                    new Need(
                        "magnet temperature",
                        "C",
                        m.limitC(),
                        OptionalDouble.of(m.temperatureC()),
                        m.temperatureC() <= m.limitC(),
                        "magnet")));
  }

  private void least(String what, String unit, double needed, double got, String by) {
    needs.add(new Need(what, unit, needed, OptionalDouble.of(got), got >= needed, by));
  }
}
