package etchloom.proof.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.Hole;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** {@code ring}, {@code hole}, {@code aspect}, {@code hole-gap} and {@code hole-copper}. */
final class HoleRules {
  /** A pad's own hole may stand out of the drilled one so far, mm. */
  private static final double PAD_HOLE_MM = 0.03;

  private final List<Hole> holes;
  private final Connectivity board;
  private final CopperLimits limits;
  private final Measures out;

  HoleRules(List<Hole> holes, Connectivity board, CopperLimits limits, Measures out) {
    this.holes = holes;
    this.board = board;
    this.limits = limits;
    this.out = out;
  }

  /** Ring and distance to foreign copper of every hole on one layer. */
  void layer(int layer, Outline outline, Names names) {
    for (Hole h : holes) {
      if (h.through(layer)) {
        Set<Integer> own = new TreeSet<>();
        if (h.plated()) {
          for (int island : board.islandsTouched(h, layer)) {
            own.add(island);
          }
          ring(layer, outline, h, own);
        }
        foreign(layer, outline, h, own, names);
      }
    }
  }

  private void ring(int layer, Outline outline, Hole h, Set<Integer> own) {
    double required =
        h.function().equals("ComponentDrill") ? limits.ringTerminalMm() : limits.ringViaMm();
    double r = h.diameterMm() / 2;
    for (Segment axis : EdgeRules.axis(h)) {
      Nearest[] best = new Nearest[1];
      boolean[] drilled = new boolean[1];
      search(
          outline,
          axis,
          (i, limit) -> {
            Segment s = outline.pieces.get(i);
            if (within(s, h, r + PAD_HOLE_MM)) {
              drilled[0] = true;
              return limit;
            }
            return nearer(best, axis, s, limit);
          });
      if (best[0] != null && !own.isEmpty()) {
        boolean inside = drilled[0] || outline.covers(best[0].onFirst());
        double ring = (inside ? best[0].distanceMm() : -best[0].distanceMm()) - r;
        out.add("ring", layer, best[0].middle(), ring, required, words(h));
      }
    }
  }

  private static boolean within(Segment s, Hole h, double r) {
    return h.slot().isEmpty()
        && s.start().distanceTo(h.at()) <= r
        && s.end().distanceTo(h.at()) <= r
        && s.at(0.5).distanceTo(h.at()) <= r;
  }

  private void foreign(int layer, Outline outline, Hole h, Set<Integer> own, Names names) {
    for (Segment axis : EdgeRules.axis(h)) {
      Nearest[] best = new Nearest[1];
      int[] which = new int[1];
      search(
          outline,
          axis,
          (i, limit) -> {
            if (own.contains(outline.figure.island(outline.ring.get(i)))) {
              return limit;
            }
            double now = nearer(best, axis, outline.pieces.get(i), limit);
            which[0] = now < limit ? i : which[0];
            return now;
          });
      if (best[0] != null) {
        boolean in = !h.plated() && outline.covers(best[0].onFirst());
        double gap = in ? 0 : Math.max(0, best[0].distanceMm() - h.diameterMm() / 2);
        String what = words(h) + " and " + names.of(layer, island(outline, which[0]));
        out.add("hole-copper", layer, best[0].middle(), gap, limits.holeCopperMm(), what);
      }
    }
  }

  private static int island(Outline outline, int piece) {
    return outline.figure.island(outline.ring.get(piece));
  }

  private static void search(Outline outline, Segment axis, ShapeTree.Visitor visitor) {
    for (Segment part : parts(axis)) {
      outline.tree().near(part, 0, 1e9, visitor);
    }
  }

  /** Gives the limit to go on with. */
  private static double nearer(Nearest[] best, Segment axis, Segment s, double limit) {
    Nearest n = Distance.between(axis, s);
    if (n.distanceMm() < limit && (best[0] == null || n.distanceMm() < best[0].distanceMm())) {
      best[0] = n;
      return n.distanceMm();
    }
    return limit;
  }

  private static List<Segment> parts(Segment s) {
    double sweep = s instanceof Arc a ? Math.abs(a.sweepRad()) : 0;
    int n = (int) Math.max(1, Math.ceil(sweep / (ShapeTree.MAX_SWEEP_RAD - 1e-3)));
    List<Segment> out = new ArrayList<>();
    for (int k = 0; k < n; k++) {
      out.add(n == 1 ? s : s.part(k / (double) n, (k + 1) / (double) n));
    }
    return out;
  }

  /** Sizes, and holes against each other. */
  void board(Optional<Double> thicknessMm) {
    for (Hole h : holes) {
      if (h.plated()) {
        out.add("hole", 0, h.at(), h.diameterMm(), limits.holeMinMm(), words(h));
        if (thicknessMm.isPresent()) {
          double aspect = thicknessMm.get() / h.diameterMm();
          out.add(new CopperFinding("aspect", "", h.at(), aspect, limits.aspect(), "1", words(h)));
        }
      }
    }
    List<Segment> axes = new ArrayList<>();
    List<Hole> of = new ArrayList<>();
    for (Hole h : holes) {
      for (Segment axis : EdgeRules.axis(h)) {
        for (Segment part : parts(axis)) {
          axes.add(part);
          of.add(h);
        }
      }
    }
    double[] fat = of.stream().mapToDouble(h -> h.diameterMm() / 2).toArray();
    double required = limits.holeGapMm();
    double[] least = {Double.POSITIVE_INFINITY};
    new ShapeTree(axes, fat)
        .pairs(
            1e9,
            (i, j, limit) -> {
              if (of.get(i).equals(of.get(j)) && of.get(i).slot().isPresent()) {
                return limit;
              }
              Nearest n = Distance.between(axes.get(i), axes.get(j));
              double gap = n.distanceMm() - fat[i] - fat[j];
              if (gap < required || gap < least[0]) {
                least[0] = Math.min(least[0], gap);
                String what = words(of.get(i)) + " and " + words(of.get(j));
                out.add("hole-gap", 0, n.middle(), Math.max(0, gap), required, what);
              }
              return Math.max(required, least[0]);
            });
  }

  static String words(Hole h) {
    String kind = h.plated() ? "plated" : "non-plated";
    String net =
        h.nets().isEmpty() || h.nets().get(0).isEmpty() ? "" : " of net " + h.nets().get(0);
    return kind + " hole" + net;
  }
}
