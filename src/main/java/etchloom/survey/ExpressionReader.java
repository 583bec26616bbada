package etchloom.survey;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.SourceSpan;
import etchloom.diagnostic.Staged;
import etchloom.survey.Expression.Comparison;
import etchloom.survey.Expression.Joined;
import etchloom.survey.Expression.Literal;
import etchloom.survey.Expression.Named;
import etchloom.survey.Expression.Not;
import etchloom.survey.Expression.Relation;
import etchloom.survey.Expression.Side;
import etchloom.units.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Reads a condition: comparisons ({@code < <= > >= == !=}) of figures, numbers and quoted words,
 * {@code and}, {@code or}, {@code not}, round brackets. A figure alone must be true. Nothing else:
 * no functions, no arithmetic, nothing that could run.
 */
final class ExpressionReader {
  private static final int LONGEST = 2000;
  private static final int DEEPEST = 50;

  private static final Map<String, Relation> RELATIONS =
      Map.of(
          "<", Relation.LESS,
          "<=", Relation.AT_MOST,
          ">", Relation.MORE,
          ">=", Relation.AT_LEAST,
          "=", Relation.EQUAL,
          "==", Relation.EQUAL,
          "!=", Relation.UNEQUAL);

  private final String text;
  private int at;
  private int depth;

  private ExpressionReader(String text) {
    this.text = text;
  }

  /** Ends the reading; never leaves this class. */
  private static final class Wrong extends Exception {
    private static final long serialVersionUID = 1L;

    Wrong(String message) {
      super(message, null, false, false);
    }
  }

  /**
   * @param option for messages, {@code --keep}
   */
  static Staged<Expression> read(String option, String text) {
    ExpressionReader r = new ExpressionReader(text);
    try {
      if (text.length() > LONGEST) {
        throw new Wrong("a condition has at most " + LONGEST + " characters");
      }
      Expression e = r.any();
      if (!r.peek().isEmpty()) {
        throw new Wrong("'" + r.peek() + "' does not belong there");
      }
      return Staged.of(e);
    } catch (Wrong e) {
      SourceSpan where =
          new SourceSpan(option, 1, Math.min(r.at, text.length()) + 1, 1, text.strip());
      return Staged.failed(
          List.of(
              Diagnostic.error(
                  "condition",
                  where,
                  "",
                  e.getMessage(),
                  "--keep \"terminalOhm < 5 and coilOhm >= 1\"")));
    }
  }

  private Expression any() throws Wrong {
    if (++depth > DEEPEST) {
      throw new Wrong("brackets are more than " + DEEPEST + " deep");
    }
    List<Expression> parts = new ArrayList<>(List.of(all()));
    while (took("or") || took("||")) {
      parts.add(all());
    }
    depth--;
    return parts.size() == 1 ? parts.get(0) : new Joined(false, parts);
  }

  private Expression all() throws Wrong {
    List<Expression> parts = new ArrayList<>(List.of(one()));
    while (took("and") || took("&&")) {
      parts.add(one());
    }
    return parts.size() == 1 ? parts.get(0) : new Joined(true, parts);
  }

  private Expression one() throws Wrong {
    int not = 0;
    while (took("not") || took("!")) {
      not++;
    }
    Expression e;
    if (took("(")) {
      e = any();
      if (!took(")")) {
        throw new Wrong("a bracket is not closed");
      }
    } else {
      e = comparison();
    }
    return not % 2 == 1 ? new Not(e) : e;
  }

  private Expression comparison() throws Wrong {
    Side left = side();
    Relation relation = RELATIONS.get(peek());
    if (relation == null) {
      if (left instanceof Named) {
        return new Comparison(left, Relation.EQUAL, new Literal("true"));
      }
      throw new Wrong("a comparison is wanted here: < <= > >= == !=");
    }
    took(peek());
    Side right = side();
    Expression first = new Comparison(left, relation, right);
    Relation more = RELATIONS.get(peek());
    if (more == null) {
      return first;
    }
    took(peek());
    return new Joined(true, List.of(first, new Comparison(right, more, side())));
  }

  private Side side() throws Wrong {
    String word = peek();
    if (word.isEmpty()) {
      throw new Wrong("a figure or a number is missing");
    }
    char c = word.charAt(0);
    if (c == '\'' || c == '"') {
      if (word.length() < 2 || word.charAt(word.length() - 1) != c) {
        throw new Wrong("a quote is not closed");
      }
      took(word);
      return new Literal(word.substring(1, word.length() - 1));
    }
    double number = Quantity.readBare(word).value();
    if (Double.isFinite(number)) {
      took(word);
      return new Literal(number);
    }
    if (!letter(c) || word.equals("and") || word.equals("or") || word.equals("not")) {
      throw new Wrong("a figure or a number is wanted, found '" + word + "'");
    }
    took(word);
    return new Named(new FigureName(word));
  }

  private boolean took(String word) {
    if (!peek().equals(word)) {
      return false;
    }
    at += word.length();
    return true;
  }

  /** The next word without taking it; empty at the end. */
  private String peek() {
    while (at < text.length() && Character.isWhitespace(text.charAt(at))) {
      at++;
    }
    if (at == text.length()) {
      return "";
    }
    char c = text.charAt(at);
    int end = at + 1;
    if (c == '\'' || c == '"') {
      int close = text.indexOf(c, end);
      end = close < 0 ? text.length() : close + 1;
    } else if (letter(c)) {
      while (end < text.length()
          && (letter(text.charAt(end))
              || ".-_".indexOf(text.charAt(end)) >= 0
              || digit(text.charAt(end)))) {
        end++;
      }
    } else if (Quantity.numberEnd(text, at) > at) {
      end = Quantity.numberEnd(text, at);
    } else if (end < text.length() && RELATIONS.containsKey(text.substring(at, end + 1))) {
      end++;
    } else if (end < text.length() && (c == '&' || c == '|') && text.charAt(end) == c) {
      end++;
    }
    return text.substring(at, end);
  }

  private static boolean letter(char c) {
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z');
  }

  private static boolean digit(char c) {
    return c >= '0' && c <= '9';
  }
}
