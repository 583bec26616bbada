package etchloom.report;

import java.util.List;
import java.util.stream.Collectors;

/** The head that all our pages share: their look, and that they ask for nothing from outside. */
public final class HtmlHead {
  private HtmlHead() {}

  /** Everything up to the body, which is left to open, of a page without a script. */
  public static void write(Html h, String title) {
    write(h, title, List.of(PageParts.style()), List.of());
  }

  /**
   * The same for a page with a style of its own beside the common one, and one script.
   *
   * @param script the text of its element, byte for byte; no other is run
   */
  public static void write(Html h, String title, String style, String script) {
    write(h, title, List.of(PageParts.style(), style), List.of(script));
  }

  /** The same for a page that runs these very scripts and shows these very styles, no others. */
  static void write(Html h, String title, List<String> styles, List<String> scripts) {
    h.raw("<!DOCTYPE html>\n").open("html", "lang=\"en\"").open("head");
    h.raw("<meta charset=\"utf-8\"/>\n");
    h.raw("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n");
    h.raw("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src ");
    h.raw(hashes(styles));
    h.raw(scripts.isEmpty() ? "" : "; script-src " + hashes(scripts));
    h.raw("; base-uri 'none'; form-action 'none'\"/>\n");
    h.element("title", title);
    styles.forEach(s -> h.open("style").raw(s).close("style"));
    h.close("head");
  }

  private static String hashes(List<String> texts) {
    return texts.stream().map(PageParts::hash).collect(Collectors.joining(" "));
  }
}
