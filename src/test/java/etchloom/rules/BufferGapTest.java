package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.board.Assembler;
import etchloom.geometry.Arc;
import etchloom.geometry.Segment;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.testing.Specs;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.buffer.BufferParameters;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/**
 * The least gap of whole boards by another road: the copper of a layer is grown by JTS's buffers
 * until it first touches itself, which shows as islands that merge or as a hole that closes. No
 * tree, no exact distances, no walk along the copper.
 */
class BufferGapTest {
  /** Arcs leave their chords by no more than this. */
  private static final double CHORD_MM = 0.0005;

  /** Far above what chords and the buffers' corners (0.2 · (1 - cos(90°/32)) = 0.0003) can do. */
  private static final double EPSILON_MM = 0.004;

  private static final GeometryFactory JTS = new GeometryFactory();

  static Stream<Specs.Shape> boards() {
    Specs.Shape wheel = Specs.wheel(4);
    return Stream.of(
        few(wheel, 3),
        few(wheel.connected(Spec.Connection.DELTA), 2),
        few(Specs.wheel(2).connected(Spec.Connection.OPEN).turned(0.3), 5));
  }

  private static Specs.Shape few(Specs.Shape s, int turns) {
    return new Specs.Shape(
        s.coils(),
        s.poles(),
        s.layers(),
        s.connection(),
        s.innerMm(),
        s.outerMm(),
        s.trackMm(),
        s.spaceMm(),
        s.padMm(),
        s.holeMm(),
        s.boardMm(),
        s.terminalsRad(),
        s.starPointOut(),
        OptionalInt.of(turns));
  }

  @ParameterizedTest
  @MethodSource("boards")
  void copperGrownByHalfTheGap_firstTouchesItself(Specs.Shape shape) {
    Spec spec = Specs.spec(shape);
    Artwork art =
        Assembler.assemble(spec, Specs.fab(), Positions.unknown("test"))
            .value()
            .orElseThrow()
            .artwork();
    RuleReport r = RuleCheck.check(art, spec, Specs.fab(), RuleContext.NONE);
    Finding least = Boards.minimum(r, "space").orElseThrow();
    double half = least.measured() / 2;
    for (int layer = 1; layer <= art.layers(); layer++) {
      List<Integer> plain = islandsAndHoles(art, layer, 0);
      assertEquals(plain, islandsAndHoles(art, layer, half - EPSILON_MM), "L" + layer);
      if (least.layer().equals("L" + layer)) {
        assertNotEquals(plain, islandsAndHoles(art, layer, half + EPSILON_MM), "L" + layer);
      }
    }
  }

  private static List<Integer> islandsAndHoles(Artwork art, int layer, double growMm) {
    List<Geometry> parts = new ArrayList<>();
    for (Conductor c : art.conductorsOn(layer)) {
      parts.add(round(JTS.createLineString(chords(c)), c.widthMm() / 2 + growMm));
    }
    for (Joint j : art.padsOn(layer)) {
      Coordinate at = new Coordinate(j.at().x(), j.at().y());
      parts.add(round(JTS.createPoint(at), j.padMm() / 2 + growMm));
    }
    Geometry copper = UnaryUnionOp.union(parts);
    int holes = 0;
    for (int i = 0; i < copper.getNumGeometries(); i++) {
      holes += ((Polygon) copper.getGeometryN(i)).getNumInteriorRing();
    }
    return List.of(copper.getNumGeometries(), holes);
  }

  private static Geometry round(Geometry g, double byMm) {
    return g.buffer(byMm, 32, BufferParameters.CAP_ROUND);
  }

  private static Coordinate[] chords(Conductor c) {
    List<Coordinate> out = new ArrayList<>();
    out.add(new Coordinate(c.path().start().x(), c.path().start().y()));
    for (Segment s : c.path().segments()) {
      int n = 1;
      if (s instanceof Arc a) {
        double step = 2 * Math.acos(1 - Math.min(1, CHORD_MM / a.radiusMm()));
        n = (int) Math.ceil(Math.abs(a.sweepRad()) / step);
      }
      for (int i = 1; i <= n; i++) {
        var p = s.at(i / (double) n);
        out.add(new Coordinate(p.x(), p.y()));
      }
    }
    return out.toArray(new Coordinate[0]);
  }
}
