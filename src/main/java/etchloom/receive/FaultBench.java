package etchloom.receive;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.Edge;
import etchloom.electric.resistance.Network;
import etchloom.electric.resistance.Node;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;

/** Sets faults in a network of the drawn board, one at a time. */
final class FaultBench {
  /** A share of a resistance that stands for none: a network has no resistors of nought. */
  private static final double NOTHING = 1e-9;

  /** Lines of one winding differ by less for their rim's sake; the star point's by far more. */
  private static final double SEEN = 0.2;

  private final Artwork artwork;
  private final Pairs pairs;
  private final Network sound;

  FaultBench(Artwork artwork, Pairs pairs) {
    this.artwork = artwork;
    this.pairs = pairs;
    sound = Network.of(artwork, Copper.REFERENCE_C);
  }

  double[] sound() {
    return pairs.ohms(sound);
  }

  List<PhaseShift> shifts() {
    List<PhaseShift> out = new ArrayList<>();
    for (Phase p : artwork.phases()) {
      Set<Integer> ids = conductors(p);
      double[] shorted = pairs.ohms(sound.with(scaled(ids, NOTHING)));
      out.add(new PhaseShift(p.mark(), shorted, sound(), pairs.ohms(without(ids))));
    }
    return out;
  }

  private static Set<Integer> conductors(Phase p) {
    return p.steps().stream().map(Phase.Step::conductor).collect(Collectors.toSet());
  }

  private List<Edge> scaled(Set<Integer> ids, double factor) {
    return sound.edges().stream()
        .map(
            e ->
                e.conductor().isPresent() && ids.contains(e.conductor().getAsInt())
                    ? new Edge(e.from(), e.to(), e.ohm() * factor, e.conductor())
                    : e)
        .toList();
  }

  private Network without(Set<Integer> ids) {
    return sound.with(
        sound.edges().stream()
            .filter(e -> e.conductor().isEmpty() || !ids.contains(e.conductor().getAsInt()))
            .toList());
  }

  /** Each phase broken, and each terminal torn off. */
  List<Suspect> breaks() {
    List<Suspect> out = new ArrayList<>();
    for (Phase p : artwork.phases()) {
      double[] ohm = pairs.ohms(without(conductors(p)));
      out.add(new Suspect(Cause.OPEN_PHASE, "phase " + p.mark(), ohm));
    }
    for (Joint t : artwork.terminals()) {
      out.add(new Suspect(Cause.OPEN_PHASE, "terminal " + t.mark(), pairs.ohms(without(at(t)))));
    }
    return out;
  }

  private Set<Integer> at(Joint terminal) {
    return artwork.conductors().stream()
        .filter(c -> c.fromJoint() == terminal.id() || c.toJoint() == terminal.id())
        .map(Conductor::id)
        .collect(Collectors.toCollection(TreeSet::new));
  }

  /** Every two phases broken at once. */
  List<Suspect> doubleBreaks() {
    List<Suspect> out = new ArrayList<>();
    List<Phase> phases = artwork.phases();
    for (int i = 0; i < phases.size(); i++) {
      for (int j = i + 1; j < phases.size(); j++) {
        Set<Integer> ids = new TreeSet<>(conductors(phases.get(i)));
        ids.addAll(conductors(phases.get(j)));
        String where = "phases " + phases.get(i).mark() + " and " + phases.get(j).mark();
        out.add(new Suspect(Cause.OPEN_PHASE, where, pairs.ohms(without(ids))));
      }
    }
    return out;
  }

  /** Every two terminals changed for each other, where that can be seen at all. */
  List<Suspect> swaps() {
    List<Suspect> out = new ArrayList<>();
    double[] ohm = sound();
    for (int a = 0; a < pairs.terminals(); a++) {
      for (int b = a + 1; b < pairs.terminals(); b++) {
        double[] swapped = pairs.swapped(ohm, a, b);
        if (differs(ohm, swapped)) {
          String where = pairs.mark(a) + " and " + pairs.mark(b);
          out.add(new Suspect(Cause.SWAPPED_TERMINALS, where, swapped));
        }
      }
    }
    return out;
  }

  private static boolean differs(double[] a, double[] b) {
    for (int p = 0; p < a.length; p++) {
      boolean open = Double.isInfinite(a[p]);
      if (open != Double.isInfinite(b[p]) || (!open && Math.abs(a[p] / b[p] - 1) > SEEN)) {
        return true;
      }
    }
    return false;
  }

  /**
   * In the first coil of every phase, each two layers that lie on each other touch where that takes
   * the most copper out of the way.
   */
  List<Suspect> shorts() {
    List<Suspect> out = new ArrayList<>();
    for (Phase p : artwork.phases()) {
      Coil coil =
          artwork.coils().stream()
              .filter(c -> c.phase().equals(p.mark()))
              .findFirst()
              .orElseThrow();
      for (int i = 0; i + 1 < coil.conductors().size(); i++) {
        Conductor upper = artwork.conductors().get(coil.conductors().get(i));
        Conductor lower = artwork.conductors().get(coil.conductors().get(i + 1));
        out.add(new Suspect(Cause.SHORTED_LAYERS, "phase " + p.mark(), worstShort(upper, lower)));
      }
    }
    return out;
  }

  private double[] worstShort(Conductor upper, Conductor lower) {
    double[] worst = sound();
    double least = Double.POSITIVE_INFINITY;
    for (int a : new int[] {upper.fromJoint(), upper.toJoint()}) {
      for (int b : new int[] {lower.fromJoint(), lower.toJoint()}) {
        double[] ohm =
            a == b ? worst : shorted(new Node(a, upper.layer()), new Node(b, lower.layer()));
        double sum = java.util.Arrays.stream(ohm).filter(Double::isFinite).sum();
        if (sum < least) {
          least = sum;
          worst = ohm;
        }
      }
    }
    return worst;
  }

  private double[] shorted(Node a, Node b) {
    double least = sound.edges().stream().mapToDouble(Edge::ohm).min().orElseThrow();
    List<Edge> edges = new ArrayList<>(sound.edges());
    edges.add(new Edge(a, b, least * NOTHING, OptionalInt.empty()));
    return pairs.ohms(sound.with(edges));
  }
}
