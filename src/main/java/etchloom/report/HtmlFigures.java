package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures;
import etchloom.report.Figure.Group;
import etchloom.report.Figure.Shown;
import etchloom.rules.Finding;
import etchloom.units.Numbers;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** The figures as tables, each with a link to its basis. */
final class HtmlFigures {
  private static final List<String> DECIDING =
      List.of(
          "resistance.minTerminalOhm",
          "resistance.maxTerminalOhm",
          "torque.newtonMetrePerAmpereRms",
          "emf.rpmPerVolt",
          "drive.speedLimitRpm",
          "drive.rippleAmperePeakToPeak",
          "thermal.copperC",
          "thermal.maxContinuousAmpereRms",
          "generator.powerWatt");

  private final Html h;
  private final Results r;
  private final Map<String, Object> figures;
  private final Map<Group, List<Shown>> shown;
  private final HtmlMachine machine;

  HtmlFigures(Html h, Results r, Map<String, Object> figures) {
    this.h = h;
    this.r = r;
    this.figures = figures;
    shown = Figures.shown(figures);
    machine = new HtmlMachine(h, r);
  }

  void deciding() {
    List<List<String>> rows = new ArrayList<>();
    for (Finding f : r.rules().minima()) {
      boolean broken = FindingText.broken(r.rules(), f.rule());
      rows.add(
          List.of(
              f.rule(),
              FindingText.value(f.measured(), f, broken),
              (FindingText.upperBound(f, broken) ? "at most " : "at least ")
                  + FindingText.value(f.required(), f, broken),
              broken ? "BROKEN" : "kept",
              FindingText.shortPlace(f),
              f.what()));
    }
    h.table(
        "The tightest place of every rule",
        List.of("Rule", "Measured", "Must be", "Verdict", "Place", "What"),
        rows,
        2);
    notes();
    List<Shown> few =
        shown.values().stream()
            .flatMap(List::stream)
            .filter(s -> DECIDING.contains(s.path()))
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
  }

  private void layers() {
    List<Double> areas = CopperArea.of(r.artwork(), r.rules());
    List<List<String>> rows = new ArrayList<>();
    for (int i = 0; i < r.artwork().layers(); i++) {
      ResistanceFigures.CoilLayer c = r.resistance().coilLayers().get(i);
      rows.add(
          List.of(
              "L" + (i + 1),
              Numbers.fixed(c.lengthMm(), 1) + " mm",
              OrderLines.ohm(c.ohm()),
              Numbers.fixed(r.resistance().copperLayers().get(i).trackLengthMm(), 0) + " mm",
              Numbers.fixed(areas.get(i), 1) + " mm\u00b2"));
    }
    h.table(
        "Copper by layer",
        List.of("Layer", "One coil, length", "One coil, resistance", "All tracks", "Area"),
        rows,
        4);
  }

  void thermal() {
    groups(Group.LOSS, Group.THERMAL);
    none(Group.LOSS, Group.THERMAL);
  }

  void drive() {
    groups(Group.DRIVE);
    machine.axes();
    machine.torqueSpeed();
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
    h.open("div", "class=\"scroll\"").open("table").element("caption", title);
    h.open("thead").open("tr").element("th", "Figure", "scope=\"col\"");
    h.element("th", "Value", "scope=\"col\"", "class=\"n\"");
    h.element("th", "Basis", "scope=\"col\"").close("tr").close("thead").open("tbody");
    for (Shown s : rows) {
      h.open("tr").element("th", Words.capital(s.label()), "scope=\"row\"");
      h.element("td", Words.symbols(s.value()), "class=\"n\"").open("td");
      h.element("a", s.basis().title(), "href=\"#" + s.basis().anchor() + "\"");
      h.close("td").close("tr");
    }
    h.close("tbody").close("table").close("div");
  }
}
