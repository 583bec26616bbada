package etchloom.electric.machine;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Losses at the duty, W.
 *
 * @param atC the copper's temperature they hold for, °C
 * @param copperWatt I²R without ripple
 * @param eddyWatt in all copper
 * @param rippleWatt I²R of the PWM ripple at its worst
 * @param circulatingWatt round a delta
 * @param eddyByOrder the field's odd orders that matter
 * @param eddyByLayer L1 first
 */
public record LossFigures(
    double atC,
    OptionalDouble copperWatt,
    OptionalDouble eddyWatt,
    OptionalDouble rippleWatt,
    OptionalDouble circulatingWatt,
    List<Part> eddyByOrder,
    List<Part> eddyByLayer) {
  public LossFigures {
    eddyByOrder = List.copyOf(eddyByOrder);
    eddyByLayer = List.copyOf(eddyByLayer);
  }

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
