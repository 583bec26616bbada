package etchloom.proof.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.List;

/**
 * The boundary of a figure as the lines and arcs that it stands for, in order along its rings, the
 * figure on the left.
 *
 * <p>Arcs lie on the true circles. Where two pieces cross at an angle, their common corner is the
 * crossing of the true curves, not of their chords; where they run into each other it is the corner
 * of the flattened boundary, brought onto the circle.
 */
final class Outline {
  private static final double MM = 1e-6;

  final Figure figure;

  /** All pieces, ring after ring. */
  final List<Segment> pieces = new ArrayList<>();

  /** The ring of each piece. */
  final List<Integer> ring = new ArrayList<>();

  /** The walk from the ring's start to each piece's start, mm. */
  final List<Double> walk = new ArrayList<>();

  /** The first piece of each ring, and one more entry. */
  final int[] first;

  final double[] ringLength;

  private ShapeTree tree;

  Outline(Figure figure) {
    this.figure = figure;
    first = new int[figure.rings() + 1];
    ringLength = new double[figure.rings()];
    for (int r = 0; r < figure.rings(); r++) {
      first[r] = pieces.size();
      addRing(r);
      Corners.sharpen(pieces.subList(first[r], pieces.size()));
      double sum = 0;
      for (int k = first[r]; k < pieces.size(); k++) {
        ring.add(r);
        walk.add(sum);
        sum += pieces.get(k).lengthMm();
      }
      ringLength[r] = sum;
    }
    first[figure.rings()] = pieces.size();
  }

  private void addRing(int r) {
    int start = figure.firstEdge(r);
    int e = start;
    // A ring that is one circle has no corner to begin with.
    while (joined(figure.previous(e), e) && figure.previous(e) != start) {
      e = figure.previous(e);
    }
    int begin = e;
    do {
      int last = e;
      double sweep = figure.round(e) ? turn(e) : 0;
      double first = sweep;
      int next = figure.next(last);
      while (next != begin
          && joined(last, next)
          && Math.abs(sweep) + Math.abs(turn(next)) <= ShapeTree.MAX_SWEEP_RAD - 0.05
          && turn(next) * first > 0) {
        last = next;
        sweep += turn(last);
        next = figure.next(last);
      }
      add(e, last, sweep);
      e = next;
    } while (e != begin);
  }

  /** Whether two edges that follow each other stand for the same circle. */
  private boolean joined(int e, int f) {
    return figure.round(e)
        && figure.round(f)
        && figure.centreX(e) == figure.centreX(f)
        && figure.centreY(e) == figure.centreY(f)
        && figure.radius(e) == figure.radius(f);
  }

  private double turn(int e) {
    double ax = figure.fromX(e) - figure.centreX(e);
    double ay = figure.fromY(e) - figure.centreY(e);
    double bx = figure.toX(e) - figure.centreX(e);
    double by = figure.toY(e) - figure.centreY(e);
    return Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
  }

  private void add(int from, int to, double sweep) {
    Point a = new Point(figure.fromX(from) * MM, figure.fromY(from) * MM);
    Point b = new Point(figure.toX(to) * MM, figure.toY(to) * MM);
    if (!figure.round(from) || sweep == 0) {
      pieces.add(new Line(a, b));
      return;
    }
    Point c = new Point(figure.centreX(from) * MM, figure.centreY(from) * MM);
    double r = figure.radius(from) * MM;
    pieces.add(new Arc(onto(a, c, r), onto(b, c, r), c, sweep > 0));
  }

  private static Point onto(Point p, Point c, double r) {
    Point d = p.minus(c);
    return c.plus(d.times(r / d.norm()));
  }

  /** The walk along its ring to a point of a piece. */
  double walkTo(int piece, Point p) {
    Segment s = pieces.get(piece);
    return walk.get(piece) + s.lengthMm() * share(s, p);
  }

  static double share(Segment s, Point p) {
    return s.match(
        l -> {
          double length = l.lengthMm();
          return length == 0 ? 0 : Math.min(1, p.distanceTo(l.start()) / length);
        },
        a -> {
          Point u = a.start().minus(a.centre());
          Point v = p.minus(a.centre());
          double t = Math.atan2(u.cross(v), u.dot(v)) / a.sweepRad();
          return Math.max(0, Math.min(1, t));
        });
  }

  /** The shorter way along the ring between two walks on it. */
  double apart(int ringNumber, double s, double t) {
    double d = Math.abs(s - t);
    return Math.min(d, ringLength[ringNumber] - d);
  }

  /** The point of a ring at a walk, which may run beyond its start. */
  Point at(int ringNumber, double s) {
    double length = ringLength[ringNumber];
    double w = s - length * Math.floor(s / length);
    int lo = first[ringNumber];
    int hi = first[ringNumber + 1] - 1;
    while (lo < hi) {
      int mid = (lo + hi + 1) >>> 1;
      if (walk.get(mid) <= w) {
        lo = mid;
      } else {
        hi = mid - 1;
      }
    }
    Segment piece = pieces.get(lo);
    double l = piece.lengthMm();
    return piece.at(l == 0 ? 0 : Math.min(1, (w - walk.get(lo)) / l));
  }

  /** The pieces, to be searched. */
  ShapeTree tree() {
    if (tree == null) {
      tree = new ShapeTree(pieces, new double[pieces.size()]);
    }
    return tree;
  }

  /** Whether a point lies in the figure. */
  boolean covers(Point p) {
    return figure.islandAt((int) Math.rint(p.x() / MM), (int) Math.rint(p.y() / MM)) >= 0;
  }
}
