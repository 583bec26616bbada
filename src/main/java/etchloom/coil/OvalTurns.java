package etchloom.coil;

import etchloom.geometry.PathBuilder;

/**
 * The turns of an outline whose sides are straight along or across the coil's axis, or round.
 * Counter-clockwise: the outer side, the left side (y positive), the inner side, the right side.
 */
interface OvalTurns {
  int count();

  /** The outermost turn's outer corners as far as a start may land on them. */
  Bend startRight();

  Bend startLeft();

  /** From the outer side of a turn to its innermost point, or past that to the next turn's side. */
  void turn(int i, boolean whole, PathBuilder path);

  /** The bend after the last turn's innermost point. */
  Bend exitInner();

  /** The corner behind the last right side if the spiral were to go on. */
  Bend exitOuter();

  /** Middle of the void on the axis, from the shaft. */
  double middleMm();
}
