package etchloom.proof.plane;

/**
 * Whether rings run along the boundary of a figure: both are walked round together, and each corner
 * of the one must lie near the edge of the other that the walk has come to. That bounds the Fréchet
 * distance, and so also that of any point of the one from the other. Linear in the edges.
 */
public final class RingWalk {
  private final Figure f;
  private final EdgeSet rings;
  private final double radius;

  private RingWalk(Figure f, EdgeSet rings, double radiusNm) {
    this.f = f;
    this.rings = rings;
    this.radius = radiusNm;
  }

  /**
   * Every ring must follow one of the figure's, and every one of the figure's must be followed.
   *
   * @param rings of weight 1, laid down ring after ring, the figure on their left
   */
  public static boolean follow(EdgeSet rings, Figure f, double radiusNm) {
    return new RingWalk(f, rings, radiusNm).all();
  }

  private boolean all() {
    boolean[] followed = new boolean[f.rings()];
    int count = 0;
    int k = 0;
    while (k < rings.size) {
      int end = k + 1;
      while (end < rings.size && startX(end) == endX(end - 1) && startY(end) == endY(end - 1)) {
        end++;
      }
      int ring = follows(k, end, followed);
      if (ring < 0) {
        return false;
      }
      followed[ring] = true;
      count++;
      k = end;
    }
    return count == f.rings();
  }

  private int startX(int k) {
    return rings.weight[k] > 0 ? rings.ax[k] : rings.bx[k];
  }

  private int startY(int k) {
    return rings.weight[k] > 0 ? rings.ay[k] : rings.by[k];
  }

  private int endX(int k) {
    return rings.weight[k] > 0 ? rings.bx[k] : rings.ax[k];
  }

  private int endY(int k) {
    return rings.weight[k] > 0 ? rings.by[k] : rings.ay[k];
  }

  /** The figure's ring that the edges from one number to before another follow, or -1. */
  private int follows(int from, int to, boolean[] followed) {
    for (int e : f.edgesWithin(startX(from), startY(from), radius)) {
      if (!followed[f.ring(e)] && walk(from, to, e)) {
        return f.ring(e);
      }
    }
    return -1;
  }

  private boolean walk(int from, int to, int start) {
    int n = to - from;
    int i = 0;
    int e = start;
    boolean round = false;
    while (i < n || !round) {
      int k = from + i % n;
      if (i < n && near(f.fromX(e), f.fromY(e), f.toX(e), f.toY(e), endX(k), endY(k))) {
        i++;
      } else if (!round && near(startX(k), startY(k), endX(k), endY(k), f.toX(e), f.toY(e))) {
        e = f.next(e);
        round = e == start;
      } else {
        return false;
      }
    }
    return true;
  }

  private boolean near(int ax, int ay, int bx, int by, int x, int y) {
    return Distance.pointToEdge(ax, ay, bx, by, x, y) <= radius;
  }
}
