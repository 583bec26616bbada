package etchloom.electric.machine.spread;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Stackup;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.field.RotorField;
import etchloom.electric.machine.TestMachine;
import etchloom.electric.machine.emf.Coupling;
import etchloom.electric.machine.emf.HeightSensitivity;
import etchloom.electric.machine.emf.RadialReach;
import etchloom.spec.FabRules;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

class SpreadTest {
  private static TestMachine wheel;
  private static SpreadFigures figures;

  @BeforeAll
  static void draw() {
    wheel = TestMachine.of("filter-wheel", "turns: fill ", "turns: 5 ");
    figures = wheel.figures().spread();
  }

  /** The worst case against the resistor network solved anew with all copper thin. */
  @Test
  void worstCaseIsTheNetworksOwn() {
    double most = 0;
    for (var pair : wheel.resistance().terminals()) {
      most = Math.max(most, pair.ohm());
    }
    double want = 100 * (wheel.resistance().worst().orElseThrow().maxTerminalOhm() / most - 1);
    assertEquals(want, figures.terminalOhmPercent().worst().getAsDouble(), 0.01 * want);
    double rss = 100 * (wheel.resistance().rss().orElseThrow().maxTerminalOhm() / most - 1);
    assertEquals(rss, figures.terminalOhmPercent().rss().getAsDouble(), 0.01 * rss);
  }

  /**
   * Four layers in series with equal parts, each with its own draw: the sum's standard deviation is
   * half of one layer's, and 95 of 100 lie within 1.96 of it (normal law). One layer's comes from
   * track and copper, a third of the tolerance each, the track's over the etched width.
   */
  @Test
  void randomBoardsFollowTheNormalLaw() {
    double layer = Math.hypot(0.2 / 3 * 0.2 / (0.2 - 0.011), 0.1 / 3);
    double want = 100 * 1.96 * layer / 2;
    assertEquals(want, figures.terminalOhmPercent().monteCarlo95().getAsDouble(), 0.12 * want);
  }

  /**
   * The bins hold every board; their mean is near the nominal pair's, and as many boards lie within
   * the share of 95 of 100 as that says.
   */
  @Test
  void binsHoldEveryBoard() {
    List<SpreadFigures.Bin> bins = figures.boards();
    assertEquals(1000, bins.stream().mapToInt(SpreadFigures.Bin::boards).sum());
    double sum = 0;
    for (int i = 0; i < bins.size(); i++) {
      SpreadFigures.Bin b = bins.get(i);
      assertTrue(b.toOhm() > b.fromOhm());
      assertTrue(i == 0 || b.fromOhm() == bins.get(i - 1).toOhm(), "no gap before " + b);
      sum += b.boards() * (b.fromOhm() + b.toOhm()) / 2;
    }
    double nominal = wheel.resistance().meanTerminalOhm();
    assertEquals(nominal, sum / 1000, 0.02 * nominal);
    double share = figures.terminalOhmPercent().monteCarlo95().getAsDouble() / 100;
    int within =
        bins.stream()
            .filter(b -> b.fromOhm() > nominal * (1 - share) && b.toOhm() < nominal * (1 + share))
            .mapToInt(SpreadFigures.Bin::boards)
            .sum();
    assertTrue(within > 850 && within <= 1000, within + " boards");
  }

  @Test
  void orderOfTheThree() {
    for (SpreadFigures.Share s :
        List.of(
            figures.terminalOhmPercent(), figures.torquePercent(), figures.imbalancePercent())) {
      assertTrue(s.monteCarlo95().getAsDouble() > 0);
      assertTrue(s.monteCarlo95().getAsDouble() < s.rss().getAsDouble(), "" + s);
      assertTrue(s.rss().getAsDouble() < s.worst().getAsDouble(), "" + s);
    }
  }

  @Test
  void noTolerance_noSpread() {
    Artwork art = wheel.assembly().artwork();
    SpreadFigures f =
        Spread.of(art, new FabRules.Tolerance(0, 0, 0), Optional.of(new double[art.layers()]));
    assertEquals(0, f.terminalOhmPercent().worst().getAsDouble(), 1e-12);
    assertEquals(0, f.terminalOhmPercent().monteCarlo95().getAsDouble(), 1e-9);
    assertEquals(0, f.torquePercent().monteCarlo95().getAsDouble(), 0);
    double nominal = wheel.resistance().imbalancePercent();
    assertEquals(nominal, f.imbalancePercent().monteCarlo95().getAsDouble(), 1e-9);
    assertEquals(nominal, f.imbalancePercent().worst().getAsDouble(), 1e-9);
  }

  @Test
  void trackThatMayVanish_absent() {
    Artwork art = wheel.assembly().artwork();
    SpreadFigures f = Spread.of(art, new FabRules.Tolerance(1, 0.1, 0.2), Optional.empty());
    assertTrue(f.terminalOhmPercent().worst().isEmpty());
    assertTrue(f.imbalancePercent().rss().isEmpty());
  }

  /** The sensitivity against a board whose layers are drawn thicker, its field taken anew. */
  @Test
  void thickerCopper_byDrawingItSo() {
    for (String template : List.of("filter-wheel", "wind-logger")) {
      TestMachine m = TestMachine.of(template, "turns: fill ", "turns: 5 ");
      Artwork art = m.assembly().artwork();
      double[] s = HeightSensitivity.perMm(art, m.spec().rotor(), coupling(m, art));
      double[] grown = {0.03, 0.01, 0.0, 0.02};
      double want = flux(m, thicker(art, grown)) / flux(m, art) - 1;
      double got = 0;
      for (int i = 0; i < s.length; i++) {
        got += s[i] * grown[i];
      }
      assertEquals(want, got, 0.03 * Math.abs(want), template);
    }
  }

  private static double flux(TestMachine m, Artwork art) {
    double sum = 0;
    for (var p : coupling(m, art).phases()) {
      sum += p.amplitude(0);
    }
    return sum;
  }

  private static Coupling coupling(TestMachine m, Artwork art) {
    double[] height = new double[art.layers()];
    for (int i = 0; i < height.length; i++) {
      height[i] = art.stackup().heightMm(i + 1);
    }
    RadialReach reach = RadialReach.of(art);
    MagnetArray magnets = MagnetArray.of(m.spec().rotor(), art.stackup().thicknessMm());
    return Coupling.of(art, new RotorField(magnets, height, reach.innerMm(), reach.outerMm()));
  }

  private static Artwork thicker(Artwork a, double[] grownMm) {
    List<Stackup.Copper> copper = new ArrayList<>();
    for (int i = 0; i < grownMm.length; i++) {
      Stackup.Copper c = a.stackup().copper().get(i);
      copper.add(new Stackup.Copper(c.thicknessMm() + grownMm[i], c.ounces(), c.undercutMm()));
    }
    Stackup s = new Stackup(copper, a.stackup().dielectricMm(), a.stackup().platingMm());
    return new Artwork(
        a.title(),
        a.slug(),
        a.revision(),
        a.draft(),
        s,
        a.profile(),
        a.joints(),
        a.conductors(),
        a.mountingHoles(),
        a.maskTop(),
        a.maskBottom(),
        a.legend(),
        a.coils(),
        a.phases(),
        a.turnsPerLayer(),
        a.expectedCircuits());
  }
}
