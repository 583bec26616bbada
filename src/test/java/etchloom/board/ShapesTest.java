package etchloom.board;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Phase;
import etchloom.geometry.Line;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.testing.SampledGap;
import etchloom.testing.Specs;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Round and racetrack coils, layers side by side and rows of vias, each where it is tight. */
class ShapesTest {
  private static final double SPACE_MM = 0.2;

  /** A board in words, for the test's name. */
  record Shape(
      Spec.CoilOutline outline,
      int coils,
      int layers,
      double innerMm,
      double outerMm,
      OptionalDouble widthMm,
      OptionalInt turns,
      OptionalDouble cornerMm,
      boolean parallel,
      int vias,
      boolean taper) {

    /** The same with so many turns whose sides widen. */
    Shape tapering(int count) {
      return new Shape(
          outline,
          coils,
          layers,
          innerMm,
          outerMm,
          widthMm,
          OptionalInt.of(count),
          cornerMm,
          parallel,
          vias,
          true);
    }

    Spec spec() {
      Spec s =
          Specs.spec(
              new Specs.Shape(
                  coils,
                  coils == 9 ? 12 : 8,
                  layers,
                  Spec.Connection.STAR,
                  innerMm,
                  outerMm,
                  0.2,
                  SPACE_MM,
                  0.6,
                  0.3,
                  2 * outerMm + 24,
                  Math.PI / 2,
                  false,
                  turns));
      Spec.Coil c = s.coil();
      return new Spec(
          s.title(),
          s.slug(),
          s.revision(),
          s.rotor(),
          s.winding(),
          new Spec.Coil(
              outline,
              innerMm,
              outerMm,
              widthMm,
              turns,
              c.trackMm(),
              c.spaceMm(),
              cornerMm,
              parallel,
              taper),
          s.rim(),
          new Spec.Via(0.3, 0.6, vias),
          s.board(),
          s.fab(),
          s.duty());
    }
  }

  private static Shape shape(
      Spec.CoilOutline outline,
      int coils,
      int layers,
      double inner,
      double outer,
      double width,
      double corner,
      boolean parallel,
      int vias) {
    return new Shape(
        outline,
        coils,
        layers,
        inner,
        outer,
        width > 0 ? OptionalDouble.of(width) : OptionalDouble.empty(),
        OptionalInt.empty(),
        corner > 0 ? OptionalDouble.of(corner) : OptionalDouble.empty(),
        parallel,
        vias,
        false);
  }

  static Stream<Shape> shapes() {
    Spec.CoilOutline wedge = Spec.CoilOutline.WEDGE;
    Spec.CoilOutline round = Spec.CoilOutline.ROUND;
    Spec.CoilOutline race = Spec.CoilOutline.RACETRACK;
    return Stream.of(
        shape(wedge, 9, 4, 12, 30, 0, 0, false, 2),
        shape(wedge, 9, 8, 12, 34, 0, 0, true, 3),
        shape(wedge, 6, 16, 16, 40, 0, 0, true, 1),
        shape(wedge, 9, 2, 6, 22, 0, 0, false, 1).tapering(6),
        shape(wedge, 9, 4, 12, 30, 0, 0, false, 2).tapering(7),
        shape(wedge, 9, 8, 12, 34, 0, 0, true, 3).tapering(5),
        shape(wedge, 6, 16, 16, 40, 0, 0, true, 1).tapering(9),
        shape(wedge, 6, 6, 16, 40, 0, 2.5, false, 1).tapering(3), // round corners
        shape(wedge, 9, 2, 12, 30, 0, 0, false, 1).tapering(1),
        shape(round, 9, 2, 15, 29, 0, 0, false, 1),
        shape(round, 9, 4, 17, 33, 0, 0, false, 2),
        shape(round, 6, 16, 20, 50, 0, 0, false, 1),
        shape(round, 6, 6, 10, 26, 0, 0, true, 4),
        shape(race, 9, 2, 15, 30, 9, 0, false, 1),
        shape(race, 9, 4, 18, 36, 11, 0, false, 2),
        shape(race, 9, 4, 26, 34, 16, 0, true, 1), // broader than it is long
        shape(race, 9, 4, 18, 36, 11, 0.2, false, 1), // sharp corners
        shape(race, 6, 8, 18, 40, 16, 3, true, 2));
  }

  @ParameterizedTest
  @MethodSource("shapes")
  void everyGapKeepsTheSpace_andTheTightestIsTheSpace(Shape shape) {
    Artwork art = drawn(shape);
    // The layers between differ from these only in which of their vias they use.
    for (int layer : List.of(1, art.layers())) {
      SampledGap.Gap gap = SampledGap.least(art, layer, SPACE_MM);
      int l = layer;
      assertTrue(gap.mm() >= SPACE_MM - 1e-6, () -> "L" + l + ": " + gap);
      assertEquals(SPACE_MM, gap.mm(), 1e-3, () -> "L" + l + ": " + gap);
    }
  }

  @ParameterizedTest
  @MethodSource("shapes")
  void allCopperLiesBetweenTheRadii_andTouchesTheOuterOne(Shape shape) {
    Artwork art = drawn(shape);
    double most = 0;
    double least = Double.POSITIVE_INFINITY;
    int n = art.coils().get(0).conductors().size();
    assertEquals(shape.layers(), n);
    for (int id : art.coils().get(0).conductors()) {
      Conductor c = art.conductors().get(id);
      var all = c.path().segments();
      // The way in from the rim is the first or the last two pieces.
      for (int k = 2; k < all.size() - 2; k++) {
        for (int i = 0; i <= 20; i++) {
          double r = all.get(k).at(i / 20.0).norm();
          most = Math.max(most, r + c.widthMm(k) / 2);
          least = Math.min(least, r - c.widthMm(k) / 2);
        }
      }
    }
    assertTrue(most <= shape.outerMm() + 1e-9, "reaches " + most);
    // A racetrack's corner reaches it only where a lead comes on to it.
    assertEquals(shape.outerMm(), most, shape.widthMm().isPresent() ? 0.2 : 1e-3);
    assertTrue(least >= shape.innerMm() - 1e-9, "reaches " + least);
    assertEquals(shape.innerMm(), least, 0.02);
  }

  /** With current from start to finish, every layer's turns go round the axis the same way. */
  @ParameterizedTest
  @MethodSource("shapes")
  void allLayersTurnTheSameWay(Shape shape) {
    Artwork art = drawn(shape);
    for (Phase.Step s : art.coils().get(0).way()) {
      Conductor c = art.conductors().get(s.conductor());
      if (art.coils().get(0).conductors().contains(c.id())) {
        double area = 0;
        for (var seg : c.path().segments()) {
          for (int i = 0; i < 16; i++) {
            area += seg.at(i / 16.0).cross(seg.at((i + 1) / 16.0)) / 2;
          }
        }
        area += c.path().end().cross(c.path().start()) / 2;
        assertTrue(area > 0 && s.forward(), "L" + c.layer());
      }
    }
  }

  @ParameterizedTest
  @MethodSource("shapes")
  void onlyTheSidesOfATaperingWedgeWiden(Shape shape) {
    for (Conductor c : drawn(shape).conductors()) {
      boolean spiral = c.what().kind() == Feature.Kind.SPIRAL;
      assertEquals(shape.taper() && spiral, c.tapered(), c.what().describe(-1));
      for (int k = 0; k < c.path().segments().size(); k++) {
        boolean straight = c.path().segments().get(k) instanceof Line;
        assertTrue(straight || c.widthMm(k) == c.widthMm());
      }
    }
  }

  private static Artwork drawn(Shape shape) {
    var staged = Assembler.assemble(shape.spec(), Specs.fab(), Positions.unknown("test"));
    assertTrue(staged.value().isPresent(), () -> staged.diagnostics().toString());
    return staged.value().orElseThrow().artwork();
  }
}
