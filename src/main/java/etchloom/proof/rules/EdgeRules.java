package etchloom.proof.rules;

import etchloom.geometry.Distance;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.copper.Hole;
import etchloom.proof.plane.Figure;
import java.util.List;

/** {@code edge} and {@code size}: copper and holes against the edge of the board and its bore. */
final class EdgeRules {
  /** A hole that is drawn as an edge too is the edge. */
  private static final double SAME_MM = 0.002;

  private final BoardEdge edge;
  private final CopperLimits limits;
  private final Measures out;

  EdgeRules(BoardEdge edge, CopperLimits limits, Measures out) {
    this.edge = edge;
    this.limits = limits;
    this.out = out;
  }

  void size() {
    double is = edge.sizeMm();
    out.add(
        new CopperFinding(
            "size", "", edge.pieces().get(0).start(), is, limits.sizeMm(), "mm", "board"));
  }

  void copper(int layer, Outline outline, Names names) {
    double required = limits.edgeCopperMm();
    Nearest[] least = new Nearest[1];
    int[] which = new int[1];
    for (Segment s : edge.pieces()) {
      double start = least[0] == null ? 1e9 : Math.max(required, least[0].distanceMm());
      outline
          .tree()
          .near(
              s,
              0,
              start,
              (i, limit) -> {
                Nearest n = Distance.between(s, outline.pieces.get(i));
                if (n.distanceMm() < required - Measures.SLACK_MM) {
                  add(layer, outline, n, i, names);
                }
                if (least[0] == null || n.distanceMm() < least[0].distanceMm()) {
                  least[0] = n;
                  which[0] = i;
                }
                return Math.max(required, least[0].distanceMm());
              });
    }
    if (least[0] != null) {
      add(layer, outline, least[0], which[0], names);
    }
    outside(layer, outline.figure, names);
  }

  private void add(int layer, Outline outline, Nearest n, int piece, Names names) {
    String what = names.of(layer, outline.figure.island(outline.ring.get(piece)));
    out.add("edge", layer, n.middle(), n.distanceMm(), limits.edgeCopperMm(), what);
  }

  private void outside(int layer, Figure f, Names names) {
    boolean[] seen = new boolean[f.islands()];
    for (int r = 0; r < f.rings(); r++) {
      int island = f.island(r);
      if (!seen[island]) {
        seen[island] = true;
        int e = f.firstEdge(r);
        Point p = new Point(f.fromX(e) * 1e-6, f.fromY(e) * 1e-6);
        if (!edge.holds(p)) {
          String what = names.of(layer, island) + " beside the board";
          out.add("edge", layer, p, 0, limits.edgeCopperMm(), what);
        }
      }
    }
  }

  void holes(List<Hole> holes) {
    for (Hole h : holes) {
      Nearest best = null;
      double gap = Double.POSITIVE_INFINITY;
      for (Segment axis : axis(h)) {
        for (Segment s : edge.pieces()) {
          Nearest n = Distance.between(axis, s);
          if (n.distanceMm() < gap) {
            gap = n.distanceMm();
            best = n;
          }
        }
      }
      double clear = gap - h.diameterMm() / 2;
      if (best != null && Math.abs(clear) > SAME_MM) {
        double signed = edge.holds(h.at()) ? clear : 0;
        out.add("edge", 0, best.middle(), signed, limits.edgeHoleMm(), HoleRules.words(h));
      }
    }
  }

  static List<Segment> axis(Hole h) {
    return h.slot().isEmpty() ? List.of(new Line(h.at(), h.at())) : h.slot().get().segments();
  }
}
