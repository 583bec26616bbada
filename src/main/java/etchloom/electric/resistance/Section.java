package etchloom.electric.resistance;

import etchloom.artwork.Stackup;

/** Cross-sections of copper and what a length of them resists. Lengths in mm, areas in mm². */
public final class Section {
  private static final double MM_TO_M = 1e-3;

  private Section() {}

  /**
   * The mean width of an etched track: at its foot it is as drawn, at its top narrower by the
   * undercut on either side, so in the mean narrower by one undercut.
   *
   * @throws IllegalArgumentException if nothing is left of the track
   */
  public static double meanWidthMm(double drawnMm, Stackup.Copper copper) {
    double mean = drawnMm - copper.undercutMm();
    if (!(mean > 0)) {
      throw new IllegalArgumentException(
          "a track of " + drawnMm + " mm is etched away: undercut " + copper.undercutMm() + " mm");
    }
    return mean;
  }

  /** Area of an etched track's trapezoid, mm². */
  public static double trackAreaMm2(double drawnMm, Stackup.Copper copper) {
    return meanWidthMm(drawnMm, copper) * copper.thicknessMm();
  }

  /**
   * Area of a plated barrel, mm²: a ring of the plating's thickness outside the finished hole.
   *
   * @param finishedHoleMm diameter after plating
   */
  public static double barrelAreaMm2(double finishedHoleMm, double platingMm) {
    return Math.PI * platingMm * (finishedHoleMm + platingMm);
  }

  /** Resistance of a length of one cross-section, Ω. */
  public static double ohm(double lengthMm, double areaMm2, double tempC) {
    return Copper.resistivityOhmMetre(tempC) * lengthMm / (areaMm2 * MM_TO_M);
  }
}
