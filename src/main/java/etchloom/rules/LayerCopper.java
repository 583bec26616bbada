package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import java.util.ArrayList;
import java.util.List;

/**
 * One layer's copper in pieces that a {@link ShapeTree} takes, pads first.
 *
 * <p>Where a track begins or ends in a pad, the stretch that lies wholly under the pad is left out:
 * the pad stands for it.
 */
final class LayerCopper {
  /** Shorter stretches are rounding, not copper: their ends' round caps are still there. */
  private static final double SLIVER_MM = 1e-9;

  private final int layer;
  private final List<Piece> pieces;
  private final ShapeTree tree;
  private final Walk walk;
  private final List<Segment> shapes;
  private final double[] fatMm;

  /**
   * @param spaceMm the greatest space that will be asked for
   */
  LayerCopper(Artwork artwork, int layer, double spaceMm) {
    this.layer = layer;
    List<Piece> out = new ArrayList<>();
    for (Joint j : artwork.padsOn(layer)) {
      out.add(Piece.pad(j.at(), j.padMm() / 2, j.id()));
    }
    List<Conductor> tracks = artwork.conductorsOn(layer);
    for (Conductor c : tracks) {
      add(out, artwork, c);
    }
    pieces = List.copyOf(out);
    fatMm = new double[pieces.size()];
    shapes = new ArrayList<>(fatMm.length);
    for (int i = 0; i < fatMm.length; i++) {
      fatMm[i] = pieces.get(i).fatMm();
      shapes.add(pieces.get(i).shape());
    }
    tree = new ShapeTree(shapes, fatMm);
    walk = new Walk(artwork, tracks, spaceMm);
  }

  int number() {
    return layer;
  }

  List<Piece> pieces() {
    return pieces;
  }

  ShapeTree tree() {
    return tree;
  }

  Walk walk() {
    return walk;
  }

  /** A search for what lies near other shapes, with no memory of earlier ones. */
  Nearby nearby(double startMm) {
    return new Nearby(tree, shapes, fatMm, startMm);
  }

  private static void add(List<Piece> out, Artwork artwork, Conductor c) {
    List<Segment> path = c.path().segments();
    Joint first = artwork.joints().get(c.fromJoint());
    Joint last = artwork.joints().get(c.toJoint());
    double at = 0;
    for (int k = 0; k < path.size(); k++) {
      Segment s = path.get(k);
      double length = s.lengthMm();
      double from = k == 0 ? hidden(s, first, c) : 0;
      double to = length - (k == path.size() - 1 ? hidden(s.reversed(), last, c) : 0);
      if (to - from > SLIVER_MM) {
        Piece whole = new Piece(s, c.widthMm(k) / 2, c.id(), k, at, at + length, -1);
        cut(out, whole, at + from, at + to);
      }
      at += length;
    }
  }

  /** How much of the piece's beginning lies wholly under its joint's pad, mm. */
  private static double hidden(Segment s, Joint j, Conductor c) {
    double room = j.padMm() / 2 - c.widthMm() / 2;
    if (!(room > 0) || !j.on(c.layer()) || !j.at().equals(s.start())) {
      return 0;
    }
    double length = s.lengthMm();
    if (s instanceof Line) {
      return Math.min(room, length);
    }
    // A chord of the arc from its start: 2r sin(u/2r).
    double r = ((Arc) s).radiusMm();
    return room >= 2 * r ? 0 : Math.min(2 * r * Math.asin(room / (2 * r)), length);
  }

  private static void cut(List<Piece> out, Piece whole, double fromMm, double toMm) {
    int n = 1;
    if (whole.shape() instanceof Arc a) {
      double sweep = Math.abs(a.sweepRad()) * (toMm - fromMm) / whole.lengthMm();
      n = ArcPieces.count(sweep);
    }
    if (n == 1 && fromMm == whole.fromMm() && toMm == whole.toMm()) {
      out.add(whole);
      return;
    }
    for (int i = 0; i < n; i++) {
      double a = fromMm + (toMm - fromMm) * i / n;
      double b = i == n - 1 ? toMm : fromMm + (toMm - fromMm) * (i + 1) / n;
      out.add(whole.part(a, b));
    }
  }

  /** {@code phase U, coil 4, turn 7}, or the pad's words. */
  static String words(Artwork artwork, Piece p) {
    return p.isPad()
        ? jointWords(artwork.joints().get(p.joint()))
        : artwork.conductors().get(p.conductor()).what().describe(p.segment());
  }

  /** {@code terminal U1}, or what the joint is called. */
  static String jointWords(Joint j) {
    return j.terminal() ? "terminal " + j.mark() : j.what();
  }
}
