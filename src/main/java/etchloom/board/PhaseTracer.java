package etchloom.board;

import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.CopperBuilder;
import etchloom.artwork.Feature;
import etchloom.artwork.Phase;
import etchloom.rim.Rim;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Follows each phase from its entry to its exit, through its coils and the links between them. */
final class PhaseTracer {
  private final CopperBuilder copper;
  private final List<Coil> coils;
  private final Map<Integer, List<Conductor>> rimAt = new HashMap<>();

  private PhaseTracer(CopperBuilder copper, List<Coil> coils) {
    this.copper = copper;
    this.coils = coils;
    for (Conductor c : copper.conductors()) {
      boolean coil =
          c.what().kind() == Feature.Kind.SPIRAL
              || (c.what().kind() == Feature.Kind.LINK && c.what().coil() > 0);
      if (!coil) {
        rimAt.computeIfAbsent(c.fromJoint(), k -> new ArrayList<>()).add(c);
        rimAt.computeIfAbsent(c.toJoint(), k -> new ArrayList<>()).add(c);
      }
    }
  }

  static List<Phase> trace(CopperBuilder copper, List<Coil> coils, Rim rim) {
    PhaseTracer t = new PhaseTracer(copper, coils);
    return rim.chains().stream().map(t::trace).toList();
  }

  private Phase trace(Rim.PhaseChain chain) {
    List<List<Integer>> paths = chain.paths();
    int entry = entry(paths.get(0).get(0));
    int exit = exit(last(paths.get(0)));
    if (paths.size() > 1) {
      entry = gathering(entry);
      exit = gathering(exit);
    }
    List<Phase.Step> steps = new ArrayList<>();
    List<Integer> starts = new ArrayList<>();
    for (List<Integer> path : paths) {
      starts.add(steps.size());
      int at = entry;
      for (int number : path) {
        link(at, entry(number), steps);
        through(coils.get(number - 1), steps);
        at = exit(number);
      }
      link(at, exit, steps);
    }
    return new Phase(chain.phase(), entry, exit, steps, starts);
  }

  private static int last(List<Integer> path) {
    return path.get(path.size() - 1);
  }

  private int entry(int number) {
    Coil c = coils.get(number - 1);
    return c.sign() > 0 ? c.startJoint() : c.finishJoint();
  }

  private int exit(int number) {
    Coil c = coils.get(number - 1);
    return c.sign() > 0 ? c.finishJoint() : c.startJoint();
  }

  /**
   * Where the ends of parallel paths count as joined: where the lead to their terminal leaves, else
   * the drop beside one of them.
   */
  private int gathering(int end) {
    Set<Integer> seen = new LinkedHashSet<>(List.of(end));
    Deque<Integer> open = new ArrayDeque<>(seen);
    int drop = end;
    while (!open.isEmpty()) {
      int at = open.remove();
      for (Conductor c : rimAt.getOrDefault(at, List.of())) {
        if (c.what().kind() == Feature.Kind.TERMINAL_TRACK) {
          return c.fromJoint();
        }
        int next = c.fromJoint() == at ? c.toJoint() : c.fromJoint();
        if (seen.add(next)) {
          open.add(next);
          drop = drop == end ? next : drop;
        }
      }
    }
    return drop;
  }

  private static void through(Coil c, List<Phase.Step> steps) {
    if (c.sign() > 0) {
      steps.addAll(c.way());
      return;
    }
    for (int i = c.way().size() - 1; i >= 0; i--) {
      Phase.Step s = c.way().get(i);
      steps.add(new Phase.Step(s.conductor(), !s.forward()));
    }
  }

  /** The shortest way over rim copper, in pieces. */
  private void link(int from, int to, List<Phase.Step> steps) {
    if (from == to) {
      return;
    }
    Map<Integer, Phase.Step> into = new HashMap<>();
    Deque<Integer> open = new ArrayDeque<>(List.of(from));
    while (!open.isEmpty() && !into.containsKey(to)) {
      int at = open.remove();
      for (Conductor c : rimAt.getOrDefault(at, List.of())) {
        boolean forward = c.fromJoint() == at;
        int next = forward ? c.toJoint() : c.fromJoint();
        if (next != from && into.putIfAbsent(next, new Phase.Step(c.id(), forward)) == null) {
          open.add(next);
        }
      }
    }
    List<Phase.Step> way = new ArrayList<>();
    for (int at = to; at != from; ) {
      Phase.Step s = into.get(at);
      if (s == null) {
        throw new IllegalStateException("no link from joint " + from + " to joint " + to);
      }
      Conductor c = copper.conductors().get(s.conductor());
      int before = s.forward() ? c.fromJoint() : c.toJoint();
      way.addAll(0, sideBySide(before, at));
      at = before;
    }
    steps.addAll(way);
  }

  /** All rim copper from one joint to the next: the vias of one joint are joined on two layers. */
  private List<Phase.Step> sideBySide(int from, int to) {
    List<Phase.Step> out = new ArrayList<>();
    for (Conductor c : rimAt.get(from)) {
      if (c.fromJoint() == to || c.toJoint() == to) {
        out.add(new Phase.Step(c.id(), c.fromJoint() == from));
      }
    }
    return out;
  }
}
