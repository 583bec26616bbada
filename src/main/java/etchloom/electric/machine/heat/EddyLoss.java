package etchloom.electric.machine.heat;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.electric.machine.emf.Coupling;
import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.Section;

/**
 * Eddy loss of the copper in the turning field.
 *
 * <p>A strip of width w in a field normal to it of amplitude B and frequency f loses {@code (π f B
 * w)² / (6 ρ)} for each volume; a round pad with a hole {@code (π f B)² (d² + h²) / (16 ρ)} (both
 * from the induced field {@code ω B x} over the width, its own reaction left out: good while the
 * width stays below the skin depth). Orders add up. The field along the board drives currents
 * through the copper's thickness only, a hundredth and less of this, left out.
 */
public final class EddyLoss {
  /** W for each (rad/s)² at 20 °C. */
  private final double[][] byLayerAndOrder;

  private final int polePairs;
  private final double widestMm;

  private EddyLoss(double[][] byLayerAndOrder, int polePairs, double widestMm) {
    this.byLayerAndOrder = byLayerAndOrder;
    this.polePairs = polePairs;
    this.widestMm = widestMm;
  }

  /** All tracks and pads of a board. */
  public static EddyLoss of(Artwork artwork, Coupling coupling) {
    double[][] sum = new double[artwork.layers()][coupling.orders()];
    double widest = 0;
    for (Conductor c : artwork.conductors()) {
      Stackup.Copper copper = artwork.stackup().copper().get(c.layer() - 1);
      double w = Section.meanWidthMm(c.widthMm(), copper) * 1e-3;
      double area = Section.trackAreaMm2(c.widthMm(), copper) * 1e-6;
      for (int i = 0; i < coupling.orders(); i++) {
        double turns = (2 * i + 1) * coupling.polePairs() * w / 2;
        sum[c.layer() - 1][i] += turns * turns / 6 * area * coupling.squareTeslaMetre(c.id(), i);
      }
      widest = Math.max(widest, c.widestMm());
    }
    pads(artwork, coupling, sum);
    for (double[] layer : sum) {
      for (int i = 0; i < layer.length; i++) {
        layer[i] /= Copper.RESISTIVITY_20_OHM_METRE;
      }
    }
    return new EddyLoss(sum, coupling.polePairs(), widest);
  }

  private static void pads(Artwork artwork, Coupling coupling, double[][] sum) {
    double[] b = new double[coupling.orders()];
    for (Joint j : artwork.joints()) {
      if (j.padMm() == 0) {
        continue;
      }
      double d = j.padMm() * 1e-3;
      double h = j.hole().orElse(0.0) * 1e-3;
      for (int layer = j.firstLayer(); layer <= j.lastLayer(); layer++) {
        double t = artwork.stackup().copper().get(layer - 1).thicknessMm() * 1e-3;
        double volume = Math.PI / 4 * (d * d - h * h) * t;
        coupling.amplitudes(layer, j.at().norm(), b);
        for (int i = 0; i < b.length; i++) {
          double turns = (2 * i + 1) * coupling.polePairs() / 2.0 * b[i];
          sum[layer - 1][i] += turns * turns * (d * d + h * h) / 16 * volume;
        }
      }
    }
  }

  public int layers() {
    return byLayerAndOrder.length;
  }

  /** How many odd orders there are. */
  public int orders() {
    return byLayerAndOrder[0].length;
  }

  /**
   * W in one layer from one order.
   *
   * @param layer from 1
   * @param i for the order 2i + 1
   */
  public double watt(int layer, int i, double radPerSecond, double tempC) {
    return byLayerAndOrder[layer - 1][i] * radPerSecond * radPerSecond / Copper.factor(tempC);
  }

  /** W in all copper. */
  public double watt(double radPerSecond, double tempC) {
    double sum = 0;
    for (double[] layer : byLayerAndOrder) {
      for (double w : layer) {
        sum += w;
      }
    }
    return sum * radPerSecond * radPerSecond / Copper.factor(tempC);
  }

  /** Whether the widest track is wider than the skin depth at the fundamental. */
  public boolean beyondSkinDepth(double radPerSecond) {
    double w = polePairs * radPerSecond;
    if (!(w > 0)) {
      return false;
    }
    double depth = Math.sqrt(2 * Copper.RESISTIVITY_20_OHM_METRE / (w * 4e-7 * Math.PI));
    return widestMm * 1e-3 > depth;
  }
}
