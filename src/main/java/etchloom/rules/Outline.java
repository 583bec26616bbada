package etchloom.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Box;
import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/** The board's edge and its cut-outs: how large the board is, and what lies how deep in it. */
final class Outline {
  /** Edges are cut into arcs no longer than this, so that searches along them stay local. */
  private static final double PIECE_RAD = Math.PI / 8;

  /**
   * A piece of the outline.
   *
   * @param path the outer edge: 0; the cut-outs: from 1
   * @param what the edge it belongs to, in the user's words
   */
  record Edge(Segment shape, int path, String what) {}

  private final List<Path> profile;
  private final List<Edge> edges = new ArrayList<>();

  /**
   * @param profile the outer edge first, then the cut-outs
   */
  Outline(List<Path> profile) {
    this.profile = List.copyOf(profile);
    for (int i = 0; i < profile.size(); i++) {
      String what = i == 0 ? "the board's edge" : i == 1 ? "the bore" : "cut-out " + i;
      for (Segment s : profile.get(i).segments()) {
        double sweep = s instanceof Arc a ? Math.abs(a.sweepRad()) : 0;
        int n = (int) Math.max(1, Math.ceil(sweep / PIECE_RAD - 1e-9));
        for (int k = 0; k < n; k++) {
          Segment part = n == 1 ? s : s.part(k / (double) n, (k + 1) / (double) n);
          edges.add(new Edge(part, i, what));
        }
      }
    }
  }

  /** All edges in pieces; empty where the artwork has no outline. */
  List<Edge> edges() {
    return edges;
  }

  /** Width and height of the board, mm; 0 where there is no outline. */
  double[] sizeMm() {
    Box all = null;
    for (Edge e : edges) {
      all = all == null ? Box.of(e.shape()) : all.join(Box.of(e.shape()));
    }
    return all == null ? new double[] {0, 0} : new double[] {all.widthMm(), all.heightMm()};
  }

  /** Whether a point lies on the board; where there is no outline all do. */
  boolean inside(Point p) {
    for (int i = 0; i < profile.size(); i++) {
      if (beyond(i, p)) {
        return false;
      }
    }
    return true;
  }

  /** Whether a point lies beyond an edge: outside the outer one, or in a cut-out. */
  boolean beyond(Edge e, Point p) {
    return beyond(e.path(), p);
  }

  private boolean beyond(int path, Point p) {
    return contains(profile.get(path), p) != (path == 0);
  }

  /** By the turns that the edge makes round the point. */
  private static boolean contains(Path path, Point p) {
    double turned = 0;
    for (Segment s : path.segments()) {
      Point a = s.start().minus(p);
      Point b = s.end().minus(p);
      double angle = Math.atan2(a.cross(b), a.dot(b));
      // Seen from inside its circle an arc goes round one way only; seen from outside, as its
      // chord does.
      if (s instanceof Arc arc && p.distanceTo(arc.centre()) < arc.radiusMm()) {
        boolean ccw = arc.counterClockwise();
        angle += ccw && angle <= 0 ? 2 * Math.PI : !ccw && angle >= 0 ? -2 * Math.PI : 0;
      }
      turned += angle;
    }
    return Math.abs(turned) > Math.PI;
  }

  /**
   * The nearest edge to a point.
   *
   * @param depthMm how far inside the board the point lies; below 0 outside
   */
  record Depth(double depthMm, Point at, String what) {}

  /** How deep a point lies in the board; the deepest there is where there is no outline. */
  Depth depth(Point p) {
    Depth best = new Depth(Double.POSITIVE_INFINITY, p, "");
    for (Edge e : edges) {
      Nearest n = Distance.between(p, e.shape());
      if (n.distanceMm() < best.depthMm()) {
        best = new Depth(n.distanceMm(), n.middle(), e.what());
      }
    }
    return inside(p) ? best : new Depth(-best.depthMm(), best.at(), best.what());
  }
}
