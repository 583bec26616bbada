package etchloom.board;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.testing.SampledGap;
import etchloom.testing.Specs;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class AssemblerTest {
  static Stream<Specs.Shape> shapes() {
    return Stream.of(
        Specs.wheel(2),
        Specs.wheel(4),
        Specs.wheel(4).connected(Spec.Connection.DELTA),
        Specs.wheel(6).connected(Spec.Connection.OPEN).turned(0.3),
        shape(12, 10, 4, Spec.Connection.STAR, 10, 28, 0.15, 0.15, 0.5, 0.25, 80),
        shape(12, 14, 6, Spec.Connection.DELTA, 14, 32, 0.15, 0.15, 0.45, 0.2, 86),
        shape(3, 4, 2, Spec.Connection.OPEN, 5, 20, 0.3, 0.2, 0.7, 0.3, 64),
        shape(3, 2, 8, Spec.Connection.STAR, 3, 25, 0.2, 0.2, 0.6, 0.3, 72),
        shape(18, 24, 2, Spec.Connection.OPEN, 20, 40, 0.25, 0.25, 0.6, 0.3, 110),
        shape(6, 8, 10, Spec.Connection.STAR, 10, 40, 0.2, 0.2, 0.5, 0.25, 106));
  }

  private static Specs.Shape shape(
      int coils,
      int poles,
      int layers,
      Spec.Connection connection,
      double inner,
      double outer,
      double track,
      double space,
      double pad,
      double hole,
      double board) {
    return new Specs.Shape(
        coils,
        poles,
        layers,
        connection,
        inner,
        outer,
        track,
        space,
        pad,
        hole,
        board,
        Math.PI / 2,
        false,
        OptionalInt.empty());
  }

  @ParameterizedTest
  @MethodSource("shapes")
  void everyGapKeepsTheSpace(Specs.Shape shape) {
    var staged = Assembler.assemble(Specs.spec(shape), Specs.fab(), Positions.unknown("test"));
    assertTrue(staged.value().isPresent(), () -> staged.diagnostics().toString());
    Artwork art = staged.value().orElseThrow().artwork();
    for (int layer = 1; layer <= art.layers(); layer++) {
      SampledGap.Gap gap = SampledGap.least(art, layer, shape.spaceMm());
      int l = layer;
      assertTrue(
          gap.mm() >= shape.spaceMm() - 1e-6,
          () -> "L" + l + ": " + gap + ", " + art.turnsPerLayer() + " turns");
      assertEquals(shape.coils() * 1.0, art.coils().size());
    }
  }
}
