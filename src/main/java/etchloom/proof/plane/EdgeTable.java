package etchloom.proof.plane;

import java.util.Arrays;

/** Edges between numbered nodes; the same edge added again only adds its weight. */
final class EdgeTable {
  private int size;
  private int[] from;
  private int[] to;
  private int[] weight;
  private int[] source;
  private final int[] slots;

  EdgeTable(int most) {
    from = new int[most];
    to = new int[most];
    weight = new int[most];
    source = new int[most];
    slots = new int[Integer.highestOneBit(Math.max(16, most)) * 4];
  }

  void add(int u, int v, int w, int s) {
    int k = NodeTable.hash(u, v) & (slots.length - 1);
    while (slots[k] != 0) {
      int e = slots[k] - 1;
      if (from[e] == u && to[e] == v) {
        weight[e] += w;
        return;
      }
      k = (k + 1) & (slots.length - 1);
    }
    from[size] = u;
    to[size] = v;
    weight[size] = w;
    source[size] = s;
    slots[k] = ++size;
  }

  /** Forgets the edges whose weights cancelled; returns how many are left. */
  int dropEmpty() {
    int n = 0;
    for (int e = 0; e < size; e++) {
      if (weight[e] != 0) {
        from[n] = from[e];
        to[n] = to[e];
        weight[n] = weight[e];
        source[n] = source[e];
        n++;
      }
    }
    size = n;
    return n;
  }

  int[] from() {
    return Arrays.copyOf(from, size);
  }

  int[] to() {
    return Arrays.copyOf(to, size);
  }

  int[] weight() {
    return Arrays.copyOf(weight, size);
  }

  int[] source() {
    return Arrays.copyOf(source, size);
  }
}
