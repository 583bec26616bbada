package etchloom.write.outline;

import etchloom.artwork.Artwork;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The outlines of a layer's united copper.
 *
 * <p>Every shape's boundary is cut where it meets the boundary of a shape that touches it; what
 * lies inside another shape is dropped; the rest is joined end to end. Exact but for the grid: each
 * corner is rounded to 1 nm, and where a track's own pieces meet at an angle too small to tell from
 * rounding, its side may be off by {@link Edge#SAME_MM} at that corner. Near linear in the number
 * of pieces.
 */
public final class Outline {
  /** Edges that run no deeper than this inside another shape run along its boundary, mm. */
  private static final double DEEP_MM = 2e-5;

  private Outline() {}

  /**
   * Closed paths on the grid, outer ones counter-clockwise, holes clockwise, in the order of the
   * artwork. Should the copper be so tangled that its boundary does not close, which copper that
   * keeps its space never is, empty.
   */
  static Optional<List<Path>> united(Artwork art, int layer) {
    Shapes shapes = new Shapes(art, layer);
    List<List<Edge>> of = new ArrayList<>();
    for (int i = 0; i < shapes.count(); i++) {
      of.add(new ArrayList<>(2));
    }
    for (Edge e : shapes.edges()) {
      of.get(e.shape).add(e);
    }
    for (int i = 0; i < shapes.count(); i++) {
      for (int j : shapes.touching(i)) {
        if (i < j && shapes.mayCross(i, j)) {
          cut(of.get(i), of.get(j));
        }
      }
    }
    Loops loops = new Loops();
    for (Edge e : shapes.edges()) {
      for (Edge part : e.parts()) {
        if (!covered(shapes, part)) {
          loops.add(part);
        }
      }
    }
    return loops.close();
  }

  /** The united outlines; for tangled copper each track's and pad's own, which then overlap. */
  public static List<Path> of(Artwork art, int layer) {
    return united(art, layer).orElseGet(() -> Apart.of(art, layer));
  }

  private static void cut(List<Edge> a, List<Edge> b) {
    for (Edge e : a) {
      for (Edge f : b) {
        for (Point p : Crossings.of(e, f)) {
          e.cut(p);
          f.cut(p);
        }
        touch(e, f);
        touch(f, e);
      }
    }
  }

  /** Cuts an edge where the other one ends on it: tangents cross nowhere. */
  private static void touch(Edge e, Edge ending) {
    if (e.holds(ending.start)) {
      e.cut(ending.start);
    }
    if (e.holds(ending.end)) {
      e.cut(ending.end);
    }
  }

  private static boolean covered(Shapes shapes, Edge part) {
    Point middle = null;
    for (int j : shapes.touching(part.shape)) {
      if (shapes.mayCross(part.shape, j)) {
        middle = middle == null ? part.middle() : middle;
        if (shapes.covers(j, middle, DEEP_MM)) {
          return true;
        }
      }
    }
    return false;
  }
}
