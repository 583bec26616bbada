package etchloom.spec.yaml;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** A file's text with its lines, so that places can be shown. */
final class SourceText {
  private final String file;
  private final String text;
  private final List<String> lines;

  /** Code points in each line: counted once, because a hostile file may be one long line. */
  private final int[] lengths;

  private SourceText(String file, String text) {
    this.file = file;
    this.text = text;
    this.lines = split(text);
    this.lengths = lines.stream().mapToInt(l -> l.codePointCount(0, l.length())).toArray();
  }

  String text() {
    return text;
  }

  List<String> lines() {
    return lines;
  }

  /**
   * Decodes UTF-8, with or without a byte order mark, and refuses what YAML cannot hold: broken
   * sequences and control characters (YAML 1.2.2, section 5.1).
   */
  static Staged<SourceText> decode(String file, byte[] bytes, int maxBytes) {
    if (bytes.length > maxBytes) {
      String found = "the file is too large; at most " + maxBytes + " bytes are read";
      return failed(YamlCodes.TOO_BIG, start(file), found);
    }
    if (bytes.length >= 2 && isUtf16Mark(bytes[0], bytes[1])) {
      String found = "the file is UTF-16 text; save it as UTF-8";
      return failed(YamlCodes.ENCODING, start(file), found);
    }
    CharBuffer chars = CharBuffer.allocate(bytes.length);
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer in = ByteBuffer.wrap(bytes);
    CoderResult result = decoder.decode(in, chars, true);
    chars.flip();
    String text = chars.toString();
    SourceText source = new SourceText(file, text.startsWith("\ufeff") ? text.substring(1) : text);
    if (result.isError()) {
      int value = bytes[in.position()] & 0xff;
      return failed(
          YamlCodes.ENCODING,
          source.end(),
          String.format(
              Locale.ROOT,
              "byte 0x%02X here (byte %d of the file) is not UTF-8; is this a text file?",
              value,
              in.position() + 1));
    }
    Optional<Diagnostic> odd = source.oddCharacter();
    return odd.map(d -> Staged.<SourceText>failed(List.of(d))).orElseGet(() -> Staged.of(source));
  }

  private static boolean isUtf16Mark(byte a, byte b) {
    return (a == (byte) 0xff && b == (byte) 0xfe) || (a == (byte) 0xfe && b == (byte) 0xff);
  }

  private static Staged<SourceText> failed(String code, SourceSpan where, String message) {
    return Staged.failed(List.of(Diagnostic.error(code, where, "", message)));
  }

  private Optional<Diagnostic> oddCharacter() {
    for (int l = 0; l < lines.size(); l++) {
      String line = lines.get(l);
      for (int i = 0; i < line.length(); i++) {
        char c = line.charAt(i);
        if ((c < ' ' && c != '\t') || (c >= 0x7f && c < 0xa0 && c != 0x85) || c >= 0xfffe) {
          int column = line.codePointCount(0, i);
          String message =
              String.format(
                  Locale.ROOT, "control character U+%04X here; is this a text file?", (int) c);
          return Optional.of(
              Diagnostic.error(YamlCodes.ENCODING, span(l, column, l, column + 1), "", message));
        }
      }
    }
    return Optional.empty();
  }

  static SourceSpan start(String file) {
    return new SourceSpan(file, 1, 1, 0, "");
  }

  SourceSpan end() {
    int last = lines.size() - 1;
    return span(last, lengths[last], last, lengths[last]);
  }

  /** A place by lines and columns from 0, columns in code points; the mark stays on one line. */
  SourceSpan span(int line, int column, int endLine, int endColumn) {
    int l = Math.min(line, lines.size() - 1);
    int length = lengths[l];
    int from = l == line ? Math.min(column, length) : length;
    int stop = endLine == line ? Math.min(endColumn, length) : length;
    return new SourceSpan(file, l + 1, from + 1, Math.max(1, stop - from), lines.get(l));
  }

  private static List<String> split(String text) {
    List<String> lines = new ArrayList<>();
    int from = 0;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '\n' || c == '\r') {
        lines.add(text.substring(from, i));
        if (c == '\r' && i + 1 < text.length() && text.charAt(i + 1) == '\n') {
          i++;
        }
        from = i + 1;
      }
    }
    lines.add(text.substring(from));
    return lines;
  }
}
