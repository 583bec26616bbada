package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures;
import etchloom.electric.resistance.ResistanceFigures.PhaseOhm;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.rules.Finding;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.Optional;

/**
 * What a command ends in on the terminal: within 80 columns, the verdict in words, colour only on
 * top of that.
 */
public final class Summary {
  private final Results r;
  private final Page page;

  private Summary(Results r, boolean colour) {
    this.r = r;
    page = new Page(colour);
  }

  /**
   * @param where the folder that was written, as the user may type it
   * @param colour whether the terminal takes colours and its user wants them
   * @return lines, each with its end
   */
  public static String text(Results r, Optional<String> where, boolean colour) {
    Summary s = new Summary(r, colour);
    s.geometry();
    s.rules();
    s.resistance();
    s.end(where);
    return s.page.text();
  }

  private void geometry() {
    Spec spec = r.spec();
    page.heading(r.artwork().title() + ", revision " + r.artwork().revision());
    Spec.Board b = spec.board();
    page.item(
        "board",
        mm(b.diameterMm())
            + (b.boreMm() > 0 ? ", bore " + mm(b.boreMm()) : ", no bore")
            + ", "
            + b.layers()
            + " layers, "
            + mm(b.thicknessMm()));
    page.item(
        "winding",
        Words.count(r.winding().phases(), "phase")
            + ", "
            + WindingTree.word(spec.winding().connection())
            + ", "
            + Words.count(r.winding().coils(), "coil")
            + ", "
            + r.winding().poles()
            + " poles, winding factor "
            + Numbers.fixed(r.winding().windingFactor(), 4));
    page.item(
        "coil",
        Words.count(r.artwork().turnsPerLayer(), "turn")
            + " a layer, track "
            + mm(spec.coil().trackMm())
            + ", space "
            + mm(spec.coil().spaceMm())
            + ", "
            + Words.count(r.vias(), "via"));
  }

  private void rules() {
    page.blank();
    page.row("rule", "measured", "required", "tightest at");
    for (Finding f : r.rules().minima()) {
      boolean broken = r.rules().findings().stream().anyMatch(x -> x.rule().equals(f.rule()));
      String at = (f.layer().isEmpty() ? "" : f.layer() + " ") + FindingText.point(f) + " mm";
      page.row(
          f.rule(),
          FindingText.value(f.measured(), f, broken),
          (FindingText.upperBound(f, broken) ? "<= " : ">= ")
              + FindingText.value(f.required(), f, broken),
          at + (broken ? "  BROKEN" : ""));
    }
    r.rules().notes().forEach(n -> page.item("note", n));
  }

  private void resistance() {
    ResistanceFigures f = r.resistance();
    page.blank();
    page.row("resistance at 20 C", "", "", "");
    page.cells("phase", f.phases(), Summary::phase);
    page.cells("terminals", f.terminals(), Summary::terminals);
    page.item(
        "limits",
        f.worst()
            .map(
                l ->
                    OrderLines.ohm(l.minTerminalOhm())
                        + " to "
                        + OrderLines.ohm(l.maxTerminalOhm())
                        + " between terminals, worst case of the fab")
            .orElse("none: within the fab's tolerance a track could be etched away"));
    page.item("imbalance", Numbers.fixed(f.imbalancePercent(), 2) + " %");
  }

  private static String phase(PhaseOhm p) {
    return p.mark() + " " + OrderLines.ohm(p.ohm());
  }

  private static String terminals(TerminalOhm t) {
    return t.key() + " " + OrderLines.ohm(t.ohm());
  }

  private void end(Optional<String> where) {
    Verdicts.add(page, r, ReportJson.figures(r));
    where.ifPresent(w -> page.item("files", (r.artwork().draft() ? "DRAFT, " : "") + w));
  }

  private static String mm(double v) {
    return Numbers.trimmed(v, 3) + " mm";
  }
}
