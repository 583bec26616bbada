package etchloom.electric.machine;

/**
 * Torque of sinusoidal currents across the field (i_d = 0).
 *
 * @param newtonMetrePerAmperePeak of one winding's current
 * @param newtonMetrePerLineAmperePeak of the current in a terminal: 1/√3 of the winding's in a
 *     delta
 * @param motorConstant N·m over the root of the I²R loss, at 20 °C, leads included
 */
public record TorqueFigures(
    double newtonMetrePerAmperePeak,
    double newtonMetrePerAmpereRms,
    double newtonMetrePerLineAmperePeak,
    double newtonMetrePerLineAmpereRms,
    double motorConstant) {}
