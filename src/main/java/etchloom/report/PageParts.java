package etchloom.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;

/** Styles and scripts that are put into the page as they are, and what lets a browser run them. */
final class PageParts {
  /** The plotting library, of which the jar holds these files. */
  private static final String LIBRARY = "/META-INF/resources/webjars/uplot/1.6.30/";

  private PageParts() {}

  static String style() {
    return "\n" + read("report.css");
  }

  static String plotStyle() {
    return "\n" + read(LIBRARY + "dist/uPlot.min.css") + "\n";
  }

  /** With its licence, as that asks for. */
  static String plotLibrary() {
    return script(
        "/*\n" + read(LIBRARY + "LICENSE") + "*/\n" + read(LIBRARY + "dist/uPlot.iife.min.js"));
  }

  static String plotScript() {
    return script(read("plots.js"));
  }

  static String pageScript() {
    return script(read("page.js"));
  }

  static String boardScript() {
    return script(read("board.js"));
  }

  /** So that an XML parser takes it for text too. */
  private static String script(String text) {
    return "/*<![CDATA[*/\n" + text + "\n/*]]>*/";
  }

  /** What a content security policy calls an element's text by. */
  static String hash(String text) {
    try {
      byte[] sum =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      return "'sha256-" + Base64.getEncoder().encodeToString(sum) + "'";
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }

  private static String read(String name) {
    try (InputStream in = PageParts.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException(name + " is missing from the program");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
