package etchloom.electric.resistance;

import etchloom.artwork.Stackup;

/**
 * A board that came out a little different: factors on the drawn track width, the finished copper
 * thickness and the barrels' plating. The undercut stays as it is, since the tolerance of the track
 * covers it.
 */
public record Variation(double track, double copper, double plating) {
  public static final Variation NONE = new Variation(1, 1, 1);

  /** Whether any copper of this width is left on this layer. */
  public boolean leaves(double drawnMm, Stackup.Copper layer) {
    return drawnMm * track - layer.undercutMm() > 0 && copper > 0 && plating > 0;
  }

  double trackAreaMm2(double drawnMm, Stackup.Copper layer) {
    return Section.trackAreaMm2(drawnMm * track, layer) * copper;
  }

  double barrelAreaMm2(double finishedHoleMm, double platingMm) {
    return Section.barrelAreaMm2(finishedHoleMm, platingMm * plating);
  }
}
