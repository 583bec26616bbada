package etchloom.electric.resistance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The copper as resistors between nodes, a node being a joint's pad on one layer.
 *
 * <p>Every conductor is one resistor; every plated hole is one resistor between each two layers
 * next to each other among those where a conductor reaches it, as long as the two layers' copper is
 * apart, middle to middle. Solved exactly, for any shape of network: series, star, delta, parallel.
 */
public final class Network {
  /** A share of the current below this is rounding: no copper of a board takes so little. */
  private static final double NO_CURRENT = 1e-9;

  private final Artwork artwork;
  private final Map<Node, Integer> index;
  private final List<Edge> edges;

  private Network(Artwork artwork, Map<Node, Integer> index, List<Edge> edges) {
    this.artwork = artwork;
    this.index = index;
    this.edges = List.copyOf(edges);
  }

  /** All the copper of a board at one temperature, °C. */
  public static Network of(Artwork artwork, double tempC) {
    return of(artwork, Variation.NONE, tempC);
  }

  /** All the copper of a board that came out different. */
  public static Network of(Artwork artwork, Variation variation, double tempC) {
    return build(artwork, artwork.conductors(), variation, tempC);
  }

  /**
   * Some of the conductors and the holes they meet at, for a coil or a phase on its own.
   *
   * @param ids the conductors' ids
   */
  public static Network ofConductors(Artwork artwork, Set<Integer> ids, double tempC) {
    List<Conductor> some = artwork.conductors().stream().filter(c -> ids.contains(c.id())).toList();
    return build(artwork, some, Variation.NONE, tempC);
  }

  private static Network build(
      Artwork artwork, List<Conductor> conductors, Variation variation, double tempC) {
    List<Edge> edges = new ArrayList<>();
    Set<Node> nodes = new TreeSet<>();
    for (Conductor c : conductors) {
      Node from = new Node(c.fromJoint(), c.layer());
      Node to = new Node(c.toJoint(), c.layer());
      double ohm = Tracks.ohm(c, artwork.stackup().copper().get(c.layer() - 1), variation, tempC);
      edges.add(new Edge(from, to, ohm, OptionalInt.of(c.id())));
      nodes.add(from);
      nodes.add(to);
    }
    addBarrels(artwork, variation, tempC, nodes, edges);
    Map<Node, Integer> index = new TreeMap<>();
    for (Node n : nodes) {
      index.put(n, index.size());
    }
    return new Network(artwork, index, edges);
  }

  /** The layers that the whole board uses at each joint, so that part networks cut holes alike. */
  private static Map<Integer, SortedSet<Integer>> layersAtJoints(Artwork artwork) {
    Map<Integer, SortedSet<Integer>> layers = new TreeMap<>();
    for (Conductor c : artwork.conductors()) {
      layers.computeIfAbsent(c.fromJoint(), k -> new TreeSet<>()).add(c.layer());
      layers.computeIfAbsent(c.toJoint(), k -> new TreeSet<>()).add(c.layer());
    }
    for (Joint t : artwork.terminals()) {
      layers.computeIfAbsent(t.id(), k -> new TreeSet<>()).add(t.firstLayer());
    }
    return layers;
  }

  private static void addBarrels(
      Artwork artwork, Variation variation, double tempC, Set<Node> nodes, List<Edge> edges) {
    Set<Integer> reached = new TreeSet<>();
    nodes.forEach(n -> reached.add(n.joint()));
    for (Map.Entry<Integer, SortedSet<Integer>> at : layersAtJoints(artwork).entrySet()) {
      Joint joint = artwork.joints().get(at.getKey());
      if (joint.hole().isEmpty() || !reached.contains(joint.id())) {
        continue;
      }
      double area = variation.barrelAreaMm2(joint.hole().get(), artwork.stackup().platingMm());
      Integer above = null;
      for (int layer : at.getValue()) {
        if (above != null) {
          double mm = artwork.stackup().heightMm(above) - artwork.stackup().heightMm(layer);
          Node from = new Node(joint.id(), above);
          Node to = new Node(joint.id(), layer);
          edges.add(new Edge(from, to, Section.ohm(mm, area, tempC), OptionalInt.empty()));
          nodes.add(from);
          nodes.add(to);
        }
        above = layer;
      }
    }
  }

  public List<Edge> edges() {
    return edges;
  }

  /**
   * The same nodes with other resistors between them, for boards with a fault.
   *
   * @param others between nodes of this network only
   */
  public Network with(List<Edge> others) {
    for (Edge e : others) {
      if (!index.containsKey(e.from()) || !index.containsKey(e.to())) {
        throw new IllegalArgumentException("no such nodes: " + e);
      }
    }
    return new Network(artwork, index, others);
  }

  /** Where a terminal is measured: its pad on the uppermost layer. */
  public static Node terminalNode(Joint terminal) {
    return new Node(terminal.id(), terminal.firstLayer());
  }

  /** Resistance between two terminals by their marks, Ω; empty where no copper joins them. */
  public OptionalDouble terminalOhm(String from, String to) {
    return ohm(terminalNode(terminal(from)), terminalNode(terminal(to)));
  }

  private Joint terminal(String mark) {
    return artwork.terminals().stream()
        .filter(t -> t.mark().equals(mark))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no terminal " + mark));
  }

  /** Resistance between two different nodes, Ω; empty where no copper joins them. */
  public OptionalDouble ohm(Node from, Node to) {
    if (!index.containsKey(from) || !index.containsKey(to)) {
      return OptionalDouble.empty();
    }
    double siemens = reduced(from, to).siemens(index.get(from), index.get(to));
    return siemens > 0 ? OptionalDouble.of(1 / siemens) : OptionalDouble.empty();
  }

  /** How one ampere from one node to another shares out; empty where no copper joins them. */
  public Optional<Currents> currents(Node from, Node to) {
    if (!index.containsKey(from) || !index.containsKey(to)) {
      return Optional.empty();
    }
    Reduction reduction = reduced(from, to);
    double siemens = reduction.siemens(index.get(from), index.get(to));
    if (!(siemens > 0)) {
      return Optional.empty();
    }
    double[] volt = new double[index.size()];
    volt[index.get(from)] = 1 / siemens;
    reduction.volts(volt);
    double[] ampere = new double[edges.size()];
    for (int i = 0; i < ampere.length; i++) {
      Edge e = edges.get(i);
      double a = (volt[index.get(e.from())] - volt[index.get(e.to())]) / e.ohm();
      ampere[i] = Math.abs(a) > NO_CURRENT ? a : 0;
    }
    return Optional.of(new Currents(edges, ampere, artwork.conductors().size(), 1 / siemens));
  }

  /** What some of the nodes see of the network: equal between any two of them, and small. */
  Network onto(List<Node> some) {
    List<Node> kept = some.stream().filter(index::containsKey).toList();
    Reduction reduction = reduced(kept.stream().mapToInt(index::get).toArray());
    List<Edge> between = new ArrayList<>();
    Map<Node, Integer> few = new TreeMap<>();
    for (Node a : kept) {
      for (Node b : few.keySet()) {
        double siemens = reduction.siemens(index.get(a), index.get(b));
        if (siemens > 0) {
          between.add(new Edge(b, a, 1 / siemens, OptionalInt.empty()));
        }
      }
      few.put(a, few.size());
    }
    return new Network(artwork, few, between);
  }

  private Reduction reduced(Node from, Node to) {
    if (from.equals(to)) {
      throw new IllegalArgumentException("a resistance needs two nodes, got " + from + " twice");
    }
    return reduced(index.get(from), index.get(to));
  }

  private Reduction reduced(int... keep) {
    return new Reduction(
        index.size(),
        edges.stream().map(e -> new int[] {index.get(e.from()), index.get(e.to())}).toList(),
        edges.stream().map(Edge::ohm).toList(),
        keep);
  }
}
