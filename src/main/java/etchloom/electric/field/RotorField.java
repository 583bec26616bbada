package etchloom.electric.field;

import java.util.ArrayList;
import java.util.List;

/**
 * A magnet array's harmonics, tabled over the radius at each layer's height.
 *
 * <p>Knots stand a fifth of the distance to the magnets apart at the magnets' ends and wider
 * elsewhere; the splines keep the harmonics to about 1e-4 of the largest.
 */
public final class RotorField implements AxialField {
  private static final double KNOTS_A_SCALE = 5;
  private static final double WIDEN = 0.15;
  private static final int MOST_KNOTS = 1500;

  private final int polePairs;
  private final int orders;
  private final double[] scaleMm;
  private final List<RadialTable> layers = new ArrayList<>();

  /**
   * @param heightMm height of each layer's copper over the board's mid-plane, L1 first
   * @param innerMm smallest radius asked for
   * @param outerMm largest radius asked for
   */
  public RotorField(MagnetArray array, double[] heightMm, double innerMm, double outerMm) {
    polePairs = array.polePairs();
    scaleMm = new double[heightMm.length];
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < heightMm.length; i++) {
      scaleMm[i] = array.clearanceMm(heightMm[i]);
      least = Math.min(least, scaleMm[i]);
    }
    orders = FieldHarmonics.ordersFor(array, least);
    FieldHarmonics harmonics = new FieldHarmonics(array, orders);
    for (int i = 0; i < heightMm.length; i++) {
      layers.add(table(array, harmonics, heightMm[i], scaleMm[i], innerMm, outerMm));
    }
  }

  private static RadialTable table(
      MagnetArray array,
      FieldHarmonics harmonics,
      double height,
      double scale,
      double inner,
      double outer) {
    double[] knot = knots(array.shape(), scale, inner, outer);
    double[][] rows = new double[knot.length][];
    for (int i = 0; i < knot.length; i++) {
      rows[i] = harmonics.at(knot[i], height);
    }
    return new RadialTable(knot, rows);
  }

  private static double[] knots(MagnetShape shape, double scale, double inner, double outer) {
    double margin = 2 * scale;
    double from = Math.max(0, inner - margin);
    double to = outer + margin;
    double fine = Math.max(scale / KNOTS_A_SCALE, (to - from) / MOST_KNOTS);
    double coarse = Math.max(fine, (to - from) / 60);
    List<Double> out = new ArrayList<>();
    double r = from;
    while (r < to) {
      out.add(r);
      double edge = Double.POSITIVE_INFINITY;
      for (double b : shape.breaksMm()) {
        edge = Math.min(edge, Math.abs(b - r));
      }
      double wide = fine + WIDEN * Math.max(0, edge - 2 * scale);
      r += Math.min(coarse, wide);
    }
    out.add(r);
    return out.stream().mapToDouble(Double::doubleValue).toArray();
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
}
