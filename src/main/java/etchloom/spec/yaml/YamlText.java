package etchloom.spec.yaml;

import java.util.List;
import java.util.Locale;
import java.util.function.BiConsumer;
import java.util.function.Consumer;

/** Writes YAML: groups as indented blocks, lists of values on one line, texts in quotes. */
public final class YamlText {
  private final StringBuilder out = new StringBuilder();
  private int depth;

  /** What the next line starts with instead of its last indentation; empty for none. */
  private String lead = "";

  /** A line for people. */
  public YamlText comment(String line) {
    out.append("# ").append(line).append('\n');
    return this;
  }

  /**
   * A key with a word, number or quantity.
   *
   * @param value holds nothing that means something to YAML
   */
  public YamlText value(String key, String value) {
    key(key).append(' ').append(value).append('\n');
    return this;
  }

  /** A key with any text, which is put in quotes. */
  public YamlText text(String key, String text) {
    return value(key, quoted(text));
  }

  /** A key with values of the kind that {@link #value} takes. */
  public YamlText list(String key, List<String> values) {
    return value(key, "[" + String.join(", ", values) + "]");
  }

  /** A key with a group of keys, which is not empty. */
  public YamlText group(String key, Consumer<YamlText> keys) {
    key(key).append('\n');
    depth++;
    keys.accept(this);
    depth--;
    return this;
  }

  /** A key with a list of groups, none of them empty. */
  public <T> YamlText groups(String key, List<T> items, BiConsumer<YamlText, T> keys) {
    key(key).append('\n');
    depth += 2;
    for (T item : items) {
      lead = "- ";
      keys.accept(this, item);
    }
    depth -= 2;
    return this;
  }

  /** All of it so far; every line ends with a line feed. */
  @Override
  public String toString() {
    return out.toString();
  }

  private StringBuilder key(String key) {
    out.append("  ".repeat(lead.isEmpty() ? depth : depth - 1)).append(lead);
    lead = "";
    return out.append(key).append(':');
  }

  private static String quoted(String text) {
    StringBuilder s = new StringBuilder("\"");
    text.codePoints().forEach(c -> escape(s, c));
    return s.append('"').toString();
  }

  /** YAML 1.2.2, section 5.7; whatever is not plainly printable is written by its number. */
  private static void escape(StringBuilder s, int c) {
    int type = Character.getType(c);
    if (c == '"' || c == '\\') {
      s.append('\\').appendCodePoint(c);
    } else if (type == Character.CONTROL
        || type == Character.FORMAT
        || type == Character.SURROGATE
        || type == Character.UNASSIGNED
        || type == Character.LINE_SEPARATOR
        || type == Character.PARAGRAPH_SEPARATOR) {
      s.append(String.format(Locale.ROOT, "\\U%08X", c));
    } else {
      s.appendCodePoint(c);
    }
  }
}
