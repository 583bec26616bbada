package etchloom.winding;

/**
 * One coil's place in the winding.
 *
 * @param coil from 1, counter-clockwise from angle 0
 * @param phase from 0 (U)
 * @param sign +1 forward, -1 reversed
 */
public record PhaseCoil(int coil, int phase, int sign) {}
