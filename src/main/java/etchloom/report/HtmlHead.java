package etchloom.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The head that all our pages share: their look, and that they ask for nothing from outside. */
public final class HtmlHead {
  private HtmlHead() {}

  /**
   * Everything up to the body, which is left to open.
   *
   * @param script whether the page has a script of its own
   */
  public static void write(Html h, String title, boolean script) {
    h.raw("<!DOCTYPE html>\n").open("html", "lang=\"en\"").open("head");
    h.raw("<meta charset=\"utf-8\"/>\n");
    h.raw("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n");
    h.raw(
        "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src"
            + " 'unsafe-inline'"
            + (script ? "; script-src 'unsafe-inline'" : "")
            + "\"/>\n");
    h.element("title", title).open("style").raw(style()).close("style").close("head");
  }

  private static String style() {
    try (InputStream in = HtmlHead.class.getResourceAsStream("report.css")) {
      if (in == null) {
        throw new IllegalStateException("report.css is missing from the program");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
