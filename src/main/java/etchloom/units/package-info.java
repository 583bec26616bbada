/** Quantities read from text, physical constants, number formatting. */
package etchloom.units;
