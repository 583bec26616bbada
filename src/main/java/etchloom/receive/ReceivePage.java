package etchloom.receive;

import etchloom.report.Html;
import etchloom.report.HtmlHead;
import etchloom.units.Numbers;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/** The result as one HTML page that asks for nothing from outside. */
public final class ReceivePage {
  private ReceivePage() {}

  /** UTF-8. */
  public static byte[] write(Outcome o) {
    Html h = new Html();
    HtmlHead.write(h, "Delivery of " + o.title() + ", revision " + o.revision());
    h.open("body").open("header").element("h1", "Delivery of " + o.title());
    h.element("p", "Revision " + o.revision() + ", Etchloom " + o.toolVersion(), "class=\"quiet\"");
    h.close("header").open("main");
    String kind = o.accepted() ? "yes" : "no";
    h.open("div", "class=\"verdict " + kind + "\"");
    h.element("strong", o.accepted() ? "All accepted" : "Not all accepted").text(" ");
    h.text(Shown.counts(o) + ".").close("div");
    Shown.spread(o.batch()).ifPresent(s -> h.element("p", s + "."));
    h.element("p", ACCEPTED);
    h.reachableTable("Boards", Shown.HEAD, o.boards().stream().map(ReceivePage::row).toList(), 0);
    causes(h, o);
    h.element("h2", "Every pair, at the temperature it was measured at");
    List<List<String>> pairs = new ArrayList<>();
    o.boards().forEach(v -> v.pairs().forEach(p -> pairs.add(row(v, p))));
    h.reachableTable("Pairs of terminals", HEAD, pairs, 5);
    h.close("main").close("body").close("html");
    return h.toString().getBytes(StandardCharsets.UTF_8);
  }

  private static final List<String> HEAD =
      List.of(
          "board, pair", "measured", "at", "least", "as drawn", "most", "between least and most");

  /** The rate is that of the share of a good batch beyond four standard deviations, and some. */
  private static final String ACCEPTED =
      "Accepted is a board of which every pair was measured and lies between the least and the most"
          + " that the fab's tolerances allow, and whose pairs depart from the drawing by no more"
          + " unlike shares than those of good boards; fewer than one good board in a thousand is"
          + " rejected for that.";

  /** A number and its unit stay in one line. */
  private static List<String> row(Verdict v) {
    List<String> row = Shown.row(v);
    return IntStream.range(0, row.size())
        .mapToObj(
            c ->
                c >= 2 && c <= 5
                    ? row.get(c).replace(" um", " \u00b5m").replace(' ', '\u00a0')
                    : row.get(c))
        .toList();
  }

  private static List<String> row(Verdict v, PairVerdict p) {
    return List.of(
        v.board() + ", " + p.pair(),
        Shown.ohm(p.ohm()),
        Numbers.fixed(p.celsius(), 1) + " C",
        Shown.ohm(p.leastOhm()),
        Shown.ohm(p.expectedOhm()),
        Double.isFinite(p.mostOhm()) ? Shown.ohm(p.mostOhm()) : "",
        p.within() ? "yes" : "NO");
  }

  private static void causes(Html h, Outcome o) {
    List<Cause> found =
        o.boards().stream()
            .map(Verdict::cause)
            .filter(c -> c != Cause.NONE)
            .distinct()
            .sorted()
            .toList();
    if (!found.isEmpty()) {
      h.open("ul");
      found.forEach(c -> h.open("li").text(c.word() + ": " + c.meaning() + ".").close("li"));
      h.close("ul");
    }
  }
}
