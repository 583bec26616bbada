package etchloom.electric.resistance;

import java.util.List;

/** How one ampere that enters at one node and leaves at another shares out over the network. */
public final class Currents {
  private final List<Edge> edges;
  private final double[] ampere;
  private final double[] byConductor;
  private final double ohm;

  Currents(List<Edge> edges, double[] ampere, int conductors, double ohm) {
    this.edges = edges;
    this.ampere = ampere;
    this.ohm = ohm;
    byConductor = new double[conductors];
    for (int i = 0; i < ampere.length; i++) {
      int at = i;
      edges.get(i).conductor().ifPresent(id -> byConductor[id] = ampere[at]);
    }
  }

  /** The network's resistors, the same order as {@link #ofEdge}. */
  public List<Edge> edges() {
    return edges;
  }

  /** Current along edge {@code index} from its first node to its second, A per A. */
  public double ofEdge(int index) {
    return ampere[index];
  }

  /** Current along a conductor's path, A per A; nought where it takes no part. */
  public double ofConductor(int id) {
    return byConductor[id];
  }

  /** Resistance between the two nodes, Ω. */
  public double ohm() {
    return ohm;
  }
}
