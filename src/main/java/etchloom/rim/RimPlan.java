package etchloom.rim;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** The rim decided, not yet drawn: links, rings, exits and lanes. */
record RimPlan(
    RimSize size,
    Connections connections,
    TerminalRow row,
    List<RingArc> arcs,
    Rings rings,
    Map<String, Double> exits,
    Map<String, Integer> lanes) {
  RimPlan {
    arcs = List.copyOf(arcs);
    exits = Map.copyOf(exits);
    lanes = Map.copyOf(lanes);
  }

  /** The plan for one way round, or empty where the terminals' links find no way out. */
  static Optional<RimPlan> make(RimSize size, TerminalRow row, Connections connections) {
    List<Double> radials = new ArrayList<>();
    for (int coil = 1; coil <= size.coils(); coil++) {
      radials.add(Angles.positive(size.pinAngleRad(new Pin(coil, true))));
      radials.add(Angles.positive(size.pinAngleRad(new Pin(coil, false))));
    }
    double middle = size.terminals().startRad();
    List<Exits.Wish> wishes =
        row.spots().stream()
            .map(s -> new Exits.Wish(s.at().angleRad(), own(size, connections, s.mark())))
            .toList();
    return Exits.choose(wishes, radials, size.clearRad(), middle)
        .map(exits -> withExits(size, row, connections, exits));
  }

  private static List<Double> own(RimSize size, Connections connections, String mark) {
    return linkOf(connections, mark).pins().stream().map(size::pinAngleRad).toList();
  }

  private static RimPlan withExits(
      RimSize size, TerminalRow row, Connections connections, List<Double> exits) {
    Map<String, Double> exitOf = new TreeMap<>();
    for (int i = 0; i < exits.size(); i++) {
      exitOf.put(row.spots().get(i).mark(), exits.get(i));
    }
    List<RingArc> arcs = new ArrayList<>();
    for (Link link : connections.links()) {
      List<RingArc.Stop> stops = new ArrayList<>();
      link.pins().forEach(p -> stops.add(new RingArc.Stop(size.pinAngleRad(p), p.coil())));
      link.terminal().ifPresent(m -> stops.add(new RingArc.Stop(exitOf.get(m), size.coils() + 1)));
      arcs.add(RingArc.over(link, stops));
    }
    double margin = size.clearRad() / 2;
    Rings rings = Rings.deal(arcs, margin);
    List<Double> targets = row.spots().stream().map(s -> s.at().angleRad()).toList();
    List<Integer> lanes = Lane.deal(exits, targets, margin);
    Map<String, Integer> laneOf = new TreeMap<>();
    for (int i = 0; i < lanes.size(); i++) {
      laneOf.put(row.spots().get(i).mark(), lanes.get(i));
    }
    return new RimPlan(size, connections, row, arcs, rings, exitOf, laneOf);
  }

  private static Link linkOf(Connections connections, String mark) {
    return connections.links().stream()
        .filter(l -> l.terminal().equals(Optional.of(mark)))
        .findFirst()
        .orElseThrow();
  }

  Link linkOf(String mark) {
    return linkOf(connections, mark);
  }

  double exitRad(String mark) {
    return exits.get(mark);
  }

  double ringRadiusMm(RingArc arc) {
    for (int i = 0; i < rings.rings().size(); i++) {
      if (rings.rings().get(i).contains(arc)) {
        return size.ringMm(i);
      }
    }
    throw new IllegalArgumentException("the arc of " + arc.link().what() + " is on no ring");
  }

  /** Outer edge of all copper up to the last ring. */
  double ringsEdgeMm() {
    int n = rings.rings().size();
    return n == 0
        ? size.nodeRadiusMm() + size.wideMm() / 2
        : size.ringMm(n - 1) + size.wideMm() / 2;
  }

  Optional<Double> laneRadiusMm(String mark) {
    int lane = lanes.get(mark);
    return lane < 0 ? Optional.empty() : Optional.of(laneRadiusMm(lane));
  }

  private double laneRadiusMm(int lane) {
    // A lead that bends over its own drop's row of vias narrows the gap short of the lane.
    double notch = size.viaCount() > 1 ? size.spaceMm() / 2 : 0;
    return ringsEdgeMm()
        + size.spaceMm()
        + notch
        + size.trackMm() / 2
        + lane * (size.trackMm() + size.spaceMm());
  }

  /** Outer edge of all copper short of the terminals' pads. */
  double leadsEdgeMm() {
    int most = lanes.values().stream().mapToInt(Integer::intValue).max().orElse(-1);
    return most < 0 ? ringsEdgeMm() : laneRadiusMm(most) + size.trackMm() / 2;
  }

  /**
   * By how much neighbouring leads are too near: they run radially, so they are nearest to each
   * other at the first lane, and to a pad beside the neighbour's.
   */
  double leadsShortMm() {
    double most = 0;
    List<TerminalRow.Spot> spots = row.spots();
    for (int i = 1; i < spots.size(); i++) {
      double a = spots.get(i - 1).at().norm();
      double b = spots.get(i).at().norm();
      double sin = Math.abs(spots.get(i - 1).at().cross(spots.get(i).at())) / (a * b);
      double leads = size.trackMm() + size.spaceMm() - laneRadiusMm(0) * sin;
      double pads =
          (size.terminals().padMm() + size.trackMm()) / 2 + size.spaceMm() - Math.min(a, b) * sin;
      most = Math.max(most, Math.max(leads, pads));
    }
    return most;
  }
}
