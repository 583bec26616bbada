package etchloom.proof.plane;

import java.util.Arrays;

/**
 * The plane cut up by a set of closed rings: nodes, edges between them, and the winding number on
 * the left of every edge.
 *
 * <p>Winding numbers spread from edge to edge around the nodes; a part that hangs together with
 * nothing else gets its start from the edge next to its leftmost node. Nearly linear in the edges.
 */
final class Arrangement {
  final int edges;
  final int nodes;

  /** Node at the lower left end of each edge, and at the other. */
  final int[] from;

  final int[] to;
  final int[] weight;
  final int[] source;
  final int[] x;
  final int[] y;

  /** Winding number on the left of each edge, walked from its lower left end. */
  final int[] left;

  /** Half-edges (edge · 2, + 1 when walked backwards) around each node, counter-clockwise. */
  private final int[] starStart;

  private final int[] star;

  Arrangement(EdgeSet set) {
    Noder n = new Noder(set);
    NodeTable table = new NodeTable(n.size);
    EdgeTable merged = new EdgeTable(n.size);
    for (int e = 0; e < n.size; e++) {
      int u = table.id(n.ax[e], n.ay[e]);
      int v = table.id(n.bx[e], n.by[e]);
      merged.add(u, v, n.weight[e], n.source[e]);
    }
    edges = merged.dropEmpty();
    nodes = table.size();
    from = merged.from();
    to = merged.to();
    weight = merged.weight();
    source = merged.source();
    x = table.x();
    y = table.y();
    starStart = new int[nodes + 1];
    star = stars();
    left = new int[edges];
    wind();
  }

  int starFrom(int node) {
    return starStart[node];
  }

  int starTo(int node) {
    return starStart[node + 1];
  }

  int half(int k) {
    return star[k];
  }

  private int[] stars() {
    for (int e = 0; e < edges; e++) {
      starStart[from[e] + 1]++;
      starStart[to[e] + 1]++;
    }
    for (int v = 0; v < nodes; v++) {
      starStart[v + 1] += starStart[v];
    }
    int[] next = Arrays.copyOf(starStart, nodes + 1);
    int[] out = new int[2 * edges];
    for (int e = 0; e < edges; e++) {
      out[next[from[e]]++] = 2 * e;
      out[next[to[e]]++] = 2 * e + 1;
    }
    for (int v = 0; v < nodes; v++) {
      sort(out, starStart[v], starStart[v + 1]);
    }
    return out;
  }

  private void sort(int[] out, int lo, int hi) {
    for (int i = lo + 1; i < hi; i++) {
      int h = out[i];
      int k = i;
      while (k > lo && before(h, out[k - 1])) {
        out[k] = out[k - 1];
        k--;
      }
      out[k] = h;
    }
  }

  /** Whether half-edge g comes before h, counter-clockwise from just past straight down. */
  private boolean before(int g, int h) {
    // Edges run from their lower left end, so forward ones lead into the right half plane.
    if ((g & 1) != (h & 1)) {
      return (g & 1) == 0;
    }
    int a = g >> 1;
    int b = h >> 1;
    return Exact.cross(dx(a), dy(a), dx(b), dy(b)) > 0;
  }

  private long dx(int e) {
    return (long) x[to[e]] - x[from[e]];
  }

  private long dy(int e) {
    return (long) y[to[e]] - y[from[e]];
  }

  int head(int half) {
    return (half & 1) == 0 ? to[half >> 1] : from[half >> 1];
  }

  /** Winding number on the left of a half-edge. */
  int leftOf(int half) {
    int e = half >> 1;
    return (half & 1) == 0 ? left[e] : left[e] - weight[e];
  }

  private void setLeft(int half, int value) {
    int e = half >> 1;
    left[e] = (half & 1) == 0 ? value : value + weight[e];
  }

  private int across(int half) {
    return (half & 1) == 0 ? weight[half >> 1] : -weight[half >> 1];
  }

  private void wind() {
    long[] order = leftmostNodes();
    EdgeGrid grid = order.length > 1 ? grid() : null;
    boolean[] known = new boolean[edges];
    boolean[] queued = new boolean[nodes];
    int[] queue = new int[nodes];
    for (long key : order) {
      int v = (int) key;
      int first = star[starStart[v]];
      int outside = grid == null ? 0 : rightOfNeighbour(grid, v);
      setLeft(first, outside + across(first));
      known[first >> 1] = true;
      spread(first, v, known, queued, queue);
    }
  }

  private EdgeGrid grid() {
    int[] ax = new int[edges];
    int[] ay = new int[edges];
    int[] bx = new int[edges];
    int[] by = new int[edges];
    for (int e = 0; e < edges; e++) {
      ax[e] = x[from[e]];
      ay[e] = y[from[e]];
      bx[e] = x[to[e]];
      by[e] = y[to[e]];
    }
    return new EdgeGrid(edges, ax, ay, bx, by);
  }

  private int rightOfNeighbour(EdgeGrid grid, int v) {
    int e = grid.leftOf(x[v], y[v]);
    if (e < 0) {
      return 0;
    }
    return dy(e) > 0 ? left[e] - weight[e] : left[e];
  }

  private void spread(int first, int start, boolean[] known, boolean[] queued, int[] queue) {
    int head = 0;
    int tail = 0;
    queue[tail++] = start;
    queued[start] = true;
    if (!queued[head(first)]) {
      queued[head(first)] = true;
      queue[tail++] = head(first);
    }
    while (head < tail) {
      int v = queue[head++];
      int lo = starStart[v];
      int n = starStart[v + 1] - lo;
      int k = 0;
      while (!known[star[lo + k] >> 1]) {
        k++;
      }
      int now = leftOf(star[lo + k]);
      for (int i = 1; i < n; i++) {
        int h = star[lo + (k + i) % n];
        now += across(h);
        if (!known[h >> 1]) {
          known[h >> 1] = true;
          setLeft(h, now);
        }
        int far = head(h);
        if (!queued[far]) {
          queued[far] = true;
          queue[tail++] = far;
        }
      }
    }
  }

  /** The leftmost node of every connected part, from left to right; each as (x, node). */
  private long[] leftmostNodes() {
    int[] group = new int[nodes];
    for (int v = 0; v < nodes; v++) {
      group[v] = v;
    }
    for (int e = 0; e < edges; e++) {
      int a = find(group, from[e]);
      int b = find(group, to[e]);
      if (a != b) {
        // The root is the leftmost, of equals the lowest.
        boolean aFirst = x[a] < x[b] || (x[a] == x[b] && y[a] < y[b]);
        group[aFirst ? b : a] = aFirst ? a : b;
      }
    }
    int n = 0;
    long[] roots = new long[nodes];
    for (int v = 0; v < nodes; v++) {
      if (group[v] == v && starStart[v + 1] > starStart[v]) {
        roots[n++] = ((long) x[v] << 32) | v;
      }
    }
    long[] out = Arrays.copyOf(roots, n);
    Arrays.sort(out);
    return out;
  }

  private static int find(int[] group, int v) {
    int r = v;
    while (group[r] != r) {
      group[r] = group[group[r]];
      r = group[r];
    }
    return r;
  }
}
