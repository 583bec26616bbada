package etchloom.electric.resistance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Stackup;
import etchloom.spec.FabRules;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Layer, coil, phase and terminal values of whole boards. */
class ResistanceTest {
  private static final FabRules.Tolerance NONE = new FabRules.Tolerance(0, 0, 0);

  /**
   * Common practice, no source: a spiral layer of 704 mm of 0.15 mm track in 35 µm copper has about
   * 2.28 Ω (the copper standard gives 2.312, rounded resistivities less); sixteen such layers in
   * series, two phases of a star with four coils of two layers each, measure close to 16 times that
   * between two terminals.
   */
  @Test
  void layerAgainstTerminals_commonPractice() {
    ResistanceFigures f = Resistance.of(star(false), NONE);
    double layer = f.coilLayers().get(0).ohm();
    assertEquals(2.28, layer, 0.02 * 2.28);
    assertEquals(704, f.coilLayers().get(0).lengthMm(), 1e-9);
    assertEquals(2 * layer, f.coilOhm(), 0.002);
    assertEquals(8 * layer, f.phases().get(0).ohm(), 0.02);
    assertEquals(List.of("U1-V1", "U1-W1", "V1-W1"), keys(f));
    for (ResistanceFigures.TerminalOhm t : f.terminals()) {
      assertEquals(16 * layer, t.ohm(), 0.002 * 16 * layer);
      assertTrue(t.ohm() > 16 * layer, "the barrels add to it");
    }
    assertEquals(0, f.imbalancePercent(), 1e-9);
    assertEquals(3 * 8 * 704 / 2, f.copperLayers().get(1).trackLengthMm(), 1e-6);
  }

  private static List<String> keys(ResistanceFigures f) {
    return f.terminals().stream().map(ResistanceFigures.TerminalOhm::key).toList();
  }

  private static Artwork star(boolean neutral) {
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int[] from = {b.terminal("U1"), b.terminal("V1"), b.terminal("W1")};
    int centre = neutral ? b.terminal("N") : b.node();
    b.threePhases(from, new int[] {centre, centre, centre}, 4, 704, 0.15);
    return b.build();
  }

  /** Each barrel counts once, with the length between its layers' middles. */
  @Test
  void phaseIsTheSumOfItsParts() {
    ResistanceFigures f = Resistance.of(star(false), NONE);
    double barrel = Section.ohm(1.6 - 0.035, Math.PI * 0.02 * 0.32, 20);
    double layer = 704 / 58e3 / (0.15 * 0.035);
    assertEquals(2 * layer + barrel, f.coilOhm(), 1e-12);
    assertEquals(12, f.coils().size());
    f.coils().forEach(c -> assertEquals(2 * layer + barrel, c.ohm(), 1e-12, "coil " + c.number()));
    f.coils().forEach(c -> assertEquals(2 * 704, c.lengthMm(), 1e-9, "coil " + c.number()));
    assertEquals(8 * layer + 7 * barrel, f.phases().get(2).ohm(), 1e-11);
  }

  @Test
  void starPointBroughtOut_hasItsOwnPairs() {
    ResistanceFigures f = Resistance.of(star(true), NONE);
    assertEquals(List.of("U1-V1", "U1-W1", "U1-N", "V1-W1", "V1-N", "W1-N"), keys(f));
    double phase = f.phases().get(0).ohm();
    assertEquals(phase, f.terminals().get(2).ohm(), 0.001 * phase);
    assertEquals(0, f.imbalancePercent(), 1e-9);
    assertEquals(2 * phase, f.meanTerminalOhm(), 0.001 * phase);
  }

  /** Three equal phases in a triangle: two thirds of one between two corners (textbook). */
  @Test
  void delta() {
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int[] corner = {b.terminal("U1"), b.terminal("V1"), b.terminal("W1")};
    b.threePhases(corner, new int[] {corner[1], corner[2], corner[0]}, 2, 500, 0.2);
    Artwork art = b.build();
    ResistanceFigures f = Resistance.of(art, NONE);
    double phase = f.phases().get(0).ohm();
    assertEquals(2.0 / 3 * phase, f.meanTerminalOhm(), 0.001 * phase);
    Currents share =
        Network.of(art, 20).currents(new Node(corner[0], 1), new Node(corner[1], 1)).orElseThrow();
    assertEquals(2.0 / 3, share.ofConductor(0), 0.001);
  }

  @Test
  void open_hasOnePairAPhase() {
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int[] from = {b.terminal("U1"), b.terminal("V1"), b.terminal("W1")};
    int[] to = {b.terminal("U2"), b.terminal("V2"), b.terminal("W2")};
    b.threePhases(from, to, 2, 500, 0.2);
    ResistanceFigures f = Resistance.of(b.build(), NONE);
    assertEquals(List.of("U1-U2", "V1-V2", "W1-W2"), keys(f));
    assertEquals(f.phases().get(1).ohm(), f.terminals().get(1).ohm(), 2e-3);
  }

  /** Two layers in parallel halve the resistance; each takes half the current. */
  @Test
  void parallelLayers() {
    TestBoards b = new TestBoards(TestBoards.twoLayers(0.035, 0));
    int u1 = b.terminal("U1");
    int u2 = b.terminal("U2");
    int upper = b.track(u1, u2, 1, 700, 0.15);
    int lower = b.track(u1, u2, 2, 700, 0.15);
    b.coil(u1, u2, List.of(upper, lower));
    b.phase("U", u1, u2, List.of(upper, lower));
    Artwork art = b.build();
    Currents share = Chains.phase(art, art.phases().get(0), 20);
    assertEquals(700 / 58e3 / (0.15 * 0.035) / 2, share.ohm(), 2e-3);
    assertEquals(0.5, share.ofConductor(lower), 1e-3);
    assertEquals(1, share.ofConductor(upper) + share.ofConductor(lower), 1e-9);
  }

  /** A lone track: R goes as 1/(w·t), so the limits follow by hand. */
  @Test
  void limitsOfOneTrack() {
    Stackup.Copper c = new Stackup.Copper(0.035, 1, 0.010);
    TestBoards b = new TestBoards(new Stackup(List.of(c, c), List.of(1.53), 0.02));
    int u1 = b.terminal("U1");
    int u2 = b.terminal("U2");
    int id = b.track(u1, u2, 1, 1000, 0.15);
    b.coil(u1, u2, List.of(id));
    b.phase("U", u1, u2, List.of(id));
    ResistanceFigures f = Resistance.of(b.build(), new FabRules.Tolerance(0.2, 0.1, 0.2));
    double nominal = 1000 / 58e3 / (0.140 * 0.035);
    assertEquals(nominal, f.terminals().get(0).ohm(), 1e-12);
    double least = nominal * 0.140 / (0.170 * 1.1);
    double most = nominal * 0.140 / (0.110 * 0.9);
    assertEquals(least, f.worst().orElseThrow().minTerminalOhm(), 1e-9);
    assertEquals(most, f.worst().orElseThrow().maxTerminalOhm(), 1e-9);
    double up = Math.hypot(0.140 / 0.110 - 1, 1 / 0.9 - 1);
    double down = Math.hypot(0.140 / 0.170 - 1, 1 / 1.1 - 1);
    assertEquals(nominal * (1 + up), f.rss().orElseThrow().maxTerminalOhm(), 1e-9);
    assertEquals(nominal * (1 - down), f.rss().orElseThrow().minTerminalOhm(), 1e-9);
    assertEquals(1.3144 * nominal, f.hotTerminals(100).get(0).ohm(), 1e-9);
  }

  @Test
  void trackThatMayVanish_hasNoLimits() {
    Stackup.Copper c = new Stackup.Copper(0.035, 1, 0.010);
    TestBoards b = new TestBoards(new Stackup(List.of(c, c), List.of(1.53), 0.02));
    int u1 = b.terminal("U1");
    int u2 = b.terminal("U2");
    int id = b.track(u1, u2, 1, 1000, 0.15);
    b.coil(u1, u2, List.of(id));
    b.phase("U", u1, u2, List.of(id));
    ResistanceFigures f = Resistance.of(b.build(), new FabRules.Tolerance(1, 0.1, 0.2));
    assertTrue(f.worst().isEmpty());
    assertTrue(f.rss().isEmpty());
  }

  /** All lengths twice as long in the same copper: twice the resistance but for the barrels. */
  @Test
  void twiceTheLength() {
    TestBoards once = new TestBoards(TestBoards.twoLayers(0.035, 0));
    TestBoards twice = new TestBoards(TestBoards.twoLayers(0.035, 0));
    double[] phase = new double[2];
    List<TestBoards> boards = List.of(once, twice);
    for (int i = 0; i < 2; i++) {
      TestBoards b = boards.get(i);
      int[] from = {b.terminal("U1"), b.terminal("V1"), b.terminal("W1")};
      int n = b.node();
      b.threePhases(from, new int[] {n, n, n}, 3, 400 * (i + 1), 0.2);
      phase[i] = Resistance.of(b.build(), NONE).meanPhaseOhm();
    }
    assertEquals(2, phase[1] / phase[0], 0.002);
  }
}
