package etchloom.electric.machine.emf;

import etchloom.electric.field.GaussRule;
import etchloom.electric.field.RadialField;
import java.util.Map;
import java.util.TreeMap;

/**
 * The part of plated holes in dλ/dθ, {@code −∫ r Br dz}: small, but it closes the path between
 * layers. Holes at one radius differ only by their angle and are integrated once.
 */
final class BarrelIntegrals {
  private static final double WEBER = 1e-6;

  private final RadialField field;
  private final int orders;
  private final GaussRule rule = new GaussRule(3);
  private final Map<Hole, double[]> known = new TreeMap<>();

  /** Radii are told apart to a nanometre. */
  private record Hole(long radiusNm, int upper, int lower) implements Comparable<Hole> {
    @Override
    public int compareTo(Hole o) {
      if (radiusNm != o.radiusNm) {
        return Long.compare(radiusNm, o.radiusNm);
      }
      return upper != o.upper ? Integer.compare(upper, o.upper) : Integer.compare(lower, o.lower);
    }
  }

  BarrelIntegrals(RadialField field, int orders) {
    this.field = field;
    this.orders = orders;
  }

  /**
   * For a current that runs down from one layer to another, at angle 0, Wb by orders.
   *
   * @param upperMm height of the upper layer's copper over the board's mid-plane
   */
  double[] down(double radiusMm, int upper, double upperMm, int lower, double lowerMm) {
    Hole hole = new Hole(Math.round(radiusMm * 1e6), upper, lower);
    return known.computeIfAbsent(hole, h -> integrate(radiusMm, upperMm, lowerMm));
  }

  private double[] integrate(double radiusMm, double upperMm, double lowerMm) {
    double[] sum = new double[orders];
    double[] b = new double[orders];
    double half = (upperMm - lowerMm) / 2;
    for (int j = 0; j < rule.size(); j++) {
      field.radialAmplitudes(radiusMm, lowerMm + half * (1 + rule.node(j)), b);
      for (int i = 0; i < orders; i++) {
        sum[i] += radiusMm * b[i] * half * rule.weight(j) * WEBER;
      }
    }
    return sum;
  }
}
