package etchloom.electric.field;

/**
 * One magnet, uniformly magnetised upwards, standing alone.
 *
 * @param bottomMm height of its south face
 * @param topMm height of its north face
 */
public record AxialMagnet(MagnetShape shape, double bottomMm, double topMm, double remanenceTesla) {

  /**
   * The axial field at a point, T: {@code Br/4π (Ω top − Ω bottom)}, and the remanence besides
   * inside the magnet. Exact for a magnet as permeable as air. A point on a face counts as just
   * above it.
   */
  public double axialTesla(double x, double y, double z) {
    double top = shape.solidAngle(x, y, z - topMm);
    double bottom = shape.solidAngle(x, y, z - bottomMm);
    double charge = remanenceTesla / (4 * Math.PI) * (top - bottom);
    return inside(x, y, z) ? charge + remanenceTesla : charge;
  }

  private boolean inside(double x, double y, double z) {
    double r = Math.hypot(x, y);
    if (z < bottomMm || z >= topMm || r < shape.innerMm() || r > shape.outerMm()) {
      return false;
    }
    double a = Math.abs(Math.atan2(y, x));
    return a >= shape.fromRad(r) && a <= shape.toRad(r);
  }
}
