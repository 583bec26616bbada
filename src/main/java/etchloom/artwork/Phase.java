package etchloom.artwork;

import java.util.List;

/**
 * One phase as a chain from its entry to its exit: coils and the links between them, leads and
 * shared star or delta copper left out.
 *
 * @param steps the conductors in the order in which the phase current passes them; conductors that
 *     run side by side from one joint to the next follow each other
 */
public record Phase(String mark, int entryJoint, int exitJoint, List<Step> steps) {
  public Phase {
    steps = List.copyOf(steps);
  }

  /**
   * @param forward whether the current runs along the conductor's path
   */
  public record Step(int conductor, boolean forward) {}
}
