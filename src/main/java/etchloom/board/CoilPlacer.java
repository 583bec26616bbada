package etchloom.board;

import etchloom.artwork.Coil;
import etchloom.artwork.CopperBuilder;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.coil.CoilPlan;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.spec.Spec;
import etchloom.winding.PhaseCoil;
import etchloom.winding.Winding;
import java.util.ArrayList;
import java.util.List;

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
    List<Integer> nodes = new ArrayList<>();
    for (int j = 0; j < plan.nodeAnglesRad().size(); j++) {
      nodes.add(node(c.coil(), j, axis, net));
    }
    List<Integer> eyes = new ArrayList<>();
    for (int j = 0; j < plan.eyeRadiiMm().size(); j++) {
      Point at = new Point(plan.eyeRadiiMm().get(j), 0).rotated(axis);
      eyes.add(drilled(Joint.Kind.EYE, at, net, "coil " + c.coil() + ", eye via " + (j + 1)));
    }
    List<Integer> spirals = new ArrayList<>();
    for (int layer = 1; layer <= plan.layers().size(); layer++) {
      int pair = (layer - 1) / 2;
      boolean inward = layer % 2 == 1;
      CoilPlan.Spiral s = plan.layers().get(layer - 1);
      Path path = s.path().rotated(axis);
      int from = inward ? nodes.get(pair) : eyes.get(pair);
      int to = inward ? eyes.get(pair) : nodes.get(pair + 1);
      Feature what = new Feature(Feature.Kind.SPIRAL, phase, c.coil(), s.turnOf());
      spirals.add(copper.track(layer, spec.coil().trackMm(), path, from, to, net, what));
    }
    coils.add(
        new Coil(
            c.coil(), phase, c.sign(), axis, nodes.get(0), nodes.get(nodes.size() - 1), spirals));
  }

  /** The first node is a start on L1 and leaves on L1: it needs no hole. */
  private int node(int coil, int j, double axis, String net) {
    Point at = Point.polar(plan.nodeRadiusMm(), plan.nodeAnglesRad().get(j)).rotated(axis);
    if (j == 0) {
      return copper.bare(Joint.Kind.NODE, at, 1, net, "coil " + coil + ", start");
    }
    return drilled(Joint.Kind.NODE, at, net, "coil " + coil + ", node " + (j + 1));
  }

  private int drilled(Joint.Kind kind, Point at, String net, String what) {
    return copper.drilled(
        kind, at, spec.via().padMm(), spec.via().holeMm(), spec.board().layers(), net, what);
  }
}
