package etchloom.electric.machine.emf;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.electric.resistance.Chains;
import etchloom.electric.resistance.Currents;
import etchloom.electric.resistance.Network;
import etchloom.electric.resistance.Node;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The whole way of one phase's current: from its terminal over the lead to the phase, and on to the
 * star point, the next corner of the delta or its second terminal, with the holes between.
 *
 * <p>The voltage of a source spread over a network, seen from two nodes, is the sum of each
 * branch's voltage times its share of an ampere sent through those nodes (reciprocity); so shares
 * from the resistor network serve branches in parallel as well.
 *
 * <p>Where a star point stays inside, any joint of its ring will do: the ring runs along the
 * turning and holds no voltage.
 */
final class PhaseCopper {
  private final Artwork artwork;
  private final Set<Integer> ofPhases = new TreeSet<>();
  private final Map<Integer, List<Conductor>> restAt = new TreeMap<>();

  PhaseCopper(Artwork artwork) {
    this.artwork = artwork;
    artwork.phases().forEach(p -> p.steps().forEach(s -> ofPhases.add(s.conductor())));
    for (Conductor c : artwork.conductors()) {
      if (!ofPhases.contains(c.id())) {
        restAt.computeIfAbsent(c.fromJoint(), k -> new ArrayList<>()).add(c);
        restAt.computeIfAbsent(c.toJoint(), k -> new ArrayList<>()).add(c);
      }
    }
  }

  /** One ampere through the phase and its leads, none through other phases. */
  Currents shares(Phase phase) {
    Set<Integer> ids = new TreeSet<>();
    phase.steps().forEach(s -> ids.add(s.conductor()));
    Set<Integer> before = reach(phase.entryJoint());
    Set<Integer> behind = reach(phase.exitJoint());
    for (Conductor c : artwork.conductors()) {
      if (!ofPhases.contains(c.id())
          && (before.contains(c.fromJoint()) || behind.contains(c.fromJoint()))) {
        ids.add(c.id());
      }
    }
    Node from = node(end(before, phase.entryJoint()), ids);
    Node to = node(end(behind, phase.exitJoint()), ids);
    if (from.equals(to)) {
      return Chains.phase(artwork, phase, 20);
    }
    return Network.ofConductors(artwork, ids, 20)
        .currents(from, to)
        .orElseThrow(
            () -> new IllegalStateException("phase " + phase.mark() + " is not one piece"));
  }

  /** The joints that copper of no phase joins to one, itself included. */
  private Set<Integer> reach(int joint) {
    Set<Integer> seen = new TreeSet<>(Set.of(joint));
    Deque<Integer> open = new ArrayDeque<>(seen);
    while (!open.isEmpty()) {
      for (Conductor c : restAt.getOrDefault(open.remove(), List.of())) {
        for (int next : new int[] {c.fromJoint(), c.toJoint()}) {
          if (seen.add(next)) {
            open.add(next);
          }
        }
      }
    }
    return seen;
  }

  /** The terminal among some joints, else the first hole on a ring, else the phase's own end. */
  private int end(Set<Integer> reached, int own) {
    Optional<Joint> terminal =
        artwork.terminals().stream().filter(t -> reached.contains(t.id())).findFirst();
    if (terminal.isPresent()) {
      return terminal.get().id();
    }
    if (artwork.joints().get(own).kind() == Joint.Kind.DROP) {
      return own;
    }
    return reached.stream()
        .filter(id -> artwork.joints().get(id).kind() == Joint.Kind.DROP)
        .findFirst()
        .orElse(own);
  }

  private Node node(int joint, Set<Integer> ids) {
    int layer = Integer.MAX_VALUE;
    for (int id : ids) {
      Conductor c = artwork.conductors().get(id);
      if (c.fromJoint() == joint || c.toJoint() == joint) {
        layer = Math.min(layer, c.layer());
      }
    }
    return layer == Integer.MAX_VALUE
        ? Network.terminalNode(artwork.joints().get(joint))
        : new Node(joint, layer);
  }
}
