package etchloom.rules;

import etchloom.geometry.Point;

/**
 * A broken rule, with its place.
 *
 * @param rule the rule's name, as bound by the spec page
 * @param layer {@code L1}, or empty where no layer is meant
 * @param at a place in between the two things
 * @param measured in {@code unit}
 * @param required in {@code unit}
 * @param unit {@code mm}, or what the rule is measured in ({@code C}, {@code 1}, …)
 * @param what the two things, in the user's words
 */
public record Finding(
    String rule,
    String layer,
    Point at,
    double measured,
    double required,
    String unit,
    String what) {

  /** Distance of the place from the shaft's axis, mm. */
  public double radiusMm() {
    return at.norm();
  }

  /** Direction of the place seen from the shaft's axis, degrees in [0, 360). */
  public double angleDegrees() {
    double degrees = Math.toDegrees(at.angleRad());
    double whole = degrees < 0 ? degrees + 360 : degrees + 0.0;
    return whole < 360 ? whole : 0;
  }
}
