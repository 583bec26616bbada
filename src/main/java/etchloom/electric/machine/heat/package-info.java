/**
 * Where the watts go and how warm the copper gets: I²R, eddy currents, the current round a delta,
 * and the balance with the board's surface.
 */
package etchloom.electric.machine.heat;
