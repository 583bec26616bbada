package etchloom.electric.machine;

import java.util.OptionalDouble;

/**
 * One demand of the duty and its answer.
 *
 * @param what {@code torque at speed}
 * @param unit {@code N m}, {@code rpm}, {@code C}, {@code A}
 * @param needed a least value, or a most for temperatures
 * @param got empty where there is none, a temperature that never settles
 * @param limitedBy what keeps it from more: {@code current}, {@code voltage}, {@code cooling}, …
 */
public record Need(
    String what, String unit, double needed, OptionalDouble got, boolean met, String limitedBy) {}
