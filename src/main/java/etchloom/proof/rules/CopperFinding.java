package etchloom.proof.rules;

import etchloom.geometry.Point;

/**
 * A measured place, kept or broken.
 *
 * @param rule the rule's name, as bound by the spec page
 * @param layer {@code L1}, or empty where no layer is meant
 * @param at a place in between the two things
 * @param measured in {@code unit}
 * @param required in {@code unit}
 * @param unit {@code mm}, or 1 for a ratio
 * @param what the two things, as far as the files tell
 */
public record CopperFinding(
    String rule,
    String layer,
    Point at,
    double measured,
    double required,
    String unit,
    String what) {}
