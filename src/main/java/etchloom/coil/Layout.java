package etchloom.coil;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.IntToDoubleFunction;

/**
 * Lays one outline's inward spirals out over the layers and rows of vias between them.
 *
 * <p>L1 winds inwards; every even layer is an inward spiral mirrored in the coil's axis and run
 * backwards, so that the current turns the same way on all layers.
 */
final class Layout {
  private Layout() {}

  /** Draws one inward spiral. */
  interface Inward {
    /**
     * @param startRad angle of the rim node from the axis
     * @param eye number of its eye via, from outside
     */
    CoilPlan.Spiral draw(double startRad, int eye);
  }

  /**
   * @param eyeMm distance of an eye via from the shaft, by its number from outside
   */
  static CoilPlan plan(CoilSize size, int turns, IntToDoubleFunction eyeMm, Inward inward) {
    List<CoilPlan.Spiral> spirals = new ArrayList<>();
    for (int layer = 0; layer < size.layers(); layer++) {
      int pair = size.parallelLayers() ? 0 : layer / 2;
      int first = pair * size.viaCount();
      spirals.add(
          layer % 2 == 0
              ? inward.draw(size.startRad(pair), first)
              : backwards(inward.draw(-size.finishRad(pair), first + size.viaCount() - 1)));
    }
    List<CoilPlan.Row> eyes = new ArrayList<>();
    for (int j = 0; j < size.pairs(); j++) {
      List<Point> row = new ArrayList<>();
      for (int k = 0; k < size.viaCount(); k++) {
        row.add(new Point(eyeMm.applyAsDouble(j * size.viaCount() + k), 0));
      }
      eyes.add(new CoilPlan.Row(row));
    }
    List<CoilPlan.Row> nodes = new ArrayList<>();
    for (int j = 0; j < size.nodes(); j++) {
      nodes.add(node(size, j));
    }
    return new CoilPlan(turns, spirals, eyes, nodes, size.parallelLayers());
  }

  static CoilPlan.Row node(CoilSize size, int j) {
    double r = size.nodeRadiusMm();
    double here = size.nodeAngleRad(j);
    Point first = Point.polar(r, here);
    if (size.viaCount() == 1 || (j == 0 && !size.parallelLayers())) {
      return new CoilPlan.Row(List.of(first));
    }
    Point last = Point.polar(r, j == 0 ? size.startRad(0) : size.finishRad(j - 1));
    return new CoilPlan.Row(inLine(first, last, size.viaCount()));
  }

  private static List<Point> inLine(Point first, Point last, int count) {
    List<Point> out = new ArrayList<>(List.of(first));
    for (int k = 1; k < count - 1; k++) {
      out.add(first.plus(last.minus(first).times(k / (count - 1.0))));
    }
    out.add(last);
    return out;
  }

  private static CoilPlan.Spiral backwards(CoilPlan.Spiral inward) {
    Path path = inward.path().mirrored().reversed();
    List<Integer> turnOf = new ArrayList<>(inward.turnOf());
    Collections.reverse(turnOf);
    List<Double> widths = new ArrayList<>(inward.widthsMm());
    Collections.reverse(widths);
    return new CoilPlan.Spiral(path, turnOf, widths);
  }
}
