package etchloom.electric.field;

import java.util.Arrays;

/**
 * A rectangular magnet, one pair of sides along the radius through its centre.
 *
 * @param pitchMm radius of its centre about the shaft
 * @param lengthMm radial size, less than twice the pitch radius
 * @param widthMm tangential size
 */
record BlockShape(double pitchMm, double lengthMm, double widthMm) implements MagnetShape {
  @Override
  public double solidAngle(double x, double y, double heightMm) {
    double a = pitchMm - lengthMm / 2;
    double b = pitchMm + lengthMm / 2;
    double w = widthMm / 2;
    return SolidAngles.polygon(new double[] {a, -w, b, -w, b, w, a, w}, pitchMm, 0, x, y, heightMm);
  }

  private double nearMm() {
    return pitchMm - lengthMm / 2;
  }

  private double farMm() {
    return pitchMm + lengthMm / 2;
  }

  @Override
  public double[] breaksMm() {
    double w = widthMm / 2;
    double[] b = {nearMm(), Math.hypot(nearMm(), w), farMm(), Math.hypot(farMm(), w)};
    Arrays.sort(b);
    return b;
  }

  @Override
  public double fromRad(double r) {
    return r > farMm() ? Math.acos(farMm() / r) : 0;
  }

  @Override
  public double toRad(double r) {
    double side = Math.asin(Math.min(1, widthMm / 2 / r));
    double end = Math.acos(Math.min(1, nearMm() / r));
    return Math.max(fromRad(r), Math.min(side, end));
  }

  @Override
  public double areaMm2() {
    return lengthMm * widthMm;
  }

  @Override
  public double centroidMm() {
    return pitchMm;
  }

  @Override
  public double reachRad() {
    return Math.atan2(widthMm / 2, nearMm());
  }
}
