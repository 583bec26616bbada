/**
 * What the rotor's field does along the copper: the flux linkage's change with the rotor's angle,
 * by harmonics, for every conductor and every phase.
 *
 * <p>Motor convention throughout: {@code u = R i + dλ/dt}, so the torque of a winding is {@code i
 * dλ/dθ}, θ the rotor's angle counter-clockwise seen from L1. Left out: the field of the currents
 * themselves, which links no rotor flux.
 */
package etchloom.electric.machine.emf;
