package etchloom.report;

import java.util.List;
import java.util.stream.Collectors;

/** The head that all our pages share: their look, and that they ask for nothing from outside. */
public final class HtmlHead {
  private static final String INLINE = "'unsafe-inline'";

  private HtmlHead() {}

  /**
   * Everything up to the body, which is left to open.
   *
   * @param script whether the page has a script of its own
   */
  public static void write(Html h, String title, boolean script) {
    write(h, title, List.of(PageParts.style()), script ? INLINE : "");
  }

  /** The same for a page that runs these very scripts and shows these very styles, no others. */
  static void write(Html h, String title, List<String> styles, List<String> scripts) {
    String run = scripts.stream().map(PageParts::hash).collect(Collectors.joining(" "));
    write(h, title, styles, run);
  }

  private static void write(Html h, String title, List<String> styles, String scripts) {
    String shown = styles.stream().map(PageParts::hash).collect(Collectors.joining(" "));
    h.raw("<!DOCTYPE html>\n").open("html", "lang=\"en\"").open("head");
    h.raw("<meta charset=\"utf-8\"/>\n");
    h.raw("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n");
    h.raw("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src ");
    h.raw(scripts.equals(INLINE) ? INLINE : shown);
    h.raw(scripts.isEmpty() ? "" : "; script-src " + scripts);
    h.raw("; base-uri 'none'; form-action 'none'\"/>\n");
    h.element("title", title);
    styles.forEach(s -> h.open("style").raw(s).close("style"));
    h.close("head");
  }
}
