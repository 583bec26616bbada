package etchloom.board;

import etchloom.artwork.Coil;
import etchloom.artwork.CopperBuilder;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.coil.CoilPlan;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.spec.Spec;
import etchloom.winding.PhaseCoil;
import etchloom.winding.Winding;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** Sets the one planned coil down at every place, with its joints and spirals. */
final class CoilPlacer {
  private final Spec spec;
  private final CoilPlan plan;
  private final Winding winding;
  private final CopperBuilder copper;
  private final NetNames nets;
  private final List<Coil> coils = new ArrayList<>();

  CoilPlacer(Spec spec, CoilPlan plan, Winding winding, CopperBuilder copper, NetNames nets) {
    this.spec = spec;
    this.plan = plan;
    this.winding = winding;
    this.copper = copper;
    this.nets = nets;
  }

  void place() {
    winding.sequence().forEach(this::place);
  }

  List<Coil> coils() {
    return coils;
  }

  int joint(int coil, boolean start) {
    Coil c = coils.get(coil - 1);
    return start ? c.startJoint() : c.finishJoint();
  }

  private void place(PhaseCoil c) {
    double axis = 2 * Math.PI * (c.coil() - 1) / winding.coils();
    String phase = winding.marks().get(c.phase());
    String net = nets.of(c.coil());
    Placed placed = new Placed(c.coil(), axis, phase, net);
    for (int j = 0; j < plan.nodes().size(); j++) {
      boolean bare = j == 0 && !plan.parallel();
      String what = "coil " + c.coil() + (j == 0 ? ", start" : ", node " + (j + 1));
      placed.nodes.add(row(Joint.Kind.NODE, plan.nodes().get(j), bare, placed, what));
    }
    for (int j = 0; j < plan.eyes().size(); j++) {
      String what = "coil " + c.coil() + ", eye via " + (j + 1);
      placed.eyes.add(row(Joint.Kind.EYE, plan.eyes().get(j), false, placed, what));
    }
    if (plan.parallel()) {
      sideBySide(placed);
    } else {
      oneByOne(placed);
    }
    placed.spirals.sort(Comparator.comparingInt(id -> copper.conductors().get(id).layer()));
    coils.add(
        new Coil(
            c.coil(),
            phase,
            c.sign(),
            axis,
            first(placed.nodes.get(0)),
            first(placed.nodes.get(placed.nodes.size() - 1)),
            placed.spirals,
            placed.way));
  }

  /** One coil on its way into the copper. */
  private static final class Placed {
    private final int coil;
    private final double axis;
    private final String phase;
    private final String net;
    private final List<List<Integer>> nodes = new ArrayList<>();
    private final List<List<Integer>> eyes = new ArrayList<>();
    private final List<Integer> spirals = new ArrayList<>();
    private final List<Phase.Step> way = new ArrayList<>();

    private Placed(int coil, double axis, String phase, String net) {
      this.coil = coil;
      this.axis = axis;
      this.phase = phase;
      this.net = net;
    }
  }

  /** In on the odd layers, out on the even ones, one after the other. */
  private void oneByOne(Placed p) {
    int layers = plan.layers().size();
    for (int pair = 0; pair < layers / 2; pair++) {
      List<Integer> eye = p.eyes.get(pair);
      List<Integer> node = p.nodes.get(pair + 1);
      int in = 2 * pair + 1;
      spiral(p, in, first(p.nodes.get(pair)), first(eye));
      bars(p, eye, List.of(in, in + 1), false);
      spiral(p, in + 1, last(eye), last(node));
      bars(p, node, in + 1 < layers ? List.of(in + 1, in + 2) : List.of(1, layers), true);
    }
  }

  /** In on all odd layers, out on all even ones. */
  private void sideBySide(Placed p) {
    int layers = plan.layers().size();
    List<Integer> odd = IntStream.rangeClosed(1, layers).filter(l -> l % 2 == 1).boxed().toList();
    List<Integer> even = odd.stream().map(l -> l + 1).toList();
    List<Integer> all = IntStream.rangeClosed(1, layers).boxed().toList();
    List<Integer> start = p.nodes.get(0);
    List<Integer> eye = p.eyes.get(0);
    List<Integer> finish = p.nodes.get(1);
    bars(p, start, odd, false);
    odd.forEach(l -> spiral(p, l, last(start), first(eye)));
    bars(p, eye, all, false);
    even.forEach(l -> spiral(p, l, last(eye), last(finish)));
    bars(p, finish, Stream.concat(Stream.of(1), even.stream()).toList(), true);
    copper.closes(2 * (odd.size() - 1));
  }

  private static int first(List<Integer> row) {
    return row.get(0);
  }

  private static int last(List<Integer> row) {
    return row.get(row.size() - 1);
  }

  private void spiral(Placed p, int layer, int from, int to) {
    CoilPlan.Spiral s = plan.layers().get(layer - 1);
    Feature what = new Feature(Feature.Kind.SPIRAL, p.phase, p.coil, s.turnOf());
    Path path = s.path().rotated(p.axis);
    int id = copper.track(layer, spec.coil().trackMm(), s.widthsMm(), path, from, to, p.net, what);
    p.spirals.add(id);
    p.way.add(new Phase.Step(id, true));
  }

  /**
   * The tracks between the vias of one joint.
   *
   * @param back whether a current from the coil's start passes them from the last via to the first
   */
  private void bars(Placed p, List<Integer> row, List<Integer> layers, boolean back) {
    List<Integer> along = new ArrayList<>(row);
    if (back) {
      Collections.reverse(along);
    }
    Feature what = new Feature(Feature.Kind.LINK, p.phase, p.coil, List.of());
    p.way.addAll(copper.row(along, layers, spec.via().padMm(), p.net, what));
  }

  /**
   * The vias of one joint.
   *
   * @param bare the start on L1 that leaves on L1: it needs no hole
   */
  private List<Integer> row(
      Joint.Kind kind, CoilPlan.Row places, boolean bare, Placed p, String what) {
    List<Integer> out = new ArrayList<>();
    for (Point place : places.at()) {
      Point at = place.rotated(p.axis);
      int n = places.at().size();
      String words = n == 1 ? what : what + ", " + (out.size() + 1) + " of " + n;
      out.add(bare ? copper.bare(kind, at, 1, p.net, words) : drilled(kind, at, p.net, words));
    }
    return out;
  }

  private int drilled(Joint.Kind kind, Point at, String net, String what) {
    return copper.drilled(
        kind, at, spec.via().padMm(), spec.via().holeMm(), spec.board().layers(), net, what);
  }
}
