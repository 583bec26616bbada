package etchloom.electric.resistance;

/**
 * A point of the network: a joint's pad on one layer.
 *
 * @param joint id of the joint
 * @param layer from 1
 */
public record Node(int joint, int layer) implements Comparable<Node> {
  @Override
  public int compareTo(Node o) {
    return joint != o.joint ? Integer.compare(joint, o.joint) : Integer.compare(layer, o.layer);
  }
}
