package etchloom.electric.field;

import java.util.ArrayList;
import java.util.List;

/** A magnet array's harmonics, tabled over the radius at each layer's height. */
public final class RotorField implements AxialField, RadialField {
  /** Heights are told apart to a nanometre: the field changes over a tenth of a millimetre. */
  private static final double SAME_MM = 1e-6;

  private final int polePairs;
  private final int orders;
  private final double[] scaleMm;
  private final List<LayerTable> layers = new ArrayList<>();
  private final FieldHarmonics harmonics;

  /**
   * As many orders as matter on the layer nearest to the magnets.
   *
   * @param heightMm height of each layer's copper over the board's mid-plane, L1 first
   * @param innerMm smallest radius asked for
   * @param outerMm largest radius asked for
   */
  public RotorField(MagnetArray array, double[] heightMm, double innerMm, double outerMm) {
    this(array, heightMm, innerMm, outerMm, ordersFor(array, heightMm));
  }

  /** The first few orders only. */
  public RotorField(
      MagnetArray array, double[] heightMm, double innerMm, double outerMm, int orders) {
    this.orders = orders;
    polePairs = array.polePairs();
    harmonics = new FieldHarmonics(array, orders);
    scaleMm = new double[heightMm.length];
    for (int i = 0; i < heightMm.length; i++) {
      scaleMm[i] = array.clearanceMm(heightMm[i]);
      int twin = array.even() ? mirrored(heightMm, i) : -1;
      layers.add(
          twin >= 0
              ? layers.get(twin)
              : new LayerTable(array, heightMm[i], innerMm, outerMm, orders));
    }
  }

  /** An earlier layer as far from the mid-plane on its other side, or -1. */
  private static int mirrored(double[] heightMm, int layer) {
    for (int i = 0; i < layer; i++) {
      if (Math.abs(heightMm[i] + heightMm[layer]) < SAME_MM) {
        return i;
      }
    }
    return -1;
  }

  private static int ordersFor(MagnetArray array, double[] heightMm) {
    double least = Double.POSITIVE_INFINITY;
    for (double h : heightMm) {
      least = Math.min(least, array.clearanceMm(h));
    }
    return FieldHarmonics.ordersFor(array, least);
  }

  @Override
  public int polePairs() {
    return polePairs;
  }

  @Override
  public int orders() {
    return orders;
  }

  @Override
  public void amplitudes(int layer, double radiusMm, double[] out) {
    layers.get(layer - 1).at(radiusMm, out);
  }

  @Override
  public double scaleMm(int layer) {
    return scaleMm[layer - 1];
  }

  @Override
  public void radialAmplitudes(double radiusMm, double heightMm, double[] out) {
    System.arraycopy(harmonics.radialAt(radiusMm, heightMm), 0, out, 0, orders);
  }
}
