package etchloom.electric.machine;

import etchloom.artwork.Artwork;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.machine.emf.Coupling;
import etchloom.electric.machine.emf.HeightSensitivity;
import etchloom.electric.machine.heat.LayerSharing;
import etchloom.electric.machine.spread.Spread;
import etchloom.electric.machine.spread.SpreadFigures;
import etchloom.electric.resistance.ResistanceFigures;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import etchloom.winding.Winding;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Works out all figures of the machine, in the order in which they need each other. */
public final class Machine {
  /** Departures from an even share below this are no cause for a word. */
  private static final double UNEVEN = 0.1;

  private Machine() {}

  /**
   * All figures that the spec gives enough for.
   *
   * @throws IllegalArgumentException if a track is narrower than its undercut
   * @throws IllegalStateException if a phase is not one piece of copper
   */
  public static MachineFigures of(
      Artwork artwork,
      Spec spec,
      FabRules fab,
      Winding winding,
      ResistanceFigures resistance,
      InductanceValues inductance) {
    Setting s = Setting.of(artwork, spec, fab, winding, resistance, inductance);
    Optional<MagnetArray> magnets = FieldStage.magnets(s);
    Optional<Linked> linked = magnets.flatMap(m -> FieldStage.linked(s, m));
    HeatStage heat = new HeatStage(s, linked);
    LossFigures loss = heat.loss();
    DriveStage drive = new DriveStage(s, linked, heat);
    DriveFigures driveFigures = drive.figures();
    Optional<GeneratorFigures> generator = drive.generator();
    Optional<EmfFigures> emf = linked.map(l -> l.emf(s, heat.circulatingAmpere()));
    Optional<double[]> byHeight =
        linked.map(l -> HeightSensitivity.perMm(artwork, spec.rotor(), l.coupling()));
    SpreadFigures spread = Spread.of(artwork, fab.tolerance(), byHeight);
    List<Need> verdict =
        new VerdictStage(s, driveFigures, heat.thermal(), drive, generator).needs();
    RotorFigures rotor = RotorStage.figures(s, magnets);
    cautions(s, linked, spread);
    return new MachineFigures(
        sharing(s, linked, heat),
        emf,
        linked.map(l -> l.torque(s.circuit())),
        loss,
        heat.thermal(),
        driveFigures,
        generator,
        spread,
        verdict,
        rotor,
        s.ledger().cautions(),
        s.ledger().absent());
  }

  private static Optional<SharingFigures> sharing(
      Setting s, Optional<Linked> linked, HeatStage heat) {
    Optional<LayerSharing> sharing = LayerSharing.of(s.artwork());
    if (sharing.isEmpty()) {
      return Optional.empty();
    }
    Optional<Coupling> coupling = linked.map(Linked::coupling);
    boolean turning = coupling.isPresent() && s.duty().speedRadPerSecond().isPresent();
    double hot = heat.thermal().hotC();
    List<SharingFigures.Layer> layers = new ArrayList<>();
    for (List<LayerSharing.Layer> group : sharing.get().groups()) {
      for (LayerSharing.Layer l : group) {
        layers.add(
            new SharingFigures.Layer(
                l.layer(),
                l.share(),
                l.evenShare(),
                coupling.isPresent()
                    ? OptionalDouble.of(sharing.get().linkageRatio(coupling.get(), l))
                    : OptionalDouble.empty(),
                turning
                    ? OptionalDouble.of(
                        sharing.get().ampereRms(coupling.get(), l, s.radPerSecond(), hot))
                    : OptionalDouble.empty()));
      }
    }
    OptionalDouble most =
        turning
            ? OptionalDouble.of(sharing.get().mostAmpereRms(coupling.get(), s.radPerSecond(), hot))
            : OptionalDouble.empty();
    double over = sharing.get().worstOverload();
    if (over > UNEVEN) {
      s.ledger()
          .caution(
              "uneven-layers",
              "the layers side by side do not share evenly: the most loaded one carries "
                  + Numbers.fixed(100 * over, 0)
                  + " % more than its even share");
    }
    most.ifPresent(
        a -> {
          double ampere = s.duty().currentAmpereRms().orElse(0);
          if (ampere > 0 && a > UNEVEN * ampere / Math.max(1, layers.size() / 2.0)) {
            s.ledger()
                .caution(
                    "circulating-layers",
                    "the magnets' field is not the same on all layers side by side: at speed it"
                        + " drives up to "
                        + Numbers.engineering(a, "A", 3)
                        + " round through them, whatever the load");
          }
        });
    return Optional.of(new SharingFigures(layers, over, most));
  }

  private static void cautions(Setting s, Optional<Linked> linked, SpreadFigures spread) {
    Spec.Rotor rotor = s.spec().rotor();
    if (rotor.counterPlateGapMm().isPresent() && linked.isPresent()) {
      s.ledger()
          .caution(
              "counter-plate-drag",
              "the counter-plate stands still in an alternating field: its losses and drag are not"
                  + " in any figure here");
    }
    if (s.circuit().phases() == 1 && linked.isPresent()) {
      s.ledger()
          .caution(
              "pulsating-torque",
              "one phase gives a torque that pulsates between nought and twice the mean stated");
    }
    if (linked.isPresent() && !linked.get().counterClockwise()) {
      s.ledger()
          .caution(
              "phase-order", "currents in the order of the marks turn the rotor clockwise from L1");
    }
    if (linked.isPresent() && linked.get().eddy().beyondSkinDepth(s.radPerSecond())) {
      s.ledger()
          .caution(
              "skin-depth",
              "the widest track is wider than the skin depth at the electrical frequency: the eddy"
                  + " loss stated is too high");
    }
    rotor
        .magnet()
        .filter(m -> m.temperatureC() > m.limitC())
        .ifPresent(
            m ->
                s.ledger()
                    .caution(
                        "magnet-heat",
                        "the magnets are at "
                            + Numbers.fixed(m.temperatureC(), 0)
                            + " C, above their limit of "
                            + Numbers.fixed(m.limitC(), 0)
                            + " C: they may lose their field for good"));
    if (spread.terminalOhmPercent().worst().isEmpty()) {
      s.ledger().absent("spread.terminalOhmPercent", "coil.track");
      s.ledger().absent("spread.imbalancePercent", "coil.track");
      s.ledger()
          .caution(
              "track-may-vanish",
              "at the thin end of the fab's tolerance nothing may be left of the narrowest tracks");
    }
  }
}
