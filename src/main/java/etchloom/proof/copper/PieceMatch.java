package etchloom.proof.copper;

import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * Which pieces of two drawings are the same: the same pen along the same curve, whichever way it is
 * walked and however an arc is cut up.
 *
 * <p>A piece that appears twice counts once. N log N where few pieces have an end on one vertical
 * line.
 *
 * @param onlyFirst pieces of the first drawing that the second lacks
 * @param onlySecond pieces of the second drawing that the first lacks
 */
public record PieceMatch(List<DrawnPiece> onlyFirst, List<DrawnPiece> onlySecond) {
  /** Coordinates on the nanometre grid, and centres worked out from bulges, differ by less. */
  public static final double TOLERANCE_MM = 1e-5;

  /** An arc with a chord below this may stand as its chord, which leaves it by next to nothing. */
  private static final double TINY_MM = 0.006;

  private static final double TINY_BOW_MM = 1e-3;

  /** Beyond so many leftovers the drawings are simply different. */
  private static final int MOST_LEFT = 3000;

  public boolean same() {
    return onlyFirst.isEmpty() && onlySecond.isEmpty();
  }

  public static PieceMatch match(List<DrawnPiece> first, List<DrawnPiece> second) {
    DrawnPiece[] a = sorted(first);
    DrawnPiece[] b = sorted(second);
    List<DrawnPiece> leftA = without(a, b);
    List<DrawnPiece> leftB = without(b, a);
    if (leftA.size() + leftB.size() > MOST_LEFT || (leftA.isEmpty() && leftB.isEmpty())) {
      return new PieceMatch(leftA, leftB);
    }
    return new PieceMatch(uncovered(leftA, leftB), uncovered(leftB, leftA));
  }

  private static DrawnPiece[] sorted(List<DrawnPiece> pieces) {
    DrawnPiece[] out = pieces.toArray(new DrawnPiece[0]);
    Arrays.sort(out, Comparator.comparingDouble(p -> p.lowEnd().x()));
    return out;
  }

  private static List<DrawnPiece> without(DrawnPiece[] a, DrawnPiece[] b) {
    List<DrawnPiece> out = new ArrayList<>();
    int from = 0;
    for (DrawnPiece p : a) {
      double x = p.lowEnd().x();
      while (from < b.length && b[from].lowEnd().x() < x - TOLERANCE_MM) {
        from++;
      }
      boolean found = false;
      for (int k = from; k < b.length && b[k].lowEnd().x() <= x + TOLERANCE_MM && !found; k++) {
        found = same(p, b[k]);
      }
      if (!found) {
        out.add(p);
      }
    }
    return out;
  }

  private static boolean same(DrawnPiece p, DrawnPiece q) {
    if (Math.abs(p.widthMm() - q.widthMm()) > TOLERANCE_MM) {
      return false;
    }
    // Ends on one vertical line within rounding may be sorted either way.
    boolean straight = near(p.lowEnd(), q.lowEnd()) && near(p.highEnd(), q.highEnd());
    boolean crossed = near(p.lowEnd(), q.highEnd()) && near(p.highEnd(), q.lowEnd());
    if (!straight && !crossed) {
      return false;
    }
    boolean tiny = p.lowEnd().distanceTo(p.highEnd()) < TINY_MM;
    double bow = p.shape().at(0.5).distanceTo(q.shape().at(0.5));
    return bow <= (tiny ? TINY_BOW_MM : TOLERANCE_MM);
  }

  private static boolean near(Point p, Point q) {
    return Math.abs(p.x() - q.x()) <= TOLERANCE_MM && Math.abs(p.y() - q.y()) <= TOLERANCE_MM;
  }

  /** The pieces of a that pieces of b do not make up together. */
  private static List<DrawnPiece> uncovered(List<DrawnPiece> a, List<DrawnPiece> b) {
    List<DrawnPiece> out = new ArrayList<>();
    for (DrawnPiece p : a) {
      if (!madeUp(p, b) && !partOfOne(p, b)) {
        out.add(p);
      }
    }
    return out;
  }

  private static boolean partOfOne(DrawnPiece p, List<DrawnPiece> b) {
    for (DrawnPiece q : b) {
      if (sameWidth(p, q)
          && on(p.shape().start(), q.shape())
          && on(p.shape().end(), q.shape())
          && on(p.shape().at(0.5), q.shape())) {
        return true;
      }
    }
    return false;
  }

  private static boolean madeUp(DrawnPiece p, List<DrawnPiece> b) {
    if (p.shape().lengthMm() == 0) {
      return false;
    }
    Point at = p.shape().start();
    double done = 0;
    while (!near(at, p.shape().end())) {
      Point next = null;
      for (DrawnPiece q : b) {
        if (sameWidth(p, q) && on(q.shape().at(0.5), p.shape())) {
          boolean forward = near(q.shape().start(), at);
          Point to = forward ? q.shape().end() : q.shape().start();
          if ((forward || near(q.shape().end(), at)) && share(to, p.shape()) > done) {
            next = to;
          }
        }
      }
      if (next == null || !on(next, p.shape())) {
        return false;
      }
      done = share(next, p.shape());
      at = next;
    }
    return true;
  }

  private static boolean sameWidth(DrawnPiece p, DrawnPiece q) {
    return Math.abs(p.widthMm() - q.widthMm()) <= TOLERANCE_MM;
  }

  private static boolean on(Point p, Segment s) {
    return etchloom.geometry.Distance.between(p, s).distanceMm() <= 2 * TOLERANCE_MM;
  }

  /** How far along a piece a point lies, 0 to 1. */
  private static double share(Point p, Segment s) {
    return s.match(
        l -> {
          Point d = l.end().minus(l.start());
          return p.minus(l.start()).dot(d) / d.dot(d);
        },
        a -> {
          Point u = a.start().minus(a.centre());
          Point v = p.minus(a.centre());
          double t = Math.atan2(u.cross(v), u.dot(v));
          double sweep = a.sweepRad();
          double way = sweep > 0 ? t : -t;
          return (way < -1e-6 ? way + 2 * Math.PI : way) / Math.abs(sweep);
        });
  }
}
