package etchloom.proof.copper;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.geometry.Arc;
import etchloom.geometry.Grid;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;

/** Copper whose area is known in closed form, and random strokes against the buffers of JTS. */
class CopperBuilderTest {
  private static final CopperBuilder BUILDER = new CopperBuilder();

  static DrawnObject stroke(double width, boolean dark, Segment... path) {
    return new DrawnObject.Stroke(
        Path.of(path), new ApertureShape.Circle(width, 0), dark, Attributes.NONE, 1);
  }

  static DrawnObject flash(Point at, ApertureShape shape, boolean dark) {
    return new DrawnObject.Flash(at, shape, 10, dark, Attributes.NONE, 1);
  }

  private static double area(DrawnObject... objects) {
    return BUILDER.build(List.of(objects)).areaMm2();
  }

  private static Line line(double x0, double y0, double x1, double y1) {
    return new Line(new Point(x0, y0), new Point(x1, y1));
  }

  @Test
  void straightStroke_isStripAndDisc() {
    double want = 10 * 0.2 + Math.PI * 0.01;
    assertEquals(want, area(stroke(0.2, true, line(0, 0, 8, 6))), 1e-6);
  }

  @Test
  void dot_isTheDiscOfThePen() {
    assertEquals(Math.PI / 4, area(stroke(1, true, line(3, 3, 3, 3))), 1e-5);
  }

  /**
   * A right-angled corner: two strips share a square of side r, a quarter disc rounds the outside.
   */
  @Test
  void corner_hasARoundOutsideAndASharpInside() {
    double r = 0.1;
    double want = 2 * 5 * 2 * r - r * r + Math.PI * r * r / 4 + Math.PI * r * r;
    // strips 5 x 0.2 each overlap in an r x r square; the outside gains a quarter disc; two half
    // caps
    assertEquals(want, area(stroke(2 * r, true, line(0, 0, 5, 0), line(5, 0, 5, 5))), 1e-6);
  }

  @Test
  void halfCircleStroke_isHalfAnnulusAndTwoCaps() {
    Arc a = Arc.of(new Point(1, 2), 3, 0.3, Math.PI);
    double want = Math.PI / 2 * (3.25 * 3.25 - 2.75 * 2.75) + Math.PI * 0.25 * 0.25;
    assertEquals(want, area(stroke(0.5, true, a)), 1e-5);
    assertEquals(want, area(stroke(0.5, true, a.reversed())), 1e-5);
  }

  @Test
  void arcSmallerThanThePen_leavesNoHole() {
    Path ring = Path.circle(new Point(0, 0), 0.2);
    DrawnObject s =
        new DrawnObject.Stroke(ring, new ApertureShape.Circle(1, 0), true, Attributes.NONE, 1);
    Figure f = BUILDER.build(List.of(s));
    assertEquals(Math.PI * 0.49, f.areaMm2(), 1e-5);
    assertEquals(1, f.rings());
  }

  @Test
  void closedRing_hasOneHole() {
    DrawnObject s =
        new DrawnObject.Stroke(
            Path.circle(new Point(0, 0), 5),
            new ApertureShape.Circle(0.5, 0),
            true,
            Attributes.NONE,
            1);
    Figure f = BUILDER.build(List.of(s));
    assertEquals(Math.PI * (5.25 * 5.25 - 4.75 * 4.75), f.areaMm2(), 1e-5);
    assertEquals(2, f.rings());
    assertEquals(1, f.islands());
  }

  @Test
  void thereAndBackAgain_isOneStrip() {
    double want = 10 * 0.2 + Math.PI * 0.01;
    assertEquals(want, area(stroke(0.2, true, line(0, 0, 10, 0), line(10, 0, 0, 0))), 1e-6);
  }

  @Test
  void apertures_inClosedForm() {
    Point p = new Point(1, 1);
    assertEquals(
        2 * 1 - Math.PI * 0.04,
        area(flash(p, new ApertureShape.Rectangle(2, 1, 0.4, 0.4), true)),
        1e-5);
    assertEquals(
        1 * 1 + Math.PI / 4, area(flash(p, new ApertureShape.Obround(1, 2, 0.7, 0), true)), 1e-5);
    // a regular hexagon of circumradius R: 3√3/2 R²
    assertEquals(
        1.5 * Math.sqrt(3) * 0.25,
        area(flash(p, new ApertureShape.RegularPolygon(1, 6, 0.1, 0), true)),
        1e-6);
  }

  @Test
  void apertureHole_showsWhatLiesUnder() {
    DrawnObject ring = flash(new Point(0, 0), new ApertureShape.Circle(2, 1), true);
    assertEquals(Math.PI * 0.75, area(ring), 1e-5);
    double bar = area(stroke(0.2, true, line(-1, 0, 1, 0)), ring);
    // the bar shows in the hole: strip of 0.2 over a disc of diameter 1
    double half = Math.sqrt(0.25 - 0.01);
    double strip = 2 * (0.1 * half + 0.25 * Math.asin(0.2));
    assertEquals(Math.PI * 0.75 + strip + outsideCaps(), bar, 2e-5);
  }

  /** The two half discs of the bar's ends beyond the ring of radius 1. */
  private static double outsideCaps() {
    // disc of radius 0.1 about (1, 0) less the lens it has in common with the unit disc
    double r = 0.1;
    double lens =
        r * r * Math.acos(r / 2)
            + Math.acos(1 - r * r / 2)
            - 0.5 * Math.sqrt(r * r * (2 - r) * (2 + r));
    return 2 * (Math.PI * r * r - lens);
  }

  @Test
  void macro_erasesOnlyItself() {
    Path square = square(0, 0, 2);
    Path inner = square(0, 0, 1);
    ApertureShape frame =
        new ApertureShape.Composite(
            "FRAME",
            List.of(
                new ApertureShape.Part(true, square, List.of()),
                new ApertureShape.Part(false, inner, List.of())));
    assertEquals(3.0, area(flash(new Point(5, 5), frame, true)), 1e-9);
    assertEquals(
        4.0,
        area(
            flash(new Point(5, 5), new ApertureShape.Rectangle(2, 2, 0, 0), true),
            flash(new Point(5, 5), frame, true)),
        1e-9);
  }

  private static Path square(double x, double y, double side) {
    double h = side / 2;
    return Path.of(
        line(x - h, y - h, x + h, y - h),
        line(x + h, y - h, x + h, y + h),
        line(x + h, y + h, x - h, y + h),
        line(x - h, y + h, x - h, y - h));
  }

  @Test
  void polarity_isKeptInOrder() {
    DrawnObject big = flash(new Point(0, 0), new ApertureShape.Rectangle(4, 4, 0, 0), true);
    DrawnObject erase = flash(new Point(0, 0), new ApertureShape.Rectangle(2, 2, 0, 0), false);
    DrawnObject small = flash(new Point(0, 0), new ApertureShape.Rectangle(1, 1, 0, 0), true);
    assertEquals(13.0, area(big, erase, small), 1e-9);
    assertEquals(12.0, area(big, small, erase), 1e-9);
    assertEquals(16.0, area(erase, big), 1e-9);
  }

  @Test
  void region_withCutIn_hasAHole() {
    Path cutIn =
        Path.of(
            line(0, 0, 6, 0),
            line(6, 0, 6, 3),
            line(6, 3, 4, 3),
            line(4, 3, 4, 2),
            line(4, 2, 2, 2),
            line(2, 2, 2, 4),
            line(2, 4, 4, 4),
            line(4, 4, 4, 3),
            line(4, 3, 6, 3),
            line(6, 3, 6, 6),
            line(6, 6, 0, 6),
            line(0, 6, 0, 0));
    for (Path p : List.of(cutIn, cutIn.reversed())) {
      Figure f =
          BUILDER.build(List.of(new DrawnObject.Region(List.of(p), true, Attributes.NONE, 1)));
      assertEquals(32.0, f.areaMm2(), 1e-9);
      assertEquals(2, f.rings());
    }
  }

  @Test
  void squarePen_sweepsAHexagon() {
    DrawnObject s =
        new DrawnObject.Stroke(
            Path.of(line(0, 0, 3, 4)),
            new ApertureShape.Rectangle(1, 1, 0, 0),
            true,
            Attributes.NONE,
            1);
    // box plus swept sides: area + |dx|·h + |dy|·w
    assertEquals(1 + 3 + 4.0, BUILDER.build(List.of(s)).areaMm2(), 1e-9);
  }

  /**
   * Two bars in one line, as wide as the pad between them, which leave each other by a nanometre:
   * of the three edges along one side each crossing that is rounded makes another one beside it.
   */
  @Test
  void barsInLine_areNotZipped() {
    Point middle = new Point(-4.651001, 23.820161);
    row(new Point(-3.799088, 23.986501), middle, new Point(-5.502914, 23.653821), 0.682);
  }

  @Test
  void rowsOfThreeVias_atAnyAngle() {
    Random random = new Random(857);
    for (int k = 0; k < 400; k++) {
      double turn = 2 * Math.PI * random.nextDouble();
      Point first = Point.polar(10 + 30 * random.nextDouble(), 2 * Math.PI * random.nextDouble());
      Point on = Point.polar(0.85, turn);
      Point middle = Grid.snap(first.plus(on));
      row(Grid.snap(first), middle, Grid.snap(first.plus(on.times(2))), 0.6);
    }
  }

  private static void row(Point first, Point middle, Point last, double pad) {
    Figure f =
        BUILDER.build(
            List.of(
                stroke(pad, true, new Line(first, middle)),
                stroke(pad, true, new Line(middle, last)),
                flash(middle, new ApertureShape.Circle(pad, 0), true)));
    double area = pad * (first.distanceTo(middle) + middle.distanceTo(last));
    area += Math.PI * pad * pad / 4;
    assertEquals(1, f.islands());
    assertEquals(1, f.rings());
    // beside the bars corners of the pad's polygon show, by less than 1 um over its rim
    assertEquals(area, f.areaMm2(), CopperBuilder.CHORD_ERROR_MM * Math.PI * pad);
  }

  /** Random polylines with sharp corners and crossings against buffers of JTS with fine caps. */
  @ParameterizedTest(name = "seed {0}")
  @ValueSource(longs = {11, 12, 13, 14, 15, 16})
  void randomStrokes_asByJts(long seed) {
    Random random = new Random(seed);
    List<DrawnObject> objects = new ArrayList<>();
    Geometry union = new GeometryFactory().createPolygon();
    for (int i = 0; i < 30; i++) {
      double width = 0.05 + random.nextDouble() * 0.5;
      int n = 1 + random.nextInt(8);
      Segment[] path = new Segment[n];
      Coordinate[] c = new Coordinate[n + 1];
      Point at = new Point(random.nextDouble() * 10, random.nextDouble() * 10);
      c[0] = new Coordinate(at.x(), at.y());
      for (int k = 0; k < n; k++) {
        Point to = at.plus(new Point(random.nextGaussian() * 0.6, random.nextGaussian() * 0.6));
        path[k] = new Line(at, to);
        c[k + 1] = new Coordinate(to.x(), to.y());
        at = to;
      }
      objects.add(stroke(width, true, path));
      union = union.union(new GeometryFactory().createLineString(c).buffer(width / 2, 64));
    }
    Figure f = BUILDER.build(objects);
    assertEquals(union.getArea(), f.areaMm2(), union.getArea() * 2e-4);
    assertEquals(union.getNumGeometries(), f.islands());
    int rings = 0;
    for (int i = 0; i < union.getNumGeometries(); i++) {
      rings += 1 + ((Polygon) union.getGeometryN(i)).getNumInteriorRing();
    }
    assertEquals(rings, f.rings());
  }
}
