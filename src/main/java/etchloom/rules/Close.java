package etchloom.rules;

import etchloom.geometry.Point;

/**
 * Two pieces of one layer's copper, by their places in {@link LayerCopper#pieces()}, that come near
 * each other.
 *
 * @param gapMm smallest gap between points that are no neighbours along the copper; below 0 where
 *     they overlap
 * @param at the middle of the gap
 * @param bend whether still nearer points were left out as neighbours: such a gap lies where the
 *     copper itself leads from one to the other, and says nothing about the spacing unless it is
 *     too small
 */
record Close(int first, int second, double gapMm, Point at, boolean bend) {}
