package etchloom.survey;

import etchloom.rules.RuleReport;
import java.util.Map;
import java.util.Optional;

/**
 * What became of one set of values.
 *
 * @param yaml the spec as a file; empty where the values make none
 * @param figures the report's, by path; empty where the board could not be drawn
 * @param rules empty where the board could not be drawn
 * @param fault our own fault, if one came up; the variant counts as not drawn
 */
record Trial(
    String reason,
    Optional<String> yaml,
    Map<String, Object> figures,
    Optional<RuleReport> rules,
    Optional<RuntimeException> fault) {

  boolean passed() {
    return rules.isPresent() && rules.get().passed();
  }

  Row row(long variant, Map<String, String> values) {
    return new Row(variant, values, passed(), reason, figures);
  }
}
