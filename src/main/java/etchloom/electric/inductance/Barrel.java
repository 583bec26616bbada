package etchloom.electric.inductance;

import etchloom.geometry.Point;
import java.util.List;

/**
 * A stretch of a plated hole.
 *
 * @param topMm height of its upper end
 * @param bottomMm height of its lower end, less
 * @param meanDistanceMm geometric mean distance of its section from itself
 * @param ampere downwards
 */
record Barrel(Point at, double topMm, double bottomMm, double meanDistanceMm, double ampere) {

  /** Neumann's integral over all pairs of two sets of barrels, weighted with the currents, mm. */
  static double coupling(List<Barrel> some, List<Barrel> others) {
    double sum = 0;
    for (Barrel a : some) {
      for (Barrel b : others) {
        double apart = a.at.distanceTo(b.at);
        double own = Math.max(a.meanDistanceMm, b.meanDistanceMm);
        double square = apart * apart < own * own ? own * own : apart * apart;
        // A thin tube's points lie about its mean distance from its axis.
        double spread = a.meanDistanceMm * a.meanDistanceMm + b.meanDistanceMm * b.meanDistanceMm;
        double mean = apart * apart + spread;
        double along = (b.topMm + b.bottomMm - a.topMm - a.bottomMm) / 2;
        double integral = PairSum.parallel(along, a.lengthMm(), b.lengthMm(), square, mean);
        sum += a.ampere * b.ampere * integral;
      }
    }
    return sum;
  }

  private double lengthMm() {
    return topMm - bottomMm;
  }
}
