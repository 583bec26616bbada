/** How far made boards may be from the drawn one, by the fab's tolerances alone. */
package etchloom.electric.machine.spread;
