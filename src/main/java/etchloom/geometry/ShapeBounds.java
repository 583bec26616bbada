package etchloom.geometry;

/** Bounds on lines and arcs. */
final class ShapeBounds {
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
}
