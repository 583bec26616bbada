package etchloom.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import java.util.ArrayList;
import java.util.List;

/** Cuts long arcs into parts that a {@link ShapeTree} takes. */
final class ArcPieces {
  private ArcPieces() {}

  static List<Segment> of(Path path) {
    List<Segment> out = new ArrayList<>();
    for (Segment s : path.segments()) {
      int n = s instanceof Arc a ? count(Math.abs(a.sweepRad())) : 1;
      for (int k = 0; k < n; k++) {
        out.add(n == 1 ? s : s.part(k / (double) n, (k + 1) / (double) n));
      }
    }
    return out;
  }

  /** Into how many parts an arc must be cut. */
  static int count(double sweepRad) {
    return (int) Math.max(1, Math.ceil(sweepRad / ShapeTree.MAX_SWEEP_RAD));
  }
}
