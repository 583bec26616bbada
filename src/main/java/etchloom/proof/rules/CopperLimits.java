package etchloom.proof.rules;

import java.util.List;

/**
 * What the fab asks of copper, holes and mask; lengths in mm.
 *
 * @param layers from L1 down
 * @param ringTerminalMm annular ring of component holes; of all other plated holes {@code
 *     ringViaMm}
 * @param aspect board thickness over hole, at most
 * @param holeGapMm hole edge to hole edge
 * @param holeCopperMm hole edge to foreign copper
 * @param edgeCopperMm copper to the board's edge
 * @param edgeHoleMm hole to the board's edge
 * @param maskWebMm mask between two openings
 * @param sizeMm largest board side
 * @param layerCounts numbers of layers that the fab builds
 */
public record CopperLimits(
    List<Layer> layers,
    double ringViaMm,
    double ringTerminalMm,
    double holeMinMm,
    double aspect,
    double holeGapMm,
    double holeCopperMm,
    double edgeCopperMm,
    double edgeHoleMm,
    double maskWebMm,
    double sizeMm,
    List<Integer> layerCounts) {
  public CopperLimits {
    layerCounts = List.copyOf(layerCounts);
    layers = List.copyOf(layers);
  }

  public record Layer(double trackMm, double spaceMm) {}
}
