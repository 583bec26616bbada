package etchloom.spec.yaml;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/** Says in plain words why a text is not YAML. */
final class SyntaxFault {
  private SyntaxFault() {}

  static final String NOTHING_BELOW = "; nothing below this place was checked";

  static void report(YamlEngineException fault, SourceText source, Findings findings) {
    Optional<Mark> mark =
        fault instanceof MarkedYamlEngineException m ? place(m) : Optional.empty();
    int line = mark.map(Mark::getLine).orElse(source.lines().size() - 1);
    if (tabs(source, line, findings)) {
      return;
    }
    SourceSpan where =
        mark.map(m -> source.span(m.getLine(), m.getColumn(), m.getLine(), m.getColumn() + 1))
            .orElseGet(source::end);
    String problem =
        fault instanceof MarkedYamlEngineException m ? m.getProblem() : fault.getMessage();
    findings.error(
        YamlCodes.SYNTAX, where, "", "this is not valid YAML: " + words(problem) + NOTHING_BELOW);
  }

  /**
   * An escape that is no character, in a text in quotes.
   *
   * @param from a line, from 0, at or before it
   */
  static void reportEscape(SourceText source, int from, Findings findings) {
    SourceSpan where = source.end();
    for (int l = source.lines().size() - 1; l >= from; l--) {
      String line = source.lines().get(l);
      int at = line.indexOf("\\U");
      if (at >= 0) {
        int column = line.codePointCount(0, at);
        where = source.span(l, column, l, column + 10); // \U and eight digits
      }
    }
    findings.error(
        YamlCodes.SYNTAX, where, "", "this escape is no Unicode character" + NOTHING_BELOW);
  }

  /**
   * The parser stumbles over a tab in many ways; if one indents a line so far, that is the cause,
   * and all such lines are reported.
   */
  private static boolean tabs(SourceText source, int lastLine, Findings findings) {
    List<String> lines = source.lines();
    List<Integer> tabbed =
        IntStream.range(0, lines.size()).filter(l -> indentTab(lines.get(l)) >= 0).boxed().toList();
    if (tabbed.isEmpty() || tabbed.get(0) > lastLine) {
      return false;
    }
    for (int l : tabbed) {
      int tab = indentTab(lines.get(l));
      findings.error(
          YamlCodes.TAB,
          source.span(l, tab, l, tab + 1),
          "",
          "a tab indents this line; YAML allows only spaces there");
    }
    return true;
  }

  private static int indentTab(String line) {
    int tab = -1;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '\t' && tab < 0) {
        tab = i;
      } else if (c != ' ' && c != '\t') {
        return c == '#' ? -1 : tab;
      }
    }
    return -1;
  }

  /** Where something that never ends begins, rather than the end of the file. */
  private static Optional<Mark> place(MarkedYamlEngineException fault) {
    boolean open =
        fault.getProblem().startsWith(NO_COLON) || fault.getProblem().startsWith(OPEN_QUOTE);
    return open && fault.getContextMark().isPresent()
        ? fault.getContextMark()
        : fault.getProblemMark();
  }

  private static final String NO_COLON = "could not find expected ':'";
  private static final String OPEN_QUOTE = "found unexpected end of stream";
  private static final String NO_TOKEN = "found character '";

  /** The parser's own words where a user can make something of them. */
  private static String words(String problem) {
    if (problem.startsWith("mapping values are not allowed")) {
      return "a second `:` on one line, or a key indented under a value; put a text that holds `: `"
          + " in quotes";
    }
    if (problem.startsWith(NO_COLON)) {
      return "a key without a `:`, a space and a value after it";
    }
    if (problem.startsWith(OPEN_QUOTE)) {
      return "what opens here is never closed";
    }
    if (problem.startsWith("expected <block end>")) {
      return "this line's indentation fits no group above it, or a bracket is not closed";
    }
    if (problem.startsWith("expected ',' or '}'")) {
      return "a `,` or the closing `}` is missing before this place";
    }
    if (problem.startsWith("expected ',' or ']'")) {
      return "a `,` or the closing `]` is missing before this place";
    }
    if (problem.startsWith("expected '<document start>'")) {
      return "nothing may stand here";
    }
    if (problem.contains("'\\t(TAB)'")) {
      return "a tab stands where only spaces are allowed";
    }
    if (problem.startsWith(NO_TOKEN) && problem.contains("cannot start any token")) {
      char c = problem.charAt(NO_TOKEN.length());
      return "a value cannot begin with `" + c + "`; put it in quotes";
    }
    return problem;
  }
}
