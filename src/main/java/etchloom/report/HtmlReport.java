package etchloom.report;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The report for people: one HTML file that asks for nothing from outside, reads well on a screen,
 * in the dark, by ear and on paper.
 */
public final class HtmlReport {
  /** A picture above this is left out, so that the file stays below 3 MB. */
  static final int LARGEST_PICTURE = 2_500_000;

  private static final List<String> SECTIONS =
      List.of(
          "Verdict",
          "The board",
          "The numbers that decide",
          "Electrical",
          "Thermal",
          "Drive set-up sheet",
          "Order sheet",
          "Acceptance sheet",
          "Cautions",
          "Basis of every figure");

  private final Results r;
  private final Map<String, Object> figures;
  private final Html h = new Html();

  private HtmlReport(Results r) {
    this.r = r;
    figures = ReportJson.figures(r);
  }

  /**
   * @param picture the board as SVG, as the set holds it; empty leaves the picture out
   * @return UTF-8
   */
  public static byte[] write(Results r, Optional<String> picture) {
    HtmlReport report = new HtmlReport(r);
    report.page(picture.filter(p -> p.length() <= LARGEST_PICTURE));
    return report.h.toString().getBytes(StandardCharsets.UTF_8);
  }

  private void page(Optional<String> picture) {
    String title = r.artwork().title() + ", revision " + r.artwork().revision();
    List<String> scripts =
        List.of(
            PageParts.pageScript(),
            PageParts.boardScript(),
            PageParts.plotLibrary(),
            PageParts.plotScript());
    HtmlHead.write(h, title, List.of(PageParts.plotStyle(), PageParts.style()), scripts);
    h.open("body");
    h.element("a", "Skip to the verdict", "class=\"skip\"", "href=\"#s1\"");
    head();
    contents();
    h.open("main");
    h.open("noscript").element("p", "Scripts are off: no plots, but their tables say the same.");
    h.close("noscript");
    sections(picture);
    h.close("main");
    scripts.forEach(s -> h.open("script").raw(s).close("script"));
    h.close("body").close("html");
  }

  private void head() {
    h.open("header").element("h1", r.artwork().title());
    h.open("dl", "class=\"block\"");
    block("Revision", r.artwork().revision());
    block("Rules", r.fab().title());
    block("Layers", String.valueOf(r.artwork().layers()));
    block("Diameter", OrderLines.mm(r.spec().board().diameterMm()));
    block("Drawn by", "Etchloom " + r.toolVersion());
    block("Status", r.artwork().draft() ? "DRAFT, not for production" : Verdicts.words(r).get(0));
    h.close("dl").close("header");
  }

  private void block(String name, String value) {
    h.open("div").element("dt", name).element("dd", value).close("div");
  }

  private void contents() {
    h.open("nav", "aria-label=\"Contents\"").open("ol");
    for (int i = 0; i < SECTIONS.size(); i++) {
      h.open("li").element("a", SECTIONS.get(i), "href=\"#s" + (i + 1) + "\"").close("li");
    }
    h.close("ol").close("nav");
  }

  private void sections(Optional<String> picture) {
    boolean pictured = picture.isPresent();
    HtmlFigures electrical = new HtmlFigures(h, r, figures, pictured);
    HtmlSheets sheets = new HtmlSheets(h, r);
    List<Runnable> bodies =
        List.of(
            () -> HtmlVerdict.add(h, r, figures, pictured),
            () -> HtmlBoard.add(h, r, picture),
            electrical::deciding,
            electrical::electrical,
            electrical::thermal,
            electrical::drive,
            sheets::order,
            sheets::acceptance,
            () -> cautions(electrical),
            sheets::basis);
    for (int i = 0; i < bodies.size(); i++) {
      String id = "s" + (i + 1);
      h.open("section", "id=\"" + id + "\"", "aria-labelledby=\"" + id + "h\"");
      h.open("h2", "id=\"" + id + "h\"");
      h.raw("<span class=\"no\">" + (i + 1) + "</span> ").text(SECTIONS.get(i)).close("h2");
      bodies.get(i).run();
      h.close("section");
    }
  }

  private void cautions(HtmlFigures electrical) {
    h.open("ul", "class=\"cautions\"");
    for (Caution c : Cautions.of(r)) {
      h.open("li").element("strong", Words.capital(c.topic()) + ".").text(" " + c.text());
      h.close("li");
    }
    h.close("ul");
    electrical.rotor();
  }
}
