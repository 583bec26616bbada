package etchloom.artwork;

import etchloom.geometry.Point;

/**
 * A non-plated hole.
 *
 * @param keepOutMm diameter of the screw head
 */
public record MountingHole(Point at, double diameterMm, double keepOutMm) {}
