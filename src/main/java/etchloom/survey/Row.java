package etchloom.survey;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * One variant and what became of it.
 *
 * @param values the varied keys with their values, in order
 * @param passed whether it was drawn and keeps every rule
 * @param reason why it did not; empty where it did
 * @param figures the report's, by path, in the report's order; empty where it could not be drawn
 */
record Row(
    long variant,
    Map<String, String> values,
    boolean passed,
    String reason,
    Map<String, Object> figures) {
  Row {
    values = Collections.unmodifiableMap(new LinkedHashMap<>(values));
    figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
  }

  boolean drawn() {
    return !figures.isEmpty();
  }
}
