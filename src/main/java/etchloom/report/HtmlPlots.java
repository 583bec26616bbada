package etchloom.report;

import etchloom.electric.machine.EmfFigures;
import etchloom.electric.machine.EmfFigures.Sample;
import etchloom.electric.machine.LossFigures;
import etchloom.electric.machine.ThermalFigures;
import etchloom.electric.machine.drive.TorqueSpeed;
import etchloom.electric.machine.spread.SpreadFigures;
import etchloom.report.Plot.Kind;
import etchloom.report.Plot.Marks;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The plots, each with its table. */
final class HtmlPlots {
  private static final double RPM = 30 / Math.PI;

  /** Temperatures are drawn up to so many times the copper's limit. */
  private static final double BEYOND_LIMIT = 1.6;

  private final Html h;
  private final Results r;

  HtmlPlots(Html h, Results r) {
    this.h = h;
    this.r = r;
  }

  private Optional<Spec.Duty> duty() {
    return r.spec().duty();
  }

  private static String at(String list, int i, String key) {
    return list + "[" + i + "]." + key;
  }

  void waveform(EmfFigures f) {
    List<String> marks = r.winding().marks();
    double most =
        f.waveform().stream()
            .flatMap(s -> s.voltSecondPerRadian().stream())
            .mapToDouble(Math::abs)
            .max()
            .orElse(0);
    Scale scale = Scale.of(most, "V s/rad");
    Plot plot =
        new Plot(
            "plot-emf",
            "Back-EMF of each phase over one electrical turn.",
            "Back-EMF of each phase over one electrical turn, at 1 rad/s.",
            "rotor, electrical degrees",
            "back-EMF at 1 rad/s, " + scale.unit(),
            scale.factor());
    List<String> head = new ArrayList<>(List.of("Electrical degrees"));
    marks.forEach(m -> head.add("Phase " + m));
    Table t =
        new Table(
            "Back-EMF over one electrical turn, at 1 rad/s", plot.tableId(), marks.size(), head);
    for (int i = 0; i < f.waveform().size(); i++) {
      Sample s = f.waveform().get(i);
      String stem = "emf.waveform[" + i + "].";
      List<Cell> row = new ArrayList<>();
      row.add(
          Cell.exact(
              Numbers.trimmed(s.electricalDegrees(), 3) + "\u00b0",
              stem + "electricalDegrees",
              s.electricalDegrees()));
      for (int p = 0; p < marks.size(); p++) {
        double v = s.voltSecondPerRadian().get(p);
        row.add(Cell.exact(Form.EMF.show(v), stem + marks.get(p), v));
      }
      t.row("", row);
    }
    plot.write(h, Kind.TURN, new Marks(), t);
  }

  void harmonics(EmfFigures f) {
    String first = "emf.phasePeakVoltSecondPerRadian";
    double one = f.phasePeakVoltSecondPerRadian();
    if (one == 0) {
      return;
    }
    Plot plot =
        new Plot(
            "plot-harmonics",
            "Harmonics of a phase's back-EMF above the first, as shares of the first.",
            "Harmonics of a phase's back-EMF above the first, as shares of the first.",
            "order",
            "of the first, %",
            1);
    Table t =
        new Table(
            "Harmonics of the back-EMF",
            plot.tableId(),
            2,
            List.of("Order", "Of the first", "Peak, a phase, at 1 rad/s"));
    for (int i = 0; i < f.harmonics().size(); i++) {
      EmfFigures.Harmonic x = f.harmonics().get(i);
      double v = x.phasePeakVoltSecondPerRadian();
      String list = "emf.harmonics";
      String key = at(list, i, "phasePeakVoltSecondPerRadian");
      String share = Numbers.fixed(100 * v / one, 2) + " %";
      t.row(
          Cell.exact("" + x.order(), at(list, i, "order"), x.order()),
          (x.order() == 1 ? Cell.of(share, key) : Cell.exact(share, key, 100 * v / one))
              .shareOf(first),
          Cell.of(Form.EMF.show(v), key));
    }
    plot.write(h, Kind.BARS, new Marks(), t);
  }

  void spread(SpreadFigures f) {
    if (f.boards().isEmpty() || r.resistance().worst().isEmpty()) {
      none("the resistance's spread: a tolerance could etch a track away");
      return;
    }
    Plot plot =
        new Plot(
            "plot-spread",
            "A thousand random boards by their resistance between terminals, and the limits.",
            "A thousand random boards, drawn from the fab's tolerances, by their mean resistance"
                + " between terminals at 20 \u00b0C. A board outside the worst case is faulty.",
            "resistance between terminals, \u03a9",
            "boards",
            1);
    Table t =
        new Table(
            "Random boards by their mean resistance between terminals",
            plot.tableId(),
            2,
            List.of("From", "Below", "Boards"));
    for (int i = 0; i < f.boards().size(); i++) {
      SpreadFigures.Bin b = f.boards().get(i);
      t.row(
          Cell.exact(OrderLines.ohm(b.fromOhm()), at("spread.boards", i, "fromOhm"), b.fromOhm()),
          Cell.exact(OrderLines.ohm(b.toOhm()), at("spread.boards", i, "toOhm"), b.toOhm()),
          Cell.exact("" + b.boards(), at("spread.boards", i, "boards"), b.boards()));
    }
    Marks marks = new Marks();
    marks.x(r.resistance().meanTerminalOhm(), "as drawn");
    r.resistance()
        .rss()
        .ifPresent(l -> marks.x(l.minTerminalOhm(), "rss").x(l.maxTerminalOhm(), "rss"));
    r.resistance()
        .worst()
        .ifPresent(
            l -> marks.x(l.minTerminalOhm(), "worst case").x(l.maxTerminalOhm(), "worst case"));
    plot.write(h, Kind.BINS, marks, t);
  }

  void losses(LossFigures f) {
    List<LossFigures.AtSpeed> all = f.bySpeed();
    if (all.isEmpty()) {
      none(
          "losses against speed: it needs rotor.magnet, rotor.air-gap, and duty.bus or duty.speed");
      return;
    }
    double most = all.stream().mapToDouble(LossFigures.AtSpeed::totalWatt).max().orElse(0);
    Scale scale = Scale.of(most, "W");
    Plot plot =
        new Plot(
            "plot-loss",
            "Losses over the speed.",
            "Losses against speed, copper at "
                + Words.symbols(Form.CELSIUS.show(f.atC()))
                + copperNote()
                + ".",
            "speed, rpm",
            "loss, " + scale.unit(),
            scale.factor());
    LossFigures.AtSpeed top = all.get(all.size() - 1);
    List<String> head = new ArrayList<>(List.of("Speed"));
    add(head, top.copperWatt(), "Copper");
    head.add("Eddy currents");
    add(head, top.rippleWatt(), "Ripple");
    add(head, top.circulatingWatt(), "Circulating");
    head.add("All known");
    Table t = new Table("Losses by speed", plot.tableId(), head.size() - 1, head);
    for (int i = 0; i < all.size(); i++) {
      LossFigures.AtSpeed a = all.get(i);
      String stem = "loss.bySpeed[" + i + "].";
      List<Cell> row = new ArrayList<>();
      row.add(Cell.exact(Numbers.trimmed(a.rpm(), 3) + " rpm", stem + "rpm", a.rpm()));
      watt(row, a.copperWatt(), stem + "copperWatt");
      watt(row, OptionalDouble.of(a.eddyWatt()), stem + "eddyWatt");
      watt(row, a.rippleWatt(), stem + "rippleWatt");
      watt(row, a.circulatingWatt(), stem + "circulatingWatt");
      watt(row, OptionalDouble.of(a.totalWatt()), stem + "totalWatt");
      t.row("", row);
    }
    plot.write(h, Kind.LINES, speed(new Marks()), t);
  }

  private String copperNote() {
    boolean load = duty().map(d -> d.generator() && d.loadOhm().isPresent()).orElse(false);
    if (load) {
      return ", the current as the load draws it";
    }
    OptionalDouble i = duty().map(Spec.Duty::currentAmpereRms).orElse(OptionalDouble.empty());
    return i.isPresent()
        ? ", at the duty's " + Form.AMPERE.show(i.getAsDouble()) + " rms"
        : ", without the loss of a current: the duty states none";
  }

  private static void add(List<String> head, OptionalDouble there, String name) {
    if (there.isPresent()) {
      head.add(name);
    }
  }

  private static void watt(List<Cell> row, OptionalDouble watt, String key) {
    if (watt.isPresent()) {
      row.add(Cell.exact(Form.WATT.show(watt.getAsDouble()), key, watt));
    }
  }

  private Marks speed(Marks marks) {
    duty()
        .map(Spec.Duty::speedRadPerSecond)
        .ifPresent(w -> w.ifPresent(x -> marks.x(RPM * x, "duty")));
    return marks;
  }

  void temperature(ThermalFigures f) {
    List<ThermalFigures.AtCurrent> all = f.byCurrent();
    if (all.isEmpty()) {
      none("temperature against current: the other losses leave room for none");
      return;
    }
    double limit = duty().map(Spec.Duty::copperLimitC).orElse(f.hotC());
    double top = f.byCurrent().get(all.size() - 1).ampereRms();
    Marks marks = new Marks().y(limit, "copper's limit").y(r.spec().board().laminateTgC(), "Tg");
    f.maxContinuousAmpereRms().ifPresent(i -> marks.x(i, "most"));
    duty().map(Spec.Duty::currentAmpereRms).ifPresent(i -> i.ifPresent(x -> marks.x(x, "duty")));
    String settles = "Above " + settles(f) + " the copper never settles: its loss outgrows the";
    String bounds =
        f.settlesUpToAmpereRms().isEmpty()
            ? "It settles at no current: the other losses alone are too much for the surface."
            : f.settlesUpToAmpereRms().getAsDouble() > top
                ? settles + " cooling (beyond this plot)."
                : settles + " cooling, and the line ends.";
    f.settlesUpToAmpereRms()
        .ifPresent(
            i -> {
              if (i <= top) {
                marks.x(i, "no balance beyond");
              }
            });
    Plot plot =
        new Plot(
            "plot-temperature",
            "Temperature of the copper over the current of a winding. " + bounds,
            "Where the copper settles, by the current of a winding, the other losses as at the"
                + " duty. "
                + bounds,
            "current of a winding, A rms",
            "copper, \u00b0C",
            1);
    Table t =
        new Table(
            "Temperature by current", plot.tableId(), 1, List.of("Current, rms", "Copper settles"));
    for (int i = 0; i < all.size(); i++) {
      ThermalFigures.AtCurrent a = all.get(i);
      OptionalDouble c = a.copperC();
      t.row(
          Cell.exact(
              Form.AMPERE.show(a.ampereRms()),
              at("thermal.byCurrent", i, "ampereRms"),
              a.ampereRms()),
          Cell.exact(
              c.isPresent() ? "at " + Form.CELSIUS.show(c.getAsDouble()) : "never",
              at("thermal.byCurrent", i, "copperC"),
              c));
    }
    double most = Math.max(BEYOND_LIMIT * limit, 1.1 * f.copperC().orElse(0));
    plot.write(h, Kind.LINES, marks, t, most);
  }

  private static String settles(ThermalFigures f) {
    return Form.AMPERE.show(f.settlesUpToAmpereRms().orElse(0));
  }

  void torqueSpeed(List<TorqueSpeed.Point> points) {
    if (points.size() < 2) {
      none("torque against speed: it needs rotor.magnet, rotor.air-gap, duty.bus and a current");
      return;
    }
    double most = points.stream().mapToDouble(TorqueSpeed.Point::newtonMetre).max().orElse(0);
    Scale scale = Scale.of(most, "N m");
    Plot plot =
        new Plot(
            "plot-torque",
            "Most torque at the shaft over the speed, and what limits it.",
            "Most torque at the shaft with the duty's current and bus, copper hot; each piece is"
                + " named for what limits it.",
            "speed, rpm",
            "torque, " + scale.unit(),
            scale.factor());
    Table t =
        new Table("Torque by speed", plot.tableId(), 1, List.of("Speed", "Torque", "Limited by"));
    for (int i = 0; i < points.size(); i++) {
      TorqueSpeed.Point p = points.get(i);
      t.row(
          Cell.exact(Form.RPM.show(p.rpm()), at("drive.torqueSpeed", i, "rpm"), p.rpm()),
          Cell.exact(
              Form.TORQUE.show(p.newtonMetre()),
              at("drive.torqueSpeed", i, "newtonMetre"),
              p.newtonMetre()),
          Cell.of(p.limit().word()));
    }
    Marks marks = speed(new Marks());
    duty().map(Spec.Duty::torqueNm).ifPresent(n -> n.ifPresent(x -> marks.y(x, "needed")));
    plot.write(h, Kind.PIECES, marks, t);
  }

  private void none(String what) {
    h.element("p", "No plot of " + what + ".", "class=\"quiet\"");
  }
}
