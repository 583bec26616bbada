package etchloom.rim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Arcs dealt to concentric rings so that no two on one ring overlap.
 *
 * @param rings innermost first; rings with terminal links lie outermost
 * @param overlap the most arcs at one angle: no fewer rings can do
 */
record Rings(List<List<RingArc>> rings, int overlap) {
  Rings {
    rings = rings.stream().map(List::copyOf).toList();
  }

  /**
   * Colours the arcs greedily by start angle, with the circle cut at each arc's start in turn, and
   * keeps the fewest rings.
   */
  static Rings deal(List<RingArc> arcs, double marginRad) {
    List<RingArc> real = arcs.stream().filter(RingArc::needsRing).toList();
    List<List<RingArc>> best = List.of();
    for (RingArc cut : real) {
      List<List<RingArc>> rings = greedy(real, cut.startRad(), marginRad);
      if (best.isEmpty() || rings.size() < best.size()) {
        best = rings;
      }
    }
    List<List<RingArc>> ordered =
        best.stream()
            .sorted(
                Comparator.comparing(
                    r -> r.stream().anyMatch(a -> a.link().terminal().isPresent())))
            .toList();
    return new Rings(ordered, overlap(real, marginRad));
  }

  private static List<List<RingArc>> greedy(List<RingArc> arcs, double cut, double marginRad) {
    List<RingArc> sorted =
        arcs.stream()
            .sorted(
                Comparator.comparingDouble(
                    (RingArc a) -> Angles.positive(a.startRad() - cut + Angles.SAME)))
            .toList();
    List<List<RingArc>> rings = new ArrayList<>();
    for (RingArc a : sorted) {
      rings.stream()
          .filter(r -> r.stream().noneMatch(b -> a.overlaps(b, marginRad)))
          .findFirst()
          .orElseGet(
              () -> {
                List<RingArc> ring = new ArrayList<>();
                rings.add(ring);
                return ring;
              })
          .add(a);
    }
    return rings;
  }

  private static int overlap(List<RingArc> arcs, double marginRad) {
    int most = 0;
    for (RingArc a : arcs) {
      int here = 0;
      for (RingArc b : arcs) {
        double in = Angles.positive(a.startRad() - b.startRad());
        if (in < b.spanRad() + 2 * marginRad - Angles.SAME) {
          here++;
        }
      }
      most = Math.max(most, here);
    }
    return most;
  }
}
