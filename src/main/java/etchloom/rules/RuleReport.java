package etchloom.rules;

import java.util.List;

/**
 * What the rule check found.
 *
 * @param minima the tightest place of every rule, kept or broken, in the order of the rules' names
 * @param findings the broken ones, sorted by rule, layer and place
 * @param notes things the reader should know, such as which voltage column applies and why
 * @param brief the same for where room is short: the report is at hand and has the rest
 */
public record RuleReport(
    List<Finding> minima, List<Finding> findings, List<String> notes, List<String> brief) {
  public RuleReport {
    minima = List.copyOf(minima);
    findings = List.copyOf(findings);
    notes = List.copyOf(notes);
    brief = List.copyOf(brief);
  }

  /** With notes that are short enough for any place. */
  public RuleReport(List<Finding> minima, List<Finding> findings, List<String> notes) {
    this(minima, findings, notes, notes);
  }

  public boolean passed() {
    return findings.isEmpty();
  }
}
