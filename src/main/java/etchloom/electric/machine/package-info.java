/**
 * What the machine does: EMF and torque, losses and heat, what a drive needs to know, the spread of
 * made boards, forces on the rotor, and whether the duty is met.
 *
 * <p>Takes the artwork with its resistances and inductances, the spec and the fab's tolerances;
 * gives figures in SI, of which some may be absent, with the keys that would bring them.
 * Conventions as in the reports: peak is the amplitude of the fundamental; flux linkage, torque
 * constants and the duty's current are of one winding; what a drive sees is the equivalent star's.
 * Left out: bearings, air drag, losses in iron and magnets, saturation.
 */
package etchloom.electric.machine;
