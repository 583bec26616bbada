package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.MountingHole;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Rules of the test class: hole 0.3, aspect 8, gap 0.25, copper gap 0.2, ring 0.13 and 0.2. */
class HoleRulesTest {
  private static final double TINY = 1e-9;

  private static Path line(double x0, double y0, double x1, double y1) {
    return Path.of(new Line(new Point(x0, y0), new Point(x1, y1)));
  }

  @Test
  void narrowTrack_isFound() {
    Boards b = new Boards();
    int from = b.bare(2, new Point(10, 0), 0.12);
    int to = b.bare(2, new Point(20, 0), 0.12);
    b.track(2, 0.12, line(10, 0, 20, 0), from, to, "W", 3);
    Finding f = Boards.only(b.check(), "track");
    assertEquals(0.12, f.measured(), TINY);
    assertEquals(0.127, f.required(), TINY);
    assertEquals("L2", f.layer());
    assertEquals("phase W, coil 3", f.what());
    assertEquals(15, f.at().x(), TINY);
  }

  @Test
  void everyLayer_hasTheTrackOfItsOwnCopper() {
    // 2 oz inside asks for 0.18, 1 oz outside for 0.127: the same 0.15 breaks one and keeps one.
    Boards b = new Boards();
    b.layers = 4;
    for (int layer : new int[] {1, 2}) {
      int from = b.bare(layer, new Point(10, 0), 0.15);
      int to = b.bare(layer, new Point(20, 0), 0.15);
      b.track(layer, 0.15, line(10, 0, 20, 0), from, to, "U", 1);
    }
    var inner =
        new etchloom.spec.FabRules.CopperRow(
            1, false, 0.035, 0.18, 0.18, java.util.OptionalDouble.empty());
    var fab = Boards.fab(List.of(Boards.row(1, true, 0.127), inner));
    Finding f = Boards.only(b.check(Boards.spec(4, Optional.empty()), fab), "track");
    assertEquals("L2", f.layer());
    assertEquals(0.18, f.required(), TINY);
  }

  @Test
  void thinRing_ofAVia() {
    Boards b = new Boards();
    b.via(new Point(20, 0), 0.54, 0.3);
    // (0.54 - 0.3)/2.
    Finding f = Boards.only(b.check(), "ring");
    assertEquals(0.12, f.measured(), TINY);
    assertEquals(0.13, f.required(), TINY);
    assertEquals(20, f.at().x(), TINY);
  }

  @Test
  void thinRing_ofATerminal_hasItsOwnLimit() {
    Boards b = new Boards();
    b.terminal("V1", new Point(0, 30), 1.3, 1.0);
    // (1.3 - 1)/2: enough for a via, not for a terminal.
    Finding f = Boards.only(b.check(), "ring");
    assertEquals(0.15, f.measured(), TINY);
    assertEquals(0.2, f.required(), TINY);
    assertEquals("terminal V1", f.what());
  }

  @Test
  void smallHole_andItsAspect() {
    Boards b = new Boards();
    b.thicknessMm = 2.4;
    b.via(new Point(20, 0), 0.6, 0.25);
    RuleReport r = b.check();
    assertEquals(0.25, Boards.findings(r, "hole").get(0).measured(), TINY);
    // 2.4 mm board over a hole of 0.25.
    Finding aspect = Boards.findings(r, "aspect").get(0);
    assertEquals(9.6, aspect.measured(), 1e-6);
    assertEquals(8, aspect.required(), 0);
    assertEquals(2, r.findings().size());
  }

  @Test
  void holesTooNear_platedOrNot() {
    Boards b = new Boards();
    // Pads joined by a wide track, so that only the holes are too near: 0.5 - 0.15 - 0.15.
    int v = b.via(new Point(20, 0), 0.6, 0.3);
    int w = b.via(new Point(20.5, 0), 0.6, 0.3);
    b.track(1, 0.4, line(20, 0, 20.5, 0), v, w, "U", 1);
    b.track(2, 0.4, line(20, 0, 20.5, 0), v, w, "U", 1);
    Finding f = Boards.only(b.check(), "hole-gap");
    assertEquals(0.2, f.measured(), TINY);
    assertEquals(0.25, f.required(), TINY);
    assertEquals("", f.layer());
    assertEquals(20.25, f.at().x(), TINY);
    assertEquals("joint 0 and joint 1", f.what());
  }

  @Test
  void mountingHole_nearAnother() {
    Boards b = new Boards();
    b.holes.add(new MountingHole(new Point(30, 0), 3, 3));
    b.holes.add(new MountingHole(new Point(30, 3.2), 3, 3));
    Finding f = Boards.only(b.check(), "hole-gap");
    // 3.2 - 1.5 - 1.5.
    assertEquals(0.2, f.measured(), TINY);
    assertEquals("mounting hole 1 and mounting hole 2", f.what());
  }

  @Test
  void holeGapMinimum_isFoundHoweverWide() {
    Boards b = new Boards();
    b.via(new Point(20, 0), 0.6, 0.3);
    b.via(new Point(-20, 0), 0.6, 0.3);
    b.via(new Point(0, 25), 0.6, 0.3);
    // hypot(20, 25) - 0.3.
    Finding f = Boards.minimum(b.check(), "hole-gap").orElseThrow();
    assertEquals(Math.hypot(20, 25) - 0.3, f.measured(), TINY);
  }

  @Test
  void foreignTrackNearAHole() {
    // The fab etches finely but drills roughly: 0.05 ring and 0.13 space are less than 0.2.
    Boards b = new Boards();
    b.via(new Point(20, 0), 0.4, 0.3);
    b.track(1, line(10, 0.43, 30, 0.43), 1);
    var fab = fineFab();
    Finding f = Boards.only(b.check(Boards.spec(2, Optional.empty()), fab), "hole-copper");
    // 0.43 - 0.15 - 0.1.
    assertEquals(0.18, f.measured(), TINY);
    assertEquals(0.2, f.required(), TINY);
    assertEquals("L1", f.layer());
    assertEquals("hole of joint 0 and phase U, coil 1, turn 1", f.what());
    assertEquals(20, f.at().x(), TINY);
  }

  @Test
  void ownTrackOfAHole_isNotForeign() {
    Boards b = new Boards();
    int v = b.via(new Point(20, 0), 0.4, 0.3);
    b.track(1, 0.2, line(20, 0, 30, 0), v, b.bare(1, new Point(30, 0)), "U", 1);
    RuleReport r = b.check(Boards.spec(2, Optional.empty()), fineFab());
    assertEquals(List.of(), r.findings());
  }

  @Test
  void copperNearAMountingHole_onAnInnerLayer() {
    Boards b = new Boards();
    b.layers = 4;
    b.holes.add(new MountingHole(new Point(30, 0), 3.2, 6.4));
    b.track(3, line(20, 1.85, 40, 1.85), 7);
    Finding f = Boards.only(b.check(), "hole-copper");
    // 1.85 - 1.6 - 0.1. Under the screw's head, but inside the board: no keep-out.
    assertEquals(0.15, f.measured(), TINY);
    assertEquals("L3", f.layer());
    assertEquals("mounting hole 1 and phase U, coil 7, turn 1", f.what());
    assertTrue(f.at().y() > 1.6 && f.at().y() < 1.75);
  }

  private static etchloom.spec.FabRules fineFab() {
    var rows = List.of(Boards.row(1, true, 0.1), Boards.row(1, false, 0.1));
    var f = Boards.fab(rows);
    return new etchloom.spec.FabRules(
        f.title(),
        f.layers(),
        f.stackups(),
        f.thicknessMinMm(),
        f.thicknessMaxMm(),
        f.sizeMm(),
        f.copper(),
        f.hole(),
        new etchloom.spec.FabRules.Ring(0.05, 0.05),
        f.edge(),
        f.mask(),
        f.legend(),
        f.tolerance());
  }
}
