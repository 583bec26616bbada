package etchloom.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class SpanTest {
  private static Span span(String text) {
    return SpanReader.read(text).value().orElseThrow();
  }

  @Test
  void wholeNumbersHaveEqualStretches() {
    Span s = span("coil.turns=4..7");
    assertEquals("4", s.value(0));
    assertEquals("4", s.value(0.2499));
    assertEquals("5", s.value(0.2501));
    assertEquals("7", s.value(1));
    assertEquals("7", s.value(2));
    for (int n = 4; n <= 7; n++) {
      assertEquals("" + n, s.value(s.share(n)));
    }
    assertEquals("6", s.value(s.share(5) + s.move(0.001)));
  }

  @Test
  void othersAreRoundedToADecimalStep() {
    Span s = span("coil.track=0.15..0.4mm");
    assertEquals("0.15 mm", s.value(-1));
    assertEquals("0.4 mm", s.value(1));
    assertEquals("0.2333 mm", s.value(1.0 / 3));
    assertEquals(0.2, s.share(0.2), 1e-12);
    assertEquals("45 deg", span("board.terminals.start=0deg..90deg").value(0.5));
    assertEquals("0.25", span("x=0.0..0.5").value(0.5));
  }
}
