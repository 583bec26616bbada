package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Phase;
import etchloom.spec.Spec;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The working voltage between any two pieces of copper.
 *
 * <p>Between phases, and to terminals, rim and screws: the greater of the bus and the line's peak
 * back-EMF with a tenth in hand. Within a phase: that voltage times the share of the phase's length
 * between the two.
 */
final class Potentials {
  /** What is kept in hand over the computed back-EMF: magnets and speed are never exact. */
  static final double EMF_RESERVE = 0.1;

  private final OptionalDouble busVolt;
  private final OptionalDouble emfVolt;
  private final int[] phaseOf;
  private final double[] shareFrom;
  private final double[] shareTo;
  private final double[] lengthMm;
  private final int[] phaseAt;
  private final double[] shareAt;

  Potentials(Artwork artwork, Spec spec, RuleContext context) {
    busVolt = spec.duty().isPresent() ? spec.duty().get().busVolt() : OptionalDouble.empty();
    OptionalDouble emf = context.linePeakEmfVolt();
    emfVolt = emf.isPresent() ? OptionalDouble.of(emf.getAsDouble() * (1 + EMF_RESERVE)) : emf;
    int conductors = artwork.conductors().size();
    phaseOf = new int[conductors];
    shareFrom = new double[conductors];
    shareTo = new double[conductors];
    lengthMm = new double[conductors];
    phaseAt = new int[artwork.joints().size()];
    shareAt = new double[phaseAt.length];
    Arrays.fill(phaseOf, -1);
    Arrays.fill(phaseAt, -1);
    for (int k = 0; k < artwork.phases().size(); k++) {
      follow(artwork, k);
    }
  }

  /** Path by path: where paths are in parallel, the voltage lies along each of them. */
  private void follow(Artwork artwork, int k) {
    artwork.phases().get(k).paths().forEach(path -> follow(artwork, k, path));
  }

  private void follow(Artwork artwork, int k, List<Phase.Step> path) {
    List<Conductor> all = artwork.conductors();
    double whole = 0;
    Phase.Step before = null;
    for (Phase.Step s : path) {
      lengthMm[s.conductor()] = all.get(s.conductor()).path().lengthMm();
      whole += sideBySide(all, before, s) ? 0 : lengthMm[s.conductor()];
      before = s;
    }
    double at = 0;
    double next = 0;
    before = null;
    for (Phase.Step s : path) {
      Conductor c = all.get(s.conductor());
      if (!sideBySide(all, before, s)) {
        at = next;
        next = at + lengthMm[c.id()];
      }
      before = s;
      if (ofCoil(c)) {
        phaseOf[c.id()] = k;
        shareFrom[c.id()] = (s.forward() ? at : next) / whole;
        shareTo[c.id()] = (s.forward() ? next : at) / whole;
        put(artwork, c.fromJoint(), k, shareFrom[c.id()]);
        put(artwork, c.toJoint(), k, shareTo[c.id()]);
      }
    }
  }

  /** A spiral, or a track between the vias of one of the coil's joints. */
  private static boolean ofCoil(Conductor c) {
    Feature f = c.what();
    return f.kind() == Feature.Kind.SPIRAL || (f.kind() == Feature.Kind.LINK && f.coil() > 0);
  }

  /** Whether two steps that follow each other lead from the same joint to the same next one. */
  private static boolean sideBySide(List<Conductor> all, Phase.Step before, Phase.Step s) {
    if (before == null) {
      return false;
    }
    Conductor a = all.get(before.conductor());
    Conductor b = all.get(s.conductor());
    return before.forward() == s.forward()
        ? a.fromJoint() == b.fromJoint() && a.toJoint() == b.toJoint()
        : a.fromJoint() == b.toJoint() && a.toJoint() == b.fromJoint();
  }

  private void put(Artwork artwork, int joint, int k, double share) {
    if (!artwork.joints().get(joint).terminal()) {
      phaseAt[joint] = k;
      shareAt[joint] = share;
    }
  }

  OptionalDouble busVolt() {
    return busVolt;
  }

  /** Peak of the line's back-EMF, reserve included. */
  OptionalDouble emfVolt() {
    return emfVolt;
  }

  /** The greatest working voltage, V; empty where nothing says what it is. */
  OptionalDouble fullVolt() {
    if (busVolt.isEmpty()) {
      return emfVolt;
    }
    return OptionalDouble.of(Math.max(busVolt.getAsDouble(), emfVolt.orElse(0)));
  }

  /** The greatest voltage between a point of the one and a point of the other, V. */
  double volt(Piece p, Piece q) {
    double full = fullVolt().orElse(0);
    int phase = phase(p);
    if (phase < 0 || phase != phase(q)) {
      return full;
    }
    double pa = share(p, p.fromMm());
    double pb = share(p, p.toMm());
    double qa = share(q, q.fromMm());
    double qb = share(q, q.toMm());
    double above = Math.max(pa, pb) - Math.min(qa, qb);
    double below = Math.max(qa, qb) - Math.min(pa, pb);
    return full * Math.max(above, below);
  }

  private int phase(Piece p) {
    return p.isPad() ? phaseAt[p.joint()] : phaseOf[p.conductor()];
  }

  private double share(Piece p, double walkMm) {
    if (p.isPad()) {
      return shareAt[p.joint()];
    }
    int c = p.conductor();
    return shareFrom[c] + (shareTo[c] - shareFrom[c]) * walkMm / lengthMm[c];
  }
}
