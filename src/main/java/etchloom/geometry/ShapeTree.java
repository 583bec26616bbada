package etchloom.geometry;

import java.util.List;

/**
 * Finds which of many fat lines and arcs come near each other, in close to linear time.
 *
 * <p>A search tree of axis-parallel boxes does not do for windings: the box of a long slanted track
 * covers all its parallel neighbours, and the box of a long arc those inside it, so that every
 * track of a coil meets every other and the cost grows with the square of the turns, however the
 * tracks are cut. Here a group of shapes is bounded by one of its own members, fattened until it
 * holds the others: for neighbouring turns that is a slim bent strip. Boxes are only a first, cheap
 * test.
 *
 * <p>Shapes are lines (a point is a line with equal ends) and arcs of at most {@link
 * #MAX_SWEEP_RAD}; each is fattened by a distance of its own: half a track's width, or a pad's
 * radius.
 */
public final class ShapeTree {
  /** Bounds on groups of arcs need arcs that bend no further than a quarter turn. */
  public static final double MAX_SWEEP_RAD = Math.PI / 2 + 1e-9;

  private static final int LEAF = 4;

  /** Up to this many members a group's reach is measured, above it is added up from its halves. */
  private static final int MEASURED = 64;

  /** Told of a pair that may be near; gives back the limit to go on with. */
  @FunctionalInterface
  public interface PairVisitor {
    double visit(int i, int j, double limitMm);
  }

  /** Told of a shape that may be near; gives back the limit to go on with. */
  @FunctionalInterface
  public interface Visitor {
    double visit(int i, double limitMm);
  }

  private final FlatShapes shapes;
  private final double[] fatMm;
  private final int[] order;
  private final int[] lo;
  private final int[] hi;
  private final int[] left;
  private final int[] right;
  private final int[] middle;
  private final double[] reachMm;
  private final double[] box;
  private int nodes;

  /**
   * @param fatMm by how much each shape is fattened, mm, not negative, one entry a shape
   */
  public ShapeTree(List<? extends Segment> shapes, double[] fatMm) {
    int n = shapes.size();
    if (fatMm.length != n) {
      throw new IllegalArgumentException(n + " shapes, but " + fatMm.length + " distances");
    }
    this.shapes = new FlatShapes(shapes, fatMm);
    this.fatMm = fatMm.clone();
    order = new int[n];
    double[][] feature = new double[6][n];
    int most = Math.max(1, 2 * n);
    lo = new int[most];
    hi = new int[most];
    left = new int[most];
    right = new int[most];
    middle = new int[most];
    reachMm = new double[most];
    box = new double[4 * most];
    for (int i = 0; i < n; i++) {
      order[i] = i;
      describe(shapes.get(i), i, feature);
    }
    if (n > 0) {
      build(0, n, feature);
    }
  }

  /** Both ends, in an order that does not depend on the walking direction, and the middle. */
  private static void describe(Segment s, int i, double[][] feature) {
    if (s instanceof Arc a && !(Math.abs(a.sweepRad()) <= MAX_SWEEP_RAD)) {
      throw new IllegalArgumentException(
          "arc bends " + a.sweepRad() + " rad, too far for the tree");
    }
    Point m = s.at(0.5);
    double dx = s.end().x() - s.start().x();
    boolean back = dx < 0 || (dx == 0 && s.end().y() < s.start().y());
    Point from = back ? s.end() : s.start();
    Point to = back ? s.start() : s.end();
    feature[0][i] = from.x();
    feature[1][i] = from.y();
    feature[2][i] = m.x();
    feature[3][i] = m.y();
    feature[4][i] = to.x();
    feature[5][i] = to.y();
  }

  private int build(int from, int to, double[][] feature) {
    int node = nodes++;
    lo[node] = from;
    hi[node] = to;
    left[node] = -1;
    int at = 4 * node;
    box[at] = box[at + 1] = Double.POSITIVE_INFINITY;
    box[at + 2] = box[at + 3] = Double.NEGATIVE_INFINITY;
    if (to - from > LEAF) {
      double[] key = feature[widest(from, to, feature)];
      int mid = (from + to) >>> 1;
      Selection.split(order, key, from, to, mid);
      middle[node] = order[mid];
      left[node] = build(from, mid, feature);
      right[node] = build(mid, to, feature);
      join(at, box, 4 * left[node]);
      join(at, box, 4 * right[node]);
      reachMm[node] =
          to - from <= MEASURED
              ? reach(from, to, middle[node])
              : Math.max(viaHalf(left[node], middle[node]), viaHalf(right[node], middle[node]));
    } else {
      middle[node] = order[(from + to) >>> 1];
      reachMm[node] = reach(from, to, middle[node]);
      for (int k = from; k < to; k++) {
        join(at, shapes.box, 4 * order[k]);
      }
    }
    return node;
  }

  private void join(int at, double[] other, int from) {
    for (int side = 0; side < 4; side++) {
      double v = other[from + side];
      if (side < 2 ? v < box[at + side] : v > box[at + side]) {
        box[at + side] = v;
      }
    }
  }

  private int widest(int from, int to, double[][] feature) {
    int best = 0;
    double most = -1;
    for (int f = 0; f < feature.length; f++) {
      double min = Double.POSITIVE_INFINITY;
      double max = Double.NEGATIVE_INFINITY;
      for (int k = from; k < to; k++) {
        double v = feature[f][order[k]];
        min = v < min ? v : min;
        max = v > max ? v : max;
      }
      if (max - min > most) {
        most = max - min;
        best = f;
      }
    }
    return best;
  }

  private double reach(int from, int to, int c) {
    double reach = 0;
    for (int k = from; k < to; k++) {
      int i = order[k];
      double own = i == c ? 0 : shapes.reach(i, c);
      reach = Math.max(reach, own + fatMm[i]);
    }
    return reach;
  }

  private double viaHalf(int half, int c) {
    int m = middle[half];
    return reachMm[half] + (m == c ? 0 : shapes.reach(m, c));
  }

  /**
   * Visits every pair i &lt; j whose fat shapes may be as near as the limit, each once, in a fixed
   * order that follows the tree and not the indices.
   *
   * @param limitMm gap between the fat shapes up to which pairs are wanted, not negative
   */
  public void pairs(double limitMm, PairVisitor visitor) {
    if (nodes > 0) {
      inside(0, limitMm, visitor);
    }
  }

  private double inside(int u, double limit, PairVisitor visitor) {
    double now = limit;
    if (left[u] >= 0) {
      now = inside(left[u], now, visitor);
      now = inside(right[u], now, visitor);
      return between(left[u], right[u], now, visitor);
    }
    for (int a = lo[u]; a < hi[u]; a++) {
      for (int b = a + 1; b < hi[u]; b++) {
        now = items(order[a], order[b], now, visitor);
      }
    }
    return now;
  }

  private double items(int i, int j, double limit, PairVisitor visitor) {
    if (boxesApart(shapes.box, 4 * i, shapes.box, 4 * j, limit)
        || FlatShapes.apart(shapes, i, shapes, j, fatMm[i] + fatMm[j] + limit)) {
      return limit;
    }
    return Math.max(0, visitor.visit(Math.min(i, j), Math.max(i, j), limit));
  }

  private double between(int u, int v, double limit, PairVisitor visitor) {
    if (apart(u, v, limit)) {
      return limit;
    }
    double now = limit;
    if (left[u] < 0 && left[v] < 0) {
      for (int a = lo[u]; a < hi[u]; a++) {
        for (int b = lo[v]; b < hi[v]; b++) {
          now = items(order[a], order[b], now, visitor);
        }
      }
      return now;
    }
    boolean cutFirst = left[v] < 0 || (left[u] >= 0 && reachMm[u] >= reachMm[v]);
    if (cutFirst) {
      now = between(left[u], v, now, visitor);
      return between(right[u], v, now, visitor);
    }
    now = between(u, left[v], now, visitor);
    return between(u, right[v], now, visitor);
  }

  private boolean apart(int u, int v, double limit) {
    if (boxesApart(box, 4 * u, box, 4 * v, limit)) {
      return true;
    }
    double held = reachMm[u] + reachMm[v] + limit;
    return FlatShapes.apart(shapes, middle[u], shapes, middle[v], held);
  }

  /** Visits every shape that may be as near to the given one as the limit, in a fixed order. */
  public void near(Segment shape, double shapeFatMm, double limitMm, Visitor visitor) {
    if (nodes > 0) {
      FlatShapes own = new FlatShapes(List.of(shape), new double[] {shapeFatMm});
      near(0, own, shapeFatMm, limitMm, visitor);
    }
  }

  private double near(int u, FlatShapes own, double ownFat, double limit, Visitor visitor) {
    if (boxesApart(own.box, 0, box, 4 * u, limit)
        || FlatShapes.apart(own, 0, shapes, middle[u], ownFat + reachMm[u] + limit)) {
      return limit;
    }
    double now = limit;
    if (left[u] >= 0) {
      now = near(left[u], own, ownFat, now, visitor);
      return near(right[u], own, ownFat, now, visitor);
    }
    for (int k = lo[u]; k < hi[u]; k++) {
      int i = order[k];
      if (!boxesApart(own.box, 0, shapes.box, 4 * i, now)
          && !FlatShapes.apart(own, 0, shapes, i, ownFat + fatMm[i] + now)) {
        now = Math.max(0, visitor.visit(i, now));
      }
    }
    return now;
  }

  private static boolean boxesApart(double[] a, int i, double[] b, int j, double limit) {
    return a[i] - b[j + 2] > limit
        || b[j] - a[i + 2] > limit
        || a[i + 1] - b[j + 3] > limit
        || b[j + 1] - a[i + 3] > limit;
  }
}
