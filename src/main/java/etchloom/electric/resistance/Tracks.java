package etchloom.electric.resistance;

import etchloom.artwork.Conductor;
import etchloom.artwork.Stackup;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Resistance of whole tracks: their stretches of one width in series.
 *
 * <p>At a step the current has to spread from the narrower width to the wider. That is left out,
 * and so is the wider stretch's round end, which helps it: a sharp step of ratio a adds about
 * {@code (a−1)² (1/2 + ln(2/(a−1))) / π} squares, the first term of its conformal map (recalled),
 * three thousandths for a step of a twentieth, where a stretch is a square long and more.
 */
public final class Tracks {
  private Tracks() {}

  /** Resistance of a track as drawn, Ω. */
  public static double ohm(Conductor c, Stackup.Copper layer, double tempC) {
    return ohm(c, layer, Variation.NONE, tempC);
  }

  static double ohm(Conductor c, Stackup.Copper layer, Variation v, double tempC) {
    double sum = 0;
    for (Width w : widths(c)) {
      sum += Section.ohm(w.lengthMm(), v.trackAreaMm2(w.widthMm(), layer), tempC);
    }
    return sum;
  }

  /** So much of a track has one width. */
  public record Width(double widthMm, double lengthMm) {}

  /** A track's widths, the least first. */
  public static List<Width> widths(Conductor c) {
    if (!c.tapered()) {
      return List.of(new Width(c.widthMm(), c.path().lengthMm()));
    }
    SortedMap<Double, Double> lengths = new TreeMap<>();
    for (int k = 0; k < c.widthsMm().size(); k++) {
      lengths.merge(c.widthMm(k), c.path().segments().get(k).lengthMm(), Double::sum);
    }
    return lengths.entrySet().stream().map(e -> new Width(e.getKey(), e.getValue())).toList();
  }

  /** What a track's resistance becomes, as a ratio, when all its widths take a factor. */
  public static double factor(List<Width> widths, Stackup.Copper layer, double track) {
    double cut = layer.undercutMm();
    double drawn = 0;
    double made = 0;
    for (Width w : widths) {
      drawn += w.lengthMm() / (w.widthMm() - cut);
      made += w.lengthMm() / (w.widthMm() * track - cut);
    }
    return made / drawn;
  }

  /** Relative change of a track's resistance over that of its widths, to first order, positive. */
  public static double sensitivity(List<Width> widths, Stackup.Copper layer) {
    double cut = layer.undercutMm();
    double ohm = 0;
    double moved = 0;
    for (Width w : widths) {
      double part = w.lengthMm() / (w.widthMm() - cut);
      ohm += part;
      moved += part * w.widthMm() / (w.widthMm() - cut);
    }
    return moved / ohm;
  }
}
