package etchloom.artwork;

import etchloom.geometry.Path;

/**
 * A line of the legend on L1's side.
 *
 * @param what the text or mark it belongs to
 */
public record Stroke(Path path, double widthMm, String what) {}
