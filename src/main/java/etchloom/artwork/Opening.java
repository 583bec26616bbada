package etchloom.artwork;

import etchloom.geometry.Point;

/** A round opening in the solder mask. */
public record Opening(Point at, double diameterMm, String what) {}
