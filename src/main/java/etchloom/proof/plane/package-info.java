/**
 * Plane figures bounded by many short edges on a 1 nm grid: union, difference and comparison by
 * winding numbers, their islands, holes and areas. Knows nothing of files or copper.
 */
package etchloom.proof.plane;
