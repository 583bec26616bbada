/** Points, lines, arcs and paths in the plane, exact distances, and the adapter to JTS. */
package etchloom.geometry;
