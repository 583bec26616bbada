/**
 * Quantities read from text, physical constants with their sources, and number formatting.
 *
 * <p>Everything here is plain text and plain numbers: no locale, no clock, no files. What a value
 * is for, and whether it lies in a sensible range, is for the reader of the spec.
 */
package etchloom.units;
