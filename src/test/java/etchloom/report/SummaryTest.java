package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.spec.Spec;
import etchloom.testing.Specs;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SummaryTest {
  private static final Results SMALL = Samples.template(Samples.SMALL);

  static Stream<Results> boards() {
    String longTitle = "<b>漢字と\u001b[2J" + "very long title ".repeat(8) + "x".repeat(120);
    return Stream.of(
        SMALL,
        Samples.with(SMALL, Samples.broken()),
        SMALL.withProof(Samples.proof()),
        Samples.Electric.STAR,
        Samples.titled(SMALL, longTitle),
        Samples.bare(Specs.wheel(4).connected(Spec.Connection.DELTA)),
        Samples.bare(Specs.wheel(2).connected(Spec.Connection.OPEN)));
  }

  @ParameterizedTest
  @MethodSource("boards")
  void noLineIsWiderThan80Columns(Results r) {
    String where = "some/very/long/folder/" + "y".repeat(90) + "/board-A";
    Summary.text(r, Optional.of(where), false)
        .lines()
        .forEach(
            l -> {
              assertTrue(Text.columns(l) <= 80, l);
              assertFalse(l.codePoints().anyMatch(c -> c < ' ' || c == 0x7f), l);
            });
  }

  @ParameterizedTest
  @MethodSource("boards")
  void colourChangesNothingButColour(Results r) {
    String plain = Summary.text(r, Optional.empty(), false);
    String painted = Summary.text(r, Optional.empty(), true);
    assertFalse(plain.contains("\u001b"));
    assertTrue(painted.contains("\u001b["));
    assertEquals(plain, painted.replaceAll("\u001b\\[[0-9]*m", ""));
  }

  @Test
  void verdictIsInWords() {
    assertTrue(Summary.text(SMALL, Optional.empty(), false).contains("\nMAY BE MADE: "));
    String broken = Summary.text(Samples.with(SMALL, Samples.broken()), Optional.empty(), false);
    assertTrue(broken.contains("\nMAY NOT BE MADE: 2 places break the rules"), broken);
    assertTrue(broken.contains("BROKEN"), broken);
  }

  @Test
  void minimaStandBesideWhatIsRequired() {
    String s = Summary.text(SMALL, Optional.of("out/pump-A"), false);
    assertTrue(s.contains("0.1600 mm     >= 0.1500 mm"), s); // the template's track, economy's rule
    assertTrue(s.contains("<= 6"), s); // economy's aspect
    assertTrue(s.contains("limits "), s);
    assertTrue(s.contains("live supply"), s);
    assertTrue(s.contains("files         out/pump-A\n"), s);
  }

  @Test
  void columnsCountWideLettersTwice() {
    assertEquals(4, Text.columns("漢字"));
    assertEquals(3, Text.columns("ae\u0301o"));
    assertEquals("漢...", Text.cut("漢字漢字", 6));
  }
}
