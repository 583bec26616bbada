/**
 * What the files of a layer set say, in one neutral form whatever tool or format they came from:
 * records only, lengths in mm, angles in rad, y up, seen from the top side.
 */
package etchloom.proof.image;
