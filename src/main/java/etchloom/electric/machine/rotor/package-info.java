/** Forces on the rotor that its builder must hold: at speed, and along the shaft. */
package etchloom.electric.machine.rotor;
