package etchloom.proof.copper;

import etchloom.geometry.Point;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.Overlay;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Where two figures differ by more than the flattening of their arcs.
 *
 * <p>Equal curves that were cut at other places leave slivers as thin as the chord error; a patch
 * counts where its rim is somewhere farther from the other figure's than {@link #LEAST_DEPTH_MM}.
 */
public final class CopperDifference {
  /** Twice the chord error: chords of both figures may leave the curve, each to its side. */
  public static final double LEAST_DEPTH_MM = 2 * CopperBuilder.CHORD_ERROR_MM;

  private static final int SNAP_NM = 3;

  private CopperDifference() {}

  /**
   * One connected patch.
   *
   * @param extra whether the first figure covers it, else the second
   * @param at a point of it
   * @param rim corners of its rim
   */
  public record Patch(boolean extra, Point at, double areaMm2, List<Point> rim) {
    public Patch {
      rim = List.copyOf(rim);
    }
  }

  /** What the first covers and the second does not, then the other way. */
  public static List<Patch> between(Figure found, Figure wanted) {
    Overlay.Difference d = Overlay.compare(found, wanted, SNAP_NM);
    List<Patch> out = new ArrayList<>();
    patches(d.onlyFirst(), wanted, true, out);
    patches(d.onlySecond(), found, false, out);
    return out;
  }

  private static void patches(Figure f, Figure other, boolean extra, List<Patch> out) {
    int n = f.islands();
    double[] area = new double[n];
    boolean[] deep = new boolean[n];
    int[] rim = new int[n];
    Arrays.fill(rim, -1);
    for (int r = 0; r < f.rings(); r++) {
      int i = f.island(r);
      area[i] += f.ringAreaMm2(r);
      if (!f.hole(r) && (rim[i] < 0 || f.ringAreaMm2(r) > f.ringAreaMm2(rim[i]))) {
        rim[i] = r;
      }
      deep[i] |= deep(f, r, other);
    }
    for (int i = 0; i < n; i++) {
      if (deep[i]) {
        out.add(patch(f, rim[i], extra, area[i]));
      }
    }
  }

  private static boolean deep(Figure f, int ring, Figure other) {
    double depth = LEAST_DEPTH_MM * RingPen.NM;
    int e = f.firstEdge(ring);
    do {
      int mx = (int) (((long) f.fromX(e) + f.toX(e)) / 2);
      int my = (int) (((long) f.fromY(e) + f.toY(e)) / 2);
      if (other.edgesWithin(f.fromX(e), f.fromY(e), depth).length == 0
          || other.edgesWithin(mx, my, depth).length == 0) {
        return true;
      }
      e = f.next(e);
    } while (e != f.firstEdge(ring));
    return false;
  }

  private static Patch patch(Figure f, int ring, boolean extra, double area) {
    List<Point> corners = new ArrayList<>();
    double ox = f.fromX(f.firstEdge(ring));
    double oy = f.fromY(f.firstEdge(ring));
    double sum = 0;
    double mx = 0;
    double my = 0;
    int e = f.firstEdge(ring);
    do {
      corners.add(Place.mm(f.fromX(e), f.fromY(e)));
      double ax = f.fromX(e) - ox;
      double ay = f.fromY(e) - oy;
      double bx = f.toX(e) - ox;
      double by = f.toY(e) - oy;
      double c = ax * by - bx * ay;
      sum += c;
      mx += c * (ax + bx) / 3;
      my += c * (ay + by) / 3;
      e = f.next(e);
    } while (e != f.firstEdge(ring));
    Point middle = Place.mm(ox + mx / sum, oy + my / sum);
    boolean inside = f.islandAt(Place.nm(middle.x()), Place.nm(middle.y())) == f.island(ring);
    return new Patch(extra, inside ? middle : corners.get(corners.size() / 4), area, corners);
  }
}
