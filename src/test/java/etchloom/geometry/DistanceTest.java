package etchloom.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;

class DistanceTest {
  private static final double PI = Math.PI;

  private static Line line(double x0, double y0, double x1, double y1) {
    return new Line(new Point(x0, y0), new Point(x1, y1));
  }

  private static Arc arc(double cx, double cy, double r, double startDeg, double sweepDeg) {
    return Arc.of(new Point(cx, cy), r, Math.toRadians(startDeg), Math.toRadians(sweepDeg));
  }

  private static Arguments of(String name, Segment a, Segment b, double expected) {
    return Arguments.of(name, a, b, expected);
  }

  static Stream<Arguments> byHand() {
    Arc quarter = arc(0, 0, 5, 0, 90);
    return Stream.of(
        // Lines.
        of("parallel, overlapping", line(0, 0, 4, 0), line(1, 0.3, 9, 0.3), 0.3),
        // Ends (4,0) and (7,4): a 3-4-5 triangle.
        of("parallel, apart along", line(0, 0, 4, 0), line(7, 4, 9, 4), 5),
        of("collinear, apart", line(0, 0, 4, 0), line(6.5, 0, 9, 0), 2.5),
        of("collinear, overlapping", line(0, 0, 4, 0), line(3, 0, 9, 0), 0),
        of("crossing", line(-1, -1, 1, 1), line(-1, 1, 1, -1), 0),
        of("touching end to end", line(0, 0, 4, 0), line(4, 0, 5, 7), 0),
        of("end touches the middle", line(0, 0, 4, 0), line(2, 0, 2, 9), 0),
        // The end (2,0.25) stands over the inside of the first.
        of("end over the middle", line(0, 0, 4, 0), line(2, 0.25, 3, 8), 0.25),
        // (3,1) to y = x: |3 - 1| / sqrt 2.
        of("slanted", line(0, 0, 10, 10), line(3, 1, 9, -5), 2 / Math.sqrt(2)),
        of("two points", line(0, 0, 0, 0), line(3, 4, 3, 4), 5),
        // Line and arc.
        // x + y = 10 from the origin 10/sqrt 2, less the radius.
        of(
            "tangent direction inside the sweep",
            line(10, 0, 0, 10),
            quarter,
            10 / Math.sqrt(2) - 5),
        // The foot (-5,-5) lies outside the quarter; nearest are the ends (0,5): |0+5+10|/sqrt 2.
        of("foot outside the sweep", line(-10, 0, 0, -10), quarter, 15 / Math.sqrt(2)),
        of("line crosses the arc", line(0, 0, 5, 5), quarter, 0),
        // Inside the circle, end (3,1): 5 - sqrt 10.
        of("line inside the circle", line(1, 1, 3, 1), quarter, 5 - Math.sqrt(10)),
        of("line tangent to the arc", line(5, -3, 5, 3), quarter, 0),
        // x = 5.2 against the full circle's rightmost point.
        of("parallel to the tangent", line(5.2, -3, 5.2, 3), arc(0, 0, 5, -45, 90), 0.2),
        // End (0,-2) to the arc's end (5,0): sqrt 29.
        of("end to end", line(0, -9, 0, -2), quarter, Math.sqrt(29)),
        of("a point at the centre", line(0, 0, 0, 0), quarter, 5),
        of("line through the centre, short", line(-1, -1, 1, 1), quarter, 5 - Math.sqrt(2)),
        // Arcs.
        of("concentric", quarter, arc(0, 0, 5.4, 30, 20), 0.4),
        // Ends (5,0) and (0,-5.4).
        of("concentric, no common direction", quarter, arc(0, 0, 5.4, 180, 90), Math.hypot(5, 5.4)),
        // Full left and right bulges: centres 12 apart, radii 5 and 5.
        of("side by side", arc(0, 0, 5, -60, 120), arc(12, 0, 5, 120, 120), 2),
        of("one circle inside the other", arc(0, 0, 5, -90, 180), arc(1, 0, 2, -90, 180), 2),
        // 3-4-5: circles of radius 3 and 4 about centres 5 apart cross at (1.8, 2.4).
        of("crossing circles", arc(0, 0, 3, 0, 90), arc(5, 0, 4, 90, 90), 0),
        // The same, but the second runs below only: its end (1,0) to the first: 3 - 1 = 2,
        // while its point (1.8,-2.4) is nearest to (3,0): sqrt(1.44 + 5.76) = 2.683.
        of("circles cross outside the arcs", arc(0, 0, 3, 0, 90), arc(5, 0, 4, 180, 90), 2),
        of("touching circles", arc(0, 0, 2, -90, 180), arc(5, 0, 3, 90, 180), 0),
        of("same circle, apart", arc(0, 0, 5, 0, 30), arc(0, 0, 5, 90, 30), 10 * Math.sin(PI / 6)),
        of("same circle, overlapping", arc(0, 0, 5, 0, 60), arc(0, 0, 5, 30, 60), 0),
        of("clockwise", arc(0, 0, 5, 90, -90), arc(0, 0, 4.5, 80, -20), 0.5),
        // Gap of a C-shaped arc of 350 degrees: the chord over 10 degrees to its own closing line.
        of(
            "into the gap of a C",
            arc(0, 0, 5, 5, 350),
            line(5, 0, 9, 0),
            10 * Math.sin(Math.toRadians(2.5))),
        // Sweep of a millionth of a degree at (5,0) against the far side of the circle.
        of("tiny sweep", arc(0, 0, 5, 0, 1e-6), line(-5, -1, -5, 1), 10),
        of("tiny sweep, near", arc(0, 0, 5, 0, 1e-6), line(5.5, -1, 5.5, 1), 0.5),
        // Tiny gap opposite to the point: the arc still passes (-5,0).
        of("tiny gap", arc(0, 0, 5, 1e-6, 360 - 2e-6), line(-6, 0, -9, 0), 1));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("byHand")
  void distance_byHand(String name, Segment a, Segment b, double expected) {
    double tolerance = 1e-12;
    for (Segment s : new Segment[] {a, a.reversed()}) {
      for (Segment t : new Segment[] {b, b.reversed()}) {
        Nearest n = Distance.between(s, t);
        assertEquals(expected, n.distanceMm(), tolerance, name);
        assertEquals(expected, n.onFirst().distanceTo(n.onSecond()), tolerance);
        assertEquals(0, Distance.between(n.onFirst(), s).distanceMm(), tolerance);
        assertEquals(0, Distance.between(n.onSecond(), t).distanceMm(), tolerance);
        assertEquals(expected, Distance.between(t, s).distanceMm(), tolerance);
      }
    }
  }

  @Test
  void nearestPoints_ofTwoArcs_standOnTheLineOfCentres() {
    Nearest n = Distance.between(arc(0, 0, 5, -60, 120), arc(12, 0, 5, 120, 120));
    assertEquals(0, n.onFirst().distanceTo(new Point(5, 0)), 1e-12);
    assertEquals(0, n.onSecond().distanceTo(new Point(7, 0)), 1e-12);
  }

  @Test
  void pointToArc_besideItsSweep_goesToTheEnd() {
    // (0,-3) to (5,0): sqrt 34.
    assertEquals(
        Math.sqrt(34), Distance.between(new Point(0, -3), arc(0, 0, 5, 0, 90)).distanceMm(), 1e-12);
  }

  static LongStream seeds() {
    return LongStream.range(0, 200);
  }

  private static Segment random(Random rnd) {
    Point p = new Point(10 * rnd.nextDouble(), 10 * rnd.nextDouble());
    if (rnd.nextBoolean()) {
      return new Line(p, new Point(10 * rnd.nextDouble(), 10 * rnd.nextDouble()));
    }
    double sweep = (rnd.nextBoolean() ? 1 : -1) * (1e-3 + 6.27 * rnd.nextDouble());
    return Arc.of(p, 0.05 + 5 * rnd.nextDouble(), 7 * rnd.nextDouble(), sweep);
  }

  /**
   * Samples at spacing h: each true nearest point has a sample within h/2, so the sampled distance
   * is at least the true one and at most h greater.
   */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void distance_againstDenseSamples(long seed) {
    Random rnd = new Random(seed);
    Segment a = random(rnd);
    Segment b = random(rnd);
    int n = 400;
    double sampled = Double.POSITIVE_INFINITY;
    for (int i = 0; i <= n; i++) {
      Point p = a.at(i / (double) n);
      for (int j = 0; j <= n; j++) {
        sampled = Math.min(sampled, p.distanceTo(b.at(j / (double) n)));
      }
    }
    double spacing = (a.lengthMm() + b.lengthMm()) / n / 2;
    double got = Distance.between(a, b).distanceMm();
    assertTrue(got <= sampled + 1e-12, () -> "too great: " + got + " for " + a + " and " + b);
    assertTrue(got >= sampled - spacing, () -> "too small: " + got + " for " + a + " and " + b);
  }

  private static Geometry chords(Segment s, int pieces) {
    Coordinate[] c = new Coordinate[pieces + 1];
    for (int i = 0; i <= pieces; i++) {
      Point p = s.at(i / (double) pieces);
      c[i] = new Coordinate(p.x(), p.y());
    }
    return new GeometryFactory().createLineString(c);
  }

  /** JTS measures the distance of chords; each chord leaves its arc by at most r(1 - cos(a/2)). */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void distance_againstJtsOnChords(long seed) {
    Random rnd = new Random(1000 + seed);
    Segment a = random(rnd);
    Segment b = random(rnd);
    int pieces = 1000;
    double jts = chords(a, pieces).distance(chords(b, pieces));
    // r at most 5.05, a at most 6.28/1000: error of each side at most 2.5e-5 mm.
    assertEquals(jts, Distance.between(a, b).distanceMm(), 5e-5);
  }
}
