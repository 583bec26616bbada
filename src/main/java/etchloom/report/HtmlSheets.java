package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import java.util.ArrayList;
import java.util.List;

/** The sheets one prints: for the fab, for the bench, and what every figure rests on. */
final class HtmlSheets {
  private final Html h;
  private final Results r;

  HtmlSheets(Html h, Results r) {
    this.h = h;
    this.r = r;
  }

  void order() {
    h.element(
        "p",
        "Send the set's fab archive with these notes. Ask for a test report of continuity, and for"
            + " the finished copper thickness of every layer: it moves the resistance more than"
            + " anything else.");
    List<List<String>> rows =
        OrderLines.of(r).stream().map(l -> List.of(Words.capital(l.item()), l.value())).toList();
    h.table("Order notes", List.of("Item", "Ordered"), rows, 0);
  }

  void acceptance() {
    h.open("p");
    h.text("Measure between the terminals with four wires, at a current that does not warm the");
    h.text(" board (a tenth of the rated current or less), and note the board's temperature.");
    h.text(" Bring each reading to 20 \u00b0C: R20 = R / (1 + 0.00393 (T \u2212 20 \u00b0C)).");
    h.close("p");
    List<String> head = new ArrayList<>(List.of("Pair", "Expected, 20 \u00b0C"));
    head.addAll(List.of("At least", "At most", "Measured", "T, \u00b0C", "At 20 \u00b0C"));
    h.open("div", "class=\"scroll\"").open("table", "class=\"form\"");
    h.element("caption", "Resistance between terminals, worst case of the fab's tolerance");
    h.open("thead").open("tr");
    for (int i = 0; i < head.size(); i++) {
      h.element("th", head.get(i), "scope=\"col\"", i > 0 && i < 4 ? "class=\"n\"" : "class=\"t\"");
    }
    h.close("tr").close("thead").open("tbody");
    List<PairLimits> limits = PairLimits.of(r.resistance());
    for (int i = 0; i < r.resistance().terminals().size(); i++) {
      pair(i, limits);
    }
    h.close("tbody").close("table").close("div");
    h.open("p");
    h.text("The pairs of one board must also agree with each other: by design they differ by ");
    h.text(Form.PERCENT.show(r.resistance().imbalancePercent()));
    h.text(" (greatest less least over the mean). A greater difference points at one coil.");
    h.close("p");
  }

  private void pair(int i, List<PairLimits> limits) {
    TerminalOhm t = r.resistance().terminals().get(i);
    h.open("tr").element("th", t.key(), "scope=\"row\"");
    ohm(t.ohm(), "resistance.terminalOhm." + t.key());
    if (limits.isEmpty()) {
      h.element("td", "-", "class=\"n\"").element("td", "-", "class=\"n\"");
    } else {
      ohm(limits.get(i).least(), "resistance.pairs[" + i + "].leastOhm");
      ohm(limits.get(i).greatest(), "resistance.pairs[" + i + "].greatestOhm");
    }
    for (int blank = 0; blank < 3; blank++) {
      h.open("td", "class=\"fill\"").close("td");
    }
    h.close("tr");
  }

  private void ohm(double v, String key) {
    h.element(
        "td",
        Words.symbols(OrderLines.ohm(v)),
        "class=\"n\"",
        "data-key=\"" + Html.escaped(key) + "\"");
  }

  void basis() {
    h.open("dl", "class=\"basis\"");
    for (Basis b : Basis.values()) {
      if (b == Basis.TAPER && r.taper().isEmpty()) {
        continue;
      }
      h.open("div", "id=\"" + b.anchor() + "\"").element("dt", b.title());
      line("Method", b.method());
      line("Source", b.source());
      line("Limits", b.limits());
      h.close("div");
    }
    h.close("dl");
  }

  private void line(String what, String text) {
    h.open("dd").element("em", what + ":").text(" " + text + ".").close("dd");
  }
}
