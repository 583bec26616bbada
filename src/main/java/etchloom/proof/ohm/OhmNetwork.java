package etchloom.proof.ohm;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.PriorityQueue;
import java.util.TreeMap;

/**
 * Resistors between nodes, reduced to what is wanted by star-mesh transformation: a node with
 * conductances g1 … gn is replaced by gi·gj/Σg between each two of its neighbours. Nodes with few
 * neighbours go first, so that chains of tracks cost N log N.
 *
 * <p>Source: A. Rosen, "A new network theorem", Journal of the IEE 62 (1924).
 */
final class OhmNetwork {
  private int nodes;
  private int[] same = new int[64];
  private final List<double[]> resistors = new ArrayList<>();

  int node() {
    if (nodes == same.length) {
      same = Arrays.copyOf(same, nodes * 2);
    }
    same[nodes] = nodes;
    return nodes++;
  }

  /** Makes two nodes one. */
  void join(int a, int b) {
    int x = find(a);
    int y = find(b);
    same[Math.max(x, y)] = Math.min(x, y);
  }

  void resistor(int a, int b, double ohm) {
    if (!(ohm >= 0 && Double.isFinite(ohm))) {
      throw new IllegalArgumentException("no resistor of " + ohm + " ohm");
    }
    if (ohm == 0) {
      join(a, b);
    } else {
      resistors.add(new double[] {a, b, ohm});
    }
  }

  private int find(int v) {
    int r = v;
    while (same[r] != r) {
      same[r] = same[same[r]];
      r = same[r];
    }
    return r;
  }

  private record Turn(int degree, int node) implements Comparable<Turn> {
    @Override
    public int compareTo(Turn o) {
      return degree != o.degree ? Integer.compare(degree, o.degree) : Integer.compare(node, o.node);
    }
  }

  /**
   * Resistance between each two of some nodes, Ω; empty where they are not joined.
   *
   * @param kept the nodes; the result is in the order (0,1), (0,2), … (1,2), …
   */
  List<OptionalDouble> between(int[] kept) {
    Map<Integer, TreeMap<Integer, Double>> star = stars();
    int[] ends = Arrays.stream(kept).map(this::find).toArray();
    for (int e : ends) {
      star.computeIfAbsent(e, k -> new TreeMap<>());
    }
    eliminate(star, Arrays.stream(ends).boxed().collect(java.util.stream.Collectors.toSet()));
    List<OptionalDouble> out = new ArrayList<>();
    for (int i = 0; i < ends.length; i++) {
      for (int j = i + 1; j < ends.length; j++) {
        out.add(ends[i] == ends[j] ? OptionalDouble.of(0) : pair(star, ends[i], ends[j]));
      }
    }
    return out;
  }

  private Map<Integer, TreeMap<Integer, Double>> stars() {
    Map<Integer, TreeMap<Integer, Double>> star = new TreeMap<>();
    for (double[] r : resistors) {
      int a = find((int) r[0]);
      int b = find((int) r[1]);
      if (a != b) {
        star.computeIfAbsent(a, k -> new TreeMap<>()).merge(b, 1 / r[2], Double::sum);
        star.computeIfAbsent(b, k -> new TreeMap<>()).merge(a, 1 / r[2], Double::sum);
      }
    }
    return star;
  }

  /** The network between the nodes kept, all others taken out. */
  private static void eliminate(
      Map<Integer, TreeMap<Integer, Double>> star, java.util.Set<Integer> kept) {
    PriorityQueue<Turn> turns = new PriorityQueue<>();
    star.forEach((v, s) -> turns.add(new Turn(s.size(), v)));
    while (!turns.isEmpty()) {
      Turn t = turns.remove();
      TreeMap<Integer, Double> s = star.get(t.node());
      if (kept.contains(t.node()) || s == null || s.size() != t.degree()) {
        continue; // kept, gone, or in the queue again with its new degree
      }
      star.remove(t.node());
      double sum = 0;
      for (double g : s.values()) {
        sum += g;
      }
      List<Map.Entry<Integer, Double>> all = new ArrayList<>(s.entrySet());
      for (Map.Entry<Integer, Double> a : all) {
        star.get(a.getKey()).remove(t.node());
      }
      for (int i = 0; i < all.size(); i++) {
        for (int j = i + 1; j < all.size(); j++) {
          double g = all.get(i).getValue() * all.get(j).getValue() / sum;
          star.get(all.get(i).getKey()).merge(all.get(j).getKey(), g, Double::sum);
          star.get(all.get(j).getKey()).merge(all.get(i).getKey(), g, Double::sum);
        }
      }
      for (Map.Entry<Integer, Double> a : all) {
        turns.add(new Turn(star.get(a.getKey()).size(), a.getKey()));
      }
    }
  }

  private static OptionalDouble pair(Map<Integer, TreeMap<Integer, Double>> reduced, int a, int b) {
    Map<Integer, TreeMap<Integer, Double>> copy = new TreeMap<>();
    reduced.forEach((v, s) -> copy.put(v, new TreeMap<>(s)));
    eliminate(copy, java.util.Set.of(a, b));
    Double g = copy.get(a).get(b);
    return g == null ? OptionalDouble.empty() : OptionalDouble.of(1 / g);
  }
}
