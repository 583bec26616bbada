package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures;
import etchloom.report.Figure.Group;
import etchloom.report.Figure.Shown;
import etchloom.rules.Finding;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Map;

/** The figures as tables, each with a link to its basis. */
final class HtmlFigures {
  /** By their names away from the tables that they stand in further on. */
  private static final Map<String, String> DECIDING =
      Map.of(
          "resistance.minTerminalOhm", "resistance between terminals, least of a good board",
          "resistance.maxTerminalOhm", "resistance between terminals, greatest of a good board",
          "torque.newtonMetrePerAmpereRms", "torque for each ampere rms of a winding",
          "emf.rpmPerVolt", "speed for each volt, line peak",
          "drive.speedLimitRpm", "no-load speed at the bus",
          "drive.rippleAmperePeakToPeak", "PWM ripple of a line, peak to peak",
          "thermal.copperC", "copper at the duty",
          "thermal.maxContinuousAmpereRms", "most continuous current, rms",
          "generator.powerWatt", "power into the load");

  private final Html h;
  private final Results r;
  private final boolean pictured;
  private final Map<String, Object> figures;
  private final Map<Group, List<Shown>> shown;
  private final HtmlPlots plots;
  private final HtmlMachine machine;

  /**
   * @param pictured whether the page shows the board
   */
  HtmlFigures(Html h, Results r, Map<String, Object> figures, boolean pictured) {
    this.h = h;
    this.pictured = pictured;
    this.r = r;
    this.figures = figures;
    shown = Figures.shown(figures);
    plots = new HtmlPlots(h, r);
    machine = new HtmlMachine(h, r, plots);
  }

  void deciding() {
    Table t =
        new Table(
            BoardMarks.caption("The tightest place of every rule", pictured),
            2,
            "Rule",
            "Measured",
            "Must be",
            "Verdict",
            "Place",
            "What");
    for (int i = 0; i < r.rules().minima().size(); i++) {
      Finding f = r.rules().minima().get(i);
      boolean broken = FindingText.broken(r.rules(), f.rule());
      BoardMarks.Mark mark = BoardMarks.tightest(i, f);
      t.row(
          mark.rowId(),
          List.of(
              Cell.of(f.rule()),
              FindingText.cell("check.minima[" + i + "]", f, true, broken),
              FindingText.cell("check.minima[" + i + "]", f, false, broken),
              Cell.of(broken ? "BROKEN" : "kept"),
              mark.place(FindingText.shortPlace(f), pictured),
              Cell.of(f.what())));
    }
    t.write(h);
    notes();
    List<Shown> few =
        shown.values().stream()
            .flatMap(List::stream)
            .filter(s -> DECIDING.containsKey(s.path()))
            .map(s -> new Shown(s.path(), DECIDING.get(s.path()), s.value(), s.basis()))
            .toList();
    table("Of the machine", few);
    absent();
  }

  private void notes() {
    if (!r.rules().notes().isEmpty()) {
      h.open("ul");
      r.rules().notes().forEach(n -> h.element("li", n));
      h.close("ul");
    }
  }

  private void absent() {
    List<Absent> all = Absent.of(r, figures);
    if (all.isEmpty()) {
      return;
    }
    h.element("h3", "Not in this report").open("ul");
    for (Absent a : all) {
      String what = String.join(", ", a.figures());
      h.open("li");
      if (a.keys().isEmpty()) {
        h.text("Not worked out for this board: " + what + ".");
      } else {
        h.text("Add ").element("strong", a.keyWords()).text(" to the spec for: " + what + ".");
      }
      h.close("li");
    }
    h.close("ul");
  }

  void electrical() {
    layers();
    groups(Group.RESISTANCE, Group.INDUCTANCE, Group.EMF);
    machine.emf();
    groups(Group.TORQUE, Group.TAPER, Group.GENERATOR, Group.SPREAD);
    r.machine().ifPresent(m -> plots.spread(m.spread()));
  }

  private void layers() {
    List<Double> areas = r.copperAreaMm2();
    Table t =
        new Table(
            "Copper by layer",
            4,
            "Layer",
            "One coil, length",
            "One coil, resistance",
            "All tracks",
            "Area");
    for (int i = 0; i < r.artwork().layers(); i++) {
      ResistanceFigures.CoilLayer c = r.resistance().coilLayers().get(i);
      String coil = "geometry.coilLayers[" + i + "].";
      String copper = "geometry.copperLayers[" + i + "].";
      double tracks = r.resistance().copperLayers().get(i).trackLengthMm();
      t.row(
          Cell.of("L" + (i + 1)),
          Cell.of(Numbers.fixed(c.lengthMm(), 1) + " mm", coil + "lengthMm"),
          Cell.of(OrderLines.ohm(c.ohm()), coil + "ohm"),
          Cell.of(Numbers.fixed(tracks, 0) + " mm", copper + "trackLengthMm"),
          Cell.of(Numbers.fixed(areas.get(i), 1) + " mm\u00b2", copper + "areaMm2"));
    }
    t.write(h);
  }

  void thermal() {
    groups(Group.LOSS, Group.THERMAL);
    none(Group.LOSS, Group.THERMAL);
    r.machine().ifPresent(m -> plots.losses(m.loss()));
    r.machine().ifPresent(m -> plots.temperature(m.thermal()));
  }

  void drive() {
    groups(Group.DRIVE);
    machine.axes();
    r.machine().ifPresent(m -> plots.torqueSpeed(m.drive().torqueSpeed()));
    none(Group.DRIVE);
  }

  void rotor() {
    groups(Group.ROTOR);
  }

  private void none(Group... groups) {
    for (Group g : groups) {
      if (shown.containsKey(g)) {
        return;
      }
    }
    h.element("p", "None of these figures is in this report; section 3 says why.");
  }

  private void groups(Group... groups) {
    for (Group g : groups) {
      table(g.title(), shown.getOrDefault(g, List.of()));
    }
  }

  private void table(String title, List<Shown> rows) {
    if (rows.isEmpty()) {
      return;
    }
    h.open("div", "class=\"scroll\"").open("table").element("caption", Words.symbols(title));
    h.open("thead").open("tr").element("th", "Figure", "scope=\"col\"");
    h.element("th", "Value", "scope=\"col\"", "class=\"n\"");
    h.element("th", "Basis", "scope=\"col\"").close("tr").close("thead").open("tbody");
    for (Shown s : rows) {
      h.open("tr").element("th", Words.capital(s.label()), "scope=\"row\"");
      h.element(
          "td",
          Words.symbols(s.value()),
          "class=\"n\"",
          "data-key=\"" + Html.escaped(s.path()) + "\"");
      h.open("td");
      h.element("a", s.basis().title(), "href=\"#" + s.basis().anchor() + "\"");
      h.close("td").close("tr");
    }
    h.close("tbody").close("table").close("div");
  }
}
