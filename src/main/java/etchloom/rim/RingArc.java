package etchloom.rim;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * A link's arc over its pins' span, counter-clockwise from {@code startRad}.
 *
 * @param startRad in [0, 2π)
 * @param spanRad 0 where all pins stand at one angle; then no ring is needed
 * @param stops the pins' angles in order along the arc, as offsets from the start
 */
record RingArc(Link link, double startRad, double spanRad, List<Double> stops) {
  RingArc {
    stops = List.copyOf(stops);
  }

  /**
   * @param order for ties: the smaller comes first
   */
  record Stop(double angleRad, int order) {}

  /** The arc that leaves out the largest gap; on a tie, the one that starts at the lower order. */
  static RingArc over(Link link, List<Stop> pins) {
    List<Stop> sorted = new ArrayList<>();
    pins.stream()
        .map(s -> new Stop(Angles.positive(s.angleRad()), s.order()))
        .sorted(Comparator.comparingDouble(Stop::angleRad).thenComparingInt(Stop::order))
        .forEach(
            s -> {
              if (sorted.isEmpty() || s.angleRad() - last(sorted).angleRad() > Angles.SAME) {
                sorted.add(s);
              }
            });
    int n = sorted.size();
    int start = 0;
    double widest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < n; i++) {
      double before = sorted.get((i + n - 1) % n).angleRad();
      double gap = Angles.positive(sorted.get(i).angleRad() - before);
      boolean tie = Math.abs(gap - widest) <= Angles.SAME;
      if (tie ? sorted.get(i).order() < sorted.get(start).order() : gap > widest) {
        widest = gap;
        start = i;
      }
    }
    double from = sorted.get(start).angleRad();
    List<Double> stops = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      stops.add(i == 0 ? 0.0 : Angles.positive(sorted.get((start + i) % n).angleRad() - from));
    }
    return new RingArc(link, from, stops.get(n - 1), stops);
  }

  private static Stop last(List<Stop> list) {
    return list.get(list.size() - 1);
  }

  boolean needsRing() {
    return spanRad > Angles.SAME;
  }

  /** Whether two arcs, both lengthened by {@code marginRad} at each end, share an angle. */
  boolean overlaps(RingArc o, double marginRad) {
    double m = 2 * marginRad - Angles.SAME;
    return Angles.positive(o.startRad - startRad) < spanRad + m
        || Angles.positive(startRad - o.startRad) < o.spanRad + m;
  }
}
