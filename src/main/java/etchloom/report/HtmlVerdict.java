package etchloom.report;

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

  private static void duty(Html h, Results r) {
    box(
        h,
        "open",
        "DUTY NOT JUDGED",
        r.spec().duty().isEmpty()
            ? "the spec has no duty; with one the report says whether the machine does it"
            : "this report does not judge the duty");
  }
}
