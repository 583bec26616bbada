package etchloom.rim;

import etchloom.artwork.CopperBuilder;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import etchloom.spec.Spec;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;

/** Draws a planned rim: rings on the bottom layer, radials, leads and terminals on L1. */
final class RimRouter {
  private final RimSize size;
  private final RimPlan plan;
  private final CopperBuilder copper;
  private final Function<Pin, Integer> jointOf;
  private final Function<Link, String> netOf;

  RimRouter(
      RimSize size,
      RimPlan plan,
      CopperBuilder copper,
      Function<Pin, Integer> jointOf,
      Function<Link, String> netOf) {
    this.size = size;
    this.plan = plan;
    this.copper = copper;
    this.jointOf = jointOf;
    this.netOf = netOf;
  }

  void draw() {
    Map<String, Integer> leaving = new TreeMap<>();
    for (RingArc arc : plan.arcs()) {
      Link link = arc.link();
      Map<Double, Integer> drops = arc.needsRing() ? ring(arc) : Map.of();
      for (Pin pin : link.pins()) {
        if (arc.needsRing()) {
          radial(link, pin, drops.get(nearest(drops, size.pinAngleRad(pin))));
        }
      }
      link.terminal()
          .ifPresent(
              mark -> {
                int from =
                    arc.needsRing()
                        ? drops.get(nearest(drops, plan.exitRad(mark)))
                        : jointOf.apply(link.pins().get(0));
                leaving.put(mark, from);
              });
    }
    for (TerminalRow.Spot spot : plan.row().spots()) {
      lead(spot, leaving.get(spot.mark()));
    }
  }

  private static double nearest(Map<Double, Integer> drops, double angle) {
    return drops.keySet().stream()
        .min(
            (a, b) ->
                Double.compare(
                    Math.abs(Angles.signed(a - angle)), Math.abs(Angles.signed(b - angle))))
        .orElseThrow();
  }

  /** The ring's arc with its drops; gives the joint at each drop's angle. */
  private Map<Double, Integer> ring(RingArc arc) {
    Link link = arc.link();
    String net = netOf.apply(link);
    double radius = plan.ringRadiusMm(arc);
    Map<Double, Integer> drops = new TreeMap<>();
    int before = -1;
    double angleBefore = 0;
    for (double stop : arc.stops()) {
      double angle = arc.startRad() + stop;
      int joint =
          copper.drilled(
              Joint.Kind.DROP,
              Point.polar(radius, angle),
              size.padMm(),
              size.holeMm(),
              size.layers(),
              net,
              "drop of " + link.what());
      drops.put(angle, joint);
      if (before >= 0) {
        Feature what = new Feature(Feature.Kind.RING, link.phase(), 0, List.of());
        Path path = between(before, joint, radius, angle - angleBefore);
        copper.track(size.layers(), size.trackMm(), path, before, joint, net, what);
      }
      before = joint;
      angleBefore = angle;
    }
    return drops;
  }

  /** An arc about the shaft from one joint to the next; more than half a turn in two pieces. */
  private Path between(int from, int to, double radius, double sweep) {
    Point a = copper.joint(from).at();
    Point b = copper.joint(to).at();
    if (sweep <= Math.PI / 2) {
      return Path.of(new Arc(a, b, Point.ORIGIN, true));
    }
    int pieces = (int) Math.ceil(sweep / (Math.PI / 2));
    PathBuilder p = new PathBuilder(a);
    for (int i = 1; i < pieces; i++) {
      Point next = Point.polar(radius, a.angleRad() + sweep * i / pieces);
      p.arcTo(next, Point.ORIGIN, true);
    }
    return p.arcTo(b, Point.ORIGIN, true).build();
  }

  private void radial(Link link, Pin pin, int drop) {
    int node = jointOf.apply(pin);
    Feature what = new Feature(Feature.Kind.RADIAL, link.phase(), pin.coil(), List.of());
    Path path = Path.of(new Line(copper.joint(node).at(), copper.joint(drop).at()));
    copper.track(1, size.trackMm(), path, node, drop, netOf.apply(link), what);
  }

  /** From the drop radially out to the lane, along it, and out to the terminal. */
  private void lead(TerminalRow.Spot spot, int from) {
    Link link = plan.linkOf(spot.mark());
    String net = netOf.apply(link);
    boolean drilled = size.terminals().kind() == Spec.TerminalKind.HOLE;
    Optional<Double> hole = drilled ? Optional.of(size.terminals().holeMm()) : Optional.empty();
    int to =
        copper.terminal(spot.at(), size.terminals().padMm(), hole, size.layers(), net, spot.mark());
    Feature what = new Feature(Feature.Kind.TERMINAL_TRACK, link.phase(), 0, List.of());
    copper.track(1, size.trackMm(), leadPath(spot, from), from, to, net, what);
  }

  private Path leadPath(TerminalRow.Spot spot, int from) {
    Point start = copper.joint(from).at();
    PathBuilder p = new PathBuilder(start);
    double turn = Angles.signed(spot.at().angleRad() - start.angleRad());
    Optional<Double> lane = plan.laneRadiusMm(spot.mark());
    if (lane.isPresent()) {
      new LeadBend(size.trackMm(), lane.get(), start, spot.at(), turn).addTo(p);
    }
    return p.lineTo(spot.at()).build();
  }
}
