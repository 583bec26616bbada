package etchloom.electric.inductance;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.electric.resistance.Currents;
import etchloom.geometry.Arc;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;
import java.util.Optional;

/** The coils of a board whose every coil is the first one turned. */
final class Repeats {
  /** How far a turned point may lie from its place, mm: rounding to the grid, twice over. */
  private static final double SLACK_MM = 5e-6;

  /** How closely currents must agree. */
  private static final double SLACK_AMPERE = 1e-9;

  private final int[] phase;
  private final double[] factor;

  private Repeats(int[] phase, double[] factor) {
    this.phase = phase;
    this.factor = factor;
  }

  static Optional<Repeats> of(Flow flow) {
    Artwork art = flow.artwork();
    int n = art.coils().size();
    int[] phase = new int[n];
    double[] factor = new double[n];
    for (int k = 0; k < n; k++) {
      if (!turned(art, k)) {
        return Optional.empty();
      }
      phase[k] = -1;
      for (int p = 0; p < flow.phases().size(); p++) {
        Currents currents = flow.phases().get(p);
        double f = factor(flow, art.coils().get(k), currents);
        if (Double.isNaN(f) || f != 0 && phase[k] >= 0) {
          return Optional.empty();
        }
        if (f != 0) {
          phase[k] = p;
          factor[k] = f;
        }
      }
    }
    return Optional.of(new Repeats(phase, factor));
  }

  int coils() {
    return phase.length;
  }

  /** Angle from one coil to the next. */
  double pitchRad() {
    return 2 * Math.PI / phase.length;
  }

  /** A coil's phase by its place among the phases, from 0; -1 where it has none. */
  int phase(int coil) {
    return phase[coil];
  }

  /** Current of a coil over that of the first, when one ampere runs through its phase. */
  double factor(int coil) {
    return factor[coil];
  }

  /** The coil's currents over the first coil's; no number where they are not in proportion. */
  private static double factor(Flow flow, Coil coil, Currents currents) {
    List<Integer> first = flow.firstCoil().copper();
    List<Integer> own = coil.copper();
    double f =
        currents.ofConductor(coil.conductors().get(0)) / flow.coil().ofConductor(first.get(0));
    for (int i = 0; i < first.size(); i++) {
      double want = f * flow.coil().ofConductor(first.get(i));
      if (!(Math.abs(currents.ofConductor(own.get(i)) - want) <= SLACK_AMPERE)) {
        return Double.NaN;
      }
    }
    return f;
  }

  private static boolean turned(Artwork art, int k) {
    Coil first = art.coils().get(0);
    Coil coil = art.coils().get(k);
    double rad = 2 * Math.PI * k / art.coils().size();
    List<Integer> some = first.copper();
    List<Integer> others = coil.copper();
    if (some.size() != others.size()) {
      return false;
    }
    for (int i = 0; i < some.size(); i++) {
      Conductor a = art.conductors().get(some.get(i));
      Conductor b = art.conductors().get(others.get(i));
      if (a.layer() != b.layer()
          || a.widthMm() != b.widthMm()
          || !a.widthsMm().equals(b.widthsMm())
          || !turned(a, b, rad)) {
        return false;
      }
    }
    return true;
  }

  private static boolean turned(Conductor a, Conductor b, double rad) {
    List<Segment> some = a.path().segments();
    List<Segment> others = b.path().segments();
    if (some.size() != others.size()) {
      return false;
    }
    double c = Math.cos(rad);
    double s = Math.sin(rad);
    for (int i = 0; i < some.size(); i++) {
      if (!turned(some.get(i), others.get(i), c, s)) {
        return false;
      }
    }
    return true;
  }

  private static boolean turned(Segment a, Segment b, double c, double s) {
    if (!at(a.start(), b.start(), c, s) || !at(a.end(), b.end(), c, s)) {
      return false;
    }
    if (a instanceof Arc x && b instanceof Arc y) {
      return x.counterClockwise() == y.counterClockwise() && at(x.centre(), y.centre(), c, s);
    }
    return !(a instanceof Arc) && !(b instanceof Arc);
  }

  private static boolean at(Point p, Point q, double c, double s) {
    return Math.abs(c * p.x() - s * p.y() - q.x()) <= SLACK_MM
        && Math.abs(s * p.x() + c * p.y() - q.y()) <= SLACK_MM;
  }
}
