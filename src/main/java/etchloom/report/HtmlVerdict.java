package etchloom.report;

import etchloom.proof.ProofReport;
import etchloom.rules.Finding;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** May it be made, and does it do its duty? */
final class HtmlVerdict {
  private HtmlVerdict() {}

  static void add(Html h, Results r, Map<String, Object> figures) {
    List<String> words = Verdicts.words(r);
    box(h, r.rules().passed() ? "yes" : "no", words.get(0), words.get(1));
    broken(h, r);
    Verdicts.ripple(r, figures).ifPresent(w -> box(h, "no", w.get(0), w.get(1)));
    duty(h, r);
    r.proof().ifPresent(p -> proof(h, p));
    h.open("p", "class=\"quiet\"");
    h.text("Gaps are measured on the drawing as it stands, turn against turn; ");
    h.text("a winding is one net, so no test by nets would see a short between turns.").close("p");
  }

  private static void box(Html h, String kind, String word, String text) {
    h.open("div", "class=\"verdict " + kind + "\"");
    h.element("strong", word).text(": " + text + ".").close("div");
  }

  private static void broken(Html h, Results r) {
    if (r.rules().passed()) {
      return;
    }
    List<List<String>> rows = new ArrayList<>();
    for (Finding f : r.rules().findings()) {
      rows.add(
          List.of(
              f.rule(),
              FindingText.value(f.measured(), f, true),
              (FindingText.upperBound(f, true) ? "at most " : "at least ")
                  + FindingText.value(f.required(), f, true),
              FindingText.place(f),
              f.what()));
    }
    h.table("Broken rules", List.of("Rule", "Measured", "Must be", "Place", "What"), rows, 2);
  }

  private static void proof(Html h, ProofReport p) {
    box(
        h,
        p.passed() ? "yes" : "no",
        p.passed() ? "FILES PROVEN" : "FILES NOT PROVEN",
        Verdicts.proof(p)
            + ". The written files were read back and their copper rebuilt and held against the"
            + " design, so that a short between turns shows");
    List<List<String>> rows = new ArrayList<>();
    p.islands()
        .forEach(
            (layer, n) ->
                rows.add(List.of("L" + layer, "" + n, "" + p.loops().getOrDefault(layer, 0))));
    h.table(
        "Copper as read back", List.of("Layer", "Islands", "Gaps closed in by copper"), rows, 2);
    p.notes().forEach(n -> h.element("p", n));
  }

  private static void duty(Html h, Results r) {
    DutyAnswer a = DutyAnswer.of(r);
    box(h, a.met().map(m -> m ? "yes" : "no").orElse("open"), a.word(), a.text());
    if (a.rows().isEmpty()) {
      return;
    }
    List<List<String>> rows =
        a.rows().stream()
            .map(x -> List.of(x.what(), x.needed(), x.got(), x.answer(), x.limitedBy()))
            .toList();
    h.table(
        "The duty, demand by demand",
        List.of("Demand", "Needed", "Got", "Met", "Limited by"),
        rows,
        2);
  }
}
