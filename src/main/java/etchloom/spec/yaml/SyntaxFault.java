package etchloom.spec.yaml;

import etchloom.diagnostic.Findings;
import etchloom.diagnostic.SourceSpan;
import java.util.List;
import java.util.Optional;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/** Says in plain words why a text is not YAML. */
final class SyntaxFault {
  private SyntaxFault() {}

  static void report(YamlEngineException fault, SourceText source, String file, Findings findings) {
    Optional<Mark> mark =
        fault instanceof MarkedYamlEngineException m ? m.getProblemMark() : Optional.empty();
    int line = mark.map(Mark::getLine).orElse(source.lines().size() - 1);
    if (tabs(source, line, findings)) {
      return;
    }
    SourceSpan where =
        mark.map(m -> source.span(m.getLine(), m.getColumn(), m.getLine(), m.getColumn() + 1))
            .orElse(SourceSpan.ofFile(file));
    String problem =
        fault instanceof MarkedYamlEngineException m ? m.getProblem() : fault.getMessage();
    findings.error(YamlCodes.SYNTAX, where, "", "this is not valid YAML: " + words(problem));
  }

  /**
   * The parser stumbles over a tab in many ways; if one indents a line so far, that is the cause.
   */
  private static boolean tabs(SourceText source, int lastLine, Findings findings) {
    boolean found = false;
    List<String> lines = source.lines();
    for (int l = 0; l <= lastLine && l < lines.size(); l++) {
      String line = lines.get(l);
      int tab = indentTab(line);
      if (tab >= 0) {
        found = true;
        findings.error(
            YamlCodes.TAB,
            source.span(l, tab, l, tab + 1),
            "",
            "a tab indents this line; YAML allows only spaces there");
      }
    }
    return found;
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

  private static String words(String problem) {
    if (problem.startsWith("mapping values are not allowed")) {
      return "a second `:` on one line, or a key indented under a value; put a text that holds `: `"
          + " in quotes";
    }
    if (problem.startsWith("could not find expected ':'")) {
      return "a key without its `:` and value";
    }
    if (problem.startsWith("expected <block end>")) {
      return "this line's indentation fits no group above it, or a bracket is not closed";
    }
    if (problem.contains("'\\t(TAB)'")) {
      return "a tab stands where only spaces are allowed";
    }
    return problem;
  }
}
