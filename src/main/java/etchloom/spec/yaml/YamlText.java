package etchloom.spec.yaml;

import etchloom.spec.yaml.YamlNode.Entry;
import etchloom.spec.yaml.YamlNode.Mapping;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.spec.yaml.YamlNode.Sequence;
import java.util.List;
import java.util.Locale;

/** Writes a tree as YAML: groups as indented blocks, lists of values on one line. */
public final class YamlText {
  private YamlText() {}

  /** The text, ending with a line end; reads back as an equal tree. */
  public static String of(Mapping root) {
    StringBuilder out = new StringBuilder();
    group(out, root, 0);
    return out.toString();
  }

  private static void group(StringBuilder out, Mapping m, int depth) {
    for (Entry e : m.entries()) {
      out.append("  ".repeat(depth)).append(scalar(e.key(), true)).append(':');
      value(out, e.value(), depth);
    }
  }

  private static void value(StringBuilder out, YamlNode value, int depth) {
    value.match(
        s -> out.append(s.isNull() ? "" : " " + text(s)).append('\n'),
        m -> {
          if (m.entries().isEmpty()) {
            return out.append(" {}\n");
          }
          out.append('\n');
          group(out, m, depth + 1);
          return out;
        },
        q -> list(out, q, depth),
        b -> out.append('\n'));
  }

  private static StringBuilder list(StringBuilder out, Sequence q, int depth) {
    if (q.items().stream().allMatch(n -> n instanceof Scalar)) {
      List<String> items = q.items().stream().map(n -> text((Scalar) n)).toList();
      return out.append(" [").append(String.join(", ", items)).append("]\n");
    }
    out.append('\n');
    for (YamlNode item : q.items()) {
      out.append("  ".repeat(depth + 1)).append('-');
      value(out, item, depth + 1);
    }
    return out;
  }

  private static String text(Scalar s) {
    return s.isNull() ? "null" : scalar(s.text(), s.plain());
  }

  /** Without quotes where it was without and can be, else in double quotes. */
  private static String scalar(String text, boolean plain) {
    if (plain && isPlain(text)) {
      return text;
    }
    StringBuilder out = new StringBuilder("\"");
    text.codePoints().forEach(c -> escape(out, c));
    return out.append('"').toString();
  }

  /** Letters, digits and a few signs that mean nothing to YAML anywhere in a value. */
  private static boolean isPlain(String text) {
    if (text.isEmpty() || text.startsWith(" ") || text.endsWith(" ")) {
      return false;
    }
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      boolean word = Character.isLetterOrDigit(c) || c == '_' || c == '.' || c == '+';
      boolean inside = i > 0 && (c == ' ' || c == '/' || c == '%' || c == '-');
      boolean sign = i == 0 && c == '-' && text.length() > 1 && text.charAt(1) != ' ';
      if (!word && !inside && !sign) {
        return false;
      }
    }
    return true;
  }

  private static void escape(StringBuilder out, int c) {
    if (c == '"' || c == '\\') {
      out.append('\\').appendCodePoint(c);
    } else if (c == '\n') {
      out.append("\\n");
    } else if (c < 0x20 || (c >= 0x7f && c < 0xa0) || c == 0xfeff || (c & 0xfffe) == 0xfffe) {
      out.append(
          c > 0xffff
              ? String.format(Locale.ROOT, "\\U%08X", c)
              : String.format(Locale.ROOT, "\\u%04X", c));
    } else {
      out.appendCodePoint(c);
    }
  }
}
