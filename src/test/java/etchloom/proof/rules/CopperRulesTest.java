package etchloom.proof.rules;

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
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/** Copper whose widths and gaps are known from its drawing. Lengths in mm. */
class CopperRulesTest {
  /** The nanometre grid, at both sides of what is measured. */
  private static final double GRID = 3e-6;

  private static final CopperLimits LIMITS =
      new CopperLimits(
          List.of(new CopperLimits.Layer(0.15, 0.15)),
          0.13,
          0.2,
          0.3,
          8,
          0.25,
          0.2,
          0.3,
          0.5,
          0.1,
          400,
          List.of(1));

  private static DrawnObject stroke(double width, Segment... path) {
    return new DrawnObject.Stroke(
        Path.of(path), new ApertureShape.Circle(width, 0), true, Attributes.NONE, 1);
  }

  private static DrawnObject pad(double x, double y, double diameter) {
    return new DrawnObject.Flash(
        new Point(x, y), new ApertureShape.Circle(diameter, 0), 10, true, Attributes.NONE, 1);
  }

  private static DrawnObject polygon(double... xy) {
    List<Segment> out = new ArrayList<>();
    for (int i = 0; i < xy.length; i += 2) {
      int k = (i + 2) % xy.length;
      out.add(line(xy[i], xy[i + 1], xy[k], xy[k + 1]));
    }
    return new DrawnObject.Region(List.of(new Path(out)), true, Attributes.NONE, 1);
  }

  private static Line line(double x0, double y0, double x1, double y1) {
    return new Line(new Point(x0, y0), new Point(x1, y1));
  }

  private static Hole hole(double x, double y, double diameter, boolean plated) {
    return new Hole(
        new Point(x, y), Optional.empty(), diameter, plated, 1, 1, "", List.of(), "t", 1);
  }

  private static CopperRuleReport check(List<Hole> holes, DrawnObject... objects) {
    return check(
        holes, new BoardSheets(Optional.empty(), Optional.empty(), Optional.empty()), objects);
  }

  private static CopperRuleReport check(
      List<Hole> holes, BoardSheets sheets, DrawnObject... objects) {
    Connectivity board =
        new Connectivity(List.of(new CopperBuilder().build(List.of(objects))), holes);
    return CopperRules.check(
        board, holes, sheets, LIMITS, Optional.of(1.6), (layer, island) -> "copper " + island);
  }

  private static CopperFinding least(CopperRuleReport r, String rule) {
    return r.minima().stream().filter(f -> f.rule().equals(rule)).findFirst().orElseThrow();
  }

  private static CopperFinding only(CopperRuleReport r) {
    assertEquals(1, r.findings().size(), () -> r.findings().toString());
    return r.findings().get(0);
  }

  @Test
  void parallelTracks_showTheirGapAndWidth() {
    CopperRuleReport r =
        check(List.of(), stroke(0.2, line(0, 0, 3, 4)), stroke(0.3, line(1, 0.2, 4, 4.2)));
    // centre distance |(1, 0.2) x (0.6, 0.8)| = 0.68, less half of each width
    assertEquals(0.68 - 0.25, least(r, "space").measured(), GRID);
    assertEquals(0.2, least(r, "track").measured(), GRID);
    assertEquals(List.of(), r.findings());
  }

  @Test
  void concentricArcs_areMeasuredOnTheTrueCircles() {
    Arc inner = Arc.of(new Point(1, 1), 10, 0.1, 1.2);
    Arc outer = Arc.of(new Point(1, 1), 10.34, 0.2, 1.2);
    CopperRuleReport r = check(List.of(), stroke(0.2, inner), stroke(0.2, outer));
    assertTrue(!r.findings().isEmpty());
    for (CopperFinding f : r.findings()) {
      assertEquals("space", f.rule());
      assertEquals("L1", f.layer());
      assertEquals(0.14, f.measured(), GRID);
      assertEquals(10.17, f.at().distanceTo(new Point(1, 1)), 1e-3);
    }
    assertEquals(0.2, least(r, "track").measured(), GRID);
  }

  /** A hairpin of one track: both gap and bend are its own; the bend's inside is a half circle. */
  @Test
  void hairpin_hasTheGapOfItsSides() {
    for (double gap : new double[] {0.1, 0.15, 0.4}) {
      double y = 0.2 + gap;
      Segment bend = Arc.of(new Point(5, y / 2), y / 2, -Math.PI / 2, Math.PI);
      DrawnObject s =
          stroke(
              0.2,
              line(0, 0, 5, 0),
              new Arc(new Point(5, 0), new Point(5, y), new Point(5, y / 2), true),
              line(5, y, 0, y));
      assertEquals(y / 2, ((Arc) bend).radiusMm(), 1e-12);
      CopperRuleReport r = check(List.of(), s);
      assertEquals(gap, least(r, "space").measured(), GRID);
      assertEquals(gap < 0.15 ? 1 : 0, r.findings().stream().filter(f -> f.at().x() > 4).count());
      assertEquals(0.2, least(r, "track").measured(), GRID);
    }
  }

  @Test
  void rightAngle_passes_andASharpAngleDoesNot() {
    CopperRuleReport right = check(List.of(), stroke(0.2, line(0, 0, 5, 0), line(5, 0, 5, 5)));
    assertEquals(List.of(), right.findings());
    double a = Math.toRadians(60);
    CopperRuleReport sharp =
        check(
            List.of(), stroke(0.2, line(5, 0, 0, 0), line(0, 0, 5 * Math.cos(a), 5 * Math.sin(a))));
    CopperFinding f = only(sharp);
    assertEquals("space", f.rule());
    // both arms together (π/2)·0.15 along the boundary: an equilateral triangle of half of that
    assertEquals(Math.PI / 4 * 0.15, f.measured(), 1e-5);
  }

  @Test
  void sharpCopper_isTooNarrow_andARightAngledPadIsNot() {
    assertEquals(List.of(), check(List.of(), polygon(0, 0, 2, 0, 2, 1, 0, 1)).findings());
    CopperFinding f = only(check(List.of(), polygon(0, 0, 3, -0.9, 5, -0.9, 5, 0.9, 3, 0.9)));
    assertEquals("track", f.rule());
    assertTrue(f.at().norm() < 0.5, f::toString);
  }

  /** Two discs that overlap a little: the neck is their common chord. */
  @Test
  void neck_isTheCommonChord() {
    CopperRuleReport r = check(List.of(), pad(0, 0, 2), pad(1.996, 0, 2));
    // the notches beside the neck are sharp, and so too narrow a gap as well
    assertEquals(
        List.of("track", "space"),
        r.findings().stream().map(CopperFinding::rule).toList(),
        () -> r.findings().toString());
    CopperFinding f = r.findings().get(0);
    assertEquals(2 * Math.sqrt(1 - 0.998 * 0.998), f.measured(), GRID);
    assertEquals(0.998, f.at().x(), 1e-5);
  }

  @Test
  void gapInsideARing_counts() {
    // a slot of 0.1 cut into a plate by drawing it round: from a U of three strokes
    CopperFinding f =
        only(
            check(
                List.of(),
                stroke(0.4, line(0, 0, 4, 0), line(4, 0, 4, 0.5), line(4, 0.5, 0, 0.5))));
    assertEquals("space", f.rule());
    assertEquals(0.1, f.measured(), GRID);
    assertTrue(f.what().startsWith("within one piece"), f::toString);
  }

  @Test
  void annularRing_isMeasuredFromTheTruePad() {
    CopperRuleReport r =
        check(
            List.of(hole(-0.05, 0, 0.3, true), hole(3, 0, 0.3, true)),
            pad(0, 0, 0.6),
            pad(3, 0, 0.6),
            stroke(0.2, line(0, 0, 3, 0)));
    CopperFinding f = only(r);
    assertEquals("ring", f.rule());
    assertEquals(0.1, f.measured(), GRID);
  }

  @Test
  void holeThatBreaksOut_hasANegativeRing() {
    CopperFinding f = only(check(List.of(hole(0.35, 0, 0.4, true)), pad(0, 0, 0.6)));
    assertEquals(-0.25, f.measured(), GRID);
  }

  @Test
  void holes_keepTheirGapToOthersAndToCopper() {
    CopperRuleReport r =
        check(
            List.of(hole(0, 0, 1, false), hole(0, 1.2, 1, false), hole(9, 9, 0.2, true)),
            pad(9, 9, 1),
            stroke(0.2, line(0.75, -5, 0.75, 5)));
    List<String> rules = r.findings().stream().map(CopperFinding::rule).toList();
    assertEquals(List.of("hole", "hole-gap", "hole-copper", "hole-copper"), rules);
    assertEquals(0.2, r.findings().get(1).measured(), 1e-9);
    assertEquals(0.15, r.findings().get(2).measured(), GRID);
    assertEquals(1.6 / 0.2, least(r, "aspect").measured(), 1e-9);
  }

  @Test
  void edge_isMeasuredFromCopperAndHoles_andNothingMayLieBeside() {
    LayerImage profile =
        new LayerImage(
            "p",
            Map.of(),
            List.of(
                stroke(0.1, Path.circle(new Point(0, 0), 10).segments().toArray(new Segment[0]))),
            List.of());
    BoardSheets sheets = BoardSheets.of(Optional.of(profile), Optional.empty(), Optional.empty());
    CopperRuleReport r =
        check(
            List.of(hole(0, 9.1, 1, false)),
            sheets,
            stroke(0.2, line(-9.65, 0, 5, 0)),
            pad(20, 0, 1));
    assertEquals(3, r.findings().size(), () -> r.findings().toString());
    assertEquals(0.4, r.findings().get(0).measured(), 1e-9);
    assertEquals(0.25, r.findings().get(1).measured(), GRID);
    assertEquals(0, r.findings().get(2).measured());
    assertTrue(r.findings().get(2).what().contains("beside the board"));
    assertEquals(20, least(r, "size").measured(), 1e-9);
  }

  @Test
  void maskWeb_isTheGapBetweenOpenings() {
    LayerImage mask =
        new LayerImage("m", Map.of(), List.of(pad(0, 0, 1), pad(1.08, 0, 1)), List.of());
    BoardSheets sheets = BoardSheets.of(Optional.empty(), Optional.of(mask), Optional.empty());
    CopperFinding f = only(check(List.of(), sheets, pad(0, 0, 0.9), pad(1.08, 0, 0.9)));
    assertEquals("mask-web", f.rule());
    assertEquals(0.08, f.measured(), GRID);
  }

  /** Islands of random strokes: their least gap against the distance of JTS's buffers. */
  @ParameterizedTest(name = "seed {0}")
  @ValueSource(longs = {1, 2, 3, 4, 5, 6})
  void randomIslands_asByJts(long seed) {
    Random random = new Random(seed);
    List<DrawnObject> objects = new ArrayList<>();
    List<Geometry> shapes = new ArrayList<>();
    GeometryFactory gf = new GeometryFactory();
    for (int i = 0; i < 40; i++) {
      double x = random.nextDouble() * 6;
      double y = random.nextDouble() * 6;
      double dx = random.nextGaussian() * 0.4;
      double dy = random.nextGaussian() * 0.4;
      objects.add(stroke(0.2, line(x, y, x + dx, y + dy)));
      Coordinate[] c = {new Coordinate(x, y), new Coordinate(x + dx, y + dy)};
      shapes.add(gf.createLineString(c).buffer(0.1, 64));
    }
    Geometry union = UnaryUnionOp.union(shapes);
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < union.getNumGeometries(); i++) {
      for (int k = 0; k < i; k++) {
        least = Math.min(least, union.getGeometryN(i).distance(union.getGeometryN(k)));
      }
    }
    Outline outline = new Outline(new CopperBuilder().build(objects));
    Facing facing = new Facing(outline, 0.15, 0.15);
    double found = Double.POSITIVE_INFINITY;
    List<Facing.Close> all = new ArrayList<>(facing.broken());
    all.add(facing.least(true));
    for (Facing.Close c : all) {
      int a = outline.figure.island(outline.ring.get(c.first()));
      int b = outline.figure.island(outline.ring.get(c.second()));
      if (c.gap() && a != b) {
        found = Math.min(found, c.mm());
      }
    }
    double want = least;
    assertTrue(want < 0.15, () -> "the seed shows nothing: " + want);
    assertEquals(want, found, 2e-5); // 64 chords a quarter turn, on both sides: 0.1 · (π/256)²
  }
}
