package etchloom.rules;

import etchloom.geometry.Nearest;
import etchloom.geometry.Point;

/**
 * Two pieces of one layer's copper that come near each other.
 *
 * @param first place of {@code p} in {@link LayerCopper#pieces()}, less than {@code second}
 * @param gapMm smallest gap between points that are no neighbours along the copper; below 0 where
 *     they overlap
 * @param centres the points of the centre lines there
 * @param bend whether still nearer points were left out as neighbours: such a gap lies where the
 *     copper itself leads from one to the other, and says nothing about the spacing unless it is
 *     too small
 */
record Close(int first, int second, Piece p, Piece q, double gapMm, Nearest centres, boolean bend) {

  /** The middle of the gap. */
  Point at() {
    return Board.middle(centres, p.fatMm(), q.fatMm());
  }
}
