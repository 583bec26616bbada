package etchloom.artwork;

import java.util.List;

/**
 * The board's build from L1 down.
 *
 * @param copper one entry a layer
 * @param dielectricMm one entry fewer; copper and dielectrics add up to the thickness
 * @param platingMm copper on the hole walls
 */
public record Stackup(List<Copper> copper, List<Double> dielectricMm, double platingMm) {
  public Stackup {
    copper = List.copyOf(copper);
    dielectricMm = List.copyOf(dielectricMm);
    if (dielectricMm.size() != copper.size() - 1) {
      throw new IllegalArgumentException("a stackup has one dielectric fewer than copper layers");
    }
  }

  /**
   * @param thicknessMm finished copper
   * @param ounces the weight it is ordered by
   * @param undercutMm by how much each side of a track is narrower at the top than at the foot; the
   *     mean width is the drawn track less this
   */
  public record Copper(double thicknessMm, double ounces, double undercutMm) {}

  public int layers() {
    return copper.size();
  }

  public double thicknessMm() {
    double sum = 0;
    for (Copper c : copper) {
      sum += c.thicknessMm();
    }
    for (double d : dielectricMm) {
      sum += d;
    }
    return sum;
  }

  /** Height of the middle of a layer's copper over the board's mid-plane, mm, L1 highest. */
  public double heightMm(int layer) {
    double down = copper.get(0).thicknessMm() / 2;
    for (int i = 1; i < layer; i++) {
      down +=
          copper.get(i - 1).thicknessMm() / 2
              + dielectricMm.get(i - 1)
              + copper.get(i).thicknessMm() / 2;
    }
    return thicknessMm() / 2 - down + 0.0;
  }
}
