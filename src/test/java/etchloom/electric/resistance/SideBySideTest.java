package etchloom.electric.resistance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import etchloom.board.Assembler;
import etchloom.electric.machine.heat.LayerSharing;
import etchloom.spec.FabReader;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import java.nio.charset.StandardCharsets;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.junit.jupiter.api.Test;

/** Layers side by side and rows of vias against networks set up by hand. */
class SideBySideTest {
  /** IEC 60028, Ω·mm: 1/58 Ω·mm²/m. */
  private static final double RHO = 1 / 58e3;

  private static Artwork drawn(String template, String... changes) {
    String text = new String(Templates.bytes(template), StandardCharsets.UTF_8);
    for (int i = 0; i < changes.length; i += 2) {
      assertTrue(text.contains(changes[i]), changes[i]);
      text = text.replace(changes[i], changes[i + 1]);
    }
    var read = SpecReader.read("test", text.getBytes(StandardCharsets.UTF_8));
    var file = read.value().orElseThrow(() -> new AssertionError(read.diagnostics()));
    var staged = Assembler.assemble(file.spec(), FabReader.builtIn("standard"), file.positions());
    return staged.value().orElseThrow(() -> new AssertionError(staged.diagnostics())).artwork();
  }

  private static double trackOhm(Artwork art, int id) {
    Conductor c = art.conductors().get(id);
    Stackup.Copper copper = art.stackup().copper().get(c.layer() - 1);
    double area = (c.widthMm() - copper.undercutMm()) * copper.thicknessMm();
    return RHO * c.path().lengthMm() / area;
  }

  /** A ring of plating outside the finished hole. */
  private static double barrelOhm(Artwork art, double hole, int upper, int lower) {
    double t = art.stackup().platingMm();
    double area = Math.PI / 4 * ((hole + 2 * t) * (hole + 2 * t) - hole * hole);
    return RHO * (art.stackup().heightMm(upper) - art.stackup().heightMm(lower)) / area;
  }

  /** Conductances between numbered nodes; one ampere in at node 1, out at node 0. */
  private static double[] volts(int nodes, double[][] resistors) {
    double[][] g = new double[nodes - 1][nodes - 1];
    for (double[] r : resistors) {
      int a = (int) r[0] - 1;
      int b = (int) r[1] - 1;
      for (int[] at : new int[][] {{a, b}, {b, a}}) {
        if (at[0] >= 0) {
          g[at[0]][at[0]] += 1 / r[2];
          if (at[1] >= 0) {
            g[at[0]][at[1]] -= 1 / r[2];
          }
        }
      }
    }
    double[] in = new double[nodes - 1];
    in[0] = 1;
    return new LUDecomposition(new Array2DRowRealMatrix(g))
        .getSolver()
        .solve(new ArrayRealVector(in))
        .toArray();
  }

  @Test
  void fourLayersInParallel_areTheHandMadeNetwork() {
    Artwork art =
        drawn(
            "tide-meter",
            "layers: 6",
            "layers: 4",
            "stackup: [0.2 mm, 0.4 mm, 0.2 mm, 0.4 mm, 0.2 mm]",
            "stackup: [0.3 mm, 0.8 mm, 0.3 mm]",
            "count: 2",
            "count: 1");
    Coil c = art.coils().get(0);
    double[] r = c.conductors().stream().mapToDouble(id -> trackOhm(art, id)).toArray();
    double hole = 0.35;
    // Nodes: finish L2 is 0, start L1 is 1; start L3 2; eye L1..L4 3..6; finish L4 7.
    double[][] net = {
      {1, 2, barrelOhm(art, hole, 1, 3)},
      {1, 3, r[0]},
      {2, 5, r[2]},
      {3, 4, barrelOhm(art, hole, 1, 2)},
      {4, 5, barrelOhm(art, hole, 2, 3)},
      {5, 6, barrelOhm(art, hole, 3, 4)},
      {4, 0, r[1]},
      {6, 7, r[3]},
      {7, 0, barrelOhm(art, hole, 2, 4)},
    };
    double[] v = volts(8, net);
    Currents now = Chains.coil(art, c, 20);
    assertEquals(v[0], now.ohm(), 1e-9 * v[0]);
    assertEquals((v[0] - v[2]) / r[0], now.ofConductor(c.conductors().get(0)), 1e-9);
    assertEquals((v[1] - v[4]) / r[2], now.ofConductor(c.conductors().get(2)), 1e-9);
    // The vias hardly matter: the group's resistances alone, to a hundredth.
    double plain = 1 / (1 / r[0] + 1 / r[2]) + 1 / (1 / r[1] + 1 / r[3]);
    assertEquals(plain, now.ohm(), 0.01 * plain);
    LayerSharing s = LayerSharing.of(art).orElseThrow();
    double outer = r[2] / (r[0] + r[2]);
    assertEquals(outer, s.groups().get(0).get(0).share(), 0.01);
    assertTrue(outer > 0.6, "2 oz beside 1 oz: " + outer);
  }

  @Test
  void aRowOfVias_sharesEvenly() {
    Artwork art = drawn("sample-shaker", "pad: 0.6 mm ", "pad: 0.6 mm\n  count: 2 ");
    Coil c = art.coils().get(0);
    Currents now = Chains.coil(art, c, 20);
    int eyes = 0;
    for (int e = 0; e < now.edges().size(); e++) {
      Edge edge = now.edges().get(e);
      Joint j = art.joints().get(edge.from().joint());
      if (edge.barrel() && j.kind() == Joint.Kind.EYE) {
        assertEquals(0.5, Math.abs(now.ofEdge(e)), 1e-9);
        eyes++;
      }
    }
    assertEquals(2, eyes);
    // Each of the two ways: one barrel, and the row's track on one of its two layers.
    double bar = trackOhm(art, c.copper().get(2));
    double row = (barrelOhm(art, 0.3, 1, 2) + bar) / 2;
    double spirals = trackOhm(art, c.conductors().get(0)) + trackOhm(art, c.conductors().get(1));
    assertEquals(spirals + 2 * row, now.ohm(), 1e-9 * now.ohm());
  }

  @Test
  void oneByOne_nothingIsShared() {
    assertTrue(LayerSharing.of(drawn("sample-shaker")).isEmpty());
  }
}
