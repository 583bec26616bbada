package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LinePlotTest {
  /** Corners of the drawing: the first point lies lower left, the last upper right. */
  @ParameterizedTest
  @ValueSource(doubles = {1e-9, 0.037, 1, 7.3, 12_108, 3e7})
  void lineEndsInsideTheAxes_onePointEach(double size) {
    String svg =
        LinePlot.draw(
            "a & b",
            "x",
            "y",
            List.of(new LinePlot.Series("U", List.of(0.0, size), List.of(0.0, size))));
    Matcher m =
        Pattern.compile("stroke-width=\"2\"[^>]* d=\"M([\\d.]+) ([\\d.]+)L([\\d.]+) ([\\d.]+)\"")
            .matcher(svg);
    assertTrue(m.find(), svg);
    assertEquals(84, Double.parseDouble(m.group(1)), 1e-9);
    assertEquals(252, Double.parseDouble(m.group(2)), 1e-9);
    assertTrue(Double.parseDouble(m.group(3)) <= 616, svg);
    assertTrue(Double.parseDouble(m.group(3)) > 350, svg);
    assertTrue(Double.parseDouble(m.group(4)) >= 34, svg);
    assertTrue(svg.contains("aria-label=\"a &amp; b\""));
  }

  @Test
  void turn_isDividedBySixties() {
    String svg =
        LinePlot.draw(
            "t",
            "x",
            "y",
            List.of(new LinePlot.Series("U", List.of(0.0, 180.0, 360.0), List.of(0.0, 1.0, 0.0))));
    for (String tick : List.of(">0<", ">60<", ">120<", ">300<", ">360<")) {
      assertTrue(svg.contains(tick), tick);
    }
  }

  @Test
  void flatLine_isDrawn() {
    String svg =
        LinePlot.draw(
            "t", "x", "y", List.of(new LinePlot.Series("", List.of(1.0, 1.0), List.of(0.0, 0.0))));
    assertTrue(svg.contains("<path"), svg);
  }
}
