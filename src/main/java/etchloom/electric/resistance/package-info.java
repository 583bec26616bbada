/**
 * Direct-current resistance of the copper as drawn.
 *
 * <p>Takes the artwork and the fab's tolerances; gives the resistance of a coil's layers, of a
 * coil, of a phase and between terminals, each kept apart from the others, and the share of current
 * in every conductor. All comes from the lengths of the artwork's own conductors over their etched
 * cross-section; pads are ideal, and the track inside a pad counts up to the pad's middle. Current
 * crowding at the inside of a bend is left out: at a fillet whose centre line has the track's own
 * radius the true figure is 9 % below length over width, for that fillet alone.
 */
package etchloom.electric.resistance;
