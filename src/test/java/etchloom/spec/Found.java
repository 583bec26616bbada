package etchloom.spec;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Test files, and findings in a form short enough for a table. */
final class Found {
  private Found() {}

  /** {@code 26:10 out-of-range coil.track} for each, in the order in which users see them. */
  static List<String> in(Staged<?> read) {
    return read.diagnostics().stream().map(Found::line).toList();
  }

  private static String line(Diagnostic d) {
    String place = d.where().line() + ":" + d.where().column() + " " + d.code();
    return d.key().isEmpty() ? place : place + " " + d.key();
  }

  /** All messages and hints, for a look at what they say. */
  static String words(Staged<?> read) {
    StringBuilder s = new StringBuilder();
    for (Diagnostic d : read.diagnostics()) {
      s.append(d.message()).append('\n');
      d.hints().forEach(h -> s.append(h).append('\n'));
    }
    return s.toString();
  }

  static String file(String name) {
    try (InputStream in = Found.class.getResourceAsStream("/spec/" + name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static byte[] utf8(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  /** The text with one piece replaced, which must be there. */
  static String with(String text, String piece, String by) {
    int at = text.indexOf(piece);
    if (at < 0) {
      throw new IllegalArgumentException("no '" + piece + "' in the text");
    }
    return text.substring(0, at) + by + text.substring(at + piece.length());
  }
}
