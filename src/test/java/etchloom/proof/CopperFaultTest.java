package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Distance;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** One fault at a time in the copper of a clean set: found by its name, at its place. */
class CopperFaultTest {
  private final Artwork wheel = EditedSet.wheel().art;
  private final Artwork delta = EditedSet.delta().art;

  @Test
  void bridgeBetweenTurns_isALoop() {
    Conductor c = FaultPlaces.spiral(wheel, 3, 2);
    Nearest n = FaultPlaces.besideEachOther(c, 30);
    EditedSet e = EditedSet.wheel().draw(2, true, 0.1, n.onFirst(), n.onSecond());
    e.mustFind(ProofNames.LOOP, 2, n.middle(), 0.15);
    ProofReport r = e.prove();
    assertEquals(1, r.loops().get(2));
    assertEquals(1, r.circuits());
    assertEquals(0, r.shorts());
    e.mustFind(ProofNames.CIRCUITS, 0, n.middle(), 0.15);
    e.mustFind(ProofNames.EXTRA_COPPER, 2, n.middle(), 0.15);
  }

  @Test
  void bridgeBetweenNeighbouringCoils_isAShort() {
    Conductor a = FaultPlaces.spiral(wheel, 1, 3);
    Conductor b = FaultPlaces.spiral(wheel, 2, 3);
    Nearest n = null;
    for (Segment s : a.path().segments()) {
      for (Segment t : b.path().segments()) {
        Nearest m = Distance.between(s.part(0.4, 0.6), t);
        n = n == null || m.distanceMm() < n.distanceMm() ? m : n;
      }
    }
    EditedSet e = EditedSet.wheel().draw(3, true, 0.12, n.onFirst(), n.onSecond());
    ProofFinding f = e.mustFind(ProofNames.SHORT, 3, n.middle(), 0.15);
    assertTrue(f.message().contains("coil 1") && f.message().contains("coil 2"), f.text());
    assertEquals(1, e.prove().shorts());
  }

  @Test
  void lastTurnToTheOtherEyeVia_isAShort() {
    Conductor c = FaultPlaces.spiral(wheel, 1, 1);
    int own =
        wheel.joints().get(c.toJoint()).kind() == Joint.Kind.EYE ? c.toJoint() : c.fromJoint();
    Joint other =
        wheel.joints().stream()
            .filter(j -> j.kind() == Joint.Kind.EYE && j.id() != own)
            .min((j, k) -> Double.compare(dist(j, own), dist(k, own)))
            .get();
    Nearest n = null;
    for (Segment s : c.path().segments()) {
      Nearest m = Distance.between(other.at(), s);
      n = n == null || m.distanceMm() < n.distanceMm() ? m : n;
    }
    EditedSet e = EditedSet.wheel().draw(1, true, 0.15, n.onFirst(), n.onSecond());
    Point edge = n.onSecond().plus(n.onFirst()).times(0.5);
    ProofFinding f = e.mustFind(ProofNames.SHORT, 1, edge, 0.3);
    assertTrue(f.message().contains("eye via"), f.text());
  }

  @Test
  void nodeToNode_isAShort() {
    Joint a = FaultPlaces.joint(wheel, Joint.Kind.NODE, 1);
    Joint b =
        wheel.joints().stream()
            .filter(j -> j.kind() == Joint.Kind.NODE && j.id() != a.id() && j.on(3))
            .min((j, k) -> Double.compare(dist(j, a.id()), dist(k, a.id())))
            .get();
    assertTrue(a.on(3));
    EditedSet e = EditedSet.wheel().draw(3, true, 0.2, a.at(), b.at());
    e.mustFind(ProofNames.SHORT, 3, a.at().plus(b.at()).times(0.5), 0.5);
  }

  @Test
  void cutInOneLegOfADelta_isAnOpenAndNoCircuit() {
    Conductor c = FaultPlaces.spiral(delta, 4, 2);
    Segment s = c.path().segments().get(FaultPlaces.longest(c));
    Point across = new Point(-s.tangent(0.5).y(), s.tangent(0.5).x()).times(0.15);
    Point at = s.at(0.5);
    EditedSet e = EditedSet.delta().draw(2, false, 0.1, at.minus(across), at.plus(across));
    ProofFinding f = e.mustFind(ProofNames.OPEN, 2, at, 0.1);
    assertTrue(f.message().contains("coil 4"), f.text());
    e.mustFind(ProofNames.CIRCUITS, 0, at, 0.1);
    ProofReport r = e.prove();
    assertEquals(1, r.opens());
    assertEquals(0, r.circuits());
    // every terminal still reaches every other: a check of nets sees nothing
    assertEquals(1, r.nets());
  }

  @Test
  void leftOutDraw_isAnOpen() {
    Conductor c = FaultPlaces.spiral(wheel, 5, 1);
    Segment s = c.path().segments().get(FaultPlaces.longest(c));
    EditedSet e = EditedSet.wheel();
    e.replace(
        EditedSet.copper(1),
        EditedSet.drawTo(s, e.text(EditedSet.copper(1))) + "D01*",
        EditedSet.xy(s.end()) + "D02*");
    e.mustFind(ProofNames.OPEN, 1, s.at(0.5), 0.01 + s.lengthMm() / 20);
    e.mustFind(ProofNames.MISSING_COPPER, 1, s.at(0.5), s.lengthMm() / 2);
  }

  @Test
  void narrowedTrack_isMissingCopper() {
    Conductor c = wheel.conductorsOn(1).get(3);
    String start = EditedSet.xy(c.path().start()) + "D02*";
    EditedSet e =
        EditedSet.wheel().replace(EditedSet.copper(1), start, "%ADD91C,0.18*%\nD91*\n" + start);
    Segment s = c.path().segments().get(FaultPlaces.longest(c));
    // one side of 0.01 mm along the whole spiral
    ProofFinding f = e.mustFind(ProofNames.MISSING_COPPER, 1, s.at(0.5), 40);
    assertTrue(f.message().contains(c.what().describe(-1)), f.text());
  }

  @Test
  void flippedArc_isExtraAndMissingCopper() {
    Conductor c = FaultPlaces.spiral(wheel, 2, 1);
    Arc a =
        (Arc)
            c.path().segments().stream()
                .filter(s -> s instanceof Arc x && x.radiusMm() > 5)
                .skip(5)
                .findFirst()
                .get();
    EditedSet e = EditedSet.wheel();
    String draw = EditedSet.drawTo(a, e.text(EditedSet.copper(1))) + "D01*\n";
    String wrong = a.counterClockwise() ? "G02*\n" : "G03*\n";
    String right = a.counterClockwise() ? "G03*\n" : "G02*\n";
    e.replace(EditedSet.copper(1), draw, wrong + draw + right);
    e.mustFind(ProofNames.MISSING_COPPER, 1, a.at(0.5), a.lengthMm() / 2 + 0.01);
    Point opposite = a.centre().times(2).minus(a.at(0.5));
    e.mustFind(ProofNames.EXTRA_COPPER, 1, opposite, 2 * a.radiusMm());
    assertTrue(e.prove().shorts() > 0);
  }

  @Test
  void flatterArc_isFound() {
    Conductor c = FaultPlaces.spiral(wheel, 2, 4);
    Arc a =
        (Arc)
            c.path().segments().stream()
                .filter(s -> s instanceof Arc x && x.radiusMm() > 5 && x.lengthMm() > 2)
                .skip(5)
                .findFirst()
                .get();
    // the centre moved out along the chord's bisector: equal radii, 2 % larger
    Point mid = a.start().plus(a.end()).times(0.5);
    Point centre = a.centre().plus(a.centre().minus(mid).times(0.02));
    EditedSet e = EditedSet.wheel();
    String draw = EditedSet.drawTo(a, e.text(EditedSet.copper(4)));
    Point ij = centre.minus(a.start());
    String moved =
        EditedSet.xy(a.end()) + "I" + Math.round(ij.x() * 1e6) + "J" + Math.round(ij.y() * 1e6);
    e.replace(EditedSet.copper(4), draw, moved);
    e.mustFind(ProofNames.MISSING_COPPER, 4, a.at(0.5), 0.3);
    e.mustFind(ProofNames.EXTRA_COPPER, 4, a.at(0.5), 0.3);
  }

  @Test
  void swappedLayers_areNamed() {
    EditedSet e = EditedSet.wheel();
    String two = e.text(EditedSet.copper(2)).replace("Copper,L2,Inr", "Copper,L3,Inr");
    String three = e.text(EditedSet.copper(3)).replace("Copper,L3,Inr", "Copper,L2,Inr");
    ProofReport r = e.put(EditedSet.copper(2), two).put(EditedSet.copper(3), three).prove();
    assertEquals(
        List.of("L2", "L3"),
        r.findings().stream()
            .filter(f -> f.name().equals(ProofNames.SWAPPED_LAYERS))
            .map(ProofFinding::layer)
            .toList());
  }

  @Test
  void strayCopper_isFound() {
    Point from = Point.polar(10, 1);
    EditedSet e = EditedSet.wheel().draw(4, true, 0.3, from, Point.polar(10.5, 1));
    e.mustFind(ProofNames.STRAY_COPPER, 4, from, 0.8);
  }

  @Test
  void missingPad_isMissingCopper() {
    Joint j = FaultPlaces.joint(wheel, Joint.Kind.EYE, 3);
    EditedSet e =
        EditedSet.wheel().replace(EditedSet.copper(4), EditedSet.xy(j.at()) + "D03*\n", "");
    e.mustFind(ProofNames.MISSING_COPPER, 4, j.at(), j.padMm() / 2 + 0.001);
  }

  @Test
  void partOfADesignThatIsShortedItself_isFoundToo() {
    // the design's own track laid over another coil's: no file differs from it
    Conductor c = FaultPlaces.spiral(wheel, 1, 1);
    Conductor d = FaultPlaces.spiral(wheel, 2, 1);
    Line bridge = new Line(c.path().segments().get(2).end(), d.path().segments().get(2).end());
    ProofExpectation e = ProofExpectation.of(wheel);
    List<ProofExpectation.Track> tracks = new ArrayList<>(e.tracks());
    ProofExpectation.Track own = tracks.get(c.id());
    List<Segment> longer = new ArrayList<>(c.path().segments());
    longer.add(new Line(c.path().end(), bridge.start()));
    longer.add(bridge);
    longer.add(bridge.reversed());
    longer.add(new Line(bridge.start(), c.path().end()));
    tracks.set(
        c.id(),
        new ProofExpectation.Track(
            1, new Path(longer), c.widthMm(), own.from(), own.to(), own.net(), own.what()));
    ProofExpectation shorted =
        new ProofExpectation(
            e.layers(),
            e.pads(),
            tracks,
            e.nonPlated(),
            e.profile(),
            e.maskTop(),
            e.maskBottom(),
            e.circuits());
    EditedSet edit = EditedSet.wheel();
    for (int i = longer.size() - 4; i < longer.size(); i++) {
      edit.replace(
          EditedSet.copper(1),
          "M02*",
          "%ADD9"
              + i % 10
              + "C,"
              + c.widthMm()
              + "*%\n%TO.N,WINDING*%\nD9"
              + i % 10
              + "*\n"
              + EditedSet.xy(longer.get(i).start())
              + "D02*\nG01*\n"
              + EditedSet.xy(longer.get(i).end())
              + "D01*\nM02*");
    }
    ProofReport r = Prover.prove(edit.files, shorted);
    assertTrue(r.shorts() > 0, () -> r.findings().toString());
    assertFalse(
        r.findings().stream().anyMatch(f -> f.name().equals(ProofNames.EXTRA_COPPER)),
        () -> r.findings().toString());
  }

  private double dist(Joint j, int id) {
    return j.at().distanceTo(wheel.joints().get(id).at());
  }
}
