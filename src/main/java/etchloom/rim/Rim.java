package etchloom.rim;

import java.util.List;

/**
 * What the way round the coils came to.
 *
 * @param chains each phase's paths, their coils in current order
 * @param ringsUsed concentric rings on the bottom layer
 * @param ringsLeast the most links at one angle: no fewer rings can do
 * @param outermostMm outer edge of the outermost ring's copper
 */
public record Rim(List<PhaseChain> chains, int ringsUsed, int ringsLeast, double outermostMm) {
  public Rim {
    chains = List.copyOf(chains);
  }

  /**
   * @param paths of each of its parallel paths the coil numbers in the order in which the phase
   *     current passes them
   */
  public record PhaseChain(String phase, List<List<Integer>> paths) {
    public PhaseChain {
      paths = paths.stream().map(List::copyOf).toList();
    }
  }
}
