package etchloom.electric.field;

/**
 * A round magnet.
 *
 * @param pitchMm radius of its centre about the shaft
 * @param radiusMm its own radius, less than the pitch radius
 */
record DiscShape(double pitchMm, double radiusMm) implements MagnetShape {
  @Override
  public double solidAngle(double x, double y, double heightMm) {
    return SolidAngles.disc(radiusMm, Math.hypot(x - pitchMm, y), heightMm);
  }

  @Override
  public double[] breaksMm() {
    return new double[] {pitchMm - radiusMm, pitchMm + radiusMm};
  }

  @Override
  public double fromRad(double r) {
    return 0;
  }

  @Override
  public double toRad(double r) {
    double c = (r * r + pitchMm * pitchMm - radiusMm * radiusMm) / (2 * r * pitchMm);
    return Math.acos(Math.min(1, c));
  }

  @Override
  public double areaMm2() {
    return Math.PI * radiusMm * radiusMm;
  }

  @Override
  public double centroidMm() {
    return pitchMm;
  }

  @Override
  public double reachRad() {
    return Math.asin(radiusMm / pitchMm);
  }
}
