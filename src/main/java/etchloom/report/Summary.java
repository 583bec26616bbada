package etchloom.report;

import etchloom.electric.resistance.ResistanceFigures;
import etchloom.electric.resistance.ResistanceFigures.PhaseOhm;
import etchloom.electric.resistance.ResistanceFigures.TerminalOhm;
import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a command ends in on the terminal: within 80 columns, the verdict in words, colour only on
 * top of that.
 */
public final class Summary {
  private Summary() {}

  /**
   * @param where the folder that was written, as the user may type it
   * @param colour whether the terminal takes colours and its user wants them
   * @return lines, each with its end
   */
  public static String text(Results r, Optional<String> where, boolean colour) {
    Page page = new Page(colour);
    board(page, r);
    rules(page, r.rules(), r.rules().brief());
    resistance(page, r);
    end(page, r, ReportJson.figures(r), where);
    return page.text();
  }

  static void board(Page page, Results r) {
    Spec spec = r.spec();
    page.heading(r.artwork().title() + ", revision " + r.artwork().revision());
    Spec.Board b = spec.board();
    page.item(
        "board",
        OrderLines.mm(b.diameterMm())
            + (b.boreMm() > 0 ? ", bore " + OrderLines.mm(b.boreMm()) : ", no bore")
            + ", "
            + b.layers()
            + " layers, "
            + OrderLines.mm(b.thicknessMm()));
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
            + OrderLines.mm(spec.coil().trackMm())
            + r.taper().map(t -> " to " + OrderLines.mm(t.widestMm())).orElse("")
            + ", space "
            + OrderLines.mm(spec.coil().spaceMm())
            + ", "
            + Words.count(r.vias(), "via"));
  }

  /**
   * @param notes those of the report, or those in short
   */
  static void rules(Page page, RuleReport rules, List<String> notes) {
    page.blank();
    page.row("rule", "measured", "required", "tightest at");
    for (Finding f : rules.minima()) {
      boolean broken = FindingText.broken(rules, f.rule());
      page.row(
          f.rule(),
          FindingText.value(f.measured(), f, broken),
          (FindingText.upperBound(f, broken) ? "<= " : ">= ")
              + FindingText.value(f.required(), f, broken),
          FindingText.shortPlace(f) + (broken ? "  BROKEN" : ""));
    }
    notes.forEach(n -> page.item("note", n));
  }

  private static void resistance(Page page, Results r) {
    ResistanceFigures f = r.resistance();
    page.blank();
    page.row("resistance at 20 C", "", "", "");
    page.cells("phase", f.phases(), Summary::phase);
    page.cells("terminals", f.terminals(), Summary::terminals);
    List<PairLimits> limits = PairLimits.lines(r.resistance());
    page.item(
        "limits",
        limits.isEmpty()
            ? "none: within the fab's tolerance a track could be etched away"
            : PairLimits.span(limits)
                + ", "
                + pairs(limits, f.terminals().size())
                + ", worst case of the fab");
    page.item("imbalance", Numbers.fixed(f.imbalancePercent(), 2) + " %");
  }

  private static String pairs(List<PairLimits> limits, int all) {
    if (limits.size() == 1) {
      return limits.get(0).pair();
    }
    return limits.size() == all ? "any pair" : "any pair without a star point";
  }

  private static String phase(PhaseOhm p) {
    return p.mark() + " " + OrderLines.ohm(p.ohm());
  }

  private static String terminals(TerminalOhm t) {
    return t.key() + " " + OrderLines.ohm(t.ohm());
  }

  static void end(Page page, Results r, Map<String, Object> figures, Optional<String> where) {
    Verdicts.add(page, r, figures);
    where.ifPresent(w -> page.item("files", (r.artwork().draft() ? "DRAFT, " : "") + w));
  }
}
