package etchloom.coil;

import etchloom.spec.Spec;
import java.util.OptionalDouble;

/**
 * What a coil is made from. Lengths in mm.
 *
 * @param coils on the board; the coil's sector spans 2π over this
 * @param layers copper layers, even
 * @param parallelLayers whether the inward layers run side by side, and the outward layers
 * @param widthMm a racetrack's tangential size over the copper
 * @param taper whether a wedge's sides widen outwards
 * @param cornerMm wanted fillet radius on the centre line; absent: the outline's default
 * @param padMm pad of eye vias and rim nodes
 * @param viaCount vias side by side at every joint
 * @param holeGapMm the fab's least distance between hole edges
 * @param rimTrackMm width of the connections outside
 */
public record CoilSize(
    Spec.CoilOutline outline,
    int coils,
    int layers,
    boolean parallelLayers,
    double innerRadiusMm,
    double outerRadiusMm,
    OptionalDouble widthMm,
    double trackMm,
    double spaceMm,
    boolean taper,
    OptionalDouble cornerMm,
    double padMm,
    double holeMm,
    int viaCount,
    double holeGapMm,
    double rimTrackMm) {

  /** The same with another track, all along, and a corner that it allows. */
  CoilSize withTrackMm(double mm) {
    double least = (mm + spaceMm) / 2;
    return new CoilSize(
        outline,
        coils,
        layers,
        parallelLayers,
        innerRadiusMm,
        outerRadiusMm,
        widthMm,
        mm,
        spaceMm,
        false,
        cornerMm.isPresent()
            ? OptionalDouble.of(Math.max(cornerMm.getAsDouble(), least))
            : cornerMm,
        padMm,
        holeMm,
        viaCount,
        holeGapMm,
        rimTrackMm);
  }

  public double pitchMm() {
    return trackMm + spaceMm;
  }

  /** Half the coil's sector, rad. */
  public double halfSpanRad() {
    return Math.PI / coils;
  }

  /** How often the current goes in and out again. */
  int pairs() {
    return parallelLayers ? 1 : layers / 2;
  }

  /** Rim nodes of one coil. */
  public int nodes() {
    return pairs() + 1;
  }

  /** Vias in the coil's eye. */
  int eyes() {
    return pairs() * viaCount;
  }

  /** The widest round copper at a joint: its pad, or the end of a track that is wider. */
  public double jointMm() {
    return Math.max(padMm, trackMm);
  }

  /** Distance of the vias of one joint at the rim. */
  public double viaPitchMm() {
    return Math.max(padMm + spaceMm, holeMm + holeGapMm);
  }

  /** A joint's row at the rim is a chord of this length, both ends at the nodes' radius. */
  double rowMm() {
    return (viaCount - 1) * viaPitchMm();
  }

  public double nodeRadiusMm() {
    double middle = outerRadiusMm + spaceMm + Math.max(padMm, rimTrackMm) / 2;
    return Math.hypot(middle, rowMm() / 2);
  }

  /** Angle that a joint's row takes at the rim, seen from the shaft. */
  double rowRad() {
    return 2 * Math.asin(rowMm() / (2 * nodeRadiusMm()));
  }

  /**
   * Half the angle over which the nodes spread: no wider than the coil, which the leads must meet.
   */
  private double nodeSpanRad() {
    double half = widthMm.orElse(outerRadiusMm - innerRadiusMm) / 2;
    return outline == Spec.CoilOutline.WEDGE
        ? halfSpanRad()
        : Math.min(halfSpanRad(), Math.atan(half / outerRadiusMm));
  }

  /** Angle of a rim node from the coil's axis; a coil's nodes are evenly spaced. */
  public double nodeAngleRad(int node) {
    double a = nodeSpanRad();
    return -a + a * (2 * node + 1) / nodes();
  }

  /** Where a layer leaves the rim inwards: only a start shared by layers is a row of vias. */
  double startRad(int pair) {
    return nodeAngleRad(pair) + (parallelLayers ? rowRad() : 0);
  }

  /** Where a layer comes back to the rim: at the far end of the node's row. */
  double finishRad(int pair) {
    return nodeAngleRad(pair + 1) - rowRad();
  }

  /** Distance between neighbouring eye vias along the axis; a track may end between two pads. */
  public double eyePitchMm() {
    double copper = (padMm + jointMm()) / 2 + spaceMm;
    return Math.max(copper, holeMm + holeGapMm);
  }

  /** Distance a pad's centre must keep from a track's centre line. */
  public double padClearanceMm() {
    return trackMm / 2 + spaceMm + padMm / 2;
  }

  /**
   * Distance an eye via's centre must keep from a track's centre line: the track that ends there
   * may be wider than the pad.
   */
  double eyeClearanceMm() {
    return trackMm / 2 + spaceMm + jointMm() / 2;
  }

  /** The tightest fillet: the gap inside it ends as a half disc just as wide as the space. */
  public double leastCornerMm() {
    return pitchMm() / 2;
  }

  /** The wedge's wanted fillet. */
  double wedgeCornerMm() {
    return cornerMm.orElse(Math.max(trackMm, leastCornerMm()));
  }
}
