package etchloom.electric.machine;

import java.util.OptionalDouble;

/**
 * As a generator at the duty's speed; fundamentals, one winding, copper hot.
 *
 * @param phaseVoltRms open circuit
 * @param loadVoltRms on each load
 * @param ampereRms in each load
 * @param powerWatt in all loads
 * @param efficiency load over load and all losses known here (no bearings, no air)
 * @param shaftNewtonMetre what the shaft must be given for that
 */
public record GeneratorFigures(
    double phaseVoltRms,
    OptionalDouble loadVoltRms,
    OptionalDouble ampereRms,
    OptionalDouble powerWatt,
    OptionalDouble efficiency,
    OptionalDouble shaftNewtonMetre) {}
