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
record Connections(List<List<Chain>> phases, List<Link> links) {
  /** How many phases of six share a star point. */
  private static final int OF_A_SET = 3;

  Connections {
    phases = phases.stream().map(List::copyOf).toList();
    links = List.copyOf(links);
  }

  /**
   * How the phases are joined.
   *
   * @param starPointOut whether star points come out
   * @param paths parallel paths of each phase
   */
  record Scheme(Spec.Connection connection, boolean starPointOut, int paths) {}

  /** The terminals' marks in counter-clockwise order along the row. */
  static List<String> marks(Winding winding, Scheme scheme) {
    List<String> out = new ArrayList<>();
    winding.marks().forEach(m -> out.add(m + "1"));
    if (scheme.connection() == Spec.Connection.OPEN) {
      winding.marks().forEach(m -> out.add(m + "2"));
    }
    if (scheme.connection() == Spec.Connection.STAR && scheme.starPointOut()) {
      out.addAll(starPoints(winding.phases()));
    }
    return out;
  }

  /** The marks of the star points: one, or one for each set of three. */
  private static List<String> starPoints(int phases) {
    return phases == 2 * OF_A_SET ? List.of("1N", "2N") : List.of("N");
  }

  /**
   * @param angle angle of a pin
   * @param terminalAngle angle of the terminal with a mark
   * @param counterClockwise which way round the chains run
   */
  static Connections make(
      Winding winding,
      Scheme scheme,
      ToDoubleFunction<Pin> angle,
      ToDoubleFunction<String> terminalAngle,
      boolean counterClockwise) {
    List<List<Chain>> phases = new ArrayList<>();
    List<Link> links = new ArrayList<>();
    for (int p = 0; p < winding.phases(); p++) {
      String mark = winding.marks().get(p);
      List<PhaseCoil> coils = winding.coilsOf(p);
      double target = terminalAngle.applyAsDouble(mark + "1");
      int first = nearest(coils, target, angle);
      List<Chain> chains = new ArrayList<>();
      int n = coils.size() / scheme.paths();
      for (int k = 0; k < scheme.paths(); k++) {
        int from = first + (counterClockwise ? k * n : -k * n);
        chains.add(chain(mark, coils, from, n, counterClockwise));
      }
      chains.forEach(c -> betweenCoils(c, links));
      phases.add(chains);
    }
    switch (scheme.connection()) {
      case STAR -> star(phases, scheme.starPointOut(), links);
      case DELTA -> delta(phases, links);
      case OPEN -> open(phases, links);
    }
    return new Connections(phases, links);
  }

  /** The coil whose entry stands nearest to an angle. */
  private static int nearest(List<PhaseCoil> coils, double target, ToDoubleFunction<Pin> angle) {
    int first = 0;
    double best = Double.POSITIVE_INFINITY;
    for (int i = 0; i < coils.size(); i++) {
      double off = Math.abs(Angles.signed(angle.applyAsDouble(entry(coils.get(i))) - target));
      if (off < best - Angles.SAME) {
        best = off;
        first = i;
      }
    }
    return first;
  }

  private static Chain chain(
      String mark, List<PhaseCoil> coils, int from, int count, boolean counterClockwise) {
    List<Pin> entries = new ArrayList<>();
    List<Pin> exits = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      PhaseCoil c = coils.get(Math.floorMod(from + (counterClockwise ? i : -i), coils.size()));
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

  private static void star(List<List<Chain>> phases, boolean starPointOut, List<Link> links) {
    phases.forEach(p -> links.add(terminal(mark(p), firsts(p), mark(p) + "1")));
    List<String> points = starPoints(phases.size());
    int each = phases.size() / points.size();
    for (int i = 0; i < points.size(); i++) {
      List<Pin> ends =
          phases.subList(i * each, (i + 1) * each).stream()
              .flatMap(p -> lasts(p).stream())
              .toList();
      String n = points.get(i);
      String what = points.size() > 1 ? "star point " + n : "star point";
      links.add(new Link("", ends, starPointOut ? Optional.of(n) : Optional.empty(), what));
    }
  }

  /** U2 joins V1, V2 joins W1, W2 joins U1. */
  private static void delta(List<List<Chain>> phases, List<Link> links) {
    int n = phases.size();
    for (int i = 0; i < n; i++) {
      List<Pin> pins = new ArrayList<>(firsts(phases.get(i)));
      pins.addAll(lasts(phases.get((i + n - 1) % n)));
      links.add(terminal("", pins, mark(phases.get(i)) + "1"));
    }
  }

  private static void open(List<List<Chain>> phases, List<Link> links) {
    phases.forEach(p -> links.add(terminal(mark(p), firsts(p), mark(p) + "1")));
    phases.forEach(p -> links.add(terminal(mark(p), lasts(p), mark(p) + "2")));
  }

  private static String mark(List<Chain> phase) {
    return phase.get(0).phase();
  }

  private static List<Pin> firsts(List<Chain> phase) {
    return phase.stream().map(Chain::first).toList();
  }

  private static List<Pin> lasts(List<Chain> phase) {
    return phase.stream().map(Chain::last).toList();
  }

  private static Link terminal(String phase, List<Pin> pins, String mark) {
    List<Pin> sorted = pins.stream().sorted(Comparator.comparingInt(Pin::coil)).toList();
    return new Link(phase, sorted, Optional.of(mark), "terminal " + mark);
  }
}
