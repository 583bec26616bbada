package etchloom.proof.copper;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The same drawing told in another way, and drawings that differ a little. */
class PieceMatchTest {
  private static DrawnPiece piece(Segment s, double width) {
    return new DrawnPiece(s, width, 0);
  }

  /** Cut up, turned round, put in another order: still the same. */
  @ParameterizedTest(name = "seed {0}")
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void sameDrawing_inAnotherOrder(long seed) {
    Random random = new Random(seed);
    List<DrawnPiece> first = new ArrayList<>();
    List<DrawnPiece> second = new ArrayList<>();
    for (int i = 0; i < 200; i++) {
      Point p = new Point(random.nextDouble() * 50, random.nextDouble() * 50);
      double width = 0.1 + 0.1 * random.nextInt(3);
      Segment s =
          i % 2 == 0
              ? new Line(p, new Point(random.nextDouble() * 50, random.nextDouble() * 50))
              : Arc.of(
                  p,
                  1 + 5 * random.nextDouble(),
                  6 * random.nextDouble(),
                  5.5 * random.nextDouble() + 0.1);
      first.add(piece(s, width));
      int parts = 1 + random.nextInt(3);
      for (int k = 0; k < parts; k++) {
        Segment part = parts == 1 ? s : s.part(k / (double) parts, (k + 1) / (double) parts);
        second.add(piece(random.nextBoolean() ? part.reversed() : part, width));
      }
    }
    Collections.shuffle(second, random);
    PieceMatch m = PieceMatch.match(first, second);
    assertTrue(m.same(), m::toString);
    assertTrue(PieceMatch.match(second, first).same());
  }

  @Test
  void otherWidth_otherBow_orAPartLeftOut_isToldOnBothSides() {
    Arc a = Arc.of(new Point(0, 0), 5, 0, 1);
    Line l = new Line(new Point(9, 9), new Point(12, 9));
    List<DrawnPiece> first = List.of(piece(a, 0.2), piece(l, 0.2));
    assertEquals(
        1, PieceMatch.match(first, List.of(piece(a, 0.201), piece(l, 0.2))).onlyFirst().size());
    Arc flatter = new Arc(a.start(), a.end(), mirrored(a), false);
    PieceMatch bow = PieceMatch.match(first, List.of(piece(flatter, 0.2), piece(l, 0.2)));
    assertEquals(1, bow.onlyFirst().size());
    assertEquals(1, bow.onlySecond().size());
    PieceMatch part = PieceMatch.match(first, List.of(piece(a.part(0, 0.6), 0.2), piece(l, 0.2)));
    assertEquals(1, part.onlyFirst().size());
    PieceMatch none = PieceMatch.match(first, List.of(piece(a, 0.2)));
    assertEquals(List.of(piece(l, 0.2)), none.onlyFirst());
    assertTrue(none.onlySecond().isEmpty());
  }

  /** The centre on the other side of the chord. */
  private static Point mirrored(Arc a) {
    Point mid = a.start().plus(a.end()).times(0.5);
    return mid.times(2).minus(a.centre());
  }

  @Test
  void discThatIsMissing_isTold_andOneDrawnTwiceIsNot() {
    DrawnPiece disc = DrawnPiece.disc(new Point(1, 1), 0.6, 3);
    assertEquals(List.of(disc), PieceMatch.match(List.of(disc), List.of()).onlyFirst());
    assertTrue(PieceMatch.match(List.of(disc), List.of(disc, disc)).same());
  }
}
