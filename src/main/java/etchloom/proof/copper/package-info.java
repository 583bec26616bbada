/**
 * Copper rebuilt from images that were read back: its figure on each layer, what it joins, how wide
 * it is, how far apart, and its resistance. Knows layers and holes, but no file format.
 */
package etchloom.proof.copper;
