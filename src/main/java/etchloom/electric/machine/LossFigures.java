package etchloom.electric.machine;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Losses at the duty, W.
 *
 * @param atC the copper's temperature they hold for, °C
 * @param copperWatt I²R without ripple
 * @param eddyWatt in all copper
 * @param rippleWatt I²R of the PWM ripple at the modulation the duty needs; at its worst where that
 *     is not known
 * @param circulatingWatt round a delta
 * @param eddyByOrder the field's odd orders that matter
 * @param eddyByLayer L1 first
 * @param bySpeed the same losses at other speeds; empty where none of them depends on it
 */
public record LossFigures(
    double atC,
    OptionalDouble copperWatt,
    OptionalDouble eddyWatt,
    OptionalDouble rippleWatt,
    OptionalDouble circulatingWatt,
    List<Part> eddyByOrder,
    List<Part> eddyByLayer,
    List<AtSpeed> bySpeed) {
  public LossFigures {
    eddyByOrder = List.copyOf(eddyByOrder);
    eddyByLayer = List.copyOf(eddyByLayer);
    bySpeed = List.copyOf(bySpeed);
  }

  /** Losses at one speed, W, as in the whole; {@code totalWatt} of those known. */
  public record AtSpeed(
      double rpm,
      OptionalDouble copperWatt,
      double eddyWatt,
      OptionalDouble rippleWatt,
      OptionalDouble circulatingWatt,
      double totalWatt) {}

  /**
   * @param number an order or a layer
   */
  public record Part(int number, double watt) {}

  /** All that is known together, W. */
  public double totalWatt() {
    return copperWatt.orElse(0)
        + eddyWatt.orElse(0)
        + rippleWatt.orElse(0)
        + circulatingWatt.orElse(0);
  }
}
