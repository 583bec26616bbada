/**
 * The resistance between places of the board, from rebuilt copper: along centre lines where copper
 * is drawn in strokes, by the potential in the sheet where it is not. At 20 °C.
 */
package etchloom.proof.ohm;
