package etchloom.write.outline;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Grid;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;

/** A layer's copper piece by piece, each piece with an outline of its own; they overlap. */
final class Apart {
  private Apart() {}

  static List<Path> of(Artwork art, int layer) {
    List<Path> out = new ArrayList<>();
    for (Conductor c : art.conductorsOn(layer)) {
      for (int k = 0; k < c.path().segments().size(); k++) {
        Segment s = c.path().segments().get(k);
        if (!s.start().equals(s.end())) {
          out.add(round(s, c.widthMm(k) / 2).mapped(Grid::snap));
        }
      }
    }
    for (Joint j : art.padsOn(layer)) {
      out.add(Path.circle(j.at(), j.padMm() / 2).mapped(Grid::snap));
    }
    return out;
  }

  /**
   * One piece of track with its round ends. Where an arc bends more sharply than half the width,
   * its inner side is a straight line between the ends.
   */
  private static Path round(Segment s, double half) {
    List<Segment> out = new ArrayList<>(4);
    Point first = side(s, half, out);
    Point second = side(s.reversed(), half, out);
    out.add(1, new Arc(out.get(0).end(), second, s.end(), true));
    out.add(
        new Arc(/* start= */ out.get(2).end(), /* end= */ first, /* centre= */ s.start(), true));
    return new Path(out);
  }

  /** Adds the right side; gives its start. */
  private static Point side(Segment s, double half, List<Segment> out) {
    Point from = right(s.start(), s.tangent(0), half);
    Point to = right(s.end(), s.tangent(1), half);
    List<Edge> shifted = new ArrayList<>(1);
    new Sides(half, shifted, new BitSet()).add(List.of(s), new int[] {0});
    boolean arc = !shifted.isEmpty() && shifted.get(0).isArc();
    out.add(
        arc
            ? new Arc(from, to, shifted.get(0).centre, shifted.get(0).turn > 0)
            : new Line(from, to));
    return from;
  }

  private static Point right(Point p, Point tangent, double half) {
    return p.plus(new Point(tangent.y(), -tangent.x()).times(half));
  }
}
