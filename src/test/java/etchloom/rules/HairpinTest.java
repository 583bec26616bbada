package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.board.Assembler;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Segment;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.testing.SampledGap;
import etchloom.testing.Specs;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.operation.buffer.BufferOp;
import org.locationtech.jts.operation.buffer.BufferParameters;

/**
 * The tightest bend of a wedge: at the inner end of the innermost turns the two sides meet in one
 * fillet of half a pitch.
 *
 * <p>The gap inside it ends round, with half the space as its radius, and widens from there: a disc
 * as wide as the space rolls through to the end. Straight across, from where the one side begins to
 * where the other does, is a chord of that disc: (track + space)·cos α - track, which is less than
 * the space as every chord near a round end is; such points are neighbours along the copper.
 */
class HairpinTest {
  private static final int QUADRANT = 32;
  private static final double CHORD_MM = 1e-4;

  /** A few times what chords and the buffers' corners (0.2 · (1 - cos(90°/64))) do to a radius. */
  private static final double SLACK_MM = 0.002;

  /** Coils, track, space: as many turns as fit in a wedge that begins near the shaft. */
  static Stream<Arguments> wedges() {
    return Stream.of(
        Arguments.of(9, 0.127, 0.127),
        Arguments.of(9, 0.2, 0.3),
        Arguments.of(12, 0.127, 0.25),
        Arguments.of(15, 0.2, 0.2),
        Arguments.of(24, 0.15, 0.2));
  }

  private static Spec spec(int coils, double track, double space) {
    double outer = Math.max(12, 6 + 0.9 * coils);
    return Specs.spec(
        new Specs.Shape(
            coils,
            coils / 3 * 4,
            2,
            Spec.Connection.STAR,
            4,
            outer,
            track,
            space,
            0.6,
            0.3,
            2 * outer + 30,
            Math.PI / 2,
            false,
            OptionalInt.empty()));
  }

  private static Artwork drawn(Spec spec) {
    return Assembler.assemble(spec, Specs.fab(), Positions.unknown("test"))
        .value()
        .orElseThrow()
        .artwork();
  }

  @ParameterizedTest
  @MethodSource("wedges")
  void leastGapIsTheSpace_byTheRuleAndBySampling(int coils, double track, double space) {
    Spec spec = spec(coils, track, space);
    Artwork art = drawn(spec);
    assertTrue(hairpins(art).count() > 0, "no single fillet: the test would show nothing");
    RuleReport r = RuleCheck.check(art, spec, Specs.fab(), RuleContext.NONE);
    assertEquals(space, Boards.minimum(r, "space").orElseThrow().measured(), Board.SLACK_MM);
    for (int layer = 1; layer <= 2; layer++) {
      SampledGap.Gap gap = SampledGap.least(art, layer, space);
      assertTrue(gap.mm() >= space - Board.SLACK_MM, gap::toString);
    }
  }

  @ParameterizedTest
  @MethodSource("wedges")
  void discAsWideAsTheSpace_rollsThroughEveryHairpin(int coils, double track, double space) {
    for (Geometry bend : hairpins(drawn(spec(coils, track, space))).toList()) {
      Geometry copper = grown(bend, track / 2);
      assertTrue(unreached(copper, space / 2 - SLACK_MM).isEmpty(), "the disc sticks");
      assertFalse(unreached(copper, space / 2 + 3 * SLACK_MM).isEmpty(), "a wider disc fits too");
    }
  }

  /** Where a disc rolling along the copper's outside does not come, slivers of chords aside. */
  private static Geometry unreached(Geometry copper, double radiusMm) {
    Geometry closed = grown(grown(copper, radiusMm), -radiusMm);
    return grown(closed.difference(copper), -SLACK_MM / 4);
  }

  private static Geometry grown(Geometry g, double byMm) {
    BufferParameters how = new BufferParameters(QUADRANT);
    how.setSimplifyFactor(1e-4); // the default leaves out corners of up to 1 % of the distance
    return BufferOp.bufferOp(g, byMm, how);
  }

  /** Centre lines of the first coil's single inner fillets with 1 mm of both sides. */
  private static Stream<Geometry> hairpins(Artwork art) {
    List<Geometry> out = new ArrayList<>();
    Conductor c = art.conductors().get(art.coils().get(0).conductors().get(0));
    List<Segment> path = c.path().segments();
    for (int i = 1; i + 1 < path.size(); i++) {
      if (path.get(i - 1) instanceof Line in
          && path.get(i) instanceof Arc bend
          && path.get(i + 1) instanceof Line on) {
        out.add(centreLine(in, bend, on));
      }
    }
    return out.stream();
  }

  private static Geometry centreLine(Line in, Arc bend, Line on) {
    List<Coordinate> at = new ArrayList<>();
    add(at, in.at(1 - Math.min(1, 1 / in.lengthMm())));
    int n = (int) Math.ceil(bend.lengthMm() / Math.sqrt(8 * CHORD_MM * bend.radiusMm()));
    for (int i = 0; i <= n; i++) {
      add(at, bend.at(i / (double) n));
    }
    add(at, on.at(Math.min(1, 1 / on.lengthMm())));
    return new GeometryFactory().createLineString(at.toArray(new Coordinate[0]));
  }

  private static void add(List<Coordinate> to, etchloom.geometry.Point p) {
    to.add(new Coordinate(p.x(), p.y()));
  }
}
