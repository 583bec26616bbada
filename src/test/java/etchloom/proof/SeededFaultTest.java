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
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** One fault at a time in the bytes of a clean set: each is found by its name, at its place. */
class SeededFaultTest {
  private static Artwork wheel;
  private static SortedMap<String, byte[]> wheelSet;
  private static Artwork delta;
  private static SortedMap<String, byte[]> deltaSet;

  @BeforeAll
  static void write() {
    wheel = WrittenSets.smallWheel();
    wheelSet = WrittenSets.withoutSums(WrittenSets.write(wheel));
    delta = WrittenSets.delta();
    deltaSet = WrittenSets.withoutSums(WrittenSets.write(delta));
  }

  /** A set with some files replaced. */
  private static final class Edit {
    final Artwork art;
    final SortedMap<String, byte[]> files;
    private ProofReport report;

    Edit(Artwork art, SortedMap<String, byte[]> clean) {
      this.art = art;
      this.files = new TreeMap<>(clean);
    }

    String text(String suffix) {
      return WrittenSets.text(files.get(art.slug() + suffix));
    }

    Edit put(String suffix, String text) {
      files.put(art.slug() + suffix, text.getBytes(WrittenSets.ASCII));
      return this;
    }

    /** Replaces one appearance, which must be there. */
    Edit replace(String suffix, String from, String to) {
      String t = text(suffix);
      int at = t.indexOf(from);
      assertTrue(at >= 0, () -> "no '" + from + "' in " + suffix);
      return put(suffix, t.substring(0, at) + to + t.substring(at + from.length()));
    }

    /** A stroke at the end of a copper layer. */
    Edit draw(int layer, boolean dark, double widthMm, Point from, Point to) {
      return replace(
          copper(layer),
          "M02*",
          (dark ? "" : "%LPC*%\n")
              + "%ADD90C,"
              + widthMm
              + "*%\n%TO.N,"
              + art.conductors().get(0).net()
              + "*%\nD90*\n"
              + xy(from)
              + "D02*\nG01*\n"
              + xy(to)
              + "D01*\nM02*");
    }

    /** The set must not be changed any more. */
    ProofReport prove() {
      if (report == null) {
        report = Prover.prove(files, ProofExpectation.of(art));
      }
      return report;
    }

    /** The finding of a name on a layer that is nearest to a place. */
    ProofFinding mustFind(String name, int layer, Point at, double withinMm) {
      ProofReport r = prove();
      String all = String.join("\n", r.findings().stream().map(ProofFinding::text).toList());
      ProofFinding best =
          r.findings().stream()
              .filter(f -> f.name().equals(name))
              .filter(f -> f.layer().equals(layer == 0 ? "" : "L" + layer))
              .filter(f -> f.at().isPresent())
              .min((f, g) -> Double.compare(away(f, at), away(g, at)))
              .orElse(null);
      assertTrue(best != null, () -> "no " + name + " on L" + layer + " in\n" + all);
      assertTrue(away(best, at) <= withinMm, () -> name + " is not at " + at + "\n" + all);
      return best;
    }

    private static double away(ProofFinding f, Point at) {
      return f.at().orElseThrow().distanceTo(at);
    }
  }

  private static Edit wheel() {
    return new Edit(wheel, wheelSet);
  }

  private static Edit delta() {
    return new Edit(delta, deltaSet);
  }

  private static String copper(int layer) {
    return "-copper-L" + layer + ".gbr";
  }

  private static String xy(Point p) {
    return "X" + Math.round(p.x() * 1e6) + "Y" + Math.round(p.y() * 1e6);
  }

  private static Conductor spiral(Artwork art, int coil, int layer) {
    return art.conductors().get(art.coils().get(coil - 1).conductors().get(layer - 1));
  }

  /** The nearest places of two pieces of a spiral that lie side by side. */
  private static Nearest besideEachOther(Conductor c, int from) {
    List<Segment> s = c.path().segments();
    Segment a = s.get(from).part(0.45, 0.55);
    Nearest best = null;
    for (int k = 0; k < s.size(); k++) {
      Nearest n = Distance.between(a, s.get(k));
      if (Math.abs(k - from) > 4 && (best == null || n.distanceMm() < best.distanceMm())) {
        best = n;
      }
    }
    return best;
  }

  /** The middle of the longest piece of a spiral. */
  private static int longest(Conductor c) {
    List<Segment> s = c.path().segments();
    int best = 0;
    for (int k = 1; k < s.size(); k++) {
      best = s.get(k).lengthMm() > s.get(best).lengthMm() ? k : best;
    }
    return best;
  }

  private static Joint joint(Joint.Kind kind, int index) {
    return wheel.joints().stream().filter(j -> j.kind() == kind).skip(index).findFirst().get();
  }

  @Test
  void bridgeBetweenTurns_isALoop() {
    Conductor c = spiral(wheel, 3, 2);
    Nearest n = besideEachOther(c, 30);
    Edit e = wheel().draw(2, true, 0.1, n.onFirst(), n.onSecond());
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
    Conductor a = spiral(wheel, 1, 3);
    Conductor b = spiral(wheel, 2, 3);
    Nearest n = null;
    for (Segment s : a.path().segments()) {
      for (Segment t : b.path().segments()) {
        Nearest m = Distance.between(s.part(0.4, 0.6), t);
        n = n == null || m.distanceMm() < n.distanceMm() ? m : n;
      }
    }
    Edit e = wheel().draw(3, true, 0.12, n.onFirst(), n.onSecond());
    ProofFinding f = e.mustFind(ProofNames.SHORT, 3, n.middle(), 0.15);
    assertTrue(f.message().contains("coil 1") && f.message().contains("coil 2"), f.text());
    assertEquals(1, e.prove().shorts());
  }

  @Test
  void lastTurnToTheOtherEyeVia_isAShort() {
    Conductor c = spiral(wheel, 1, 1);
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
    Edit e = wheel().draw(1, true, 0.15, n.onFirst(), n.onSecond());
    Point edge = n.onSecond().plus(n.onFirst()).times(0.5);
    ProofFinding f = e.mustFind(ProofNames.SHORT, 1, edge, 0.3);
    assertTrue(f.message().contains("eye via"), f.text());
  }

  private static double dist(Joint j, int id) {
    return j.at().distanceTo(wheel.joints().get(id).at());
  }

  @Test
  void nodeToNode_isAShort() {
    Joint a = joint(Joint.Kind.NODE, 1);
    Joint b =
        wheel.joints().stream()
            .filter(j -> j.kind() == Joint.Kind.NODE && j.id() != a.id() && j.on(3))
            .min((j, k) -> Double.compare(dist(j, a.id()), dist(k, a.id())))
            .get();
    assertTrue(a.on(3));
    Edit e = wheel().draw(3, true, 0.2, a.at(), b.at());
    e.mustFind(ProofNames.SHORT, 3, a.at().plus(b.at()).times(0.5), 0.5);
  }

  @Test
  void cutInOneLegOfADelta_isAnOpenAndNoCircuit() {
    Conductor c = spiral(delta, 4, 2);
    Segment s = c.path().segments().get(longest(c));
    Point across = new Point(-s.tangent(0.5).y(), s.tangent(0.5).x()).times(0.15);
    Point at = s.at(0.5);
    Edit e = delta().draw(2, false, 0.1, at.minus(across), at.plus(across));
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
    Conductor c = spiral(wheel, 5, 1);
    Segment s = c.path().segments().get(longest(c));
    Edit e = wheel();
    e.replace(copper(1), drawTo(s, e.text(copper(1))) + "D01*", xy(s.end()) + "D02*");
    e.mustFind(ProofNames.OPEN, 1, s.at(0.5), 0.01 + s.lengthMm() / 20);
    e.mustFind(ProofNames.MISSING_COPPER, 1, s.at(0.5), s.lengthMm() / 2);
  }

  /** The line of a file by which a piece is drawn, without its operation. */
  private static String drawTo(Segment s, String file) {
    String to = xy(s.end());
    int at = file.indexOf(to);
    assertTrue(at >= 0, () -> "no draw to " + to);
    return file.substring(at, file.indexOf("D0", at));
  }

  @Test
  void narrowedTrack_isMissingCopper() {
    Conductor c = wheel.conductorsOn(1).get(3);
    String start = xy(c.path().start()) + "D02*";
    Edit e = wheel().replace(copper(1), start, "%ADD91C,0.18*%\nD91*\n" + start);
    Segment s = c.path().segments().get(longest(c));
    // one side of 0.01 mm along the whole spiral
    ProofFinding f = e.mustFind(ProofNames.MISSING_COPPER, 1, s.at(0.5), 40);
    assertTrue(f.message().contains(c.what().describe(-1)), f.text());
  }

  @Test
  void viaNotDrilled_isAMissingHole() {
    Joint j = joint(Joint.Kind.EYE, 4);
    Edit e = wheel().replace("-plated.gbr", xy(j.at()) + "D03*\n", "");
    assertEquals("", e.mustFind(ProofNames.MISSING_HOLE, 0, j.at(), 1e-6).layer());
    ProofReport r = e.prove();
    assertTrue(r.findings().stream().anyMatch(f -> f.name().equals(ProofNames.OPEN)));
    // its pads on the two layers that no track leads to stand alone, and the coil is cut in two
    assertEquals(4, r.nets());
  }

  @Test
  void viaNotDrilledInOneFormat_isAMissingHole() {
    Joint j = joint(Joint.Kind.NODE, 2);
    Edit e = wheel();
    String hit =
        e.text("-plated.xnc")
            .lines()
            .filter(l -> l.startsWith("X") && away(l, j.at()) < 1e-6)
            .findFirst()
            .orElseThrow();
    e.replace("-plated.xnc", hit + "\n", "");
    ProofFinding f = e.mustFind(ProofNames.MISSING_HOLE, 0, j.at(), 1e-6);
    assertEquals(wheel.slug() + "-plated.xnc", f.file());
  }

  private static double away(String hit, Point p) {
    int y = hit.indexOf('Y');
    return p.distanceTo(
        new Point(
            Double.parseDouble(hit.substring(1, y)), Double.parseDouble(hit.substring(y + 1))));
  }

  @Test
  void movedHole_isFoundWhereItIs() {
    Joint j = joint(Joint.Kind.NODE, 7);
    Point to = j.at().plus(new Point(0.12, -0.05));
    Edit e = wheel().replace("-plated.gbr", xy(j.at()), xy(to));
    ProofFinding f = e.mustFind(ProofNames.MOVED_HOLE, 0, to, 2e-6);
    assertTrue(f.message().contains("0.1300 mm"), f.text());
  }

  @Test
  void largerHole_isFound() {
    Edit e = wheel().replace("-nonplated.gbr", "C,3.2*", "C,3.4*");
    e.mustFind(ProofNames.HOLE_SIZE, 0, wheel.mountingHoles().get(0).at(), 100);
    assertEquals(
        4,
        e.prove().findings().stream().filter(f -> f.name().equals(ProofNames.HOLE_SIZE)).count());
  }

  @Test
  void wrongNetName_isFoundWithItsLine() {
    Edit e = wheel().replace(copper(2), "%TO.N,WINDING*%", "%TO.N,WINDUNG*%");
    ProofFinding f =
        e.mustFind(ProofNames.NET_NAME, 2, wheel.conductorsOn(2).get(0).path().start(), 1e-6);
    assertTrue(f.line() > 10 && f.message().contains("WINDUNG"), f.text());
  }

  @Test
  void swappedLayers_areNamed() {
    Edit e = wheel();
    String two = e.text(copper(2)).replace("Copper,L2,Inr", "Copper,L3,Inr");
    String three = e.text(copper(3)).replace("Copper,L3,Inr", "Copper,L2,Inr");
    ProofReport r = e.put(copper(2), two).put(copper(3), three).prove();
    assertEquals(
        List.of("L2", "L3"),
        r.findings().stream()
            .filter(f -> f.name().equals(ProofNames.SWAPPED_LAYERS))
            .map(ProofFinding::layer)
            .toList());
  }

  @Test
  void flippedArc_isExtraAndMissingCopper() {
    Conductor c = spiral(wheel, 2, 1);
    Arc a =
        (Arc)
            c.path().segments().stream()
                .filter(s -> s instanceof Arc x && x.radiusMm() > 5)
                .skip(5)
                .findFirst()
                .get();
    Edit e = wheel();
    String draw = drawTo(a, e.text(copper(1))) + "D01*\n";
    String wrong = a.counterClockwise() ? "G02*\n" : "G03*\n";
    String right = a.counterClockwise() ? "G03*\n" : "G02*\n";
    e.replace(copper(1), draw, wrong + draw + right);
    e.mustFind(ProofNames.MISSING_COPPER, 1, a.at(0.5), a.lengthMm() / 2 + 0.01);
    Point opposite = a.centre().times(2).minus(a.at(0.5));
    e.mustFind(ProofNames.EXTRA_COPPER, 1, opposite, 2 * a.radiusMm());
    assertTrue(e.prove().shorts() > 0);
  }

  @Test
  void flatterArc_isFound() {
    Conductor c = spiral(wheel, 2, 4);
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
    Edit e = wheel();
    String draw = drawTo(a, e.text(copper(4)));
    Point ij = centre.minus(a.start());
    String moved = xy(a.end()) + "I" + Math.round(ij.x() * 1e6) + "J" + Math.round(ij.y() * 1e6);
    e.replace(copper(4), draw, moved);
    e.mustFind(ProofNames.MISSING_COPPER, 4, a.at(0.5), 0.3);
    e.mustFind(ProofNames.EXTRA_COPPER, 4, a.at(0.5), 0.3);
  }

  @Test
  void arcWhoseRadiiDisagree_cannotBeRead() {
    Conductor c = spiral(wheel, 2, 1);
    Arc a =
        (Arc) c.path().segments().stream().filter(s -> s instanceof Arc).skip(7).findFirst().get();
    Edit e = wheel();
    String draw = drawTo(a, e.text(copper(1)));
    int i = draw.indexOf('I');
    int j = draw.indexOf('J');
    long off = Long.parseLong(draw.substring(i + 1, j)) + 60_000;
    e.replace(copper(1), draw, draw.substring(0, i + 1) + off + draw.substring(j));
    ProofReport r = e.prove();
    ProofFinding f = only(r, ProofNames.UNREADABLE);
    assertTrue(f.line() > 20, f.text());
  }

  private static ProofFinding only(ProofReport r, String name) {
    List<ProofFinding> some = r.findings().stream().filter(f -> f.name().equals(name)).toList();
    assertEquals(1, some.size(), () -> r.findings().toString());
    return some.get(0);
  }

  /** Cuts an entity of a layer out of a DXF file: from its kind to the next entity's. */
  private static String withoutEntity(String dxf, String layer, int which) {
    int at = dxf.indexOf("ENTITIES");
    for (int k = 0; k <= which; k++) {
      at =
          dxf.indexOf("\n" + layer + "\r\n", at + 1) > 0
              ? dxf.indexOf("\n" + layer + "\r\n", at + 1)
              : dxf.indexOf("\n" + layer + "\n", at + 1);
    }
    int from = Math.max(dxf.lastIndexOf("\nLWPOLYLINE", at), dxf.lastIndexOf("\nCIRCLE", at));
    from = dxf.lastIndexOf('\n', from - 1) + 1;
    int to = Math.min(after(dxf, "\nLWPOLYLINE", at), after(dxf, "\nCIRCLE", at));
    to = dxf.lastIndexOf('\n', to - 1) + 1;
    return dxf.substring(0, from) + dxf.substring(to);
  }

  private static int after(String text, String word, int at) {
    int found = text.indexOf(word, at);
    return found < 0 ? Integer.MAX_VALUE : found;
  }

  @Test
  void removedDxfEntity_isFound() {
    Edit e = wheel();
    e.put(".dxf", withoutEntity(e.text(".dxf"), "COPPER_L2", 4));
    Conductor c = wheel.conductorsOn(2).get(4);
    Segment s = c.path().segments().get(longest(c));
    ProofFinding f = e.mustFind(ProofNames.DXF, 2, s.at(0.5), 1e-3);
    assertTrue(f.message().contains("lacks"), f.text());
  }

  @Test
  void removedOutline_isFound() {
    Edit e = wheel();
    e.put("-outlines.dxf", withoutEntity(e.text("-outlines.dxf"), "COPPER_L3", 0));
    ProofReport r = e.prove();
    ProofFinding f = only(r, ProofNames.OUTLINES);
    assertEquals("L3", f.layer());
    assertTrue(f.message().contains("leave out"), f.text());
    assertTrue(r.gerberDxfAreaDifferenceMm2().orElseThrow() > 0.2, r::toString);
  }

  @Test
  void widerOutline_isFoundByItsArea() {
    Edit e = wheel();
    // one end of a long side moved by 4 um: within what flattening bears at a point
    String t = e.text("-outlines.dxf");
    int at = t.indexOf("LWPOLYLINE", t.indexOf("ENTITIES"));
    int x = t.indexOf(".", t.indexOf("10\r\n", at) > 0 ? t.indexOf("\n 10", at) : at);
    String moved =
        t.substring(0, x + 1)
            + (char) (t.charAt(x + 1) == '9' ? '8' : t.charAt(x + 1) + 1)
            + t.substring(x + 2);
    ProofReport r = e.put("-outlines.dxf", moved).prove();
    assertTrue(
        r.findings().stream().anyMatch(f -> f.name().equals(ProofNames.OUTLINES)), r::toString);
  }

  @Test
  void removedSvgPath_isFound() {
    Edit e = wheel();
    String t = e.text(".svg");
    int group = t.indexOf("id=\"copper-L4\"");
    int from = t.indexOf("<path", group);
    int to = t.indexOf("</path>", from) + 7;
    e.put(".svg", t.substring(0, from) + t.substring(to));
    Conductor c = wheel.conductorsOn(4).get(0);
    List<ProofFinding> told =
        e.prove().findings().stream().filter(f -> f.name().equals(ProofNames.SVG)).toList();
    assertEquals(Math.min(50, c.path().segments().size()), told.size());
    for (ProofFinding f : told) {
      assertTrue(
          c.path().segments().stream()
              .anyMatch(s -> Distance.between(f.at().orElseThrow(), s).distanceMm() < 1e-3),
          f.text());
    }
  }

  @Test
  void netlistOfAnotherNet_isFound() {
    Edit e = wheel();
    String line = e.text(".ipc").lines().filter(l -> l.startsWith("317")).skip(6).findFirst().get();
    e.replace(".ipc", line, line.replace("WINDING", "WINDUNG"));
    ProofFinding f = only(e.prove(), ProofNames.NETLIST);
    assertTrue(f.at().isPresent() && f.line() > 5 && f.message().contains("WINDUNG"), f.text());
  }

  @Test
  void netlistEdgeOffThePlace_isFound() {
    Edit e = wheel();
    String line = e.text(".ipc").lines().filter(l -> l.startsWith("089")).findFirst().get();
    int x = line.indexOf("X", 6);
    String moved = line.substring(0, x + 4) + (line.charAt(x + 4) == '0' ? '1' : '0');
    e.replace(".ipc", line, moved + line.substring(x + 5));
    assertTrue(e.prove().findings().stream().anyMatch(f -> f.name().equals(ProofNames.NETLIST)));
  }

  @Test
  void padAndHoleCalledSomethingElse_areFound() {
    Edit pad =
        wheel().replace(copper(1), "%TA.AperFunction,ComponentPad*%", "%TA.AperFunction,ViaPad*%");
    Joint t = wheel.terminals().get(0);
    pad.mustFind(ProofNames.FUNCTION, 1, t.at(), 1e-6);
    Edit hole = wheel().replace("-plated.xnc", "ComponentDrill", "ViaDrill");
    hole.mustFind(ProofNames.FUNCTION, 0, t.at(), 1e-6);
  }

  @Test
  void jobFileThatSaysOtherwise_isFound() {
    Edit e = wheel().replace(".gbrjob", "Copper,L2,Inr", "Copper,L3,Inr");
    assertTrue(only(e.prove(), ProofNames.JOB_FILE).message().contains("-copper-L2.gbr"));
    Edit size = wheel().replace(".gbrjob", "84", "85");
    assertTrue(only(size.prove(), ProofNames.JOB_FILE).message().contains("85"));
  }

  @Test
  void missingMaskOpening_isFound() {
    Joint t = wheel.terminals().get(1);
    Edit e = wheel().replace("-mask-top.gbr", xy(t.at()) + "D03*\n", "");
    e.mustFind(ProofNames.MASK, 0, t.at(), 1e-6);
  }

  @Test
  void movedEdge_isFound() {
    Edit e = wheel();
    String t = e.text("-profile.gbr");
    ProofReport r = e.put("-profile.gbr", t.replace("7000000", "7100000")).prove();
    assertEquals(4, r.findings().stream().filter(f -> f.name().equals("profile")).count());
  }

  @Test
  void archiveOfOtherBytes_isFound() {
    Edit e = wheel();
    byte[] zip = e.files.get(wheel.slug() + "-fab.zip").clone();
    String name = wheel.slug() + "-profile.gbr";
    byte[] bytes = e.files.get(name).clone();
    e.files.put(name, bytes);
    bytes[5] = 'q'; // a letter of the comment
    e.files.put(wheel.slug() + "-fab.zip", zip);
    List<String> told =
        e.prove().findings().stream()
            .filter(f -> f.name().equals(ProofNames.ARCHIVE))
            .map(ProofFinding::message)
            .toList();
    assertTrue(told.stream().anyMatch(m -> m.contains("-profile.gbr")), told::toString);
  }

  @Test
  void missingEnd_cannotBeRead() {
    ProofFinding f = only(wheel().replace(copper(3), "M02*\n", "").prove(), ProofNames.UNREADABLE);
    assertEquals(wheel.slug() + copper(3), f.file());
    assertTrue(f.message().contains("M02"), f.text());
  }

  @Test
  void truncatedFile_cannotBeRead() {
    for (String suffix : List.of(copper(2), "-plated.xnc", "-profile.gbr")) {
      Edit e = wheel();
      String t = e.text(suffix);
      ProofReport r = e.put(suffix, t.substring(0, t.length() * 2 / 3)).prove();
      assertEquals(wheel.slug() + suffix, only(r, ProofNames.UNREADABLE).file());
    }
  }

  @Test
  void missingFile_isNamed() {
    Edit e = wheel();
    e.files.remove(wheel.slug() + copper(2));
    ProofFinding f = only(e.prove(), ProofNames.MISSING_FILE);
    assertTrue(f.message().contains("L2"), f.text());
  }

  @Test
  void strayCopper_isFound() {
    Point from = Point.polar(10, 1);
    Edit e = wheel().draw(4, true, 0.3, from, Point.polar(10.5, 1));
    e.mustFind(ProofNames.STRAY_COPPER, 4, from, 0.8);
  }

  @Test
  void missingPad_isMissingCopper() {
    Joint j = joint(Joint.Kind.EYE, 3);
    Edit e = wheel().replace(copper(4), xy(j.at()) + "D03*\n", "");
    e.mustFind(ProofNames.MISSING_COPPER, 4, j.at(), j.padMm() / 2 + 0.001);
  }

  @Test
  void exchangedTerminalMarks_areFound() {
    Edit e = wheel();
    String t = e.text(copper(1)).replace("X1,U1", "X1,?").replace("X1,V1", "X1,U1");
    e.put(copper(1), t.replace("X1,?", "X1,V1"));
    ProofReport r = e.prove();
    assertEquals(2, r.findings().stream().filter(f -> f.name().equals("terminal")).count());
    assertFalse(r.passed());
  }

  @Test
  void partOfADesignThatIsShortedItself_isFoundToo() {
    // the design's own track laid over another coil's: no file differs from it
    Conductor c = spiral(wheel, 1, 1);
    Conductor d = spiral(wheel, 2, 1);
    Line bridge = new Line(c.path().segments().get(2).end(), d.path().segments().get(2).end());
    ProofExpectation e = ProofExpectation.of(wheel);
    List<ProofExpectation.Track> tracks = new java.util.ArrayList<>(e.tracks());
    ProofExpectation.Track own = tracks.get(c.id());
    List<Segment> longer = new java.util.ArrayList<>(c.path().segments());
    longer.add(new Line(c.path().end(), bridge.start()));
    longer.add(bridge);
    longer.add(bridge.reversed());
    longer.add(new Line(bridge.start(), c.path().end()));
    tracks.set(
        c.id(),
        new ProofExpectation.Track(
            1,
            new etchloom.geometry.Path(longer),
            c.widthMm(),
            own.from(),
            own.to(),
            own.net(),
            own.what()));
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
    Edit edit = wheel();
    for (int i = longer.size() - 4; i < longer.size(); i++) {
      edit.replace(
          copper(1),
          "M02*",
          "%ADD9"
              + i % 10
              + "C,"
              + c.widthMm()
              + "*%\n%TO.N,WINDING*%\nD9"
              + i % 10
              + "*\n"
              + xy(longer.get(i).start())
              + "D02*\nG01*\n"
              + xy(longer.get(i).end())
              + "D01*\nM02*");
    }
    ProofReport r = Prover.prove(edit.files, shorted);
    assertTrue(r.shorts() > 0, () -> r.findings().toString());
    assertFalse(
        r.findings().stream().anyMatch(f -> f.name().equals(ProofNames.EXTRA_COPPER)),
        () -> r.findings().toString());
  }
}
