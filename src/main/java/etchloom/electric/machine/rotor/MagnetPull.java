package etchloom.electric.machine.rotor;

import etchloom.electric.field.MagnetShape;
import etchloom.spec.Spec;

/**
 * What centrifugal force does to one magnet held by glue on its back: {@code m ω² r}, r the radius
 * of its centre of mass, and that force over the back's area as mean shear. No safety factor;
 * nothing for a rim or pocket that holds the magnet.
 *
 * @param kilogram of one magnet
 */
public record MagnetPull(double kilogram, double newton, double shearPascal) {
  public static MagnetPull of(Spec.Magnet m, double radPerSecond) {
    MagnetShape shape = MagnetShape.of(m);
    double area = shape.areaMm2() * 1e-6;
    double kilogram = m.density() * area * m.thicknessMm() * 1e-3;
    double newton = kilogram * radPerSecond * radPerSecond * shape.centroidMm() * 1e-3;
    return new MagnetPull(kilogram, newton, newton / area);
  }
}
