package etchloom.electric.machine;

import etchloom.electric.machine.drive.Generator;
import etchloom.electric.machine.drive.Ripple;
import etchloom.electric.machine.drive.TorqueSpeed;
import etchloom.electric.machine.heat.EddyLoss;
import etchloom.electric.machine.heat.HeatBalance;
import etchloom.electric.machine.heat.Losses;
import etchloom.electric.machine.heat.TrackChart;
import etchloom.electric.resistance.Copper;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import java.util.function.IntToDoubleFunction;

/** Losses at the duty and the temperature they lead to. */
final class HeatStage {
  /** Orders and layers with less than this share of the eddy loss are not listed. */
  private static final double FAINT = 1e-4;

  /** A laminate held for long should stay so far below its glass transition (common practice). */
  private static final double BELOW_GLASS_K = 25;

  private static final OptionalDouble NONE = OptionalDouble.empty();

  private final Setting s;
  private final Optional<Linked> linked;
  private final Losses losses;
  private final Optional<Ripple> ripple;
  private final boolean currentKnown;
  private final ThermalFigures thermal;

  HeatStage(Setting s, Optional<Linked> linked) {
    this.s = s;
    this.linked = linked;
    ripple = s.ripple();
    boolean turning = s.duty().speedRadPerSecond().isPresent();
    currentKnown = current(turning, s.radPerSecond()).isPresent();
    losses = losses(turning, s.radPerSecond());
    if (ripple.isPresent() && !s.duty().generator() && !modulationKnown(turning)) {
      s.ledger()
          .caution(
              "ripple-loss-at-worst",
              "the modulation is not known without magnets, duty.speed and duty.current: the"
                  + " ripple's loss is stated as if the ripple were at its worst all the time");
    }
    thermal = balance();
  }

  private Losses losses(boolean turning, double radPerSecond) {
    return new Losses(
        s.circuit(),
        current(turning, radPerSecond).orElse(t -> 0),
        rippleSquare(turning, radPerSecond),
        turning ? linked.map(Linked::eddy) : Optional.empty(),
        turning ? linked.flatMap(Linked::circulating) : Optional.empty(),
        turning ? linked.map(Linked::layersWatt).orElse(OptionalDouble.empty()) : NONE,
        radPerSecond);
  }

  private boolean modulationKnown(boolean turning) {
    return turning && currentKnown && linked.isPresent() && !s.duty().generator();
  }

  /** What ripple adds to the line current's square, by a winding's current and the temperature. */
  private DoubleBinaryOperator rippleSquare(boolean turning, double radPerSecond) {
    if (ripple.isEmpty()) {
      return (i, t) -> 0;
    }
    Ripple r = ripple.get();
    if (!modulationKnown(turning)) {
      return (i, t) -> r.worstMeanSquare(t);
    }
    double flux = linked.get().fluxWeber();
    return (i, t) -> r.meanSquare(r.depth(flux, radPerSecond, i, t), t);
  }

  /** A winding's current by the copper's temperature. */
  private Optional<DoubleUnaryOperator> current(boolean turning, double radPerSecond) {
    Spec.Duty duty = s.duty();
    if (turning && duty.generator() && linked.isPresent() && duty.loadOhm().isPresent()) {
      Generator g =
          new Generator(
              s.circuit(), linked.get().fluxWeber(), radPerSecond, duty.loadOhm().getAsDouble());
      return Optional.of(g::ampereRms);
    }
    OptionalDouble stated = duty.currentAmpereRms();
    return stated.isPresent() ? Optional.of(t -> stated.getAsDouble()) : Optional.empty();
  }

  ThermalFigures thermal() {
    return thermal;
  }

  Losses losses() {
    return losses;
  }

  private ThermalFigures balance() {
    Spec.Duty duty = s.duty();
    double limit = duty.copperLimitC();
    double area = HeatBalance.surfaceM2(s.artwork());
    HeatBalance board =
        new HeatBalance(area, duty.coolingWattPerSquareMetreKelvin(), duty.ambientC());
    OptionalDouble copper = OptionalDouble.empty();
    Optional<Boolean> stable = Optional.empty();
    if (currentKnown) {
      copper = board.solve(losses::totalWatt);
      stable = Optional.of(copper.isPresent());
      warn(copper, board);
    } else {
      s.ledger().has("thermal.copperC", s.current());
    }
    OptionalDouble most = continuous(board, limit);
    double chart = Math.max(most.orElse(0), duty.currentAmpereRms().orElse(0));
    return new ThermalFigures(
        copper,
        most,
        stable,
        TrackChart.narrowest(s.artwork(), limit - duty.ambientC()),
        copper.orElse(limit),
        HeatCurves.reaching(board, losses, HeatBalance.MELTING_C),
        HeatCurves.byCurrent(board, losses, chart),
        area);
  }

  /** What current the balance leaves room for at the copper's limit. */
  private OptionalDouble continuous(HeatBalance board, double limit) {
    OptionalDouble most = HeatCurves.reaching(board, losses, limit);
    if (most.isPresent()) {
      return most;
    }
    s.ledger()
        .caution(
            "no-current-left",
            "eddy, ripple and circulating losses alone take "
                + Numbers.engineering(losses.totalWatt(0, limit), "W", 3)
                + ", more than the surface carries off at the copper's limit");
    s.ledger().absent("thermal.maxContinuousAmpereRms", "duty.cooling");
    return OptionalDouble.empty();
  }

  private void warn(OptionalDouble copper, HeatBalance board) {
    if (copper.isEmpty()) {
      s.ledger()
          .caution(
              "no-stable-temperature",
              "the loss grows faster with temperature than the surface carries it off ("
                  + Numbers.engineering(board.wattPerKelvin(), "W/K", 3)
                  + "): there is no temperature at which the copper settles");
      s.ledger().absent("thermal.copperC", "duty.current");
      return;
    }
    double glass = s.spec().board().laminateTgC();
    double c = copper.getAsDouble();
    if (c > glass - BELOW_GLASS_K) {
      s.ledger()
          .caution(
              "laminate-heat",
              "the copper settles at "
                  + Numbers.fixed(c, 0)
                  + " C; a laminate of Tg "
                  + Numbers.fixed(glass, 0)
                  + " C is best kept 25 K below it");
    }
  }

  LossFigures loss() {
    double t = thermal.hotC();
    boolean eddy = losses.eddy().isPresent();
    if (linked.isPresent()) {
      s.ledger().has("loss.eddyWatt", s.speed());
    }
    if (!currentKnown) {
      s.ledger().has("loss.copperWatt", s.current());
    }
    if (ripple.isEmpty()) {
      s.ledger().has("loss.rippleWatt", s.bus(), s.switching());
    }
    return new LossFigures(
        t,
        when(currentKnown, losses.copperWatt(t)),
        when(eddy, losses.eddyWatt(t)),
        when(ripple.isPresent(), losses.rippleWatt(t)),
        when(
            losses.circulating().isPresent() || losses.layersWatt().isPresent(),
            losses.circulatingWatt(t)),
        eddy ? byOrder(losses.eddy().get(), t) : List.of(),
        eddy ? byLayer(losses.eddy().get(), t) : List.of(),
        linked.isPresent()
            ? HeatCurves.bySpeed(w -> losses(true, w), topRadPerSecond(), t, known())
            : List.of());
  }

  private HeatCurves.Known known() {
    return new HeatCurves.Known(
        current(true, 0).isPresent(),
        ripple.isPresent(),
        linked.flatMap(Linked::circulating).isPresent()
            || linked.map(Linked::layersWatt).orElse(NONE).isPresent());
  }

  /** Up to where losses are told: the no-load speed, or a half more than the duty's; 0 if none. */
  private double topRadPerSecond() {
    OptionalDouble bus = s.duty().generator() ? NONE : s.duty().busVolt();
    double free =
        bus.isPresent()
            ? TorqueSpeed.noLoadRadPerSecond(
                s.circuit(), linked.get().fluxWeber(), bus.getAsDouble())
            : 0;
    return bus.isPresent() ? Math.max(free, s.radPerSecond()) : 1.5 * s.radPerSecond();
  }

  private static OptionalDouble when(boolean known, double value) {
    return known ? OptionalDouble.of(value) : OptionalDouble.empty();
  }

  private List<LossFigures.Part> byOrder(EddyLoss e, double tempC) {
    List<LossFigures.Part> out = new ArrayList<>();
    double all = e.watt(s.radPerSecond(), tempC);
    for (int i = 0; i < e.orders(); i++) {
      int order = i;
      double w = sum(e.layers(), l -> e.watt(l + 1, order, s.radPerSecond(), tempC));
      if (w > FAINT * all) {
        out.add(new LossFigures.Part(2 * i + 1, w));
      }
    }
    return out;
  }

  private List<LossFigures.Part> byLayer(EddyLoss e, double tempC) {
    List<LossFigures.Part> out = new ArrayList<>();
    for (int l = 1; l <= e.layers(); l++) {
      int layer = l;
      double w = sum(e.orders(), i -> e.watt(layer, i, s.radPerSecond(), tempC));
      out.add(new LossFigures.Part(l, w));
    }
    return out;
  }

  private static double sum(int n, IntToDoubleFunction part) {
    double sum = 0;
    for (int i = 0; i < n; i++) {
      sum += part.applyAsDouble(i);
    }
    return sum;
  }

  /** Rms round the delta at the duty's speed, copper hot. */
  OptionalDouble circulatingAmpere() {
    if (linked.flatMap(Linked::circulating).isEmpty()) {
      return OptionalDouble.empty();
    }
    if (s.circuit().zeroHenry() <= 0) {
      s.ledger()
          .caution(
              "zero-sequence-inductance",
              "self and mutual inductance add up to nothing round the delta; only its resistance"
                  + " is taken");
    }
    return s.ledger().has("emf.deltaCirculatingAmpere", s.speed())
        ? OptionalDouble.of(
            linked.get().circulating().orElseThrow().ampereRms(s.radPerSecond(), thermal.hotC()))
        : OptionalDouble.empty();
  }

  /** Drag of eddy and circulating currents at a speed, N·m, copper hot. */
  DoubleUnaryOperator drag() {
    double t = thermal.hotC();
    return w -> {
      if (!(w > 0) || linked.isEmpty()) {
        return 0;
      }
      double layers = linked.get().layersWatt().orElse(0) * w * w / Copper.factor(t);
      double round = linked.get().circulating().map(c -> c.watt(w, t)).orElse(0.0) + layers;
      return (linked.get().eddy().watt(w, t) + round) / w;
    };
  }
}
