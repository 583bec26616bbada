package etchloom.board;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Stroke;
import etchloom.geometry.Box;
import etchloom.geometry.Segment;
import etchloom.spec.Positions;
import etchloom.testing.Specs;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The letters' height that a stroke states is the one it is drawn with. */
class LegendLettersTest {
  @Test
  void marksOfATopRow_areAsHighAsTheySay() {
    List<Stroke> legend =
        Assembler.assemble(Specs.spec(Specs.wheel(2)), Specs.fab(), Positions.unknown("test"))
            .value()
            .orElseThrow()
            .artwork()
            .legend();
    // Terminals at 90 degrees: their marks stand upright.
    for (String mark : List.of("mark U1", "mark V1", "mark W1")) {
      List<Stroke> strokes = legend.stream().filter(s -> s.what().equals(mark)).toList();
      Box box = null;
      for (Stroke s : strokes) {
        for (Segment g : s.path().segments()) {
          box = box == null ? Box.of(g) : box.join(Box.of(g));
        }
      }
      assertEquals(strokes.get(0).letterMm().orElseThrow(), box.heightMm(), 1e-9, mark);
    }
    assertTrue(
        legend.stream()
            .filter(s -> s.what().equals("datum"))
            .allMatch(s -> s.letterMm().isEmpty()));
  }
}
