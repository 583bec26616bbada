package etchloom.electric.machine;

import etchloom.electric.field.MagnetArray;
import etchloom.electric.field.RotorField;
import etchloom.electric.machine.Ledger.Given;
import etchloom.electric.machine.emf.Coupling;
import etchloom.electric.machine.emf.RadialReach;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Optional;

/** From the spec's rotor to its field along the copper. */
final class FieldStage {
  /** Every figure that needs the rotor's field, as the report names them. */
  private static final List<String> FIGURES =
      List.of(
          "emf",
          "torque",
          "loss.eddyWatt",
          "drive.speedLimitRpm",
          "drive.senseSpeedRpm",
          "drive.torqueSpeed",
          "generator",
          "spread.torquePercent",
          "rotor.axialPullNewton");

  /** Less linkage than this, Wb, is rounding beside any magnet over any coil. */
  private static final double NOTHING_WEBER = 1e-12;

  private FieldStage() {}

  /** The magnets with their iron; empty, and noted, where the spec does not give them. */
  static Optional<MagnetArray> magnets(Setting s) {
    Spec.Rotor rotor = s.spec().rotor();
    Given magnet = new Given("rotor.magnet", rotor.magnet().isPresent());
    Given gap = Given.of("rotor.air-gap", rotor.airGapMm());
    boolean given = true;
    for (String figure : FIGURES) {
      if (s.duty().generator() || !figure.equals("generator")) {
        given = s.ledger().has(figure, magnet, gap);
      }
    }
    if (!given) {
      return Optional.empty();
    }
    MagnetArray array = MagnetArray.of(rotor, s.artwork().stackup().thicknessMm());
    if (array.remanenceTesla() > 0) {
      return Optional.of(array);
    }
    s.ledger()
        .caution(
            "demagnetised",
            "at "
                + Numbers.trimmed(rotor.magnet().orElseThrow().temperatureC(), 1)
                + " C the stated drift leaves a remanence of "
                + Numbers.trimmed(array.remanenceTesla(), 3)
                + " T: no magnet does that, and no field is taken from it");
    FIGURES.forEach(f -> s.ledger().absent(f, "rotor.magnet.remanence-drift"));
    return Optional.empty();
  }

  /** The field along all copper; empty, and noted, where the phases link none of it. */
  static Optional<Linked> linked(Setting s, MagnetArray array) {
    RadialReach reach = RadialReach.of(s.artwork());
    double[] height = new double[s.artwork().layers()];
    for (int i = 0; i < height.length; i++) {
      height[i] = s.artwork().stackup().heightMm(i + 1);
    }
    RotorField field = new RotorField(array, height, reach.innerMm(), reach.outerMm());
    Coupling coupling = Coupling.of(s.artwork(), field);
    Linked linked = Linked.of(s, coupling);
    if (linked.fluxWeber() > NOTHING_WEBER) {
      return Optional.of(linked);
    }
    s.ledger()
        .caution(
            "no-flux", "the phases link no flux of the magnets: magnets and coils do not meet");
    FIGURES.stream()
        .filter(f -> !f.equals("loss.eddyWatt") && !f.equals("rotor.axialPullNewton"))
        .forEach(f -> s.ledger().absent(f, "rotor.magnet"));
    return Optional.empty();
  }
}
