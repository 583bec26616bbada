package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.MountingHole;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Board of radius 42 with a bore of radius 7; copper 0.3 and holes 0.5 from both. */
class EdgeRuleTest {
  private static final double TINY = 1e-9;

  /** The finding about the track; its end pads are found too. */
  private static Finding track(Boards b) {
    RuleReport r = b.check();
    assertTrue(r.findings().stream().allMatch(f -> f.rule().equals("edge")));
    return r.findings().stream().filter(f -> f.what().contains("turn 1")).findFirst().orElseThrow();
  }

  @Test
  void ringTooNearTheEdge() {
    Boards b = new Boards();
    b.track(2, Path.of(Arc.of(Point.ORIGIN, 41.65, 0.2, 1)), 4);
    Finding f = track(b);
    // 42 - 41.65 - 0.1.
    assertEquals(0.25, f.measured(), TINY);
    assertEquals(0.3, f.required(), TINY);
    assertEquals("L2", f.layer());
    assertEquals("phase U, coil 4, turn 1 and the board's edge", f.what());
    // Half-way between the copper's edge at 41.75 and the board's at 42.
    assertEquals(41.875, f.at().norm(), 1e-6);
  }

  @Test
  void copperTooNearTheBore() {
    Boards b = new Boards();
    b.track(1, Path.of(new Line(new Point(7.3, 0), new Point(7.3, 9))), 2);
    Finding f = track(b);
    // 7.3 - 7 - 0.1 at the line's foot.
    assertEquals(0.2, f.measured(), TINY);
    assertTrue(f.what().endsWith("and the bore"), f.what());
  }

  @Test
  void copperAcrossTheEdge_isBelowNothing() {
    Boards b = new Boards();
    b.track(1, Path.of(new Line(new Point(30, 0), new Point(50, 0))), 1);
    double least =
        Boards.findings(b.check(), "edge").stream().mapToDouble(Finding::measured).min().orElse(9);
    // The end at radius 50 lies 8 outside, its pad of radius 0.1 too.
    assertEquals(-8.1, least, TINY);
  }

  @Test
  void copperBeyondTheEdge_isFoundWhereverItIs() {
    Boards b = new Boards();
    b.track(1, Path.of(new Line(new Point(100, 0), new Point(110, 0))), 1);
    b.track(1, Path.of(new Line(new Point(-3, 0), new Point(3, 0.1))), 2);
    List<Finding> all = Boards.findings(b.check(), "edge");
    assertTrue(
        all.stream().anyMatch(f -> f.what().startsWith("phase U, coil 1, turn 1 and the b")));
    assertTrue(
        all.stream().anyMatch(f -> f.what().startsWith("phase U, coil 2, turn 1 and the b")));
    assertTrue(all.stream().allMatch(f -> f.measured() < -3));
  }

  @Test
  void viaHoleTooNearTheEdge_isToldApartFromItsPad() {
    Boards b = new Boards();
    // Pad 42 - 41.3 - 0.3 = 0.4 is enough; hole 42 - 41.3 - 0.25 = 0.45 is not.
    b.via(Point.polar(41.3, 0.5), 0.6, 0.5);
    var fab = Boards.fab();
    var loose =
        new etchloom.spec.FabRules(
            fab.title(),
            fab.layers(),
            fab.stackups(),
            fab.thicknessMinMm(),
            fab.thicknessMaxMm(),
            fab.sizeMm(),
            fab.copper(),
            fab.hole(),
            new etchloom.spec.FabRules.Ring(0.05, 0.05),
            fab.edge(),
            fab.mask(),
            fab.legend(),
            fab.tolerance());
    Finding f = Boards.only(b.check(Boards.spec(2, java.util.Optional.empty()), loose), "edge");
    assertEquals(0.45, f.measured(), TINY);
    assertEquals(0.5, f.required(), TINY);
    assertEquals("hole of joint 0 and the board's edge", f.what());
  }

  @Test
  void mountingHoleTooNearTheBore() {
    Boards b = new Boards();
    b.holes.add(new MountingHole(new Point(0, 9), 3.2, 3.2));
    Finding f = Boards.only(b.check(), "edge");
    // 9 - 1.6 - 7.
    assertEquals(0.4, f.measured(), TINY);
    assertEquals("hole of mounting hole 1 and the bore", f.what());
  }

  @Test
  void minimum_isTheTightestOverItsLimit() {
    Boards b = new Boards();
    b.track(1, Path.of(new Line(new Point(10, 0), new Point(39, 0))), 1);
    Finding f = Boards.minimum(b.check(), "edge").orElseThrow();
    // 10 - 7 - 0.1 to the bore, 42 - 39 - 0.1 to the edge: equal; either is right.
    assertEquals(2.9, f.measured(), TINY);
  }

  @Test
  void outline_knowsWhatLiesOnTheBoard() {
    Outline o = new Outline(List.of(Path.circle(Point.ORIGIN, 42), Path.circle(Point.ORIGIN, 7)));
    for (int k = 0; k < 24; k++) {
      double a = Math.toRadians(15 * k);
      assertTrue(o.inside(Point.polar(20, a)), "on the ring at " + 15 * k);
      assertFalse(o.inside(Point.polar(5, a)), "in the bore at " + 15 * k);
      assertFalse(o.inside(Point.polar(50, a)), "outside at " + 15 * k);
      assertEquals(2, o.depth(Point.polar(40, a)).depthMm(), TINY);
      assertEquals(-3, o.depth(Point.polar(4, a)).depthMm(), TINY);
    }
    assertFalse(o.inside(Point.ORIGIN));
  }

  @Test
  void outline_ofLinesAndInwardArcs() {
    // A square of 20 with a bite of radius 5 out of its right side.
    Point a = new Point(-10, -10);
    Point b = new Point(10, -10);
    Point c = new Point(10, -5);
    Point d = new Point(10, 5);
    Point e = new Point(10, 10);
    Point f = new Point(-10, 10);
    Path p =
        Path.of(
            new Line(a, b),
            new Line(b, c),
            new Arc(c, d, new Point(10, 0), false),
            new Line(d, e),
            new Line(e, f),
            new Line(f, a));
    Outline o = new Outline(List.of(p));
    assertTrue(o.inside(new Point(4, 0)));
    assertFalse(o.inside(new Point(6, 0)));
    assertFalse(o.inside(new Point(9.9, 0)));
    assertTrue(o.inside(new Point(9.9, 6)));
    assertFalse(o.inside(new Point(10.1, 6)));
    assertEquals(1, o.depth(new Point(4, 0)).depthMm(), TINY);
    assertEquals(20, o.sizeMm()[0], TINY);
    assertEquals(20, o.sizeMm()[1], TINY);
  }
}
