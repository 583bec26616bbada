package etchloom.coil;

/**
 * What a coil is made from. Lengths in mm.
 *
 * @param coils on the board; the coil's sector spans 2π over this
 * @param layers copper layers, even
 * @param cornerMm wanted fillet radius on the centre line
 * @param padMm pad of eye vias and rim nodes
 * @param holeGapMm the fab's least distance between hole edges
 * @param rimTrackMm width of the connections outside
 */
public record CoilSize(
    int coils,
    int layers,
    double innerRadiusMm,
    double outerRadiusMm,
    double trackMm,
    double spaceMm,
    double cornerMm,
    double padMm,
    double holeMm,
    double holeGapMm,
    double rimTrackMm) {

  public double pitchMm() {
    return trackMm + spaceMm;
  }

  /** Half the coil's sector, rad. */
  public double halfSpanRad() {
    return Math.PI / coils;
  }

  /** Rim nodes of one coil. */
  public int nodes() {
    return layers / 2 + 1;
  }

  public double nodeRadiusMm() {
    return outerRadiusMm + spaceMm + Math.max(padMm, rimTrackMm) / 2;
  }

  /** Angle of a rim node from the coil's axis; all nodes of the board are evenly spaced. */
  public double nodeAngleRad(int node) {
    double a = halfSpanRad();
    return -a + a * (2 * node + 1) / nodes();
  }

  /** Distance between neighbouring eye vias along the axis; a track may end between two pads. */
  public double eyePitchMm() {
    double copper = (padMm + Math.max(padMm, trackMm)) / 2 + spaceMm;
    return Math.max(copper, holeMm + holeGapMm);
  }

  /** Distance a pad's centre must keep from a track's centre line. */
  public double padClearanceMm() {
    return trackMm / 2 + spaceMm + padMm / 2;
  }
}
