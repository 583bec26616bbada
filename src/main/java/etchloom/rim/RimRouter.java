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
import java.util.ArrayList;
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
    double row = size.rowRad(radius);
    int before = -1;
    double angleBefore = 0;
    for (int i = 0; i < arc.stops().size(); i++) {
      boolean last = i > 0 && i == arc.stops().size() - 1;
      double angle = arc.startRad() + arc.stops().get(i);
      List<Integer> vias = drop(link, radius, angle, last ? -row : row, net);
      int here = vias.get(0);
      int far = vias.get(vias.size() - 1);
      drops.put(angle, here);
      if (before >= 0) {
        int to = last ? far : here;
        double sweep = (last ? angle - row : angle) - angleBefore;
        Feature what = new Feature(Feature.Kind.RING, link.phase(), 0, List.of());
        Path path = between(before, to, radius, sweep);
        copper.track(size.layers(), size.trackMm(), path, before, to, net, what);
      }
      before = far;
      angleBefore = angle + row;
    }
    return drops;
  }

  /**
   * The vias of one drop, in a line into the arc: the radial comes to the first, the ring leaves
   * from the last, so that the current shares evenly.
   */
  private List<Integer> drop(Link link, double radius, double angle, double row, String net) {
    Point first = Point.polar(radius, angle);
    Point last = Point.polar(radius, angle + row);
    List<Integer> out = new ArrayList<>();
    int n = size.viaCount();
    for (int k = 0; k < n; k++) {
      Point at =
          k == 0 ? first : k == n - 1 ? last : first.plus(last.minus(first).times(k / (n - 1.0)));
      String what = "drop of " + link.what() + (n == 1 ? "" : ", " + (k + 1) + " of " + n);
      out.add(
          copper.drilled(
              Joint.Kind.DROP, at, size.padMm(), size.holeMm(), size.layers(), net, what));
    }
    Feature bar = new Feature(Feature.Kind.LINK, link.phase(), 0, List.of());
    copper.row(out, List.of(1, size.layers()), size.padMm(), net, bar);
    return out;
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
