package etchloom.proof;

import etchloom.geometry.Point;
import etchloom.proof.ProofExpectation.Disc;
import etchloom.proof.ProofExpectation.Pad;
import etchloom.proof.copper.Hole;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;

/** Holds the holes of one set of drill files against the design's. */
final class HoleProof {
  /** Drill files give six decimals, as the design's grid has. */
  private static final double SAME_MM = 2e-6;

  /** A missing and an extra hole of one size no farther apart are one hole that was moved. */
  private static final double MOVED_MM = 5;

  private record Wanted(
      Point at, double diameterMm, boolean plated, String function, String net, String what) {}

  private final Function<Boolean, String> file;
  private final Findings out;

  private HoleProof(Function<Boolean, String> file, Findings out) {
    this.file = file;
    this.out = out;
  }

  /**
   * @param file to be named where a plated hole is missing, and where another one is
   */
  static void check(
      ProofExpectation e, List<Hole> holes, Function<Boolean, String> file, Findings out) {
    new HoleProof(file, out).check(wanted(e), holes);
  }

  private static List<Wanted> wanted(ProofExpectation e) {
    List<Wanted> out = new ArrayList<>();
    for (Pad p : e.pads()) {
      if (p.holeMm().isPresent()) {
        String function = p.terminal() ? "ComponentDrill" : "ViaDrill";
        out.add(new Wanted(p.at(), p.holeMm().getAsDouble(), true, function, p.net(), p.what()));
      }
    }
    for (Disc d : e.nonPlated()) {
      out.add(new Wanted(d.at(), d.diameterMm(), false, "MechanicalDrill", "", "mounting hole"));
    }
    return out;
  }

  private void check(List<Wanted> wanted, List<Hole> holes) {
    List<Hole> found = new ArrayList<>(holes);
    found.sort(Comparator.comparingDouble(h -> h.at().x()));
    boolean[] used = new boolean[found.size()];
    List<Wanted> missing = new ArrayList<>();
    for (Wanted w : wanted) {
      int k = at(found, used, w);
      if (k < 0) {
        missing.add(w);
      } else {
        used[k] = true;
        compare(w, found.get(k));
      }
    }
    List<Hole> extra = new ArrayList<>();
    for (int k = 0; k < used.length; k++) {
      if (!used[k]) {
        extra.add(found.get(k));
      }
    }
    missing.forEach(w -> missing(w, extra));
    for (Hole h : extra) {
      String what = kind(h.plated()) + " hole of " + mm(h.diameterMm()) + " is not in the design";
      out.add(ProofNames.EXTRA_HOLE, h.file(), h.line(), 0, h.at(), what);
    }
  }

  /** A hole of the same kind, at the place; of several the one that fits best in size. */
  private static int at(List<Hole> found, boolean[] used, Wanted w) {
    int lo = 0;
    int hi = found.size();
    while (lo < hi) {
      int mid = (lo + hi) >>> 1;
      if (found.get(mid).at().x() < w.at().x() - SAME_MM) {
        lo = mid + 1;
      } else {
        hi = mid;
      }
    }
    int best = -1;
    for (int k = lo; k < found.size() && found.get(k).at().x() <= w.at().x() + SAME_MM; k++) {
      Hole h = found.get(k);
      if (!used[k] && h.plated() == w.plated() && h.at().distanceTo(w.at()) <= SAME_MM) {
        best = best < 0 || off(h, w) < off(found.get(best), w) ? k : best;
      }
    }
    return best;
  }

  private static double off(Hole h, Wanted w) {
    return Math.abs(h.diameterMm() - w.diameterMm());
  }

  private void compare(Wanted w, Hole h) {
    if (off(h, w) > SAME_MM || h.slot().isPresent()) {
      String is = h.slot().isPresent() ? "a slot" : mm(h.diameterMm());
      String message = w.what() + ": the hole is " + is + ", it must be " + mm(w.diameterMm());
      out.add(ProofNames.HOLE_SIZE, h.file(), h.line(), 0, h.at(), message);
    }
    if (!h.function().equals(w.function())) {
      String message = w.what() + " is called " + h.function() + ", it is " + w.function();
      out.add(ProofNames.FUNCTION, h.file(), h.line(), 0, h.at(), message);
    }
    if (!h.nets().isEmpty() && !w.net().isEmpty() && !h.nets().equals(List.of(w.net()))) {
      String message =
          w.what() + " carries net " + String.join(", ", h.nets()) + ", not " + w.net();
      out.add(ProofNames.NET_NAME, h.file(), h.line(), 0, h.at(), message);
    }
  }

  private void missing(Wanted w, List<Hole> extra) {
    Hole moved =
        extra.stream()
            .filter(h -> h.plated() == w.plated() && off(h, w) <= SAME_MM)
            .filter(h -> h.at().distanceTo(w.at()) <= MOVED_MM)
            .min(Comparator.comparingDouble(h -> h.at().distanceTo(w.at())))
            .orElse(null);
    if (moved == null) {
      String message = w.what() + ": there is no " + kind(w.plated()) + " hole here";
      out.add(ProofNames.MISSING_HOLE, file.apply(w.plated()), 0, 0, w.at(), message);
      return;
    }
    extra.remove(moved);
    String message =
        w.what() + ": the hole is " + mm(moved.at().distanceTo(w.at())) + " from its place";
    out.add(ProofNames.MOVED_HOLE, moved.file(), moved.line(), 0, moved.at(), message);
  }

  private static String kind(boolean plated) {
    return plated ? "plated" : "non-plated";
  }

  private static String mm(double v) {
    return String.format(Locale.ROOT, "%.4f mm", v);
  }
}
