package etchloom.proof.copper;

import etchloom.proof.plane.Figure;
import java.util.Comparator;
import java.util.List;

/** Tells holes of the image that a plated barrel fills, such as those of ring-shaped pads. */
final class DrilledAway {
  /** How far a pad's own hole may stand out of the barrel, mm: plating and rounding. */
  private static final double SLACK_MM = 0.03;

  private final List<Hole> holes;

  DrilledAway(List<Hole> plated) {
    holes =
        plated.stream()
            .filter(h -> h.slot().isEmpty())
            .sorted(Comparator.comparingDouble(h -> h.at().x()))
            .toList();
  }

  boolean covers(Figure f, int ring, int layer) {
    int first = f.firstEdge(ring);
    double left = f.fromX(first) / RingPen.NM;
    for (int k = from(left - SLACK_MM); k < holes.size(); k++) {
      Hole h = holes.get(k);
      double r = h.diameterMm() / 2 + SLACK_MM;
      // The ring's leftmost corner lies within the radius: no hole farther right can cover it.
      if (h.at().x() - left > MAX_RADIUS_MM) {
        return false;
      }
      if (h.through(layer) && Math.abs(h.at().x() - left) <= r && within(f, first, h, r)) {
        return true;
      }
    }
    return false;
  }

  /** Drills are no wider; larger openings are routed. */
  private static final double MAX_RADIUS_MM = 10;

  private static boolean within(Figure f, int first, Hole h, double r) {
    int e = first;
    do {
      if (Place.mm(f.fromX(e), f.fromY(e)).distanceTo(h.at()) > r) {
        return false;
      }
      e = f.next(e);
    } while (e != first);
    return true;
  }

  private int from(double x) {
    int lo = 0;
    int hi = holes.size();
    while (lo < hi) {
      int mid = (lo + hi) >>> 1;
      if (holes.get(mid).at().x() < x) {
        lo = mid + 1;
      } else {
        hi = mid;
      }
    }
    return lo;
  }
}
