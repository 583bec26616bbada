package etchloom.spec;

import etchloom.diagnostic.Findings;
import etchloom.spec.yaml.YamlNode;
import etchloom.spec.yaml.YamlNode.Scalar;
import etchloom.units.Dimension;
import etchloom.units.Quantity;
import etchloom.units.Quantity.Fault;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads one value and says what is wrong with it. */
final class ValueReader {
  private final Findings findings;
  private final String path;
  private final String key;

  /**
   * @param path full path, for the diagnostic
   * @param key the key alone, for hints that can be typed
   */
  ValueReader(Findings findings, String path, String key) {
    this.findings = findings;
    this.path = path;
    this.key = key;
  }

  Optional<Scalar> scalar(YamlNode node) {
    return node.match(
        Optional::of,
        m -> wrongShape(node, "one value belongs here, not a group of keys"),
        q -> wrongShape(node, "one value belongs here, not a list"),
        b -> Optional.empty());
  }

  private Optional<Scalar> wrongShape(YamlNode node, String message) {
    findings.error(Codes.WRONG_SHAPE, node.span(), path, message);
    return Optional.empty();
  }

  /** In the dimension's base unit; NaN where faulty. */
  double number(Scalar s, Dimension dimension, Range range) {
    return quantity(s, dimension, range).value();
  }

  /** As {@link #number}, with the unit that was written. */
  Quantity quantity(Scalar s, Dimension dimension, Range range) {
    String text = s.typed() ? Quantity.spaced(s.text()) : s.text();
    Quantity q = Quantity.read(text, dimension);
    if (!q.ok()) {
      QuantityFault.report(findings, s.span(), path, key, s.text(), q, dimension, range);
      return q;
    }
    return checked(s, q, range);
  }

  double bare(Scalar s, Range range) {
    Quantity q = Quantity.readBare(s.text());
    if (!q.ok()) {
      String what =
          q.fault() == Fault.WRONG_UNIT ? "takes a bare number, without a unit" : "takes a number";
      error(
          q.fault() == Fault.WRONG_UNIT ? Codes.WRONG_UNIT : Codes.NOT_A_NUMBER,
          s,
          Show.found(s.text()) + " was found; this key " + what + ", " + range.text());
      return Double.NaN;
    }
    return checked(s, q, range).value();
  }

  private Quantity checked(Scalar s, Quantity q, Range range) {
    if (range.holds(q.value())) {
      return q;
    }
    error(
        Codes.OUT_OF_RANGE,
        s,
        Show.found(s.text()) + " is out of range; allowed is " + range.text());
    return new Quantity(Double.NaN, Fault.NOT_FINITE, q.number(), q.unit());
  }

  static String countWanted(int min, int max, boolean even) {
    return (even ? "an even whole number, " : "a whole number, ") + min + " to " + max;
  }

  /** A count: decimal digits, no point, no unit, no quotes. */
  Optional<Integer> count(Scalar s, int min, int max, boolean even) {
    String wanted = countWanted(min, max, even);
    if (!isWhole(s.text())) {
      error(Codes.NOT_WHOLE, s, Show.found(s.text()) + " was found; this key takes " + wanted);
      return Optional.empty();
    }
    if (!s.plain()) {
      error(Codes.NOT_WHOLE, s, "a count stands without quotes: `" + key + ": " + s.text() + "`");
      return Optional.empty();
    }
    int value = s.text().length() > 9 ? Integer.MAX_VALUE : Integer.parseInt(s.text());
    boolean negative = s.text().startsWith("-");
    if (negative || value < min || value > max || (even && value % 2 != 0)) {
      error(Codes.OUT_OF_RANGE, s, Show.found(s.text()) + " was found; this key takes " + wanted);
      return Optional.empty();
    }
    return Optional.of(value);
  }

  /** A count where a word could stand as well: the message names both. */
  Optional<Integer> countOrWord(Scalar s, int min, int max, String word) {
    if (isWhole(s.text())) {
      return count(s, min, max, false);
    }
    String[] hints =
        Suggest.nearest(s.text(), List.of(word))
            .map(w -> "did you mean `" + key + ": " + w + "`?")
            .stream()
            .toArray(String[]::new);
    findings.error(
        Codes.NOT_WHOLE,
        s.span(),
        path,
        Show.found(s.text())
            + " was found; this key takes `"
            + word
            + "` or "
            + countWanted(min, max, false),
        hints);
    return Optional.empty();
  }

  private static boolean isWhole(String text) {
    int from = !text.isEmpty() && "+-".indexOf(text.charAt(0)) >= 0 ? 1 : 0;
    return text.length() > from && text.chars().skip(from).allMatch(c -> c >= '0' && c <= '9');
  }

  <E> Optional<E> word(Scalar s, Map<String, E> words) {
    E value = words.get(s.text());
    if (value == null) {
      String[] hints =
          Suggest.nearest(s.text(), words.keySet())
              .map(w -> "did you mean `" + key + ": " + w + "`?")
              .stream()
              .toArray(String[]::new);
      findings.error(
          Codes.UNKNOWN_WORD,
          s.span(),
          path,
          Show.found(s.text()) + " was found; allowed is " + Show.oneOf(words.keySet()),
          hints);
    }
    return Optional.ofNullable(value);
  }

  /** A text of one line that can be printed, not longer than {@code maxLength} characters. */
  Optional<String> text(Scalar s, int maxLength) {
    String text = s.text().strip();
    int length = text.codePointCount(0, text.length());
    if (text.isEmpty()) {
      error(Codes.TEXT, s, "the text is empty");
    } else if (length > maxLength) {
      error(
          Codes.TEXT,
          s,
          "the text has " + length + " characters; allowed are at most " + maxLength);
    } else if (!text.codePoints().allMatch(ValueReader::printable)) {
      error(Codes.TEXT, s, "the text holds a line end or a character that cannot be printed");
    } else {
      return Optional.of(text);
    }
    return Optional.empty();
  }

  /** Neither control nor format characters (which hide, or turn the writing direction). */
  private static boolean printable(int c) {
    return switch (Character.getType(c)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.PRIVATE_USE,
          Character.UNASSIGNED,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          false;
      default -> true;
    };
  }

  private void error(String code, Scalar s, String message) {
    findings.error(code, s.span(), path, message);
  }
}
