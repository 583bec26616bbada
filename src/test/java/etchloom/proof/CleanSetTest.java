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
  private static final Map<String, Integer> PIECES =
      Map.of("wind-logger", 3, "sample-stirrer", 2, "rover-wheel", 2);

  private static final List<String> CLOSING = List.of("tide-meter", "test-bench");

  static List<String> templates() {
    return Templates.names();
  }

  @ParameterizedTest
  @MethodSource("templates")
  void templateIsProved(String name) {
    Artwork art = WrittenSets.template(name);
    ProofReport r = Prover.prove(WrittenSets.write(art), ProofExpectation.of(art));
    assertEquals(List.of(), r.findings().stream().map(ProofFinding::text).toList());
    // two paths close a circuit in each of the six phases; rows of vias and layers side by side
    // close as many as the design counts
    int counted = CLOSING.contains(name) ? art.expectedCircuits() : 0;
    assertEquals(name.equals("rover-wheel") ? 6 : counted, r.circuits());
    assertEquals(art.layers(), r.islands().size());
    for (int l = 1; l <= art.layers(); l++) {
      assertEquals(0, r.loops().get(l));
    }
    // curves flattened twice, 1 um of chord error: areas of 1200 to 3500 mm2 a layer
    assertTrue(r.gerberDxfAreaDifferenceMm2().orElseThrow() < 0.01 * art.layers(), r::toString);
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
