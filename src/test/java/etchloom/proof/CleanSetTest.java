package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.spec.Templates;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What is written as designed passes without a word. */
class CleanSetTest {
  /**
   * Closed circuits by hand; a row of two vias between n layers closes n - 1.
   *
   * <p>rover-wheel: two paths in each of six phases. test-bench: the delta; in each of 6 coils two
   * eyes, a node and the finish between two layers; two drops at each of 3 links between coils and
   * three at each corner. tide-meter: in each of 12 coils 2 for each group of three layers, and
   * rows of 3, 6 and 4 layers; two drops at each of 9 links, three at the star point, two at each
   * of the two terminals that do not stand at their coil's own angle.
   */
  private static final Map<String, Integer> CIRCUITS =
      Map.of(
          "rover-wheel", 6,
          "test-bench", 1 + 6 * 4 + 3 * 2 + 3 * 3,
          "tide-meter", 12 * (2 + 2 + 2 + 5 + 3) + 9 * 2 + 3 + 2 * 2);

  private static final Map<String, Integer> PIECES =
      Map.of("wind-logger", 3, "sample-stirrer", 2, "rover-wheel", 2);

  static List<String> templates() {
    return Templates.names();
  }

  @ParameterizedTest
  @MethodSource("templates")
  void templateIsProved(String name) {
    Artwork art = WrittenSets.template(name);
    ProofReport r = Prover.prove(WrittenSets.write(art), ProofExpectation.of(art));
    assertEquals(List.of(), r.findings().stream().map(ProofFinding::text).toList());
    assertEquals(CIRCUITS.getOrDefault(name, 0), r.circuits());
    assertEquals(art.layers(), r.islands().size());
    for (int l = 1; l <= art.layers(); l++) {
      assertEquals(0, r.loops().get(l));
    }
    // curves flattened twice, 1 um of chord error: areas of 1200 to 3500 mm2 a layer; where tracks
    // widen each step is two more arcs (with a quarter of the chord error they too keep the 0.01)
    double least = name.equals("record-player") ? 0.05 : 0.01;
    assertTrue(r.gerberDxfAreaDifferenceMm2().orElseThrow() < least * art.layers(), r::toString);
    // an open winding is a piece for each phase, a star one: the spec page on nets
    assertEquals(PIECES.getOrDefault(name, 1), r.nets());
  }

  @Test
  void deltaIsOneCircuit() {
    Artwork art = WrittenSets.delta();
    ProofReport r = Prover.prove(WrittenSets.write(art), ProofExpectation.of(art));
    assertEquals(List.of(), r.findings().stream().map(ProofFinding::text).toList());
    assertEquals(1, r.circuits());
    assertEquals(1, r.nets());
  }
}
