package etchloom.proof.plane;

import java.util.Arrays;
import java.util.function.IntPredicate;

/**
 * The edges of an arrangement that part inside from outside, each linked to the next of its ring.
 */
final class Boundary {
  final int edges;
  final int[] fromX;
  final int[] fromY;
  final int[] toX;
  final int[] toY;
  final int[] source;
  final int[] next;

  /** The arrangement's node at which each edge starts. */
  final int[] node;

  private final Arrangement a;

  /** For each edge of the arrangement: its boundary edge, -1 when it is none. */
  private final int[] kept;

  private final boolean[] alongArrangement;

  Boundary(Arrangement a, IntPredicate inside) {
    this.a = a;
    kept = new int[a.edges];
    Arrays.fill(kept, -1);
    alongArrangement = new boolean[a.edges];
    int n = 0;
    for (int e = 0; e < a.edges; e++) {
      boolean l = inside.test(a.left[e]);
      if (l != inside.test(a.left[e] - a.weight[e])) {
        alongArrangement[e] = l;
        kept[e] = n++;
      }
    }
    edges = n;
    fromX = new int[n];
    fromY = new int[n];
    toX = new int[n];
    toY = new int[n];
    source = new int[n];
    next = new int[n];
    node = new int[n];
    for (int e = 0; e < a.edges; e++) {
      if (kept[e] >= 0) {
        place(e, kept[e]);
      }
    }
  }

  private void place(int e, int b) {
    int u = alongArrangement[e] ? a.from[e] : a.to[e];
    int v = alongArrangement[e] ? a.to[e] : a.from[e];
    fromX[b] = a.x[u];
    fromY[b] = a.y[u];
    toX[b] = a.x[v];
    toY[b] = a.y[v];
    source[b] = a.source[e];
    node[b] = u;
    next[b] = follow(v, 2 * e + (alongArrangement[e] ? 1 : 0));
  }

  /**
   * The edge by which the outside on the right is followed further: the first boundary edge
   * counter-clockwise from the way back.
   */
  private int follow(int v, int back) {
    int lo = a.starFrom(v);
    int n = a.starTo(v) - lo;
    int k = 0;
    while (a.half(lo + k) != back) {
      k++;
    }
    for (int i = 1; i <= n; i++) {
      int e = a.half(lo + (k + i) % n) >> 1;
      if (kept[e] >= 0) {
        return kept[e];
      }
    }
    throw new IllegalStateException("a boundary ends at " + a.x[v] + ", " + a.y[v] + " nm");
  }
}
