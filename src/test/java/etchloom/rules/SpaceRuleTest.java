package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Track 0.2 mm, space 0.2 mm: neighbours along the copper up to (π/2)·0.4 = 0.628 mm. */
class SpaceRuleTest {
  private static final double NM = 1e-6;

  private static Line line(double x0, double y0, double x1, double y1) {
    return new Line(new Point(x0, y0), new Point(x1, y1));
  }

  private static double space(Boards b) {
    return Boards.minimum(b.check(), "space").orElseThrow().measured();
  }

  private static int broken(Boards b) {
    return Boards.findings(b.check(), "space").size();
  }

  @Test
  void parallelTracks_gapIsDistanceLessWidth() {
    Boards b = new Boards();
    b.track(1, Path.of(line(10, 0, 20, 0)), 1);
    b.track(1, Path.of(line(10, 0.35, 20, 0.35)), 2);
    RuleReport r = b.check();
    Finding f = Boards.findings(r, "space").get(0);
    // 0.35 - 0.2/2 - 0.2/2
    assertEquals(0.15, f.measured(), 1e-12);
    assertEquals(0.2, f.required(), 0);
    assertEquals("L1", f.layer());
    assertEquals("mm", f.unit());
    assertTrue(r.findings().stream().anyMatch(x -> x.what().contains("phase U, coil 1, turn 1")));
    assertEquals(0.175, f.at().y(), 1e-9);
  }

  @Test
  void tracksOnDifferentLayers_doNotMeet() {
    Boards b = new Boards();
    b.track(1, Path.of(line(10, 0, 20, 0)), 1);
    b.track(2, Path.of(line(15, -5, 15, 5)), 2);
    assertEquals(List.of(), b.check().findings());
  }

  @Test
  void crossingTracks_areBroken() {
    Boards b = new Boards();
    b.track(1, Path.of(line(10, 0, 20, 0)), 1);
    b.track(1, Path.of(line(15, -5, 15, 5)), 2);
    // Centre lines meet: 0 - 0.1 - 0.1.
    assertEquals(-0.2, space(b), 1e-12);
  }

  @Test
  void gapOfExactlyTheSpace_isKept_andThreeNanometresLessIsNot() {
    for (double off : new double[] {0, -3 * NM}) {
      Boards b = new Boards();
      b.track(1, Path.of(line(10, 0, 20, 0)), 1);
      b.track(1, Path.of(line(10, 0.4 + off, 20, 0.4 + off)), 2);
      assertEquals(off == 0, b.check().passed());
    }
  }

  private static Path hairpin(double radius, double legs) {
    Point turn = new Point(20, radius);
    return Path.of(
        line(20 - legs, 0, 20, 0),
        new Arc(new Point(20, 0), new Point(20, 2 * radius), turn, true),
        line(20, 2 * radius, 20 - legs, 2 * radius));
  }

  @Test
  void hairpinOfHalfThePitch_isKept() {
    Boards b = new Boards();
    b.track(1, hairpin(0.2, 5), 1);
    // Legs 0.4 apart: 0.4 - 0.2.
    assertEquals(0.2, space(b), NM);
    assertTrue(b.check().passed());
  }

  @Test
  void tighterHairpin_isBroken() {
    Boards b = new Boards();
    b.track(1, hairpin(0.19, 5), 1);
    // Legs 0.38 apart: 0.38 - 0.2.
    assertEquals(0.18, space(b), 1e-9);
    assertEquals(1, broken(b) > 0 ? 1 : 0);
  }

  @Test
  void hairpinWithoutLegs_isNeighbourOfItself() {
    Boards b = new Boards();
    b.track(1, hairpin(0.19, 0.01), 1);
    // The ends lie π·0.19 + 0.02 = 0.617 mm apart along the copper, less than 0.628.
    assertTrue(b.check().passed());
  }

  @Test
  void openingC_theEndsComeNear() {
    // Circle of radius 2, open over 12 degrees: chord 4 sin 6° = 0.41811, less 0.2.
    Boards b = new Boards();
    Point c = new Point(20, 0);
    Arc a = Arc.of(c, 2, Math.toRadians(6), Math.toRadians(348));
    b.track(1, Path.of(a), 1);
    assertEquals(4 * Math.sin(Math.toRadians(6)) - 0.2, space(b), 1e-9);
  }

  @Test
  void spiralOfArcs_gapBetweenTurns() {
    // Half circles of radius 2, 2.15, 2.3, 2.45 about centres 0.15 apart: every turn steps by 0.3,
    // so the gap is 0.3 - 0.2 where two half circles about one centre face each other.
    Boards b = new Boards();
    Point c0 = new Point(20, 0);
    Point c1 = new Point(20.15, 0);
    Arc a0 = new Arc(new Point(22, 0), new Point(18, 0), c0, true);
    Arc a1 = new Arc(a0.end(), new Point(22.3, 0), c1, true);
    Arc a2 = new Arc(a1.end(), new Point(17.7, 0), c0, true);
    b.track(1, Path.of(a0, a1, a2), 1);
    assertEquals(0.1, space(b), 1e-9);
  }

  @Test
  void rightAngle_isNoNarrowPlace() {
    Boards b = new Boards();
    b.track(1, Path.of(line(10, 0, 20, 0), line(20, 0, 20, 9)), 1);
    assertTrue(b.check().passed());
  }

  @Test
  void acuteAngle_isOne() {
    // 30°: points t from the corner on both legs are 2t sin 15° apart and 2t along the copper. At
    // 2t = (π/2)·0.4 the gap is 0.6283·0.2588 - 0.2 = -0.0374.
    Boards b = new Boards();
    double a = Math.toRadians(30);
    Point corner = new Point(20, 0);
    Point end = corner.plus(new Point(-9 * Math.cos(a), 9 * Math.sin(a)));
    b.track(1, Path.of(line(10, 0, 20, 0), new Line(corner, end)), 1);
    double expected = 0.2 * Math.PI * Math.sin(Math.toRadians(15)) - 0.2;
    assertEquals(0.2 * Math.PI, 0.62832, 1e-5);
    assertEquals(Math.PI / 2 * 0.4 * Math.sin(Math.toRadians(15)) - 0.2, expected, 1e-12);
    assertEquals(expected, space(b), 1e-6);
  }

  @Test
  void acuteAngleAtAJoint_isTheSameAsInOneTrack() {
    double a = Math.toRadians(30);
    Point corner = new Point(20, 0);
    Point end = corner.plus(new Point(-9 * Math.cos(a), 9 * Math.sin(a)));
    Boards b = new Boards();
    int first = b.bare(1, new Point(10, 0));
    int mid = b.bare(1, corner);
    int last = b.bare(1, end);
    b.track(1, 0.2, Path.of(line(10, 0, 20, 0)), first, mid, "U", 1);
    b.track(1, 0.2, Path.of(new Line(corner, end)), mid, last, "U", 2);
    assertEquals(Math.PI / 2 * 0.4 * Math.sin(Math.toRadians(15)) - 0.2, space(b), 1e-6);
  }

  @Test
  void straightOnThroughAPad_isKept() {
    Boards b = new Boards();
    int first = b.bare(1, new Point(10, 0));
    int via = b.via(new Point(15, 0), 0.6, 0.3);
    int last = b.bare(1, new Point(20, 0));
    b.track(1, 0.2, Path.of(line(10, 0, 15, 0)), first, via, "U", 1);
    b.track(1, 0.2, Path.of(line(15, 0, 20, 0)), via, last, "U", 2);
    assertEquals(List.of(), Boards.findings(b.check(), "space"));
  }

  @Test
  void anglesUnderALargePad_areHidden() {
    // 60° under a pad of radius 1: the tracks clear each other by the space from 0.4 mm on
    // (2·0.4·sin 30° - 0.2 = 0.2), well under the pad.
    Boards b = new Boards();
    Point at = new Point(20, 0);
    Point end = at.plus(Point.polar(9, Math.toRadians(60)));
    int via = b.via(at, 2, 1);
    b.track(1, 0.2, Path.of(line(20, 0, 29, 0)), via, b.bare(1, new Point(29, 0)), "U", 1);
    b.track(1, 0.2, Path.of(new Line(at, end)), via, b.bare(1, end), "U", 2);
    assertEquals(List.of(), Boards.findings(b.check(), "space"));
  }

  @Test
  void foreignTrackBesideAPad() {
    // 0.55 - 0.6/2 - 0.2/2.
    Boards b = new Boards();
    b.via(new Point(15, 0.55), 0.6, 0.3);
    b.track(1, Path.of(line(10, 0, 20, 0)), 1);
    assertEquals(0.15, space(b), 1e-12);
  }

  @Test
  void ownTrackComingBackToItsPad_isFoundAlthoughJoined() {
    // Leaves the pad to the right, turns and passes over it at 0.55: the same gap as above.
    Boards b = new Boards();
    int via = b.via(new Point(15, 0), 0.6, 0.3);
    Path p =
        Path.of(
            line(15, 0, 17, 0),
            new Arc(new Point(17, 0), new Point(17, 0.55), new Point(17, 0.275), true),
            line(17, 0.55, 10, 0.55));
    b.track(1, 0.2, p, via, b.bare(1, new Point(10, 0.55)), "U", 1);
    assertEquals(0.15, space(b), 1e-9);
  }

  @Test
  void padsJoinedByAShortTrack_areNeighbours_andElseNot() {
    Point a = new Point(15, 0);
    Point c = new Point(15.7, 0);
    Boards joined = new Boards();
    int first = joined.via(a, 0.6, 0.3);
    int second = joined.via(c, 0.6, 0.3);
    joined.track(1, 0.4, Path.of(new Line(a, c)), first, second, "U", 1);
    assertEquals(
        0,
        Boards.findings(joined.check(), "space").stream()
            .filter(f -> f.layer().equals("L1"))
            .count());
    // On L2 nothing joins them: 0.7 - 0.6.
    Finding f = Boards.findings(joined.check(), "space").get(0);
    assertEquals("L2", f.layer());
    assertEquals(0.1, f.measured(), 1e-12);
  }

  @Test
  void netNamesDoNotMatter_butBothThingsAreTold() {
    Boards b = new Boards();
    b.terminal("U1", new Point(20, 0), 2, 1);
    b.terminal("V1", new Point(22.1, 0), 2, 1);
    Finding f = Boards.findings(b.check(), "space").get(0);
    assertEquals("terminal U1 and terminal V1", f.what());
    assertEquals(0.1, f.measured(), 1e-12);
    assertEquals(21.05, f.at().x(), 1e-9);
  }

  @Test
  void minimumIsFound_howeverWideTheGaps() {
    Boards b = new Boards();
    b.track(1, Path.of(line(10, 0, 20, 0)), 1);
    b.track(1, Path.of(line(10, 5, 20, 5)), 2);
    assertEquals(4.8, space(b), 1e-9);
  }

  @Test
  void manyBrokenPlaces_areCountedAndTheTightestListed() {
    Boards b = new Boards();
    // 80 pairs of tracks, each broken by track and track, by the end pads at both ends, and by an
    // end pad and the other track four times: 7 · 80 = 560.
    for (int i = 0; i < 80; i++) {
      // Gap 0.1 + 0.001 i.
      double y = 2.0 * i;
      b.track(1, Path.of(line(10, y, 20, y)), 2 * i + 1);
      b.track(1, Path.of(line(10, y + 0.3 + 0.001 * i, 20, y + 0.3 + 0.001 * i)), 2 * i + 2);
    }
    RuleReport r = b.check();
    List<Finding> space = Boards.findings(r, "space");
    assertEquals(50, space.size());
    assertTrue(space.stream().allMatch(f -> f.measured() < 0.15 + NM));
    assertTrue(
        r.notes().stream().anyMatch(n -> n.contains("space") && n.contains("560")), r::toString);
  }

  @Test
  void findingsDoNotDependOnTheOrderOfTheCopper() {
    Boards b = new Boards();
    b.track(1, Path.of(line(10, 0, 20, 0)), 1);
    b.track(1, Path.of(line(10, 0.35, 20, 0.35)), 2);
    assertEquals(b.check(), b.check());
  }

  @Test
  void eachLayerHasItsRow() {
    // Inner rows ask for 0.3: the gap of 0.25 breaks it on L2 and keeps 0.2 on L1.
    Boards b = new Boards();
    b.layers = 4;
    for (int layer : new int[] {1, 2}) {
      b.track(layer, Path.of(line(10, 0, 20, 0)), 1);
      b.track(layer, Path.of(line(10, 0.45, 20, 0.45)), 2);
    }
    var fab = Boards.fab(List.of(Boards.row(1, true, 0.2), Boards.row(1, false, 0.3)));
    List<Finding> found =
        Boards.findings(b.check(Boards.spec(4, java.util.Optional.empty()), fab), "space");
    assertTrue(found.stream().allMatch(f -> f.layer().equals("L2") && f.required() == 0.3));
    assertEquals(0.25, found.get(0).measured(), 1e-9);
  }
}
