package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.strtree.STRtree;

/** A closed path among others, with what is found out about it. */
final class Contour {
  /** An index over fewer pieces costs more than it saves. */
  private static final int FEW = 16;

  /** So many questions are answered without an index, which costs as much to build. */
  private static final int OFTEN = 20;

  private int asked;
  final Path path;
  final double areaMm2;
  final Envelope box = new Envelope();
  private STRtree pieces;

  /** Whether copper lies just outside and just inside. */
  boolean filledOutside;

  boolean filledInside;

  /** The smallest one around it; null for none. */
  Contour around;

  final List<Contour> holes = new ArrayList<>();

  Contour(Path path) {
    this.path = path;
    this.areaMm2 = Contours.signedAreaMm2(path);
    for (Segment s : path.segments()) {
      box.expandToInclude(box(s));
    }
  }

  /** A box around a piece; of an arc that around its whole circle. */
  private static Envelope box(Segment s) {
    Envelope e = new Envelope(s.start().x(), s.end().x(), s.start().y(), s.end().y());
    if (s instanceof Arc a) {
      double r = a.radiusMm();
      Point c = a.centre();
      e.expandToInclude(new Envelope(c.x() - r, c.x() + r, c.y() - r, c.y() + r));
    }
    return e;
  }

  boolean bounds() {
    return filledInside && !filledOutside;
  }

  /** The pieces that a ray from the point to the right may meet. */
  List<Segment> besides(Point p) {
    if (path.segments().size() <= FEW || ++asked <= OFTEN) {
      return path.segments();
    }
    if (pieces == null) {
      pieces = new STRtree();
      for (Segment s : path.segments()) {
        pieces.insert(box(s), s);
      }
      pieces.build();
    }
    List<Segment> out = new ArrayList<>();
    double right = Math.max(p.x(), box.getMaxX());
    pieces.query(new Envelope(p.x(), right, p.y(), p.y()), item -> out.add((Segment) item));
    return out;
  }
}
