package etchloom.electric.machine;

import java.util.OptionalDouble;

/**
 * Forces on the rotor, all cautions and no strength check.
 *
 * @param magnetKilogram one magnet
 * @param magnetPullNewton centrifugal, one magnet, at the duty's speed
 * @param bondStressPascal mean shear over the magnet's back from it
 * @param axialPullNewton between the two rotors, or to the iron on the board's far side
 */
public record RotorFigures(
    OptionalDouble magnetKilogram,
    OptionalDouble magnetPullNewton,
    OptionalDouble bondStressPascal,
    OptionalDouble axialPullNewton) {}
