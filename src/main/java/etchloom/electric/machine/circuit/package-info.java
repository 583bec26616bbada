/** The winding as a drive sees it: resistance and inductance of one phase, and how phases join. */
package etchloom.electric.machine.circuit;
