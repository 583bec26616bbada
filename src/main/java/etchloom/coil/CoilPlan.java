package etchloom.coil;

import etchloom.geometry.Path;
import java.util.List;

/**
 * One coil in its own frame, axis along +x, shaft at the origin, seen from L1.
 *
 * @param turns on each layer
 * @param layers one spiral a layer, L1 first, in the walking direction from start to finish
 * @param eyeRadiiMm radii of the eye vias on the axis; pair {@code j} of layers takes the j-th
 * @param nodeRadiusMm radius of the rim nodes
 * @param nodeAnglesRad angles of the rim nodes from the axis, clockwise-most first
 */
public record CoilPlan(
    int turns,
    List<Spiral> layers,
    List<Double> eyeRadiiMm,
    double nodeRadiusMm,
    List<Double> nodeAnglesRad) {
  public CoilPlan {
    layers = List.copyOf(layers);
    eyeRadiiMm = List.copyOf(eyeRadiiMm);
    nodeAnglesRad = List.copyOf(nodeAnglesRad);
  }

  /**
   * @param turnOf the turn, from 1 outermost, of each segment of the path
   */
  public record Spiral(Path path, List<Integer> turnOf) {
    public Spiral {
      turnOf = List.copyOf(turnOf);
    }
  }
}
