package etchloom.proof.plane;

/** Edges to be asked whether one of them passes near a point. */
public final class EdgeCloud {
  private final int size;
  private final int[] ax;
  private final int[] ay;
  private final int[] bx;
  private final int[] by;
  private final EdgeGrid grid;

  public EdgeCloud(EdgeSet set) {
    this(set.size, set.ax, set.ay, set.bx, set.by);
  }

  private EdgeCloud(int size, int[] ax, int[] ay, int[] bx, int[] by) {
    this.size = size;
    this.ax = ax;
    this.ay = ay;
    this.bx = bx;
    this.by = by;
    this.grid = new EdgeGrid(size, ax, ay, bx, by);
  }

  /** The boundary of a figure. */
  public static EdgeCloud of(Figure f) {
    return new EdgeCloud(f.toEdges(f.circles(), 1));
  }

  public int size() {
    return size;
  }

  /** Whether an edge passes within a distance of a point, nm. */
  public boolean near(int x, int y, double radius) {
    if (size == 0) {
      return false;
    }
    int n = grid.coverBox(x - radius, y - radius, x + radius, y + radius);
    for (int c = 0; c < n; c++) {
      int cell = grid.covered(c);
      for (int k = grid.from(cell); k < grid.to(cell); k++) {
        int e = grid.entry(k);
        if (Distance.pointToEdge(ax[e], ay[e], bx[e], by[e], x, y) <= radius) {
          return true;
        }
      }
    }
    return false;
  }

  /**
   * Whether all edges of this and of the other pass near each other: no corner and no middle of an
   * edge is farther than {@code radius} from some edge of the other.
   */
  public boolean follows(EdgeCloud other, double radius) {
    return within(other, radius) && other.within(this, radius);
  }

  private boolean within(EdgeCloud other, double radius) {
    for (int e = 0; e < size; e++) {
      // Edges of a ring follow each other: one corner has been asked for with the edge before.
      boolean good = (e > 0 && corner(e - 1, ax[e], ay[e])) || other.near(ax[e], ay[e], radius);
      good &= (e > 0 && corner(e - 1, bx[e], by[e])) || other.near(bx[e], by[e], radius);
      if (Math.abs((long) bx[e] - ax[e]) + Math.abs((long) by[e] - ay[e]) > 20 * radius) {
        int mx = (int) (((long) ax[e] + bx[e]) / 2);
        int my = (int) (((long) ay[e] + by[e]) / 2);
        good &= other.near(mx, my, radius);
      }
      if (!good) {
        return false;
      }
    }
    return true;
  }

  private boolean corner(int e, int x, int y) {
    return (ax[e] == x && ay[e] == y) || (bx[e] == x && by[e] == y);
  }
}
