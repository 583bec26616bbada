package etchloom.proof.plane;

import java.util.Arrays;
import java.util.function.IntPredicate;

/**
 * A plane figure as its boundary: directed edges with the figure on their left, joined to rings.
 *
 * <p>Parts that touch in one point count as joined: a ring goes round a piece of the outside, so a
 * figure pinched to a point stays one island, and what it encloses is a hole. Coordinates in nm;
 * areas in mm².
 */
public final class Figure {
  private final CircleTable circles;
  private final int edges;
  private final int[] fromX;
  private final int[] fromY;
  private final int[] toX;
  private final int[] toY;
  private final int[] source;
  private final int[] next;
  private final int[] previous;
  private final int[] ringOf;
  private final Rings rings;

  /** Built when it is first asked for. */
  private EdgeGrid grid;

  /** Whether the edge runs from its lower left end, as the grid needs it. */
  private boolean[] forward;

  Figure(Arrangement a, CircleTable circles, IntPredicate inside) {
    this.circles = circles;
    Boundary b = new Boundary(a, inside);
    edges = b.edges;
    fromX = b.fromX;
    fromY = b.fromY;
    toX = b.toX;
    toY = b.toY;
    source = b.source;
    next = b.next;
    previous = new int[edges];
    for (int e = 0; e < edges; e++) {
      previous[next[e]] = e;
    }
    ringOf = new int[edges];
    rings = new Rings(this, b.node);
  }

  public int edges() {
    return edges;
  }

  public int fromX(int e) {
    return fromX[e];
  }

  public int fromY(int e) {
    return fromY[e];
  }

  public int toX(int e) {
    return toX[e];
  }

  public int toY(int e) {
    return toY[e];
  }

  /** The edge that follows along the ring. */
  public int next(int e) {
    return next[e];
  }

  public int previous(int e) {
    return previous[e];
  }

  /** Whether the edge stands for a piece of a circle. */
  public boolean round(int e) {
    return source[e] >= 0;
  }

  public double centreX(int e) {
    return circles.cx(source[e]);
  }

  public double centreY(int e) {
    return circles.cy(source[e]);
  }

  public double radius(int e) {
    return circles.radius(source[e]);
  }

  public int ring(int e) {
    return ringOf[e];
  }

  void setRing(int e, int ring) {
    ringOf[e] = ring;
  }

  public int rings() {
    return rings.count();
  }

  /** Some edge of a ring: the one that leaves its leftmost corner. */
  public int firstEdge(int ring) {
    return rings.first(ring);
  }

  /** Enclosed area in mm², negative for a hole. */
  public double ringAreaMm2(int ring) {
    return rings.area(ring);
  }

  public boolean hole(int ring) {
    return rings.area(ring) < 0;
  }

  /** The connected piece of the figure that a ring bounds. */
  public int island(int ring) {
    return rings.island(ring);
  }

  /** Connected pieces, numbered from 0 by the leftmost corner of their rings. */
  public int islands() {
    return rings.islands();
  }

  public double areaMm2() {
    double sum = 0;
    for (int r = 0; r < rings(); r++) {
      sum += ringAreaMm2(r);
    }
    return sum;
  }

  public double islandAreaMm2(int island) {
    double sum = 0;
    for (int r = 0; r < rings(); r++) {
      if (island(r) == island) {
        sum += ringAreaMm2(r);
      }
    }
    return sum;
  }

  /** The island that covers a point, or -1. */
  public int islandAt(int x, int y) {
    int e = leftOf(x, y);
    return e >= 0 && fromY[e] > toY[e] ? island(ringOf[e]) : -1;
  }

  /** The islands that a disc touches or covers part of, in ascending order. */
  public int[] islandsWithin(int x, int y, double radius) {
    int[] near = edgesWithin(x, y, radius);
    int[] some = Arrays.copyOf(near, near.length + 1);
    for (int k = 0; k < near.length; k++) {
      some[k] = island(ringOf[near[k]]);
    }
    int here = islandAt(x, y);
    some[near.length] = here;
    return distinct(some, here < 0 ? near.length : near.length + 1);
  }

  /** The edges that a disc touches, in ascending order. */
  public int[] edgesWithin(int x, int y, double radius) {
    if (edges == 0) {
      return new int[0];
    }
    EdgeGrid g = grid();
    int n = g.coverBox(x - radius, y - radius, x + radius, y + radius);
    int[] found = new int[16];
    int count = 0;
    for (int c = 0; c < n; c++) {
      int cell = g.covered(c);
      for (int k = g.from(cell); k < g.to(cell); k++) {
        int e = g.entry(k);
        if (Distance.pointToEdge(this, e, x, y) <= radius) {
          if (count == found.length) {
            found = Arrays.copyOf(found, 2 * count);
          }
          found[count++] = e;
        }
      }
    }
    return distinct(found, count);
  }

  /** The first of some numbers, ascending, each once. */
  private static int[] distinct(int[] some, int count) {
    Arrays.sort(some, 0, count);
    int n = 0;
    for (int k = 0; k < count; k++) {
      if (n == 0 || some[n - 1] != some[k]) {
        some[n++] = some[k];
      }
    }
    return Arrays.copyOf(some, n);
  }

  /** The edge met first on the way to the left, or -1. */
  int leftOf(int x, int y) {
    return edges == 0 ? -1 : grid().leftOf(x, y);
  }

  EdgeGrid grid() {
    if (grid == null) {
      int[] ax = Arrays.copyOf(fromX, edges);
      int[] ay = Arrays.copyOf(fromY, edges);
      int[] bx = Arrays.copyOf(toX, edges);
      int[] by = Arrays.copyOf(toY, edges);
      forward = new boolean[edges];
      for (int e = 0; e < edges; e++) {
        forward[e] = ax[e] < bx[e] || (ax[e] == bx[e] && ay[e] < by[e]);
        if (!forward[e]) {
          ax[e] = toX[e];
          ay[e] = toY[e];
          bx[e] = fromX[e];
          by[e] = fromY[e];
        }
      }
      grid = new EdgeGrid(edges, ax, ay, bx, by);
    }
    return grid;
  }

  /** The boundary as rings of weight one, to be laid over other figures. */
  EdgeSet toEdges(CircleTable shared, int factor) {
    if (shared != circles) {
      EdgeSet out = new EdgeSet(shared);
      out.addAll(toEdges(circles, 1), 0, 0, factor);
      return out;
    }
    EdgeSet out = new EdgeSet(shared);
    for (int e = 0; e < edges; e++) {
      out.add(fromX[e], fromY[e], toX[e], toY[e], factor, source[e]);
    }
    return out;
  }

  /** Lays the boundary into a set of edges, as rings of the weight given. */
  public void copyTo(EdgeSet out, int weight) {
    out.addAll(toEdges(circles, 1), 0, 0, weight);
  }

  CircleTable circles() {
    return circles;
  }
}
