package etchloom.proof.rules;

import java.util.List;

/**
 * What the copper alone was found to keep.
 *
 * @param minima the tightest place of every rule, kept or broken, in the order of the spec page
 * @param findings the broken ones, sorted by rule, layer and place
 * @param notes what could not be measured, and why
 */
public record CopperRuleReport(
    List<CopperFinding> minima, List<CopperFinding> findings, List<String> notes) {
  public CopperRuleReport {
    minima = List.copyOf(minima);
    findings = List.copyOf(findings);
    notes = List.copyOf(notes);
  }

  public boolean passed() {
    return findings.isEmpty();
  }
}
