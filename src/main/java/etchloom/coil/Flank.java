package etchloom.coil;

import etchloom.geometry.Point;
import java.util.List;

/**
 * One straight side of a wedge's turn, the left one, from its inner fillet outwards to the corner
 * at its outer end. Lengths in mm.
 *
 * @param cornerRad angle of the outer fillet's centre from the coil's axis
 * @param at where its straight pieces end, outwards; the last where the outer fillet begins
 * @param widthMm of each piece
 */
record Flank(double cornerRad, List<Point> at, List<Double> widthMm) {
  Flank {
    at = List.copyOf(at);
    widthMm = List.copyOf(widthMm);
  }
}
