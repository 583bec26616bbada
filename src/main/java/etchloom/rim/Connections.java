package etchloom.rim;

import etchloom.spec.Spec;
import etchloom.winding.PhaseCoil;
import etchloom.winding.Winding;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * What is to be joined with what: the phases' chains, and the links between coils and terminals.
 */
record Connections(List<Chain> chains, List<Link> links) {
  Connections {
    chains = List.copyOf(chains);
    links = List.copyOf(links);
  }

  /** The terminals' marks in counter-clockwise order along the row. */
  static List<String> marks(Winding winding, Spec.Connection connection, boolean starPointOut) {
    List<String> out = new ArrayList<>();
    winding.marks().forEach(m -> out.add(m + "1"));
    if (connection == Spec.Connection.OPEN) {
      winding.marks().forEach(m -> out.add(m + "2"));
    }
    if (connection == Spec.Connection.STAR && starPointOut) {
      out.add("N");
    }
    return out;
  }

  /**
   * @param angle angle of a pin
   * @param terminalAngle angle of the terminal with a mark
   * @param counterClockwise which way round the chains run
   */
  static Connections make(
      Winding winding,
      Spec.Connection connection,
      boolean starPointOut,
      ToDoubleFunction<Pin> angle,
      ToDoubleFunction<String> terminalAngle,
      boolean counterClockwise) {
    List<Chain> chains = new ArrayList<>();
    for (int p = 0; p < winding.phases(); p++) {
      int phase = p;
      List<PhaseCoil> coils = winding.sequence().stream().filter(c -> c.phase() == phase).toList();
      String mark = winding.marks().get(p);
      double target = terminalAngle.applyAsDouble(mark + "1");
      chains.add(chain(mark, coils, target, angle, counterClockwise));
    }
    List<Link> links = new ArrayList<>();
    chains.forEach(c -> betweenCoils(c, links));
    switch (connection) {
      case STAR -> star(chains, starPointOut, links);
      case DELTA -> delta(chains, links);
      case OPEN -> open(chains, links);
    }
    return new Connections(chains, links);
  }

  private static Chain chain(
      String mark,
      List<PhaseCoil> coils,
      double target,
      ToDoubleFunction<Pin> angle,
      boolean counterClockwise) {
    int first = 0;
    double best = Double.POSITIVE_INFINITY;
    for (int i = 0; i < coils.size(); i++) {
      double off = Math.abs(Angles.signed(angle.applyAsDouble(entry(coils.get(i))) - target));
      if (off < best - Angles.SAME) {
        best = off;
        first = i;
      }
    }
    int n = coils.size();
    List<Pin> entries = new ArrayList<>();
    List<Pin> exits = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      PhaseCoil c = coils.get(Math.floorMod(first + (counterClockwise ? i : -i), n));
      entries.add(entry(c));
      exits.add(exit(c));
    }
    return new Chain(mark, entries, exits);
  }

  private static Pin entry(PhaseCoil c) {
    return new Pin(c.coil(), c.sign() > 0);
  }

  private static Pin exit(PhaseCoil c) {
    return new Pin(c.coil(), c.sign() < 0);
  }

  private static void betweenCoils(Chain c, List<Link> links) {
    for (int i = 0; i + 1 < c.entries().size(); i++) {
      Pin a = c.exits().get(i);
      Pin b = c.entries().get(i + 1);
      String what = "coil " + a.coil() + " to coil " + b.coil();
      links.add(new Link(c.phase(), List.of(a, b), Optional.empty(), what));
    }
  }

  private static void star(List<Chain> chains, boolean starPointOut, List<Link> links) {
    for (Chain c : chains) {
      links.add(terminal(c.phase(), List.of(c.first()), c.phase() + "1"));
    }
    List<Pin> ends = chains.stream().map(Chain::last).toList();
    links.add(new Link("", ends, starPointOut ? Optional.of("N") : Optional.empty(), "star point"));
  }

  /** U2 joins V1, V2 joins W1, W2 joins U1. */
  private static void delta(List<Chain> chains, List<Link> links) {
    int n = chains.size();
    for (int i = 0; i < n; i++) {
      Chain c = chains.get(i);
      Pin before = chains.get((i + n - 1) % n).last();
      links.add(terminal("", List.of(c.first(), before), c.phase() + "1"));
    }
  }

  private static void open(List<Chain> chains, List<Link> links) {
    for (Chain c : chains) {
      links.add(terminal(c.phase(), List.of(c.first()), c.phase() + "1"));
    }
    for (Chain c : chains) {
      links.add(terminal(c.phase(), List.of(c.last()), c.phase() + "2"));
    }
  }

  private static Link terminal(String phase, List<Pin> pins, String mark) {
    List<Pin> sorted = pins.stream().sorted(Comparator.comparingInt(Pin::coil)).toList();
    return new Link(phase, sorted, Optional.of(mark), "terminal " + mark);
  }
}
