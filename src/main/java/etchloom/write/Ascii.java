package etchloom.write;

import java.text.Normalizer;

/** Text for files that hold ASCII only: each format's own escapes, and plain stand-ins. */
final class Ascii {
  private Ascii() {}

  /** The bytes of a finished file; a character that ASCII lacks is a fault of the writer. */
  static byte[] bytes(CharSequence text) {
    byte[] out = new byte[text.length()];
    for (int i = 0; i < out.length; i++) {
      char c = text.charAt(i);
      if (c > 126 || (c < 32 && c != '\n' && c != '\r')) {
        throw new IllegalArgumentException("character " + (int) c + " in a file of ASCII text");
      }
      out[i] = (byte) c;
    }
    return out;
  }

  /**
   * A field of a Gerber attribute: what the format reserves, and all beyond ASCII, as a backslash,
   * a {@code u} and four hexadecimal digits.
   */
  static String gerberField(String text) {
    StringBuilder s = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c < 32 || c > 126 || c == '%' || c == '*' || c == '\\' || c == ',') {
        s.append("\\u").append(hex(c));
      } else {
        s.append(c);
      }
    }
    return s.toString();
  }

  /**
   * Readable ASCII for people: accents dropped, common signs spelt out, what is left as {@code ?}.
   */
  static String plain(String text) {
    StringBuilder s = new StringBuilder(text.length());
    String apart = Normalizer.normalize(spelt(text), Normalizer.Form.NFD);
    for (int i = 0; i < apart.length(); i++) {
      char c = apart.charAt(i);
      if (c >= 32 && c <= 126) {
        s.append(c);
      } else if (Character.getType(c) != Character.NON_SPACING_MARK) {
        s.append(Character.isWhitespace(c) ? ' ' : '?');
      }
    }
    return s.toString();
  }

  private static String spelt(String text) {
    return text.replace("\u00b5", "u")
        .replace("\u03bc", "u")
        .replace("\u03a9", "ohm")
        .replace("\u2126", "ohm")
        .replace("\u00df", "ss")
        .replace("\u00b0", "deg")
        .replace("\u2013", "-")
        .replace("\u2014", "-")
        .replace("\u00b1", "+/-")
        .replace("\u00d7", "x");
  }

  /**
   * Text of an XML element or attribute; beyond ASCII as a numeric reference, what XML does not
   * allow at all as {@code ?}.
   */
  static String xml(String text) {
    StringBuilder s = new StringBuilder(text.length());
    text.codePoints()
        .forEach(
            c -> {
              if ((c >= 0xD800 && c <= 0xDFFF) || c == 0xFFFE || c == 0xFFFF) {
                s.append('?');
              } else if (c == '&' || c == '<' || c == '>' || c == '"' || c > 126) {
                s.append("&#").append(c).append(';');
              } else {
                s.append(c < 32 ? ' ' : (char) c);
              }
            });
    return s.toString();
  }

  private static String hex(char c) {
    StringBuilder s = new StringBuilder(4);
    for (int shift = 12; shift >= 0; shift -= 4) {
      s.append("0123456789ABCDEF".charAt((c >> shift) & 15));
    }
    return s.toString();
  }
}
