package etchloom.electric.resistance;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.PriorityQueue;
import java.util.TreeMap;

/**
 * A resistor network reduced onto a few of its nodes, exactly: each other node is replaced by
 * conductances between its neighbours (star to mesh), those with the fewest neighbours first.
 *
 * <p>This is Gauss elimination of the node equations in minimum-degree order. Windings are chains
 * with a few branches, so nearly all nodes have one or two neighbours when their turn comes and the
 * cost is about linear. Every conductance is positive, so nothing cancels.
 */
final class Reduction {
  private final List<TreeMap<Integer, Double>> siemens = new ArrayList<>();
  private final boolean[] kept;
  private final List<Integer> order = new ArrayList<>();

  /**
   * @param nodes number of nodes
   * @param keep the nodes that stay
   */
  Reduction(int nodes, List<int[]> ends, List<Double> ohms, int... keep) {
    for (int i = 0; i < nodes; i++) {
      siemens.add(new TreeMap<>());
    }
    for (int e = 0; e < ends.size(); e++) {
      join(ends.get(e)[0], ends.get(e)[1], 1 / ohms.get(e));
    }
    kept = new boolean[nodes];
    for (int k : keep) {
      kept[k] = true;
    }
    eliminate();
  }

  private void join(int a, int b, double g) {
    if (a != b) {
      siemens.get(a).merge(b, g, Double::sum);
      siemens.get(b).merge(a, g, Double::sum);
    }
  }

  private record Turn(int degree, int node) implements Comparable<Turn> {
    @Override
    public int compareTo(Turn o) {
      return degree != o.degree ? Integer.compare(degree, o.degree) : Integer.compare(node, o.node);
    }
  }

  private void eliminate() {
    PriorityQueue<Turn> queue = new PriorityQueue<>();
    boolean[] gone = new boolean[kept.length];
    for (int i = 0; i < kept.length; i++) {
      if (!kept[i]) {
        queue.add(new Turn(siemens.get(i).size(), i));
      }
    }
    while (!queue.isEmpty()) {
      Turn turn = queue.poll();
      int node = turn.node();
      if (gone[node] || siemens.get(node).size() != turn.degree()) {
        continue;
      }
      gone[node] = true;
      order.add(node);
      for (int neighbour : dissolve(node)) {
        if (!kept[neighbour]) {
          queue.add(new Turn(siemens.get(neighbour).size(), neighbour));
        }
      }
    }
  }

  /** Takes a node out; its own map stays as it was, for {@link #volts}. */
  private List<Integer> dissolve(int node) {
    TreeMap<Integer, Double> star = siemens.get(node);
    double total = sum(star);
    List<Integer> neighbours = new ArrayList<>(star.keySet());
    for (int a : neighbours) {
      siemens.get(a).remove(node);
    }
    for (int i = 0; i < neighbours.size(); i++) {
      for (int j = i + 1; j < neighbours.size(); j++) {
        int a = neighbours.get(i);
        int b = neighbours.get(j);
        join(a, b, star.get(a) / total * star.get(b));
      }
    }
    return neighbours;
  }

  /** Conductance between two kept nodes after the reduction, S; 0 if none joins them. */
  double siemens(int a, int b) {
    return siemens.get(a).getOrDefault(b, 0.0);
  }

  /**
   * Fills in the voltages of the eliminated nodes from those of the kept ones. A node that joins no
   * other gets 0.
   */
  void volts(double[] volt) {
    for (int i = order.size() - 1; i >= 0; i--) {
      Map<Integer, Double> star = siemens.get(order.get(i));
      double total = sum(star);
      double v = 0;
      for (Map.Entry<Integer, Double> e : star.entrySet()) {
        v += e.getValue() / total * volt[e.getKey()];
      }
      volt[order.get(i)] = v;
    }
  }

  private static double sum(Map<Integer, Double> star) {
    double total = 0;
    for (double g : star.values()) {
      total += g;
    }
    return total;
  }
}
