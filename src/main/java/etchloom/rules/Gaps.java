package etchloom.rules;

import etchloom.geometry.Distance;
import etchloom.geometry.Nearest;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Optional;

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

  Gaps(Walk walk) {
    this.walk = walk;
  }

  /**
   * @param centres the nearest points of the centre lines
   * @param bend whether nearer points were left out as neighbours
   */
  record Gap(Nearest centres, boolean bend) {}

  /**
   * The smallest gap up to the limit; empty where there is none.
   *
   * @param spaceMm the space that the neighbours' length is reckoned with
   * @param limitMm gaps above this are of no interest
   */
  Optional<Gap> gap(Piece p, Piece q, double spaceMm, double limitMm) {
    double fat = p.fatMm() + q.fatMm();
    Nearest n = Distance.between(p.shape(), q.shape());
    if (n.distanceMm() - fat > limitMm) {
      return Optional.empty();
    }
    double near = walk.neighbourMm(p, q, spaceMm) + WALK_SLACK_MM;
    List<Walk.Way> ways = walk.ways(p, q, near);
    Pair whole = new Pair(p, q, n);
    if (!near(whole, ways, near)) {
      return Optional.of(new Gap(n, false));
    }
    return outside(whole, ways, near, limitMm + fat).map(c -> new Gap(c, true));
  }

  private record Pair(Piece p, Piece q, Nearest nearest) {}

  private static Optional<Nearest> outside(
      Pair whole, List<Walk.Way> ways, double near, double limitMm) {
    Deque<Pair> open = new ArrayDeque<>();
    open.add(whole);
    Nearest best = null;
    double bound = limitMm;
    int cuts = 0;
    while (!open.isEmpty()) {
      Pair pair = open.remove();
      if (pair.nearest().distanceMm() > bound || allNear(pair, ways, near)) {
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
    return Optional.ofNullable(best);
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
