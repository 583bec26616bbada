package etchloom.geometry;

/** Bounds on lines and on arcs of at most a quarter turn. */
final class ShapeBounds {
  /** Centres nearer than this count as one: it is added to the bound. */
  private static final double SAME_CENTRE_MM = 1e-9;

  private ShapeBounds() {}

  /** Writes min x, min y, max x, max y of the fattened shape, mm. */
  static void box(Segment s, double fatMm, double[] out, int at) {
    double x0 = Math.min(s.start().x(), s.end().x());
    double y0 = Math.min(s.start().y(), s.end().y());
    double x1 = Math.max(s.start().x(), s.end().x());
    double y1 = Math.max(s.start().y(), s.end().y());
    if (s instanceof Arc a) {
      double r = a.radiusMm();
      double cx = a.centre().x();
      double cy = a.centre().y();
      x0 = Distance.sweeps(a, -1, 0) ? Math.min(x0, cx - r) : x0;
      x1 = Distance.sweeps(a, 1, 0) ? Math.max(x1, cx + r) : x1;
      y0 = Distance.sweeps(a, 0, -1) ? Math.min(y0, cy - r) : y0;
      y1 = Distance.sweeps(a, 0, 1) ? Math.max(y1, cy + r) : y1;
    }
    out[at] = x0 - fatMm;
    out[at + 1] = y0 - fatMm;
    out[at + 2] = x1 + fatMm;
    out[at + 3] = y1 + fatMm;
  }

  /**
   * An upper bound, mm, on how far any point of {@code s} lies from {@code c}.
   *
   * <p>From a line or arc to a line: the distance from a convex set is greatest at the ends of a
   * line; an arc leaves its chord by no more than its height. Between concentric arcs: the
   * difference of the radii, or an end that stands beyond the other arc's.
   */
  static double reach(Segment s, Segment c) {
    if (s instanceof Arc a
        && c instanceof Arc b
        && a.centre().distanceTo(b.centre()) <= SAME_CENTRE_MM) {
      double between = Math.abs(a.radiusMm() - b.radiusMm());
      return SAME_CENTRE_MM
          + Math.max(
              between,
              Math.max(
                  Distance.between(a.start(), b).distanceMm(),
                  Distance.between(a.end(), b).distanceMm()));
    }
    Line chord = new Line(c.start(), c.end());
    return height(s)
        + height(c)
        + Math.max(
            Distance.between(s.start(), chord).distanceMm(),
            Distance.between(s.end(), chord).distanceMm());
  }

  /** By how much an arc leaves its chord, mm; 0 for a line. */
  private static double height(Segment s) {
    if (s instanceof Arc a) {
      double half = a.start().distanceTo(a.end()) / 2;
      double r = a.radiusMm();
      // r - sqrt(r² - h²), without the loss of digits; holds up to half a turn.
      return half * half / (r + Math.sqrt(Math.max(0, (r - half) * (r + half))));
    }
    return 0;
  }
}
