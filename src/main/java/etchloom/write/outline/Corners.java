package etchloom.write.outline;

import etchloom.geometry.Grid;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Numbers for points: those within {@link Edge#SAME_MM} of each other share one. */
final class Corners {
  /** Much wider than what counts as one point, so that most points need one look-up only. */
  private static final double CELL_MM = 40 * Edge.SAME_MM;

  private final Map<Long, Integer> lastInCell = new HashMap<>();
  private final List<Point> points = new ArrayList<>();

  /** The corner before this one in the same cell, or -1. */
  private int[] before = new int[256];

  /** The number of the corner at a point, a new one where there is none. */
  int at(Point p) {
    long x0 = cell(p.x() - Edge.SAME_MM);
    long x1 = cell(p.x() + Edge.SAME_MM);
    long y0 = cell(p.y() - Edge.SAME_MM);
    long y1 = cell(p.y() + Edge.SAME_MM);
    for (long x = x0; x <= x1; x++) {
      for (long y = y0; y <= y1; y++) {
        int found = find(key(x, y), p);
        if (found >= 0) {
          return found;
        }
      }
    }
    return add(p);
  }

  /** The corner's place on the grid. */
  Point point(int corner) {
    return points.get(corner);
  }

  int count() {
    return points.size();
  }

  private int find(long key, Point p) {
    for (int i = lastInCell.getOrDefault(key, -1); i >= 0; i = before[i]) {
      if (Edge.same(points.get(i), p)) {
        return i;
      }
    }
    return -1;
  }

  private int add(Point p) {
    int n = points.size();
    if (n == before.length) {
      before = Arrays.copyOf(before, 2 * n);
    }
    Integer last = lastInCell.put(key(cell(p.x()), cell(p.y())), n);
    before[n] = last == null ? -1 : last;
    points.add(Grid.snap(p));
    return n;
  }

  private static long cell(double mm) {
    return (long) Math.floor(mm / CELL_MM);
  }

  private static long key(long x, long y) {
    return (x << 32) ^ (y & 0xFFFFFFFFL);
  }
}
