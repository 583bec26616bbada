package etchloom.proof.plane;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/** Figures against closed forms and against JTS, which works them out by another road. */
class OverlayTest {
  private static final GeometryFactory JTS = new GeometryFactory();

  private static void box(EdgeSet out, double x0, double y0, double x1, double y1, int weight) {
    out.begin(x0 * 1e6, y0 * 1e6, weight);
    out.to(x1 * 1e6, y0 * 1e6, EdgeSet.STRAIGHT);
    out.to(x1 * 1e6, y1 * 1e6, EdgeSet.STRAIGHT);
    out.to(x0 * 1e6, y1 * 1e6, EdgeSet.STRAIGHT);
    out.close(EdgeSet.STRAIGHT);
  }

  @Test
  void twoBoxesThatOverlap() {
    EdgeSet s = new EdgeSet();
    box(s, 0, 0, 2, 2, 1);
    box(s, 1, 1, 3, 3, 1);
    Figure f = Overlay.union(s);
    assertEquals(7.0, f.areaMm2(), 1e-12);
    assertEquals(1, f.islands());
    assertEquals(1, f.rings());
    assertEquals(0, f.islandAt(500_000, 500_000));
    assertEquals(-1, f.islandAt(500_000, 2_500_000));
  }

  @Test
  void boxesThatShareASide_areOnePiece() {
    EdgeSet s = new EdgeSet();
    box(s, 0, 0, 1, 1, 1);
    box(s, 1, 0, 2, 1, 1);
    box(s, 0, 0, 2, 1, 1);
    Figure f = Overlay.union(s);
    assertEquals(2.0, f.areaMm2(), 1e-12);
    assertEquals(1, f.rings());
  }

  @Test
  void boxesThatTouchInAPoint_countAsJoined_andEncloseAHole() {
    EdgeSet s = new EdgeSet();
    box(s, 0, 0, 1, 1, 1);
    box(s, 1, 1, 2, 2, 1);
    Figure pair = Overlay.union(s);
    assertEquals(1, pair.islands());
    box(s, 2, 0, 3, 1, 1);
    box(s, 1, -1, 2, 0, 1);
    Figure four = Overlay.union(s);
    assertEquals(1, four.islands());
    assertEquals(2, four.rings());
    assertEquals(4.0, four.areaMm2(), 1e-12);
  }

  @Test
  void islandInAHole_belongsToItself() {
    EdgeSet s = new EdgeSet();
    box(s, 0, 0, 10, 10, 1);
    box(s, 1, 1, 9, 9, -1);
    box(s, 2, 2, 8, 8, 1);
    box(s, 3, 3, 7, 7, -1);
    Figure f = Overlay.union(s);
    assertEquals(2, f.islands());
    assertEquals(36 + 20.0, f.areaMm2(), 1e-12);
    int outer = f.islandAt(500_000, 5_000_000);
    int inner = f.islandAt(2_500_000, 5_000_000);
    assertTrue(outer != inner && outer >= 0 && inner >= 0);
    assertEquals(-1, f.islandAt(5_000_000, 5_000_000));
    assertEquals(36.0, f.islandAreaMm2(outer), 1e-12);
    assertEquals(20.0, f.islandAreaMm2(inner), 1e-12);
  }

  /** Two frames one of which lies wholly in the other's copper, so that no edges cross. */
  @Test
  void holeOfAnotherRing_belongsToTheSurroundingPiece() {
    EdgeSet s = new EdgeSet();
    box(s, 0, 0, 10, 10, 1);
    box(s, 3, 3, 7, 7, -1);
    box(s, 1, 1, 9, 9, 1);
    box(s, 4, 4, 6, 6, -1);
    Figure f = Overlay.union(s);
    assertEquals(1, f.islands());
    assertEquals(96.0, f.areaMm2(), 1e-12);
  }

  @Test
  void subtract_leavesTheRest() {
    EdgeSet s = new EdgeSet();
    box(s, 0, 0, 4, 4, 1);
    EdgeSet cut = new EdgeSet();
    box(cut, 1, -1, 2, 5, 1);
    box(cut, 1.5, -1, 2.5, 5, 1);
    Figure f = Overlay.subtract(Overlay.union(s), cut);
    assertEquals(2, f.islands());
    assertEquals(10.0, f.areaMm2(), 1e-12);
  }

  @Test
  void compare_findsWhatOnlyOneHas() {
    EdgeSet a = new EdgeSet();
    box(a, 0, 0, 4, 4, 1);
    EdgeSet b = new EdgeSet();
    box(b, 0.000001, 0, 4, 4.000001, 1);
    box(b, 5, 5, 6, 6, 1);
    Overlay.Difference d = Overlay.compare(Overlay.union(a), Overlay.union(b), 3);
    assertEquals(0.0, d.onlyFirst().areaMm2(), 0.0);
    assertEquals(1.0, d.onlySecond().areaMm2(), 1e-12);
    Overlay.Difference exact = Overlay.compare(Overlay.union(a), Overlay.union(b), 0);
    assertEquals(4e-6, exact.onlyFirst().areaMm2(), 1e-11);
    assertEquals(1 + 4e-6, exact.onlySecond().areaMm2(), 1e-11);
  }

  /**
   * Triangles with corners on a coarse grid, so that they share corners and sides, or on a fine
   * one, against the union by JTS: area, pieces, and which points are covered.
   */
  @ParameterizedTest(name = "seed {0}")
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void randomTriangles_asByJts(long seed) {
    Random random = new Random(seed);
    int grid = seed % 2 == 0 ? 12 : 1_000_000;
    double unit = 10.0 / grid;
    EdgeSet s = new EdgeSet();
    List<Geometry> parts = new ArrayList<>();
    for (int i = 0; i < 250; i++) {
      int reach = Math.max(2, grid / 12);
      double x = random.nextInt(grid);
      double y = random.nextInt(grid);
      double[] c = {x, y, 0, 0, 0, 0};
      for (int k = 2; k < 6; k++) {
        c[k] = (k % 2 == 0 ? x : y) + random.nextInt(2 * reach + 1) - reach;
      }
      double cross = (c[2] - c[0]) * (c[5] - c[1]) - (c[4] - c[0]) * (c[3] - c[1]);
      if (cross != 0) {
        triangle(s, c, unit, cross > 0 ? 1 : -1);
        parts.add(triangle(c, unit));
      }
    }
    Figure f = Overlay.union(s);
    Geometry g = UnaryUnionOp.union(parts);
    assertEquals(g.getArea(), f.areaMm2(), grid == 12 ? 2e-5 : 1e-5);
    if (grid != 12) {
      assertEquals(g.getNumGeometries(), f.islands());
      int holes = 0;
      for (int i = 0; i < g.getNumGeometries(); i++) {
        holes += ((Polygon) g.getGeometryN(i)).getNumInteriorRing();
      }
      assertEquals(holes + g.getNumGeometries(), f.rings());
    }
    IndexedPointInAreaLocator where = new IndexedPointInAreaLocator(g);
    for (int i = 0; i < 2000; i++) {
      double x = random.nextDouble() * 10;
      double y = random.nextDouble() * 10;
      boolean in = where.locate(new Coordinate(x, y)) == Location.INTERIOR;
      assertEquals(in, f.islandAt((int) (x * 1e6), (int) (y * 1e6)) >= 0, x + ", " + y);
    }
  }

  private static void triangle(EdgeSet s, double[] c, double unit, int weight) {
    s.begin(c[0] * unit * 1e6, c[1] * unit * 1e6, weight);
    s.to(c[2] * unit * 1e6, c[3] * unit * 1e6, EdgeSet.STRAIGHT);
    s.to(c[4] * unit * 1e6, c[5] * unit * 1e6, EdgeSet.STRAIGHT);
    s.close(EdgeSet.STRAIGHT);
  }

  private static Geometry triangle(double[] c, double unit) {
    Coordinate[] p = new Coordinate[4];
    for (int i = 0; i < 4; i++) {
      p[i] = new Coordinate(c[i % 3 * 2] * unit, c[i % 3 * 2 + 1] * unit);
    }
    return JTS.createPolygon(p);
  }
}
