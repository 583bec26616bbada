package etchloom.cli;

import etchloom.diagnostic.SourceSpan;
import java.nio.charset.StandardCharsets;

/** The inputs as a set keeps them, so that the set can be drawn again from its own folder. */
final class InputsAsUsed {
  /** Where the rules lie in the set. */
  private static final String FAB = "./fab.yaml";

  private InputsAsUsed() {}

  /**
   * The spec as it was read; only where its rules come from a file or from the command line, its
   * {@code fab} points to the set's own copy.
   */
  static byte[] spec(InputFiles.Inputs in) {
    boolean ownClass =
        !InputFiles.isPath(in.fabName()) && in.fabName().equals(in.file().spec().fab());
    if (ownClass) {
      return in.specText().getBytes(StandardCharsets.UTF_8);
    }
    SourceSpan at = in.file().positions().at("fab");
    String text = in.specText();
    int start = text.offsetByCodePoints(lineStart(text, at.line()), at.column() - 1);
    int end = text.offsetByCodePoints(start, at.length());
    return (text.substring(0, start) + FAB + text.substring(end)).getBytes(StandardCharsets.UTF_8);
  }

  static byte[] fab(InputFiles.Inputs in) {
    return in.fabText().getBytes(StandardCharsets.UTF_8);
  }

  /** Lines end as YAML has it: LF, CR LF or CR. */
  private static int lineStart(String text, int line) {
    int at = text.startsWith("\uFEFF") ? 1 : 0;
    for (int left = line - 1; left > 0; at++) {
      char c = text.charAt(at);
      boolean first = c == '\r' && at + 1 < text.length() && text.charAt(at + 1) == '\n';
      if (c == '\n' || (c == '\r' && !first)) {
        left--;
      }
    }
    return at;
  }
}
