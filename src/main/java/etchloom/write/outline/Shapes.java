package etchloom.write.outline;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Distance;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * One layer's copper as fat points, lines and arcs: a disc at every pad and at every end of a
 * track, and each track's pieces; and which of them touch.
 */
final class Shapes {
  private final List<Segment> centres = new ArrayList<>();
  private final List<Double> halves = new ArrayList<>();
  private final List<Edge> edges = new ArrayList<>();

  /** Pieces of a track but its first. */
  private final BitSet following = new BitSet();

  /** Of these, those whose sides may cross the sides of the piece before. */
  private final BitSet loose = new BitSet();

  /** For each shape, the numbers of those that touch it. */
  private final List<List<Integer>> touching = new ArrayList<>();

  Shapes(Artwork art, int layer) {
    discs(art, layer);
    for (Conductor c : art.conductorsOn(layer)) {
      c.stretches().forEach(this::track);
    }
    for (int i = 0; i < centres.size(); i++) {
      touching.add(new ArrayList<>(4));
    }
    double[] fat = halves.stream().mapToDouble(Double::doubleValue).toArray();
    new ShapeTree(centres, fat)
        .pairs(
            Edge.SAME_MM,
            (i, j, limit) -> {
              if (!Distance.exceeds(centres.get(i), centres.get(j), fat[i] + fat[j] + limit)) {
                touching.get(i).add(j);
                touching.get(j).add(i);
              }
              return limit;
            });
  }

  /** Every shape's own boundary; tracks without their ends, which lie under discs. */
  List<Edge> edges() {
    return edges;
  }

  List<Integer> touching(int shape) {
    return touching.get(shape);
  }

  /** Whether the sides of two shapes may cross: not where one cleanly follows the other. */
  boolean mayCross(int i, int j) {
    int later = Math.max(i, j);
    return Math.abs(i - j) != 1 || !following.get(later) || loose.get(later);
  }

  int count() {
    return centres.size();
  }

  /** Whether a point lies deeper in a shape than the distance given, mm. */
  boolean covers(int shape, Point p, double deepMm) {
    double reach = halves.get(shape) - deepMm;
    return Distance.between(p, centres.get(shape)).distanceMm() < reach;
  }

  private void discs(Artwork art, int layer) {
    Map<Point, Double> radius = new LinkedHashMap<>();
    for (Joint j : art.padsOn(layer)) {
      radius.merge(j.at(), j.padMm() / 2, Math::max);
    }
    for (Conductor c : art.conductorsOn(layer)) {
      for (Conductor.Stretch s : c.stretches()) {
        radius.merge(s.path().start(), s.widthMm() / 2, Math::max);
        radius.merge(s.path().end(), s.widthMm() / 2, Math::max);
      }
    }
    radius.forEach(
        (at, r) -> {
          int shape = add(new Line(at, at), r);
          for (Segment s : Path.circle(at, r).segments()) {
            edges.add(Edge.arc(shape, s.start(), s.end(), at, true));
          }
        });
  }

  private void track(Conductor.Stretch c) {
    double half = c.widthMm() / 2;
    List<Segment> path = new ArrayList<>(c.path().segments().size());
    for (Segment s : c.path().segments()) {
      if (!s.start().equals(s.end())) {
        quarters(s, path);
      }
    }
    int n = path.size();
    if (n == 0) {
      return;
    }
    int[] forward = new int[n];
    int[] back = new int[n];
    List<Segment> reversed = new ArrayList<>(n);
    for (int i = 0; i < n; i++) {
      forward[i] = add(path.get(i), half);
    }
    for (int i = 0; i < n; i++) {
      reversed.add(path.get(n - 1 - i).reversed());
      back[i] = forward[n - 1 - i];
    }
    following.set(forward[0] + 1, forward[0] + n);
    Sides sides = new Sides(half, edges, loose);
    sides.add(path, forward);
    sides.add(reversed, back);
  }

  /** The search tree takes arcs of a quarter turn at most. */
  private static void quarters(Segment s, List<Segment> out) {
    int n = s.match(l -> 1, Shapes::pieces);
    if (n == 1) {
      out.add(s);
      return;
    }
    Arc a = (Arc) s;
    Point from = a.start();
    for (int i = 1; i <= n; i++) {
      Point to = a.at((double) i / n);
      out.add(new Arc(from, to, a.centre(), a.counterClockwise()));
      from = to;
    }
  }

  private static int pieces(Arc a) {
    return (int) Math.ceil(Math.abs(a.sweepRad()) / ShapeTree.MAX_SWEEP_RAD);
  }

  private int add(Segment centre, double half) {
    centres.add(centre);
    halves.add(half);
    return centres.size() - 1;
  }
}
