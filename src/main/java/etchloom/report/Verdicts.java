package etchloom.report;

import java.util.List;

/** The last lines of every text: may it be made, and what can hurt. */
final class Verdicts {
  private Verdicts() {}

  static void add(Page page, Results r) {
    page.blank();
    made(page, r);
    page.item("cautions", Cautions.line(r));
  }

  private static void made(Page page, Results r) {
    List<String> words = words(r);
    if (r.rules().passed()) {
      page.good(words.get(0), words.get(1));
    } else {
      page.bad(words.get(0), words.get(1));
    }
  }

  /** The verdict in capitals, then what it rests on. */
  static List<String> words(Results r) {
    String fab = r.fab().title();
    if (r.rules().passed()) {
      return List.of("MAY BE MADE", "every rule checked is kept: " + fab);
    }
    int n = r.rules().findings().size();
    return List.of(
        "MAY NOT BE MADE", n + (n == 1 ? " place breaks" : " places break") + " the rules: " + fab);
  }
}
