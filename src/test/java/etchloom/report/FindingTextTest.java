package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import etchloom.geometry.Point;
import etchloom.rules.Finding;
import java.util.List;
import org.junit.jupiter.api.Test;

class FindingTextTest {
  @Test
  void line_hasRuleLayerPlaceValuesAndThings() {
    assertEquals(
        "error[space]: L1 at (18.202, 3.308) mm, radius 18.500 mm, 10.30 deg: 0.1120 mm, must be at"
            + " least 0.1270 mm: phase U, coil 4, turn 7 and phase U, coil 4, turn 8",
        FindingText.line(Samples.close()));
  }

  @Test
  void line_upperBoundAndNoLayer() {
    assertEquals(
        "error[aspect]: at (-3.000, 0.000) mm, radius 3.000 mm, 180.00 deg: 10, must be at most 8:"
            + " coil 1, eye via 1",
        FindingText.line(Samples.deep()));
  }

  @Test
  void line_brokenByLessThanItShows_getsMoreDigits() {
    Finding f = new Finding("ring", "", new Point(1, 0), 0.129996, 0.13, "mm", "via");
    String line = FindingText.line(f);
    assertEquals("0.129996 mm, must be at least 0.130000 mm: via", line.split(": ", 3)[2]);
  }

  @Test
  void line_cannotSteerATerminal() {
    Finding f = new Finding("ring", "", new Point(1, 0), 0.1, 0.13, "mm", "a\u001b[31m\nb\u202e");
    String line = FindingText.line(f);
    assertFalse(line.codePoints().anyMatch(c -> c < ' ' || c == 0x202e), line);
  }

  @Test
  void notesFollowTheFindings() {
    List<String> lines = FindingText.lines(Samples.broken());
    assertEquals(3, lines.size());
    assertEquals("note: space: 51 places", lines.get(2));
  }
}
