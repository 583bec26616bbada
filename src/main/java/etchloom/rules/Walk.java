package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.PriorityQueue;

/**
 * Ways from one piece of copper to another along the centre lines of one layer, through joints.
 *
 * <p>Only ways short enough to make two pieces neighbours are of interest, so the search between
 * joints ends where no such way can follow.
 */
final class Walk {
  /**
   * A way: its length is {@code base + a·(walk of the first) + b·(walk of the second)}, where a and
   * b are 1 or -1, or 0 at a pad.
   */
  record Way(double base, int a, int b) {
    double lengthMm(double firstMm, double secondMm) {
      return base + a * firstMm + b * secondMm;
    }

    /** Where on the first piece its neighbours on the second end; not finite where nowhere. */
    double firstAtMm(Piece q, double nearMm) {
      return (nearMm - base - b * (b > 0 ? q.fromMm() : q.toMm())) / a;
    }

    /** The same for the second piece. */
    double secondAtMm(Piece p, double nearMm) {
      return (nearMm - base - a * (a > 0 ? p.fromMm() : p.toMm())) / b;
    }

    double leastMm(Piece p, Piece q) {
      return lengthMm(a > 0 ? p.fromMm() : p.toMm(), b > 0 ? q.fromMm() : q.toMm());
    }

    double mostMm(Piece p, Piece q) {
      return lengthMm(a > 0 ? p.toMm() : p.fromMm(), b > 0 ? q.toMm() : q.fromMm());
    }
  }

  private record Hop(int joint, double lengthMm) {}

  /** A joint that a piece leads to; the walk there is {@code base + slope·(walk of the piece)}. */
  private record End(int joint, double base, int slope) {
    double leastMm(Piece p) {
      return base + slope * (slope > 0 ? p.fromMm() : p.toMm());
    }
  }

  private final List<Conductor> conductors;
  private final double[] lengthMm;
  private final double[] narrowestMm;
  private final Map<Integer, List<Hop>> hops = new HashMap<>();
  private final Map<Integer, Map<Integer, Double>> reached = new HashMap<>();
  private final double farthestMm;

  /**
   * @param tracks the layer's
   * @param spaceMm the greatest space that will be asked for
   */
  Walk(Artwork artwork, List<Conductor> tracks, double spaceMm) {
    conductors = artwork.conductors();
    lengthMm = new double[conductors.size()];
    narrowestMm = new double[artwork.joints().size()];
    Arrays.fill(narrowestMm, Double.POSITIVE_INFINITY);
    double widest = 0;
    for (Conductor c : tracks) {
      double length = c.path().lengthMm();
      lengthMm[c.id()] = length;
      widest = Math.max(widest, c.widestMm());
      narrowestMm[c.fromJoint()] = Math.min(narrowestMm[c.fromJoint()], c.widthMm());
      narrowestMm[c.toJoint()] = Math.min(narrowestMm[c.toJoint()], c.widthMm());
      hops.computeIfAbsent(c.fromJoint(), k -> new ArrayList<>()).add(new Hop(c.toJoint(), length));
      hops.computeIfAbsent(c.toJoint(), k -> new ArrayList<>()).add(new Hop(c.fromJoint(), length));
    }
    double pad = 0;
    for (Joint j : artwork.joints()) {
      pad = Math.max(pad, j.padMm());
    }
    farthestMm = Math.PI / 2 * (widest + spaceMm) + pad;
  }

  /**
   * How far apart two pieces may lie along the copper and still count as neighbours: {@code
   * (π/2)(width + space)}, which is half-way round the tightest bend that keeps the space to
   * itself; a pad counts from its rim.
   */
  double neighbourMm(Piece p, Piece q, double spaceMm) {
    double width = (widthMm(p, q) + widthMm(q, p)) / 2;
    return Math.PI / 2 * (width + spaceMm)
        + (p.isPad() ? p.fatMm() : 0)
        + (q.isPad() ? q.fatMm() : 0);
  }

  private double widthMm(Piece of, Piece partner) {
    if (!of.isPad()) {
      return 2 * of.fatMm();
    }
    if (!partner.isPad()) {
      return 2 * partner.fatMm();
    }
    double narrowest = narrowestMm[of.joint()];
    return Double.isFinite(narrowest) ? narrowest : 0;
  }

  /** All ways between two different pieces that are somewhere no longer than the limit. */
  List<Way> ways(Piece p, Piece q, double limitMm) {
    if (p.conductor() != q.conductor() && (far(p, limitMm) || far(q, limitMm))) {
      return List.of();
    }
    List<Way> out = new ArrayList<>(2);
    if (!p.isPad() && p.conductor() == q.conductor()) {
      boolean forward = p.fromMm() <= q.fromMm();
      keep(out, new Way(0, forward ? -1 : 1, forward ? 1 : -1), p, q, limitMm);
    }
    List<End> ends = ends(p, limitMm);
    if (!ends.isEmpty()) {
      for (End b : ends(q, limitMm)) {
        for (End a : ends) {
          Double between = between(a.joint()).get(b.joint());
          if (between != null) {
            keep(out, new Way(a.base() + between + b.base(), a.slope(), b.slope()), p, q, limitMm);
          }
        }
      }
    }
    return out;
  }

  private static void keep(List<Way> out, Way w, Piece p, Piece q, double limitMm) {
    if (w.leastMm(p, q) <= limitMm) {
      out.add(w);
    }
  }

  /** Whether no way from the piece to a joint is within the limit. */
  private boolean far(Piece p, double limitMm) {
    return !p.isPad() && p.fromMm() > limitMm && lengthMm[p.conductor()] - p.toMm() > limitMm;
  }

  private List<End> ends(Piece p, double limitMm) {
    if (p.isPad()) {
      return List.of(new End(p.joint(), 0, 0));
    }
    Conductor c = conductors.get(p.conductor());
    List<End> out = new ArrayList<>(2);
    End back = new End(c.fromJoint(), 0, 1);
    End ahead = new End(c.toJoint(), lengthMm[c.id()], -1);
    if (back.leastMm(p) <= limitMm) {
      out.add(back);
    }
    if (ahead.leastMm(p) <= limitMm) {
      out.add(ahead);
    }
    return out;
  }

  /** Walks from a joint to the joints near it, itself included. */
  private Map<Integer, Double> between(int joint) {
    Map<Integer, Double> known = reached.get(joint);
    if (known != null) {
      return known;
    }
    Map<Integer, Double> done = new HashMap<>();
    PriorityQueue<Hop> open =
        new PriorityQueue<>(Comparator.comparingDouble(Hop::lengthMm).thenComparingInt(Hop::joint));
    open.add(new Hop(joint, 0));
    while (!open.isEmpty()) {
      Hop at = open.remove();
      if (done.putIfAbsent(at.joint(), at.lengthMm()) == null) {
        for (Hop h : hops.getOrDefault(at.joint(), List.of())) {
          double length = at.lengthMm() + h.lengthMm();
          if (length <= farthestMm) {
            open.add(new Hop(h.joint(), length));
          }
        }
      }
    }
    reached.put(joint, done);
    return done;
  }
}
