package etchloom.electric.field;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The harmonics at one height over the radius, in a few tables by the faces' distance: a near
 * face's part changes within its distance and needs close knots, a far one's is smooth.
 *
 * <p>Knots stand a fifth of that distance apart at the magnets' ends and wider elsewhere; the
 * splines keep the harmonics to about 1e-4 of the largest.
 */
final class LayerTable {
  private static final double KNOTS_A_SCALE = 5;
  private static final double WIDEN = 0.15;
  private static final int MOST_KNOTS = 1500;

  /** Faces up to so many times the distance of a table's nearest one are in it too. */
  private static final double BAND = 2;

  private static final int MOST_TABLES = 4;

  private final List<RadialTable> tables = new ArrayList<>();
  private final double[] part;

  LayerTable(MagnetArray array, double heightMm, double innerMm, double outerMm, int orders) {
    part = new double[orders];
    double from = 0;
    double scale = array.clearanceMm(heightMm);
    while (scale < Double.POSITIVE_INFINITY) {
      boolean last = tables.size() == MOST_TABLES - 1;
      double least = from;
      double most = last ? Double.POSITIVE_INFINITY : BAND * scale;
      FieldHarmonics harmonics =
          new FieldHarmonics(array, Math.min(orders, FieldHarmonics.ordersFor(array, scale)));
      List<ChargeSheet> band =
          upTo(array, heightMm, most).stream().filter(s -> off(s, heightMm) > least).toList();
      double[] knot = knots(array.shape(), scale, innerMm, outerMm);
      double[][] rows = new double[knot.length][];
      for (int i = 0; i < knot.length; i++) {
        rows[i] =
            last
                ? harmonics.rest(knot[i], heightMm, s -> off(s, heightMm) > least)
                : harmonics.at(knot[i], heightMm, band);
      }
      tables.add(new RadialTable(knot, rows));
      from = most;
      scale = nearest(array, heightMm, from);
    }
  }

  private static double off(ChargeSheet s, double heightMm) {
    return Math.abs(s.heightMm() - heightMm);
  }

  /** All faces and images up to a distance; those of the first group only where it is infinite. */
  private static List<ChargeSheet> upTo(MagnetArray array, double heightMm, double mostMm) {
    List<ChargeSheet> out = new ArrayList<>();
    for (int k = 0; k <= MagnetArray.MOST_GROUPS; k++) {
      List<ChargeSheet> group = array.iron().group(array.sheets(), k);
      out.addAll(group.stream().filter(s -> off(s, heightMm) <= mostMm).toList());
      boolean beyond = group.stream().allMatch(s -> off(s, heightMm) > mostMm);
      if (!array.iron().endless() || beyond || mostMm == Double.POSITIVE_INFINITY) {
        break;
      }
    }
    return out;
  }

  /** Distance of the nearest face or image beyond a distance; infinite where there is none. */
  private static double nearest(MagnetArray array, double heightMm, double beyondMm) {
    double least = Double.POSITIVE_INFINITY;
    if (beyondMm == Double.POSITIVE_INFINITY) {
      return least;
    }
    boolean found = false;
    for (int k = 0; k <= MagnetArray.MOST_GROUPS; k++) {
      for (ChargeSheet s : array.iron().group(array.sheets(), k)) {
        if (off(s, heightMm) > beyondMm) {
          least = Math.min(least, off(s, heightMm));
        }
      }
      // The group after the first that has any may still hold a nearer one; later ones may not.
      if (!array.iron().endless() || found) {
        break;
      }
      found = least < Double.POSITIVE_INFINITY;
    }
    return least;
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

  void at(double radiusMm, double[] out) {
    Arrays.fill(out, 0);
    for (RadialTable t : tables) {
      t.at(radiusMm, part);
      for (int i = 0; i < t.width(); i++) {
        out[i] += part[i];
      }
    }
  }
}
