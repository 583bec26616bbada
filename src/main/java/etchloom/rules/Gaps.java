package etchloom.rules;

import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;

/**
 * The gap between two pieces of copper, the parts that are neighbours along the copper left out.
 *
 * <p>Exact where the nearest points are no neighbours. Else both pieces are halved until their
 * parts hold neighbours only, or none, or are no nearer than wanted. Where the border between the
 * two stays near, the halving ends at {@link #FINEST_MM} or {@link #MOST_CUTS}, and neighbours near
 * the border count: that can make the gap too small by up to the size of the parts, never too
 * great.
 */
final class Gaps {
  /** Far below the slack of 1 nm: what the halving may leave undecided. */
  private static final double FINEST_MM = 2e-7;

  /** Enough to come down to the finest part at several places of a pair. */
  private static final int MOST_CUTS = 3000;

  /** Lengths along the copper are sums of many rounded terms. */
  private static final double WALK_SLACK_MM = 1e-9;

  private final Walk walk;
  private final double spaceMm;

  /**
   * @param spaceMm the space that the neighbours' length is reckoned with
   */
  Gaps(Walk walk, double spaceMm) {
    this.walk = walk;
    this.spaceMm = spaceMm;
  }

  /**
   * @param centres the nearest points of the centre lines
   * @param bend whether nearer points were left out as neighbours
   */
  record Gap(Nearest centres, boolean bend) {}

  /**
   * The smallest gap up to the limit; null where there is none.
   *
   * @param limitMm gaps above this are of no interest
   * @param bendMm where nearer points were left out as neighbours: gaps from this on are of no
   *     interest
   */
  Gap gap(Piece p, Piece q, double limitMm, double bendMm) {
    double fat = p.fatMm() + q.fatMm();
    double near = walk.neighbourMm(p, q, spaceMm) + WALK_SLACK_MM;
    if (adjacent(p, q) && straight(p, q, near, bendMm + fat)) {
      return null;
    }
    Nearest n = Distance.between(p.shape(), q.shape());
    if (n.distanceMm() - fat > limitMm) {
      return null;
    }
    List<Walk.Way> ways = walk.ways(p, q, near);
    Pair whole = new Pair(p, q, n);
    if (!near(whole, ways, near)) {
      return new Gap(n, false);
    }
    Nearest outside = outside(whole, ways, near, bendMm + fat);
    return outside == null ? null : new Gap(outside, true);
  }

  private record Pair(Piece p, Piece q, Nearest nearest) {}

  /**
   * The nearest points that are no neighbours, nearer than the limit; null where there are none.
   */
  private static Nearest outside(Pair whole, List<Walk.Way> ways, double near, double limitMm) {
    Deque<Pair> open = new ArrayDeque<>();
    open.add(whole);
    Nearest best = null;
    double bound = limitMm;
    int cuts = 0;
    while (!open.isEmpty()) {
      Pair pair = open.remove();
      if (pair.nearest().distanceMm() > bound
          || straight(pair.p(), pair.q(), near, bound)
          || allNear(pair, ways, near)) {
        continue;
      }
      boolean finest = pair.p().lengthMm() + pair.q().lengthMm() <= FINEST_MM || cuts >= MOST_CUTS;
      if (finest || !near(pair, ways, near)) {
        best = pair.nearest();
        bound = Math.min(bound, best.distanceMm() - FINEST_MM);
        continue;
      }
      cuts++;
      halve(open, pair);
    }
    return best;
  }

  private static void halve(Deque<Pair> open, Pair pair) {
    Piece p = pair.p();
    Piece q = pair.q();
    boolean cutFirst = p.lengthMm() >= q.lengthMm();
    Piece cut = cutFirst ? p : q;
    double mid = (cut.fromMm() + cut.toMm()) / 2;
    for (Piece half : List.of(cut.part(cut.fromMm(), mid), cut.part(mid, cut.toMm()))) {
      Piece a = cutFirst ? half : p;
      Piece b = cutFirst ? q : half;
      open.add(new Pair(a, b, Distance.between(a.shape(), b.shape())));
    }
  }

  private static boolean adjacent(Piece p, Piece q) {
    return p.conductor() == q.conductor()
        && !p.isPad()
        && (p.toMm() == q.fromMm() || q.toMm() == p.fromMm());
  }

  /**
   * Whether one track turns so little from the one piece to the other that points too far along it
   * for neighbours are at least the limit apart.
   *
   * <p>Seen in the direction half-way between its extreme ones, a run that turns by no more than t
   * advances by at least cos(t/2) of its length.
   */
  private static boolean straight(Piece p, Piece q, double near, double limitMm) {
    if (p.isPad() || p.conductor() != q.conductor()) {
      return false;
    }
    double turn =
        Math.max(p.turnToRad(), q.turnToRad()) - Math.min(p.turnFromRad(), q.turnFromRad());
    return turn < Math.PI && near * Math.cos(turn / 2) >= limitMm;
  }

  /** Whether every point of the one is a neighbour of every point of the other. */
  private static boolean allNear(Pair pair, List<Walk.Way> ways, double near) {
    for (Walk.Way w : ways) {
      if (w.mostMm(pair.p(), pair.q()) <= near) {
        return true;
      }
    }
    return false;
  }

  /** Whether the nearest points are neighbours. */
  private static boolean near(Pair pair, List<Walk.Way> ways, double near) {
    if (ways.isEmpty()) {
      return false;
    }
    double s = pair.p().walkMm(pair.nearest().onFirst());
    double t = pair.q().walkMm(pair.nearest().onSecond());
    for (Walk.Way w : ways) {
      if (w.lengthMm(s, t) <= near) {
        return true;
      }
    }
    return false;
  }
}
