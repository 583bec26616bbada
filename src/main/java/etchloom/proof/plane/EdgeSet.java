package etchloom.proof.plane;

import java.util.Arrays;

/**
 * Closed rings as a growing heap of directed edges on the 1 nm grid. An edge adds its weight to the
 * winding number of all that lies on its left. Every edge keeps the circle it approximates, so that
 * distances can be measured on the true curve afterwards.
 *
 * <p>Coordinates stay within ±1 m: differences then fit 31 bits and the cross product of two of
 * them a long, so that every decision about sides is exact.
 */
public final class EdgeSet {
  /** Largest coordinate, nm. */
  public static final int LIMIT_NM = 1_000_000_000;

  /** The source of an edge that is straight by itself. */
  public static final int STRAIGHT = -1;

  int size;
  int[] ax = new int[64];
  int[] ay = new int[64];
  int[] bx = new int[64];
  int[] by = new int[64];
  int[] weight = new int[64];
  int[] source = new int[64];
  private final CircleTable circles;

  private int ringX;
  private int ringY;
  private int firstX;
  private int firstY;
  private int ringWeight;

  public EdgeSet() {
    this(new CircleTable());
  }

  /** A set whose edges speak of circles that another set has too. */
  EdgeSet(CircleTable circles) {
    this.circles = circles;
  }

  public int size() {
    return size;
  }

  CircleTable circles() {
    return circles;
  }

  /** A circle that edges may name as their source; nm. */
  public int circle(double cx, double cy, double radius) {
    return circles.add(cx, cy, radius);
  }

  /** Starts a ring; nm, rounded to the grid. */
  public void begin(double x, double y, int weightOfRing) {
    firstX = grid(x);
    firstY = grid(y);
    ringX = firstX;
    ringY = firstY;
    ringWeight = weightOfRing;
  }

  /** The next corner of the ring; an edge of no length is left out. */
  public void to(double x, double y, int sourceOfEdge) {
    toGrid(grid(x), grid(y), sourceOfEdge);
  }

  /** Ends the ring at its start. */
  public void close(int sourceOfEdge) {
    toGrid(firstX, firstY, sourceOfEdge);
  }

  private void toGrid(int x, int y, int sourceOfEdge) {
    add(ringX, ringY, x, y, ringWeight, sourceOfEdge);
    ringX = x;
    ringY = y;
  }

  /** One directed edge, stored from its lower left end with the sign of its weight to match. */
  void add(int x0, int y0, int x1, int y1, int w, int sourceOfEdge) {
    if ((x0 == x1 && y0 == y1) || w == 0) {
      return;
    }
    if (size == ax.length) {
      grow();
    }
    boolean forward = x0 < x1 || (x0 == x1 && y0 < y1);
    ax[size] = forward ? x0 : x1;
    ay[size] = forward ? y0 : y1;
    bx[size] = forward ? x1 : x0;
    by[size] = forward ? y1 : y0;
    weight[size] = forward ? w : -w;
    source[size] = sourceOfEdge;
    size++;
  }

  /** All edges of another set, moved, weights multiplied. */
  public void addAll(EdgeSet o, int dx, int dy, int factor) {
    boolean same = circles == o.circles;
    int shift = same ? 0 : circles.addAll(o.circles, dx, dy);
    if (same && (dx != 0 || dy != 0)) {
      throw new IllegalArgumentException("edges cannot be moved away from their own circles");
    }
    for (int i = 0; i < o.size; i++) {
      int s = o.source[i] < 0 ? STRAIGHT : o.source[i] + shift;
      add(
          checked(o.ax[i] + (long) dx),
          checked(o.ay[i] + (long) dy),
          checked(o.bx[i] + (long) dx),
          checked(o.by[i] + (long) dy),
          o.weight[i] * factor,
          s);
    }
  }

  /** The same set, edges that lie on each other taken together and dropped where they cancel. */
  EdgeSet cancelled() {
    NodeTable table = new NodeTable(size);
    EdgeTable merged = new EdgeTable(size);
    for (int i = 0; i < size; i++) {
      merged.add(table.id(ax[i], ay[i]), table.id(bx[i], by[i]), weight[i], source[i]);
    }
    int n = merged.dropEmpty();
    int[] u = merged.from();
    int[] v = merged.to();
    int[] w = merged.weight();
    int[] s = merged.source();
    int[] x = table.x();
    int[] y = table.y();
    EdgeSet out = new EdgeSet(circles);
    for (int e = 0; e < n; e++) {
      out.add(x[u[e]], y[u[e]], x[v[e]], y[v[e]], w[e], s[e]);
    }
    return out;
  }

  private void grow() {
    int n = size * 2;
    ax = Arrays.copyOf(ax, n);
    ay = Arrays.copyOf(ay, n);
    bx = Arrays.copyOf(bx, n);
    by = Arrays.copyOf(by, n);
    weight = Arrays.copyOf(weight, n);
    source = Arrays.copyOf(source, n);
  }

  private static int grid(double v) {
    double r = Math.rint(v);
    if (!(Math.abs(r) <= LIMIT_NM)) {
      throw new OutOfRange("coordinate " + v * 1e-6 + " mm is beyond 1000 mm from the origin");
    }
    return (int) r;
  }

  private static int checked(long v) {
    if (Math.abs(v) > LIMIT_NM) {
      throw new OutOfRange("coordinate " + v * 1e-6 + " mm is beyond 1000 mm from the origin");
    }
    return (int) v;
  }
}
