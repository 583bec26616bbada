package etchloom.coil;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;

/**
 * One coil in its own frame, axis along +x, shaft at the origin, seen from L1.
 *
 * @param turns on each layer
 * @param layers one spiral a layer, L1 first, in the walking direction from start to finish
 * @param eyes the vias at the centre, a row for each place where the current changes layers there
 * @param nodes the vias at the rim, clockwise-most first; a first row of one place that only L1
 *     uses needs no hole
 * @param parallel whether all inward layers run side by side, and all outward layers
 */
public record CoilPlan(
    int turns, List<Spiral> layers, List<Row> eyes, List<Row> nodes, boolean parallel) {
  public CoilPlan {
    layers = List.copyOf(layers);
    eyes = List.copyOf(eyes);
    nodes = List.copyOf(nodes);
  }

  /**
   * @param turnOf the turn, from 1 outermost, of each segment of the path
   * @param widthsMm the width of each segment; empty where all have the coil's own
   */
  public record Spiral(Path path, List<Integer> turnOf, List<Double> widthsMm) {
    public Spiral {
      turnOf = List.copyOf(turnOf);
      widthsMm = List.copyOf(widthsMm);
    }

    Spiral(Path path, List<Integer> turnOf) {
      this(path, turnOf, List.of());
    }
  }

  /**
   * Vias of one joint in one line. Copper arrives at the one end of the row and leaves from the
   * other, so that the current shares evenly.
   *
   * @param at in an eye from the outermost in, at the rim from the radial's own via on
   */
  public record Row(List<Point> at) {
    public Row {
      at = List.copyOf(at);
    }
  }
}
