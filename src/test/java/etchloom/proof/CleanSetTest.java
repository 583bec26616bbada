package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Feature;
import etchloom.proof.copper.CopperBuilder;
import etchloom.proof.image.DxfFile;
import etchloom.proof.image.LayerImage;
import etchloom.spec.Templates;
import etchloom.write.outline.Areas;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

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
    double doubled = doubledArcsMm(art) * CopperBuilder.CHORD_ERROR_MM / 4;
    assertTrue(r.gerberDxfAreaDifferenceMm2().orElseThrow() < 0.01 + doubled, r::toString);
    // an open winding is a piece for each phase, a star one: the spec page on nets
    assertEquals(PIECES.getOrDefault(name, 1), r.nets());
  }

  /**
   * Where a bar joins vias its round ends lie on the pads' own rims: two polygons of one circle
   * whose corners stand at different angles, and the copper is what either covers. Each leaves the
   * circle by a parabola a chord, from 2/3 of the chord error outside at the corners to 1/3 inside,
   * 0 in the mean; of two the outer one leaves it by at most 1/4 in the mean, when the corners of
   * the one stand over the chords of the other: ∫ max(x², (1-x)²) dx - 1/3 over [0, 1].
   *
   * @return the length of such arcs, both halves of each bar's ends, mm
   */
  private static double doubledArcsMm(Artwork art) {
    return art.conductors().stream()
        .filter(c -> c.what().kind() == Feature.Kind.LINK)
        .mapToDouble(c -> Math.PI * c.widthMm())
        .sum();
  }

  /** That it is the flattening: a 16th of the chord error leaves a 16th of the difference. */
  @ParameterizedTest
  @ValueSource(strings = {"test-bench", "tide-meter"})
  void finerChords_bringTheAreasTogether(String name) {
    SetFiles set = new SetFiles(WrittenSets.write(WrittenSets.template(name)), new Findings());
    double coarse = apartMm2(set, CopperBuilder.CHORD_ERROR_MM);
    double fine = apartMm2(set, CopperBuilder.CHORD_ERROR_MM / 16);
    assertTrue(coarse > 0.02, "else the wider bound is not needed: " + coarse);
    assertTrue(fine < 0.005, () -> "with fine chords " + fine + " mm2");
  }

  /** Area of the Gerber copper less the closed form of the DXF outlines, all layers. */
  private static double apartMm2(SetFiles set, double chordErrorMm) {
    double sum = 0;
    for (Map.Entry<Integer, LayerImage> e : set.copper().entrySet()) {
      double outlines = 0;
      for (DxfFile.Entity x : set.outlines().orElseThrow().entities()) {
        if (x instanceof DxfFile.Polyline p && p.layer().equals("COPPER_L" + e.getKey())) {
          outlines += Areas.signedMm2(p.path());
        }
      }
      double copper = new CopperBuilder(chordErrorMm).build(e.getValue().objects()).areaMm2();
      sum += Math.abs(copper - outlines);
    }
    return sum;
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
