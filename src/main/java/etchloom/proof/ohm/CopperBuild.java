package etchloom.proof.ohm;

import java.util.List;

/**
 * How the copper is built; lengths in mm.
 *
 * @param layers from L1 down
 * @param dielectricMm between them, one fewer
 * @param platingMm copper on the walls of the holes, outside the finished hole
 */
public record CopperBuild(List<Layer> layers, List<Double> dielectricMm, double platingMm) {
  public CopperBuild {
    layers = List.copyOf(layers);
    dielectricMm = List.copyOf(dielectricMm);
    if (dielectricMm.size() != layers.size() - 1) {
      throw new IllegalArgumentException("a stackup has one dielectric fewer than copper layers");
    }
  }

  /**
   * @param undercutMm by how much each side of a track is narrower at the top than at the foot; the
   *     mean width is the drawn one less this
   */
  public record Layer(double thicknessMm, double undercutMm) {}

  /** From the middle of a layer's copper to the middle of the next one's. */
  double stepMm(int layer) {
    return layers.get(layer - 1).thicknessMm() / 2
        + dielectricMm.get(layer - 1)
        + layers.get(layer).thicknessMm() / 2;
  }
}
