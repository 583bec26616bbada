package etchloom.proof.ohm;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.copper.Hole;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Copper whose resistance is known in closed form: 1/58 Ω·mm²/m, IEC 60028. Lengths in mm. */
class FileResistanceTest {
  private static final double THICK = 0.035;
  private static final double PER_SQUARE = 1 / 58e3 / THICK;

  private static DrawnObject stroke(double width, boolean dark, Segment... path) {
    return new DrawnObject.Stroke(
        Path.of(path), new ApertureShape.Circle(width, 0), dark, Attributes.NONE, 1);
  }

  private static DrawnObject pad(Point at, double diameter) {
    return new DrawnObject.Flash(
        at, new ApertureShape.Circle(diameter, 0), 10, true, Attributes.NONE, 1);
  }

  private static DrawnObject region(Path contour) {
    return new DrawnObject.Region(List.of(contour), true, Attributes.NONE, 1);
  }

  private static Line line(double x0, double y0, double x1, double y1) {
    return new Line(new Point(x0, y0), new Point(x1, y1));
  }

  private static Hole hole(Point at, double diameter, int layers) {
    return new Hole(at, Optional.empty(), diameter, true, 1, layers, "", List.of(), "t", 1);
  }

  private static FileResistance.Ohms ohms(
      double undercut, List<Hole> holes, List<Point> ends, DrawnObject... objects) {
    List<DrawnObject> all = List.of(objects);
    Connectivity board = new Connectivity(List.of(new CopperBuilder().build(all)), holes);
    CopperBuild build =
        new CopperBuild(List.of(new CopperBuild.Layer(THICK, undercut)), List.of(), 0.02);
    List<FileResistance.Terminal> terminals = new ArrayList<>();
    for (Point p : ends) {
      terminals.add(new FileResistance.Terminal("T" + terminals.size(), 1, p));
    }
    return FileResistance.between(
        List.of(new LayerImage("t", Map.of(), all, List.of())), board, build, terminals);
  }

  private static double ohm(FileResistance.Ohms r) {
    assertEquals(1, r.pairs().size(), r::toString);
    return r.pairs().get(0).ohm();
  }

  @Test
  void lineAndArc_areTheirLengthOverTheirEtchedSection() {
    Point a = new Point(0, 0);
    Point c = new Point(10, 6);
    Arc bend = new Arc(new Point(10, 0), c, new Point(10, 3), true);
    FileResistance.Ohms r =
        ohms(
            0.02,
            List.of(),
            List.of(a, c),
            pad(a, 1),
            pad(c, 1),
            stroke(0.2, true, line(0, 0, 10, 0), bend));
    assertEquals(PER_SQUARE * (10 + 3 * Math.PI) / 0.18, ohm(r), 1e-12);
    assertEquals(0, r.error());
  }

  @Test
  void strokesThatCross_meetWhereTheyCross() {
    Point a = new Point(-4, 0);
    Point b = new Point(0, 3);
    FileResistance.Ohms r =
        ohms(
            0,
            List.of(),
            List.of(a, b),
            stroke(0.2, true, line(-4, 0, 5, 0)),
            stroke(0.4, true, line(0, 3, 0, -9)));
    assertEquals(PER_SQUARE * (4 / 0.2 + 3 / 0.4), ohm(r), 1e-12);
  }

  @Test
  void trackThatEndsOnAnother_isATap() {
    Point a = new Point(0, 0);
    Point b = new Point(6, 5);
    FileResistance.Ohms r =
        ohms(
            0,
            List.of(),
            List.of(a, b),
            stroke(0.2, true, line(0, 0, 10, 0)),
            stroke(0.2, true, line(6, 0.05, 6, 5)));
    assertEquals(PER_SQUARE * (6 + 4.95) / 0.2, ohm(r), 1e-12);
  }

  /** The round ends of the wide tracks meet in one point, to the grid's step, over the bar. */
  @Test
  void roundEndsThatGraze_leaveTheBarBetweenThem() {
    Point a = new Point(-5, 0);
    Point b = new Point(6, 0);
    double bar = 0.999999;
    FileResistance.Ohms r =
        ohms(
            0,
            List.of(),
            List.of(a, b),
            stroke(1, true, line(-5, 0, 0, 0)),
            stroke(0.8, true, line(0, 0, bar, 0)),
            stroke(1, true, line(bar, 0, 6, 0)));
    assertEquals(PER_SQUARE * (5 + bar / 0.8 + 6 - bar), ohm(r), 1e-12);
  }

  @Test
  void twoWays_shareTheCurrent_andCopperDrawnTwiceCountsOnce() {
    Point a = new Point(0, 0);
    Point b = new Point(10, 0);
    FileResistance.Ohms r =
        ohms(
            0,
            List.of(),
            List.of(a, b),
            pad(a, 1),
            pad(b, 1),
            stroke(0.2, true, line(0, 0, 10, 0)),
            stroke(0.2, true, line(10, 0, 0, 0)),
            stroke(0.2, true, line(0, 0, 0, 10), line(0, 10, 10, 10), line(10, 10, 10, 0)));
    assertEquals(PER_SQUARE / 0.2 / (1 / 10.0 + 1 / 30.0), ohm(r), 1e-12);
  }

  @Test
  void hole_isATubeOfPlating() {
    Point a = new Point(0, 0);
    Point b = new Point(5, 0);
    Point c = new Point(9, 0);
    List<DrawnObject> top = List.of(stroke(0.2, true, line(0, 0, 5, 0)), pad(b, 0.6));
    List<DrawnObject> bottom = List.of(stroke(0.2, true, line(5, 0, 9, 0)), pad(b, 0.6));
    CopperBuilder builder = new CopperBuilder();
    Connectivity board =
        new Connectivity(
            List.of(builder.build(top), builder.build(bottom)), List.of(hole(b, 0.3, 2)));
    CopperBuild.Layer l = new CopperBuild.Layer(THICK, 0);
    FileResistance.Ohms r =
        FileResistance.between(
            List.of(
                new LayerImage("t", Map.of(), top, List.of()),
                new LayerImage("b", Map.of(), bottom, List.of())),
            board,
            new CopperBuild(List.of(l, l), List.of(1.5), 0.02),
            List.of(
                new FileResistance.Terminal("A", 1, a), new FileResistance.Terminal("B", 2, c)));
    // plating from radius 0.15 to 0.17, from the middle of one layer to that of the other
    double barrel = 1 / 58e3 * (1.5 + THICK) / (Math.PI * (0.17 * 0.17 - 0.15 * 0.15));
    assertEquals(PER_SQUARE * 9 / 0.2 + barrel, ohm(r), 1e-12);
  }

  @Test
  void cutTrack_joinsNothing() {
    Point a = new Point(0, 0);
    Point b = new Point(10, 0);
    FileResistance.Ohms r =
        ohms(
            0,
            List.of(hole(a, 0.3, 1), hole(b, 0.3, 1)),
            List.of(a, b),
            stroke(0.6, true, line(0, 0, 10, 0)),
            stroke(0.1, false, line(5, -1, 5, 1)));
    assertTrue(r.pairs().isEmpty());
  }

  /** A strip at an odd angle, drawn as an area: twice as long is so many squares more. */
  @Test
  void area_asLongAgain_isItsSquaresMore() {
    double[] r = new double[2];
    for (int k = 0; k < 2; k++) {
      double length = k == 0 ? 8 : 16;
      double turn = 0.3;
      Path strip =
          Path.of(
              line(-1, -0.5, length + 1, -0.5),
              line(length + 1, -0.5, length + 1, 0.5),
              line(length + 1, 0.5, -1, 0.5),
              line(-1, 0.5, -1, -0.5));
      Point a = new Point(0, 0);
      Point b = new Point(length, 0).rotated(turn);
      FileResistance.Ohms o =
          ohms(
              0.02,
              List.of(hole(a, 0.5, 1), hole(b, 0.5, 1)),
              List.of(a, b),
              region(strip.rotated(turn)));
      r[k] = ohm(o);
      assertTrue(o.error() > 0 && o.error() < 0.02, o::toString);
    }
    // 8 mm of a strip of 1 mm less the undercut of 0.02 mm
    assertEquals(PER_SQUARE * 8 / 0.98, r[1] - r[0], PER_SQUARE * 8 / 0.98 * 0.003);
  }

  /**
   * Two round electrodes in a round plate, by images: the plate's insulated rim mirrors each of
   * them at distance b²/(d/2). R = R□/π · (arcosh(d/2a) + ln((D + d/2)/(D - d/2))).
   */
  @Test
  void twoHolesInARoundPlate_asByImages() {
    double b = 20;
    double d = 10;
    double a = 0.5;
    Point p = new Point(-d / 2, 0);
    Point q = new Point(d / 2, 0);
    FileResistance.Ohms o =
        ohms(
            0,
            List.of(hole(p, 2 * a, 1), hole(q, 2 * a, 1)),
            List.of(p, q),
            region(Path.circle(new Point(0, 0), b)));
    double x = d / (2 * a);
    double image = 2 * b * b / d;
    double want =
        PER_SQUARE
            / Math.PI
            * (Math.log(x + Math.sqrt(x * x - 1)) + Math.log((image + d / 2) / (image - d / 2)));
    assertEquals(want, ohm(o), want * Math.max(0.02, 2 * o.error()));
    assertTrue(o.error() < 0.08, o::toString);
  }

  /** A track drawn as an area is the same copper as one drawn as a stroke. */
  @Test
  void trackAsArea_agreesWithTheStroke() {
    Point a = new Point(0, 0);
    Point b = new Point(12, 0);
    Path area =
        Path.of(
            line(0, -0.15, 12, -0.15),
            new Arc(new Point(12, -0.15), new Point(12, 0.15), b, true),
            line(12, 0.15, 0, 0.15),
            new Arc(new Point(0, 0.15), new Point(0, -0.15), a, true));
    List<Hole> holes = List.of(hole(a, 0.2, 1), hole(b, 0.2, 1));
    double asArea = ohm(ohms(0.01, holes, List.of(a, b), region(area), pad(a, 0.6), pad(b, 0.6)));
    double asStroke =
        ohm(
            ohms(
                0.01,
                holes,
                List.of(a, b),
                stroke(0.3, true, line(0, 0, 12, 0)),
                pad(a, 0.6),
                pad(b, 0.6)));
    assertEquals(asStroke, asArea, asStroke * 0.02);
  }
}
