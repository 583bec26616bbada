package etchloom.write.outline;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import etchloom.testing.TemplateBoards;
import etchloom.testing.ToyBoards;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Polygon;

class OutlineTest {
  private static final double WIDTH = 0.4;
  private static final int TANGLES = 40;

  @Test
  void anArcTrack_isExact() {
    // Length times width and two half discs; centre line 10 mm, 0.3 rad round the shaft.
    Path p = Path.of(Arc.of(Point.ORIGIN, 10, 1.0, 0.3));
    List<Path> out = Outline.of(board(List.of(p), List.of()), 1);
    assertEquals(1, out.size());
    double expected = 10 * 0.3 * WIDTH + Math.PI * WIDTH * WIDTH / 4;
    assertEquals(expected, Areas.signedMm2(out.get(0)), 1e-5);
  }

  @Test
  void aSquareTrack_hasAnOuterOutlineAndAHole() {
    Path p =
        new PathBuilder(new Point(5, 5))
            .lineTo(new Point(-5, 5))
            .lineTo(new Point(-5, -5))
            .lineTo(new Point(5, -5))
            .lineTo(new Point(5, 5))
            .build();
    List<Path> out = Outline.of(board(List.of(p), List.of()), 1);
    List<Double> areas = out.stream().map(Areas::signedMm2).sorted().toList();
    assertEquals(2, areas.size());
    assertEquals(-9.6 * 9.6, areas.get(0), 1e-6); // a hole runs clockwise
    double corners = (4 - Math.PI) * WIDTH * WIDTH / 4; // rounded outside
    assertEquals(10.4 * 10.4 - corners, areas.get(1), 1e-6);
  }

  @Test
  void aTrackWithAPadAtEachEnd_isOnePiece() {
    Path p = Path.of(new Line(new Point(0, 0), new Point(6, 0)));
    List<Path> out = Outline.of(board(List.of(p), List.of(new Point(0, 0), new Point(6, 0))), 1);
    assertEquals(1, out.size());
    // Two discs of radius 0.5, and the strip between them less what lies in them.
    double h = WIDTH / 2;
    double r = 0.5;
    double inDisc = h * Math.sqrt(r * r - h * h) + r * r * Math.asin(h / r);
    assertEquals(2 * Math.PI * r * r + 6 * WIDTH - 2 * inDisc, Areas.signedMm2(out.get(0)), 5e-6);
  }

  @ParameterizedTest
  @ValueSource(strings = {"toy-two", "toy-four", "dosing-pump"})
  void aBoard_hasTheIslandsAndTheAreaThatJtsFinds(String name) {
    Artwork art =
        switch (name) {
          case "toy-two" -> ToyBoards.twoLayers();
          case "toy-four" -> ToyBoards.fourLayers();
          default -> TemplateBoards.onGrid(name);
        };
    for (int layer = 1; layer <= art.layers(); layer++) {
      List<Path> out = Outline.united(art, layer).orElseThrow();
      Geometry jts = Areas.jts(art, layer);
      String where = name + " L" + layer;
      if (!name.startsWith("toy")) { // where a pad and a track touch in one point
        assertEquals(jts.getNumGeometries() + holes(jts), out.size(), where);
      }
      double area = out.stream().mapToDouble(Areas::signedMm2).sum();
      // JTS has chords for arcs, at most 0.1 um inside.
      assertEquals(1, area / jts.getArea(), 5e-5, where);
      out.forEach(p -> assertTrue(p.closed(), where));
    }
  }

  /**
   * Tracks and pads thrown down anyhow: they cross, overlap and turn back on themselves as on no
   * finished board. A few may be beyond the method, and then it must say so; none may come out
   * wrong.
   */
  @Test
  void tangledCopper_hasTheAreaThatJtsFinds() {
    int given = 0;
    for (int seed = 0; seed < TANGLES; seed++) {
      Artwork art = tangle(seed);
      Optional<List<Path>> out = Outline.united(art, 1);
      if (out.isEmpty()) {
        assertTrue(!Outline.of(art, 1).isEmpty());
        continue;
      }
      given++;
      Geometry jts = Areas.jts(art, 1);
      double area = out.get().stream().mapToDouble(Areas::signedMm2).sum();
      assertEquals(1, area / jts.getArea(), 1e-4, "seed " + seed);
      assertEquals(jts.getNumGeometries() + holes(jts), out.get().size(), "seed " + seed);
    }
    assertTrue(given >= TANGLES - 2, given + " of " + TANGLES);
  }

  /** What is left when copper is too tangled to be united: each piece with its own outline. */
  @Test
  void piecesApart_haveTheirOwnAreas() {
    Path p =
        new PathBuilder(new Point(0, 0))
            .lineTo(new Point(3, 0))
            .arcTo(new Point(5, 2), new Point(3, 2), true)
            .build();
    List<Path> out = Apart.of(board(List.of(p), List.of(new Point(0, 0))), 1);
    double ends = Math.PI * WIDTH * WIDTH / 4;
    assertEquals(3, out.size());
    assertEquals(3 * WIDTH + ends, Areas.signedMm2(out.get(0)), 1e-6);
    assertEquals(Math.PI * WIDTH + ends, Areas.signedMm2(out.get(1)), 1e-5);
    assertEquals(Math.PI * 0.25, Areas.signedMm2(out.get(2)), 1e-6);
  }

  private static int holes(Geometry g) {
    int n = 0;
    for (int i = 0; i < g.getNumGeometries(); i++) {
      n += ((Polygon) g.getGeometryN(i)).getNumInteriorRing();
    }
    return n;
  }

  private static Artwork tangle(int seed) {
    Random r = new Random(seed);
    List<Path> paths = new ArrayList<>();
    while (paths.size() < 5) {
      PathBuilder b = new PathBuilder(point(r));
      for (int i = 0; i < 3; i++) {
        Point to = point(r);
        if (to.distanceTo(b.at()) < 1) {
          continue;
        }
        if (r.nextBoolean()) {
          b.lineTo(to);
        } else {
          Point half = to.minus(b.at()).times(0.5);
          Point across = new Point(-half.y(), half.x()).times(2 * r.nextDouble() - 1);
          b.arcTo(to, b.at().plus(half).plus(across), r.nextBoolean());
        }
      }
      if (b.size() > 0) {
        paths.add(b.build());
      }
    }
    return board(paths, List.of(point(r), point(r), point(r)));
  }

  private static Point point(Random r) {
    return new Point(6 * r.nextDouble() - 3, 6 * r.nextDouble() - 3);
  }

  private static Artwork board(List<Path> tracks, List<Point> pads) {
    List<Conductor> conductors = new ArrayList<>();
    Feature what = new Feature(Feature.Kind.LINK, "", 0, List.of());
    for (Path p : tracks) {
      conductors.add(new Conductor(conductors.size(), 1, WIDTH, p, 0, 0, "N", what));
    }
    List<Joint> joints = new ArrayList<>();
    for (Point p : pads) {
      joints.add(
          new Joint(
              joints.size(), Joint.Kind.NODE, p, 1.0, Optional.of(0.5), 1, 2, "N", "", "pad"));
    }
    Stackup.Copper copper = new Stackup.Copper(0.035, 1, 0);
    return new Artwork(
            "Outline",
            "outline",
            "A",
            false,
            new Stackup(List.of(copper, copper), List.of(1.0), 0.02),
            List.of(Path.circle(Point.ORIGIN, 20)),
            joints,
            conductors,
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            1,
            0)
        .onGrid();
  }
}
