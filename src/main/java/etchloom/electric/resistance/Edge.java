package etchloom.electric.resistance;

import java.util.OptionalInt;

/**
 * One resistor of the network: a conductor of the artwork, or the stretch of a plated barrel
 * between two layers.
 *
 * @param from a conductor's start, or the upper layer of a barrel
 * @param conductor id in the artwork; empty for a barrel
 */
public record Edge(Node from, Node to, double ohm, OptionalInt conductor) {
  public Edge {
    if (!(ohm > 0 && ohm < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException("a resistor of " + ohm + " ohm from " + from);
    }
  }

  public boolean barrel() {
    return conductor.isEmpty();
  }
}
