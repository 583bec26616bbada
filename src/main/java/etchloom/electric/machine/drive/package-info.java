/**
 * What a drive needs to know: ripple, current-loop gains, limits, the torque-speed line; and what a
 * generator gives. Formulas of plain numbers, SI; peaks are amplitudes of the fundamental.
 */
package etchloom.electric.machine.drive;
