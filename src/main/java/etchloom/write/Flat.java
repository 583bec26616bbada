package etchloom.write;

import etchloom.geometry.Arc;
import etchloom.geometry.Grid;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/** Arcs as chords, for the one format that has no arcs. */
final class Flat {
  /** Greatest distance between an arc and its chord, mm. */
  static final double SAGITTA_MM = 0.005;

  private Flat() {}

  /**
   * The corners of a path as {x, y} in nm, the first and the last included. Corners stand on the
   * path; a convex edge's chords lie inside it.
   */
  static List<long[]> points(Path path) {
    List<long[]> out = new ArrayList<>();
    out.add(Trace.steps(path.start()));
    for (Segment s : path.segments()) {
      int n = s.match(l -> 1, Flat::chords);
      for (int i = 1; i < n; i++) {
        Point p = s.at((double) i / n);
        out.add(new long[] {Grid.nm(p.x()), Grid.nm(p.y())});
      }
      out.add(Trace.steps(s.end()));
    }
    return out;
  }

  private static int chords(Arc a) {
    double share = Math.min(1, SAGITTA_MM / a.radiusMm());
    double stepRad = 2 * Math.acos(1 - share);
    return Math.max(1, (int) Math.ceil(Math.abs(a.sweepRad()) / stepRad));
  }
}
