package etchloom.electric.field;

import etchloom.spec.Spec;

/**
 * A magnet's outline seen along the shaft, centred on angle 0, alike above and below that line.
 * Lengths in mm, angles in rad.
 */
public sealed interface MagnetShape permits DiscShape, SectorShape, BlockShape {

  /** The shape a spec asks for. */
  static MagnetShape of(Spec.Magnet m) {
    return switch (m.outline()) {
      case DISC -> new DiscShape(m.pitchRadiusMm(), m.diameterMm() / 2);
      case SECTOR -> new SectorShape(m.innerRadiusMm(), m.outerRadiusMm(), m.spanRad());
      case BLOCK -> new BlockShape(m.pitchRadiusMm(), m.lengthMm(), m.widthMm());
    };
  }

  /**
   * Solid angle under which the outline is seen, sr.
   *
   * @param x place in the magnet's frame, mm
   * @param heightMm over the outline's plane; negative from below, which gives a negative angle
   */
  double solidAngle(double x, double y, double heightMm);

  /** Radii at which the outline's angles change their law, ascending, first and last included. */
  double[] breaksMm();

  /** Angle from the axis at which the outline begins at a radius; 0 where it covers the axis. */
  double fromRad(double radiusMm);

  /** Angle from the axis at which the outline ends at a radius. */
  double toRad(double radiusMm);

  double areaMm2();

  /** Radius of the centre of mass. */
  double centroidMm();

  /** Largest angle from the axis that the outline reaches. */
  double reachRad();

  default double innerMm() {
    return breaksMm()[0];
  }

  default double outerMm() {
    double[] b = breaksMm();
    return b[b.length - 1];
  }
}
