package etchloom.receive;

/**
 * One fault set in the drawn board, and what the pairs of terminals would show.
 *
 * @param where {@code phase U}, {@code U1 and V1}
 * @param ohm each pair's resistance at 20 °C, infinite where nothing joins it
 */
record Suspect(Cause cause, String where, double[] ohm) {}
