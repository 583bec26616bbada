package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Location;

class ContoursTest {
  /** A quarter ring with a bite: lines and arcs of both senses. */
  private static Path bitten() {
    Point a = new Point(3, 0);
    Point b = new Point(0, 3);
    Point c = new Point(0, 1);
    Point d = new Point(1, 0);
    return Path.of(
        new Arc(a, b, Point.ORIGIN, true),
        new Arc(b, c, new Point(0, 2), false),
        new Arc(c, d, Point.ORIGIN, false),
        new Line(d, a));
  }

  @Test
  void area_closedForm() {
    // A quarter of the ring between 1 and 3, less half a disc of radius 1.
    double ring = Math.PI * (9 - 1) / 4;
    assertEquals(ring - Math.PI / 2, Contours.signedAreaMm2(bitten()), 1e-12);
    assertEquals(-ring + Math.PI / 2, Contours.signedAreaMm2(bitten().reversed()), 1e-12);
    Path far = bitten().mapped(p -> p.plus(new Point(1e5, -1e5)));
    assertEquals(ring - Math.PI / 2, Contours.signedAreaMm2(far), 1e-9);
  }

  /** Against JTS on the finely chorded contour, points next to the chords left out. */
  @Test
  void inside_againstJts() {
    Path path = bitten();
    Contour contour = new Contour(path);
    Geometry shape = TestCopper.filled(path);
    IndexedPointInAreaLocator jts = new IndexedPointInAreaLocator(shape);
    Random random = new Random(7);
    int inside = 0;
    int asked = 0;
    for (int i = 0; i < 4000; i++) {
      // Every second point as high as a corner or the top of an arc, where a ray is hardest.
      double y =
          i % 2 == 0 ? 4 * random.nextDouble() - 0.5 : List.of(0.0, 1.0, 2.0, 3.0).get(i / 2 % 4);
      Coordinate c = new Coordinate(4 * random.nextDouble() - 0.5, y);
      if (shape.getBoundary().distance(shape.getFactory().createPoint(c)) > 1e-4) {
        Point at = new Point(c.x, c.y);
        boolean wanted = jts.locate(c) == Location.INTERIOR;
        assertEquals(wanted, Contours.inside(contour.besides(at), at), () -> "at " + c);
        inside += wanted ? 1 : 0;
        asked++;
      }
    }
    assertEquals(true, inside > 500 && asked - inside > 500, inside + " of " + asked);
  }
}
