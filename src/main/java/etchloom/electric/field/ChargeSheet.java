package etchloom.electric.field;

/**
 * The face of every magnet at one height, as a sheet of magnetic charge.
 *
 * @param heightMm over the board's mid-plane
 * @param charge +1 where the magnet at angle 0 has its north face here, -1 for its south face; the
 *     magnets' signs alternate round the shaft
 */
public record ChargeSheet(double heightMm, double charge) {}
