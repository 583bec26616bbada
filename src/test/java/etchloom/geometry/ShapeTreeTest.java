package etchloom.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The tree and its cheap bounds against the exact distance of every pair. */
class ShapeTreeTest {
  static LongStream seeds() {
    return LongStream.range(0, 60);
  }

  private static final class Shapes {
    private final List<Segment> shapes;
    private final double[] fat;

    Shapes(List<Segment> shapes, double[] fat) {
      this.shapes = shapes;
      this.fat = fat;
    }

    List<Segment> shapes() {
      return shapes;
    }

    double[] fat() {
      return fat;
    }

    double gap(int i, int j) {
      return Distance.between(shapes.get(i), shapes.get(j)).distanceMm() - fat[i] - fat[j];
    }
  }

  /** Lines, points and arcs of up to a quarter turn, many of them concentric or parallel. */
  private static Shapes shapes(Random rnd) {
    List<Segment> out = new ArrayList<>();
    Point hub = new Point(20 * rnd.nextDouble(), 20 * rnd.nextDouble());
    int n = 1 + rnd.nextInt(150);
    double[] fat = new double[n];
    for (int i = 0; i < n; i++) {
      fat[i] = rnd.nextBoolean() ? 0.1 : 0.5 * rnd.nextDouble();
      Point p = new Point(20 * rnd.nextDouble(), 20 * rnd.nextDouble());
      double sweep = (rnd.nextBoolean() ? 1 : -1) * (1e-4 + 1.5707 * rnd.nextDouble());
      switch (rnd.nextInt(5)) {
        case 0 -> out.add(new Line(p, p));
        case 1 -> out.add(new Line(p, p.plus(Point.polar(8, 0.7))));
        case 2 -> out.add(new Line(p, p.plus(Point.polar(9 * rnd.nextDouble(), rnd.nextInt(7)))));
        case 3 -> out.add(Arc.of(hub, 0.2 + 12 * rnd.nextDouble(), 7 * rnd.nextDouble(), sweep));
        default -> out.add(Arc.of(p, 0.1 + 2 * rnd.nextDouble(), 7 * rnd.nextDouble(), sweep));
      }
    }
    return new Shapes(out, fat);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void pairs_missesNoPairWithinTheLimit(long seed) {
    Random rnd = new Random(seed);
    Shapes s = shapes(rnd);
    double limit = 0.5 * rnd.nextDouble();
    Set<Long> visited = new HashSet<>();
    new ShapeTree(s.shapes(), s.fat())
        .pairs(
            limit,
            (i, j, l) -> {
              assertTrue(i < j);
              assertTrue(visited.add(i * 1000L + j), "visited twice");
              return l;
            });
    for (int i = 0; i < s.fat().length; i++) {
      for (int j = i + 1; j < s.fat().length; j++) {
        int a = i;
        int b = j;
        assertTrue(
            visited.contains(i * 1000L + j) || s.gap(i, j) > limit,
            () -> s.shapes().get(a) + " and " + s.shapes().get(b) + ": " + s.gap(a, b));
      }
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void pairs_withAShrinkingLimit_findsTheNearest(long seed) {
    Shapes s = shapes(new Random(seed));
    double[] best = {Double.POSITIVE_INFINITY};
    new ShapeTree(s.shapes(), s.fat())
        .pairs(
            1000,
            (i, j, l) -> {
              best[0] = Math.min(best[0], s.gap(i, j));
              return Math.max(0, best[0]);
            });
    double exact = Double.POSITIVE_INFINITY;
    for (int i = 0; i < s.fat().length; i++) {
      for (int j = i + 1; j < s.fat().length; j++) {
        exact = Math.min(exact, s.gap(i, j));
      }
    }
    // Below 0 the search may stop at any overlap.
    assertEquals(Math.max(0, exact), Math.max(0, best[0]), 1e-8);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void near_missesNothingWithinTheLimit(long seed) {
    Random rnd = new Random(seed);
    Shapes s = shapes(rnd);
    Segment asked =
        rnd.nextBoolean()
            ? shapes(rnd).shapes().get(0)
            : Arc.of(new Point(10, 10), 12 * rnd.nextDouble() + 0.1, 7 * rnd.nextDouble(), Math.PI);
    double limit = rnd.nextDouble();
    Set<Integer> visited = new TreeSet<>();
    new ShapeTree(s.shapes(), s.fat())
        .near(
            asked,
            0.3,
            limit,
            (i, l) -> {
              visited.add(i);
              return l;
            });
    for (int i = 0; i < s.fat().length; i++) {
      double gap = Distance.between(asked, s.shapes().get(i)).distanceMm() - 0.3 - s.fat()[i];
      assertTrue(visited.contains(i) || gap > limit, s.shapes().get(i) + " and " + asked);
    }
  }

  /** No point of a shape may lie further from the other shape than the bound says. */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void reach_isNoLessThanTheFarthestPoint(long seed) {
    Shapes s = shapes(new Random(seed));
    FlatShapes flat = new FlatShapes(s.shapes(), s.fat());
    int n = Math.min(25, s.fat().length);
    for (int i = 0; i < n; i++) {
      for (int c = 0; c < n; c++) {
        double bound = flat.reach(i, c);
        for (int k = 0; k <= 8; k++) {
          Point p = s.shapes().get(i).at(k / 8.0);
          double far = Distance.between(p, s.shapes().get(c)).distanceMm();
          assertTrue(far <= bound + 1e-12, s.shapes().get(i) + " and " + s.shapes().get(c));
        }
      }
    }
  }

  @Test
  void arcsOverAQuarterTurn_areRefused() {
    List<Segment> half = List.of(Arc.of(Point.ORIGIN, 1, 0, 2));
    assertThrows(IllegalArgumentException.class, () -> new ShapeTree(half, new double[] {0}));
  }

  @Test
  void parallelSlantedTracks_meetOnlyTheirNeighbours() {
    // 200 lines at 45°, 0.4 mm apart, 30 mm long: their boxes all overlap.
    List<Segment> lines = new ArrayList<>();
    for (int i = 0; i < 200; i++) {
      Point from = Point.polar(0.4 * i, -Math.PI / 4);
      lines.add(new Line(from, from.plus(Point.polar(30, Math.PI / 4))));
    }
    int[] visits = {0};
    double[] fat = new double[200];
    java.util.Arrays.fill(fat, 0.1);
    new ShapeTree(lines, fat)
        .pairs(
            0.21,
            (i, j, l) -> {
              visits[0]++;
              assertFalse(j > i + 1);
              return l;
            });
    assertEquals(199, visits[0]);
  }
}
