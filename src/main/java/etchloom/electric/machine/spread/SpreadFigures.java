package etchloom.electric.machine.spread;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Departures from the nominal board, by the fab's tolerances alone; the magnets' own spread comes
 * on top.
 *
 * @param terminalOhmPercent of the resistance between terminals, any pair, to the farther side
 * @param torquePercent of the torque per ampere, from the layers' heights; empty without a rotor
 * @param imbalancePercent largest less smallest over the mean of the terminal pairs
 * @param boards the seeded random boards by the mean resistance of their pairs, least first; empty
 *     without limits of resistance
 */
public record SpreadFigures(
    Share terminalOhmPercent, Share torquePercent, Share imbalancePercent, List<Bin> boards) {
  public SpreadFigures {
    boards = List.copyOf(boards);
  }

  /**
   * How many boards lie between two resistances, Ω at 20 °C.
   *
   * @param toOhm not itself in this bin
   */
  public record Bin(double fromOhm, double toOhm, int boards) {}

  /**
   * @param worst every tolerance at its end, the worse way
   * @param rss each tolerance's single effect, added as root of the sum of squares
   * @param monteCarlo95 what 95 of 100 boards keep, of seeded random boards
   */
  public record Share(OptionalDouble worst, OptionalDouble rss, OptionalDouble monteCarlo95) {
    public static final Share ABSENT =
        new Share(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());

    static Share of(double worst, double rss, double monteCarlo95) {
      return new Share(
          OptionalDouble.of(worst), OptionalDouble.of(rss), OptionalDouble.of(monteCarlo95));
    }
  }
}
