package etchloom.electric.machine.spread;

import etchloom.spec.FabRules;

/**
 * The model of what a fab's tolerances do. A tolerance is a limit that three standard deviations
 * reach. Each layer draws its own track width and copper, each board its own plating. Within one
 * board, one coil's copper on a layer departs from its layer's by {@link #LOCAL} of that, and only
 * these local differences unbalance the phases. The split is our own assumption; no standard states
 * one.
 */
public record Tolerances(double track, double copper, double plating) {
  /** Share of a tolerance that is left between places on one layer of one board. */
  public static final double LOCAL = 0.25;

  /** Standard deviation of what a whole layer has in common, over the tolerance. */
  static final double LAYER_SIGMA = Math.sqrt(1 - LOCAL * LOCAL) / 3;

  static final double LOCAL_SIGMA = LOCAL / 3;

  static Tolerances of(FabRules.Tolerance t) {
    return new Tolerances(t.track(), t.copper(), t.plating());
  }
}
