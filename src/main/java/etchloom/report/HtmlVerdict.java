package etchloom.report;

import etchloom.proof.ProofReport;
import etchloom.rules.Finding;
import java.util.List;
import java.util.Map;

/** May it be made, and does it do its duty? */
final class HtmlVerdict {
  private HtmlVerdict() {}

  /**
   * @param pictured whether the page shows the board
   */
  static void add(Html h, Results r, Map<String, Object> figures, boolean pictured) {
    List<String> words = Verdicts.words(r);
    box(h, r.rules().passed() ? "yes" : "no", words.get(0), words.get(1));
    Verdicts.ripple(r, figures).ifPresent(w -> box(h, "no", w.get(0), w.get(1)));
    duty(h, r);
    broken(h, r, pictured);
    r.proof().ifPresent(p -> proof(h, p));
    h.open("p", "class=\"quiet\"");
    h.text("Gaps are measured on the drawing as it stands, turn against turn; ");
    h.text("a winding is one net, so no test by nets would see a short between turns.").close("p");
  }

  private static void box(Html h, String kind, String word, String text) {
    h.open("div", "class=\"verdict " + kind + "\"");
    h.element("strong", word).text(": " + Words.symbols(text) + ".").close("div");
  }

  private static void broken(Html h, Results r, boolean pictured) {
    if (r.rules().passed()) {
      return;
    }
    Table t =
        new Table(
            BoardMarks.caption("Broken rules", pictured),
            2,
            "Rule",
            "Measured",
            "Must be",
            "Place",
            "What");
    for (int i = 0; i < r.rules().findings().size(); i++) {
      Finding f = r.rules().findings().get(i);
      String stem = "check.findings[" + i + "]";
      BoardMarks.Mark mark = BoardMarks.broken(i, f);
      t.row(
          mark.rowId(),
          List.of(
              Cell.of((i + 1) + "\u00a0" + f.rule()),
              FindingText.cell(stem, f, true, true),
              FindingText.cell(stem, f, false, true),
              mark.place(FindingText.place(f), pictured),
              Cell.of(f.what())));
    }
    t.write(h);
  }

  private static void proof(Html h, ProofReport p) {
    box(
        h,
        p.passed() ? "yes" : "no",
        p.passed() ? "FILES PROVEN" : "FILES NOT PROVEN",
        Verdicts.proof(p)
            + ". The written files were read back and their copper rebuilt and held against the"
            + " design, so that a short between turns shows");
    Table t = new Table("Copper as read back", 2, "Layer", "Islands", "Gaps closed in by copper");
    p.islands()
        .forEach(
            (layer, n) ->
                t.row(
                    Cell.of("L" + layer),
                    Cell.of("" + n, "proof.islands.L" + layer),
                    p.loops().containsKey(layer)
                        ? Cell.of("" + p.loops().get(layer), "proof.loops.L" + layer)
                        : Cell.of("0")));
    t.write(h);
    p.notes().forEach(n -> h.element("p", n));
  }

  private static void duty(Html h, Results r) {
    DutyAnswer a = DutyAnswer.of(r);
    box(h, a.met().map(m -> m ? "yes" : "no").orElse("open"), a.word(), a.text());
    if (a.rows().isEmpty()) {
      return;
    }
    Table t =
        new Table("The duty, demand by demand", 2, "Demand", "Needed", "Got", "Met", "Limited by");
    for (int i = 0; i < a.rows().size(); i++) {
      DutyAnswer.Row x = a.rows().get(i);
      String stem = "verdict.duty[" + i + "].";
      t.row(
          Cell.of(x.what()),
          Cell.of(x.needed(), stem + "needed"),
          Cell.of(x.got(), stem + "got"),
          Cell.of(x.answer()),
          Cell.of(x.limitedBy()));
    }
    t.write(h);
  }
}
