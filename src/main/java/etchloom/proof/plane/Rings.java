package etchloom.proof.plane;

import java.util.Arrays;

/** The rings of a figure, their areas, and which of them bound one connected piece. */
final class Rings {
  private int count;
  private int[] first = new int[16];
  private double[] area = new double[16];
  private int[] island;
  private int islands;

  Rings(Figure f, int[] node) {
    boolean[] seen = new boolean[f.edges()];
    for (int e = 0; e < f.edges(); e++) {
      if (!seen[e]) {
        walk(f, e, seen);
      }
    }
    island = new int[count];
    for (int r = 0; r < count; r++) {
      island[r] = r;
    }
    boolean[] touching = joinTouching(f, node);
    joinHoles(f, touching);
    number(f);
  }

  private void walk(Figure f, int start, boolean[] seen) {
    if (count == first.length) {
      first = Arrays.copyOf(first, count * 2);
      area = Arrays.copyOf(area, count * 2);
    }
    int best = start;
    double sum = 0;
    double ox = f.fromX(start);
    double oy = f.fromY(start);
    int e = start;
    do {
      seen[e] = true;
      f.setRing(e, count);
      sum += (f.fromX(e) - ox) * (f.toY(e) - oy) - (f.toX(e) - ox) * (f.fromY(e) - oy);
      if (f.fromX(e) < f.fromX(best)
          || (f.fromX(e) == f.fromX(best) && f.fromY(e) < f.fromY(best))) {
        best = e;
      }
      e = f.next(e);
    } while (e != start);
    first[count] = best;
    area[count] = sum / 2 * 1e-12;
    count++;
  }

  /** Rings that share a corner bound the same piece; says which share their leftmost corner. */
  private boolean[] joinTouching(Figure f, int[] node) {
    int most = 0;
    for (int v : node) {
      most = Math.max(most, v);
    }
    int[] at = new int[most + 1];
    Arrays.fill(at, -1);
    boolean[] several = new boolean[most + 1];
    for (int e = 0; e < f.edges(); e++) {
      int v = node[e];
      if (at[v] >= 0 && at[v] != f.ring(e)) {
        join(f.ring(e), at[v]);
        several[v] = true;
      }
      at[v] = f.ring(e);
    }
    boolean[] touching = new boolean[count];
    for (int r = 0; r < count; r++) {
      touching[r] = several[node[first[r]]];
    }
    return touching;
  }

  private void joinHoles(Figure f, boolean[] touching) {
    for (int r = 0; r < count; r++) {
      if (area[r] < 0 && !touching[r]) {
        int e = f.leftOf(f.fromX(first[r]), f.fromY(first[r]));
        if (e < 0) {
          throw new IllegalStateException("a hole that nothing surrounds");
        }
        join(r, f.ring(e));
      }
    }
  }

  private void join(int r, int s) {
    int a = find(r);
    int b = find(s);
    island[Math.max(a, b)] = Math.min(a, b);
  }

  private int find(int r) {
    int v = r;
    while (island[v] != v) {
      island[v] = island[island[v]];
      v = island[v];
    }
    return v;
  }

  private void number(Figure f) {
    long[] order = new long[count];
    for (int r = 0; r < count; r++) {
      order[r] = ((long) f.fromX(first[r]) << 32) | r;
    }
    Arrays.sort(order);
    int[] numbers = new int[count];
    Arrays.fill(numbers, -1);
    int[] out = new int[count];
    for (long key : order) {
      int r = (int) key;
      int root = find(r);
      if (numbers[root] < 0) {
        numbers[root] = islands++;
      }
      out[r] = numbers[root];
    }
    island = out;
  }

  int count() {
    return count;
  }

  int first(int r) {
    return first[r];
  }

  double area(int r) {
    return area[r];
  }

  int island(int r) {
    return island[r];
  }

  int islands() {
    return islands;
  }
}
