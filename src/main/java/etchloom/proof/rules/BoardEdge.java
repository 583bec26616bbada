package etchloom.proof.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Box;
import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.List;

/**
 * The edge of the board and of its cut-outs: the centre lines of the profile, or the contours of
 * its regions.
 *
 * @param pieces lines, and arcs of at most a quarter turn
 */
public record BoardEdge(List<Segment> pieces) {
  private static final double STEP_RAD = 0.02;

  public BoardEdge {
    pieces = List.copyOf(pieces);
  }

  static BoardEdge of(LayerImage profile) {
    List<Segment> out = new ArrayList<>();
    for (DrawnObject o : profile.objects()) {
      List<Path> paths = o.match(s -> List.of(s.path()), f -> List.<Path>of(), r -> r.contours());
      for (Path p : paths) {
        for (Segment s : p.segments()) {
          if (s.lengthMm() > 0) {
            split(s, out);
          }
        }
      }
    }
    return new BoardEdge(out);
  }

  private static void split(Segment s, List<Segment> out) {
    double sweep = s instanceof Arc a ? Math.abs(a.sweepRad()) : 0;
    int n = (int) Math.max(1, Math.ceil(sweep / (ShapeTree.MAX_SWEEP_RAD - 1e-3)));
    for (int k = 0; k < n; k++) {
      out.add(n == 1 ? s : s.part(k / (double) n, (k + 1) / (double) n));
    }
  }

  double sizeMm() {
    Box box = null;
    for (Segment s : pieces) {
      box = box == null ? Box.of(s) : box.join(Box.of(s));
    }
    return box == null ? 0 : Math.max(box.widthMm(), box.heightMm());
  }

  Nearest nearest(Point p) {
    Nearest best = null;
    for (Segment s : pieces) {
      Nearest n = Distance.between(p, s);
      best = best == null || n.distanceMm() < best.distanceMm() ? n : best;
    }
    return best;
  }

  /** Whether a point lies on the board: an odd number of edges lies to its left. */
  boolean holds(Point p) {
    boolean in = false;
    for (Segment s : pieces) {
      double sweep = s instanceof Arc a ? Math.abs(a.sweepRad()) : 0;
      int n = (int) Math.max(1, Math.ceil(sweep / STEP_RAD));
      for (int k = 0; k < n; k++) {
        Point a = s.at(k / (double) n);
        Point b = s.at((k + 1) / (double) n);
        if ((a.y() > p.y()) != (b.y() > p.y())
            && a.x() + (p.y() - a.y()) / (b.y() - a.y()) * (b.x() - a.x()) < p.x()) {
          in = !in;
        }
      }
    }
    return in;
  }
}
