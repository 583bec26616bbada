package etchloom.rim;

/**
 * One end of a coil at the rim.
 *
 * @param coil from 1
 * @param start whether it is the coil's start (its first node), else its finish (its last)
 */
record Pin(int coil, boolean start) {}
