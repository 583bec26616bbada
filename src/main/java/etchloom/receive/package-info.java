/**
 * Judges delivered boards by their measured resistances: reads the readings, holds each pair of
 * terminals against its limits and against the others, and names the likely cause of what is wrong
 * by comparing with a network of the drawn copper in which faults are set one at a time.
 *
 * <p>Takes the drawn board and bytes, gives values and bytes: no files, no clock, no terminal.
 */
package etchloom.receive;
