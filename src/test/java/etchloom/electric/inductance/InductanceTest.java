package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.board.Assembler;
import etchloom.electric.field.IronPlanes;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.testing.Specs;
import etchloom.testing.ToyBoards;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Whole boards. */
class InductanceTest {
  private static Specs.Shape shape(int coils, int poles, int layers, int turns, double scale) {
    return new Specs.Shape(
        coils,
        poles,
        layers,
        Spec.Connection.STAR,
        12 * scale,
        30 * scale,
        0.2 * scale,
        0.2 * scale,
        0.6 * scale,
        0.3 * scale,
        90 * scale,
        Math.PI / 2,
        false,
        OptionalInt.of(turns));
  }

  private static Artwork board(Specs.Shape shape) {
    var staged = Assembler.assemble(Specs.spec(shape), Specs.fab(), Positions.unknown("test"));
    return staged.value().orElseThrow(() -> new AssertionError(staged.diagnostics())).artwork();
  }

  private static IronPlanes planes(double above, double below) {
    return new IronPlanes(OptionalDouble.of(above), OptionalDouble.of(below));
  }

  /**
   * Nine coils with 12 or 6 poles: all coils forward, neighbours of other phases, so that all
   * mutual inductances are negative. With 8 poles each phase is three coils side by side, the
   * middle one reversed; its two neighbours then help it, and phases meet at two coils of like
   * sense only.
   */
  @ParameterizedTest(name = "{0} coils, {1} poles")
  @CsvSource({"9, 12", "9, 6", "9, 8", "12, 10"})
  void signs(int coils, int poles) {
    Artwork art = board(shape(coils, poles, 2, 8, 1));
    InductanceFigures f = Inductance.of(art, Spec.Connection.STAR, IronPlanes.NONE);
    double coil = f.coilHenry();
    double self = f.phaseSelfHenry();
    double mutual = f.phaseMutualHenry().orElseThrow();
    int each = coils / 3;
    boolean sideBySide = poles == 8 || poles == 10;
    assertTrue(sideBySide ? self > each * coil : self > 0.95 * each * coil, "self " + f);
    assertTrue(mutual < 0, "mutual " + f);
    assertTrue(sideBySide ? mutual > -0.03 * self : mutual < -0.03 * self, "mutual " + f);
    assertEquals(self - mutual, f.synchronousHenry(), 1e-9 * self);
    assertEquals(2 * (self - mutual), f.terminalHenry(), 1e-9 * self);
    for (int p = 0; p < 3; p++) {
      assertEquals(self, f.phaseHenry().get(p).get(p), 0.01 * self, "the rim differs a little");
      for (int q = 0; q < 3; q++) {
        assertEquals(f.phaseHenry().get(p).get(q), f.phaseHenry().get(q).get(p), 0);
      }
    }
  }

  /**
   * One coil against the others, turned, comes to the same as the phases' own copper as it lies.
   */
  @ParameterizedTest(name = "{0} coils, {1} poles")
  @CsvSource({"9, 8", "9, 12"})
  void repeatedCoils_asWholePhases(int coils, int poles) {
    Artwork art = board(shape(coils, poles, 2, 7, 1)).onGrid();
    BoardCopper copper = new BoardCopper(art);
    Flow flow = Flow.of(art);
    Optional<Repeats> repeats = Repeats.of(flow);
    assertTrue(repeats.isPresent());
    for (IronPlanes iron : List.of(IronPlanes.NONE, planes(3, -4))) {
      double[] turned = Inductance.couplings(flow, copper, iron, repeats);
      double[] whole = Inductance.couplings(flow, copper, iron, Optional.empty());
      for (int i = 0; i < turned.length; i++) {
        assertEquals(whole[i], turned[i], 2e-4 * whole[1], "value " + i + ", " + iron);
      }
    }
  }

  /** All lengths twice as large: twice the inductance. */
  @Test
  void scales() {
    Specs.Shape s = shape(9, 12, 2, 6, 1);
    InductanceFigures one = Inductance.of(board(s), Spec.Connection.STAR, IronPlanes.NONE);
    Artwork large = Scaled.twice(board(s));
    InductanceFigures two = Inductance.of(large, Spec.Connection.STAR, IronPlanes.NONE);
    assertEquals(2 * one.coilHenry(), two.coilHenry(), 1e-9 * two.coilHenry());
    assertEquals(2 * one.synchronousHenry(), two.synchronousHenry(), 1e-9 * two.coilHenry());
  }

  /** Four layers in series against two: more than twice, at most four times the inductance. */
  @Test
  void layersInSeries() {
    InductanceFigures two =
        Inductance.of(board(shape(9, 12, 2, 8, 1)), Spec.Connection.STAR, IronPlanes.NONE);
    InductanceFigures four =
        Inductance.of(board(shape(9, 12, 4, 8, 1)), Spec.Connection.STAR, IronPlanes.NONE);
    double ratio = four.coilHenry() / two.coilHenry();
    assertTrue(ratio > 3 && ratio < 4.1, "ratio " + ratio);
  }

  @Test
  void connections() {
    Artwork art = board(shape(9, 12, 2, 6, 1));
    InductanceFigures star = Inductance.of(art, Spec.Connection.STAR, IronPlanes.NONE);
    InductanceFigures delta = Inductance.of(art, Spec.Connection.DELTA, IronPlanes.NONE);
    InductanceFigures open = Inductance.of(art, Spec.Connection.OPEN, IronPlanes.NONE);
    assertEquals(star.terminalHenry() / 3, delta.terminalHenry(), 1e-3 * star.terminalHenry());
    assertEquals(open.phaseSelfHenry(), open.terminalHenry(), 0);
    assertEquals(star.synchronousHenry(), delta.synchronousHenry(), 0);
  }

  /** Iron raises a coil's inductance, twice at most; plates on both sides more than one. */
  @Test
  void iron() {
    Artwork art = board(shape(9, 12, 2, 8, 1));
    double none = Inductance.of(art, Spec.Connection.STAR, IronPlanes.NONE).synchronousHenry();
    IronPlanes above = new IronPlanes(OptionalDouble.of(4), OptionalDouble.empty());
    double one = Inductance.of(art, Spec.Connection.STAR, above).synchronousHenry();
    double two = Inductance.of(art, Spec.Connection.STAR, planes(4, -4)).synchronousHenry();
    double far = Inductance.of(art, Spec.Connection.STAR, planes(500, -500)).synchronousHenry();
    assertTrue(none < one && one < 2 * none, none + " " + one);
    assertTrue(one < two && two < 3 * none, one + " " + two);
    assertEquals(none, far, 1e-3 * none);
    assertThrows(
        IllegalArgumentException.class,
        () -> Inductance.of(art, Spec.Connection.STAR, planes(0.5, -4)));
  }

  /** A small board whose coils do not repeat: finite figures, the coil as the direct sum has it. */
  @Test
  void toyBoard() {
    Artwork art = ToyBoards.fourLayers();
    InductanceFigures f = Inductance.of(art, Spec.Connection.OPEN, IronPlanes.NONE);
    BoardCopper copper = new BoardCopper(art);
    Flow flow = Flow.of(art);
    double direct = Bodies.direct(flow.coilFilaments(copper, false), copper.sections());
    double barrels = Barrel.coupling(copper.barrels(flow.coil()), copper.barrels(flow.coil()));
    assertTrue(barrels > 0);
    double expected = direct + Bodies.HENRY_A_MM * barrels;
    assertEquals(expected, f.coilHenry(), 1e-3 * expected);
    assertEquals(f.coilHenry(), f.phaseHenry().get(0).get(0), 1e-9 * expected);
    assertTrue(f.phaseHenry().get(1).get(1) > f.coilHenry() / 2);
    assertEquals(f.terminalHenry(), f.phaseSelfHenry(), 0);
  }

  /** Rosa 1908: a tube of thin wall has ln(2l/a) - 1 times its length, plus its radius's share. */
  @Test
  void barrel_rosa() {
    double l = 10;
    double a = 0.16;
    Barrel b =
        new Barrel(etchloom.geometry.Point.ORIGIN, l, 0, MeanDistance.annulusMm(0.1601, 0.16), 1);
    double expected = 2 * (l * (Math.log(2 * l / a) - 1) + 4 * a / Math.PI);
    assertEquals(expected, Barrel.coupling(List.of(b), List.of(b)), 1e-3 * expected);
  }
}
