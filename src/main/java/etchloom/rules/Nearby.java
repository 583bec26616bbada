package etchloom.rules;

import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import java.util.List;

/** Finds which of many fat shapes lie near others: all that are too near, and the nearest. */
final class Nearby {
  /** Told of a shape. */
  @FunctionalInterface
  interface Hit {
    /**
     * @param gapMm between the fat shapes
     * @param centres the nearest points, first the one asked about
     * @return the gap that counts; infinite where the shape does not
     */
    double at(int i, double gapMm, Nearest centres);
  }

  private final ShapeTree tree;
  private final List<? extends Segment> shapes;
  private final double[] fatMm;
  private double bestMm;

  /**
   * @param startMm gaps above this are of no interest, unless required
   */
  Nearby(ShapeTree tree, List<? extends Segment> shapes, double[] fatMm, double startMm) {
    bestMm = startMm;
    this.tree = tree;
    this.shapes = shapes;
    this.fatMm = fatMm;
  }

  /** All with gaps up to the required one, and perhaps those nearer than any before. */
  void look(Segment s, double sFatMm, double requiredMm, Hit hit) {
    tree.near(
        s,
        sFatMm,
        Math.max(requiredMm, bestMm),
        (i, limit) -> {
          Nearest n = Distance.between(s, shapes.get(i));
          double gap = n.distanceMm() - sFatMm - fatMm[i];
          if (gap <= limit) {
            bestMm = Math.min(bestMm, hit.at(i, gap, n));
          }
          return Math.max(requiredMm, bestMm);
        });
  }
}
