package etchloom.electric.resistance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Phase;
import java.util.Set;
import java.util.TreeSet;

/**
 * One coil, or one phase, taken out of the board, and how one ampere through it shares out.
 *
 * <p>A coil runs from its start to its finish: its spirals and the holes between them. A phase runs
 * from its entry to its exit: coils, their holes, and the links between coils; leads to terminals,
 * star and delta copper, and the barrels of its entry and exit joints are left out.
 */
public final class Chains {
  private Chains() {}

  /** One ampere from the coil's start to its finish. */
  public static Currents coil(Artwork artwork, Coil coil, double tempC) {
    return run(
        artwork,
        new TreeSet<>(coil.copper()),
        coil.startJoint(),
        coil.finishJoint(),
        "coil " + coil.number(),
        tempC);
  }

  /** One ampere from the phase's entry to its exit. */
  public static Currents phase(Artwork artwork, Phase phase, double tempC) {
    Set<Integer> ids = new TreeSet<>();
    phase.steps().forEach(s -> ids.add(s.conductor()));
    return run(artwork, ids, phase.entryJoint(), phase.exitJoint(), "phase " + phase.mark(), tempC);
  }

  private static Currents run(
      Artwork artwork, Set<Integer> ids, int from, int to, String what, double tempC) {
    return Network.ofConductors(artwork, ids, tempC)
        .currents(top(artwork, ids, from, what), top(artwork, ids, to, what))
        .orElseThrow(() -> new IllegalStateException(what + " is not one piece of copper"));
  }

  /** The joint's pad on the uppermost layer where one of the conductors ends at it. */
  private static Node top(Artwork artwork, Set<Integer> ids, int joint, String what) {
    int layer = Integer.MAX_VALUE;
    for (int id : ids) {
      Conductor c = artwork.conductors().get(id);
      if (c.fromJoint() == joint || c.toJoint() == joint) {
        layer = Math.min(layer, c.layer());
      }
    }
    if (layer == Integer.MAX_VALUE) {
      throw new IllegalStateException(what + " has no copper at joint " + joint);
    }
    return new Node(joint, layer);
  }
}
