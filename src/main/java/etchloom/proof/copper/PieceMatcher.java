package etchloom.proof.copper;

import etchloom.geometry.Distance;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/** Finds pieces of two drawings that are the same; see {@link PieceMatch}. */
final class PieceMatcher {
  /** An arc with a chord below this may stand as its chord, which leaves it by next to nothing. */
  private static final double TINY_MM = 0.006;

  private static final double TINY_BOW_MM = 1e-3;

  private final PieceMatch.Tolerance tolerance;

  PieceMatcher(PieceMatch.Tolerance tolerance) {
    this.tolerance = tolerance;
  }

  PieceMatch match(List<DrawnPiece> first, List<DrawnPiece> second) {
    PiecesAcross a = new PiecesAcross(first);
    PiecesAcross b = new PiecesAcross(second);
    List<DrawnPiece> leftA = without(a, b);
    List<DrawnPiece> leftB = without(b, a);
    boolean[] doneA = new boolean[leftA.size()];
    boolean[] doneB = new boolean[leftB.size()];
    join(leftA, doneA, leftB, doneB);
    join(leftB, doneB, leftA, doneA);
    return new PieceMatch(rest(leftA, doneA), rest(leftB, doneB));
  }

  private static List<DrawnPiece> rest(List<DrawnPiece> some, boolean[] done) {
    List<DrawnPiece> out = new ArrayList<>();
    for (int i = 0; i < done.length; i++) {
      if (!done[i]) {
        out.add(some.get(i));
      }
    }
    return out;
  }

  private List<DrawnPiece> without(PiecesAcross a, PiecesAcross b) {
    List<DrawnPiece> out = new ArrayList<>();
    int from = 0;
    for (int i = 0; i < a.size(); i++) {
      double low = a.x(i) - tolerance.endMm() - PiecesAcross.STEP_MM;
      double high = a.x(i) + tolerance.endMm() + PiecesAcross.STEP_MM;
      while (from < b.size() && b.x(from) < low) {
        from++;
      }
      boolean found = false;
      for (int k = from; k < b.size() && b.x(k) <= high && !found; k++) {
        found = same(a.piece(i), b.piece(k));
      }
      if (!found) {
        out.add(a.piece(i));
      }
    }
    return out;
  }

  private boolean same(DrawnPiece p, DrawnPiece q) {
    if (Math.abs(p.widthMm() - q.widthMm()) > tolerance.endMm()) {
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
    return bow <= (tiny ? Math.max(TINY_BOW_MM, tolerance.bowMm()) : tolerance.bowMm());
  }

  private boolean near(Point p, Point q) {
    return Math.abs(p.x() - q.x()) <= tolerance.endMm()
        && Math.abs(p.y() - q.y()) <= tolerance.endMm();
  }

  /** Pieces of the first that pieces of the second make up together are done, and so are those. */
  private void join(
      List<DrawnPiece> whole, boolean[] doneWhole, List<DrawnPiece> parts, boolean[] doneParts) {
    PieceEnds ends = new PieceEnds(parts);
    for (int i = 0; i < doneWhole.length; i++) {
      List<Integer> chain = doneWhole[i] ? List.of() : chain(whole.get(i), parts, ends);
      doneWhole[i] |= !chain.isEmpty();
      chain.forEach(k -> doneParts[k] = true);
    }
  }

  /** The pieces that follow each other along p from its start to its end; none if it is not so. */
  private List<Integer> chain(DrawnPiece p, List<DrawnPiece> parts, PieceEnds ends) {
    List<Integer> out = new ArrayList<>();
    if (p.shape().lengthMm() == 0) {
      return out;
    }
    Point at = p.shape().start();
    double done = 0;
    while (!near(at, p.shape().end())) {
      Point from = at;
      double least = done;
      int next = -1;
      for (int k : ends.at(from.x(), tolerance.endMm())) {
        DrawnPiece q = parts.get(k);
        Point to = near(q.shape().start(), from) ? q.shape().end() : q.shape().start();
        boolean starts = near(q.shape().start(), from) || near(q.shape().end(), from);
        if (starts
            && sameWidth(p, q)
            && on(q.shape().at(0.5), p.shape())
            && on(to, p.shape())
            && share(to, p.shape()) > least) {
          next = k;
          least = share(to, p.shape());
          at = to;
        }
      }
      if (next < 0) {
        return List.of();
      }
      out.add(next);
      done = least;
    }
    return out;
  }

  private boolean sameWidth(DrawnPiece p, DrawnPiece q) {
    return Math.abs(p.widthMm() - q.widthMm()) <= tolerance.endMm();
  }

  private boolean on(Point p, Segment s) {
    return Distance.between(p, s).distanceMm() <= tolerance.endMm() + tolerance.bowMm();
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
