package etchloom.rules;

import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;

/**
 * The gap between two pieces of copper, the parts that are neighbours along the copper left out.
 *
 * <p>Exact where the nearest points are no neighbours. Else both pieces are cut, where neighbours
 * end or in the middle, until their parts hold neighbours only, or none, or are no nearer than
 * wanted. Where the border between the two stays near, the cutting ends at {@link #FINEST_MM} or
 * {@link #MOST_CUTS}, and neighbours near the border count: that can make the gap too small by up
 * to the size of the parts, never too great.
 */
final class Gaps {
  /** Far below the slack of 1 nm: what the cutting may leave undecided. */
  private static final double FINEST_MM = 2e-7;

  /** Enough to come down to the finest part at several places of a pair. */
  private static final int MOST_CUTS = 3000;

  /** Where the border cuts off less, the middle is the better place to cut. */
  private static final double LEAST_PART = 0.01;

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
    double least = Run.leastMm(p, q, near);
    if (least > limitMm + fat || (least >= bendMm + fat && least > facingMm(p, q))) {
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

  /**
   * Between the ends where a track leaves the one piece and enters the other. If these are nearer
   * than all points that are no neighbours, the nearest points are neighbours.
   */
  private static double facingMm(Piece p, Piece q) {
    return p.fromMm() <= q.fromMm()
        ? p.shape().end().distanceTo(q.shape().start())
        : q.shape().end().distanceTo(p.shape().start());
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
          || Run.leastMm(pair.p(), pair.q(), near) >= bound
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
      cut(open, pair, ways.get(0), near);
    }
    return best;
  }

  private static void cut(Deque<Pair> open, Pair pair, Walk.Way way, double near) {
    Piece p = pair.p();
    Piece q = pair.q();
    double atP = way.firstAtMm(q, near);
    double atQ = way.secondAtMm(p, near);
    boolean cutFirst = inside(p, atP) || (!inside(q, atQ) && p.lengthMm() >= q.lengthMm());
    Piece cut = cutFirst ? p : q;
    double at = cutFirst ? atP : atQ;
    // No border to cut at: in the middle.
    at = inside(cut, at) ? at : (cut.fromMm() + cut.toMm()) / 2;
    add(open, cutFirst, cut.part(cut.fromMm(), at), cutFirst ? q : p);
    add(open, cutFirst, cut.part(at, cut.toMm()), cutFirst ? q : p);
  }

  private static void add(Deque<Pair> open, boolean first, Piece part, Piece other) {
    Piece p = first ? part : other;
    Piece q = first ? other : part;
    open.add(new Pair(p, q, Distance.between(p.shape(), q.shape())));
  }

  /** Whether a cut there leaves two parts worth having. */
  private static boolean inside(Piece p, double atMm) {
    double least = Math.max(FINEST_MM / 2, LEAST_PART * p.lengthMm());
    return atMm > p.fromMm() + least && atMm < p.toMm() - least;
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
