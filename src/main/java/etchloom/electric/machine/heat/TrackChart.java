package etchloom.electric.machine.heat;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Stackup;
import etchloom.electric.resistance.Section;
import etchloom.units.Constants;
import java.util.Map;
import java.util.TreeMap;

/**
 * The current of the IPC-2221 chart for one track standing alone: {@code I = k ΔT^0.44 A^0.725}, A
 * in square mils, k 0.048 outside and 0.024 inside (the usual fit to section 6.2, seen in several
 * open sources; the standard itself not seen). A wound coil is not one track alone: it carries
 * less.
 */
public final class TrackChart {
  private static final double OUTER = 0.048;
  private static final double INNER = 0.024;
  private static final double MIL2 = Constants.MM_PER_INCH * Constants.MM_PER_INCH / 1e6;

  private TrackChart() {}

  /** A for a cross-section and a rise in kelvin. */
  public static double ampere(double areaMm2, double riseKelvin, boolean outer) {
    double k = outer ? OUTER : INNER;
    return k * Math.pow(riseKelvin, 0.44) * Math.pow(areaMm2 / MIL2, 0.725);
  }

  /**
   * A of a winding for the narrowest tracks of a board, on the layer where they carry least; of
   * layers side by side each carries its share only.
   */
  public static double narrowest(Artwork artwork, double riseKelvin) {
    Map<Integer, Double> shareOf = new TreeMap<>();
    LayerSharing.of(artwork)
        .ifPresent(s -> s.groups().forEach(g -> g.forEach(l -> shareOf.put(l.layer(), l.share()))));
    double width = Double.POSITIVE_INFINITY;
    double least = Double.POSITIVE_INFINITY;
    for (Conductor c : artwork.conductors()) {
      Stackup.Copper copper = artwork.stackup().copper().get(c.layer() - 1);
      boolean outer = c.layer() == 1 || c.layer() == artwork.layers();
      double a = ampere(Section.trackAreaMm2(c.widthMm(), copper), riseKelvin, outer);
      if (c.what().kind() == Feature.Kind.SPIRAL) {
        a /= shareOf.getOrDefault(c.layer(), 1.0);
      }
      if (c.widthMm() < width) {
        width = c.widthMm();
        least = a;
      } else if (c.widthMm() == width) {
        least = Math.min(least, a);
      }
    }
    return least;
  }
}
