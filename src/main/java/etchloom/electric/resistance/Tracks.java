package etchloom.electric.resistance;

import etchloom.artwork.Conductor;
import etchloom.artwork.Stackup;

/**
 * Resistance of whole tracks: their stretches of one width in series.
 *
 * <p>At a step the current has to spread from the narrower width to the wider, which is left out:
 * over the ratio a of two widths it adds {@code (ln((1+a)²/4a) + ...)/π} squares, to first order
 * {@code (a−1)²/4π}, for steps of a twentieth two ten-thousandths of a square each.
 */
public final class Tracks {
  private Tracks() {}

  /** Resistance of a track as drawn, Ω. */
  public static double ohm(Conductor c, Stackup.Copper layer, double tempC) {
    return ohm(c, layer, Variation.NONE, tempC);
  }

  static double ohm(Conductor c, Stackup.Copper layer, Variation v, double tempC) {
    double sum = 0;
    for (Conductor.Stretch s : c.stretches()) {
      double area = v.trackAreaMm2(s.widthMm(), layer);
      sum += Section.ohm(s.path().lengthMm(), area, tempC);
    }
    return sum;
  }

  /** What a track's resistance becomes, as a ratio, when all its widths take a factor. */
  public static double factor(Conductor c, Stackup.Copper layer, double track) {
    double cut = layer.undercutMm();
    if (!c.tapered()) {
      return (c.widthMm() - cut) / (c.widthMm() * track - cut);
    }
    double drawn = 0;
    double made = 0;
    for (Conductor.Stretch s : c.stretches()) {
      drawn += s.path().lengthMm() / (s.widthMm() - cut);
      made += s.path().lengthMm() / (s.widthMm() * track - cut);
    }
    return made / drawn;
  }

  /** Relative change of a track's resistance over that of its widths, to first order, positive. */
  public static double sensitivity(Conductor c, Stackup.Copper layer) {
    double cut = layer.undercutMm();
    double ohm = 0;
    double moved = 0;
    for (Conductor.Stretch s : c.stretches()) {
      double part = s.path().lengthMm() / (s.widthMm() - cut);
      ohm += part;
      moved += part * s.widthMm() / (s.widthMm() - cut);
    }
    return moved / ohm;
  }
}
