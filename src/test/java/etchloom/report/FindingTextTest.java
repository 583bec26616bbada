package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.geometry.Point;
import etchloom.rules.Finding;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

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
  void brief_tellsTheFirstPlacesOfEachRuleAndItsKeys() {
    List<Finding> all = new ArrayList<>(Collections.nCopies(7, Samples.close()));
    all.add(Samples.deep());
    List<String> lines = FindingBrief.lines(all);
    assertEquals(5, lines.stream().filter(l -> l.startsWith("error[space]: L1 at")).count());
    assertEquals("  2 more like these are listed by `check --json`", lines.get(5));
    assertEquals("  hint: in the spec see coil.space", lines.get(6));
    assertEquals(FindingText.line(Samples.deep()), lines.get(7));
    assertEquals("  hint: in the spec see via.hole, board.thickness", lines.get(8));
    assertEquals(9, lines.size());
  }

  /** The words of the spec page, section 4; each has its keys. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "track",
        "space",
        "ring",
        "hole",
        "aspect",
        "hole-gap",
        "hole-copper",
        "edge",
        "mask-web",
        "legend",
        "copper-weight",
        "layers",
        "size",
        "voltage",
        "keep-out",
        "laminate"
      })
  void brief_knowsEveryRule(String rule) {
    List<String> lines =
        FindingBrief.lines(List.of(new Finding(rule, "", new Point(1, 0), 1, 2, "mm", "x")));
    assertTrue(lines.get(1).matches("  hint: in the spec see [a-z][a-z., -]+"), lines.get(1));
  }
}
