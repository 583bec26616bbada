package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.spec.Spec;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class OrderRulesTest {
  @Test
  void layerCountThatTheFabDoesNotBuild() {
    Boards b = new Boards();
    b.layers = 8;
    Finding f = Boards.only(b.check(), "layers");
    assertEquals(8, f.measured(), 0);
    assertEquals(6, f.required(), 0);
    assertEquals("copper layers; the fab builds 2, 4 or 6", f.what());
  }

  @Test
  void boardTooLarge() {
    Boards b = new Boards();
    b.profile = List.of(Path.circle(Point.ORIGIN, 205));
    Finding f = Boards.only(b.check(), "size");
    assertEquals(410, f.measured(), 1e-9);
    assertEquals(400, f.required(), 0);
  }

  @Test
  void boardTooThickOrTooThin() {
    Boards b = new Boards();
    b.thicknessMm = 2.5;
    Finding thick = Boards.only(b.check(), "size");
    assertEquals(2.5, thick.measured(), 1e-9);
    assertEquals(2.4, thick.required(), 0);
    b.thicknessMm = 0.5;
    Finding thin = Boards.only(b.check(), "size");
    assertEquals(0.5, thin.measured(), 1e-9);
    assertEquals(0.6, thin.required(), 0);
  }

  @Test
  void copperThatTheFabDoesNotOffer() {
    Boards b = new Boards();
    b.layers = 4;
    var fab = Boards.fab(List.of(Boards.row(1, true, 0.2), Boards.row(2, false, 0.3)));
    RuleReport r = b.check(Boards.spec(4, Optional.empty()), fab);
    List<Finding> all = Boards.findings(r, "copper-weight");
    assertEquals(r.findings(), all);
    assertEquals(List.of("L2", "L3"), all.stream().map(Finding::layer).toList());
    assertEquals(1, all.get(0).measured(), 0);
    assertEquals(2, all.get(0).required(), 0);
    assertEquals("oz", all.get(0).unit());
  }

  private static RuleReport laminate(double tgC, double copperLimitC) {
    Spec.Duty d = Boards.duty(OptionalDouble.empty());
    Spec.Duty duty =
        new Spec.Duty(
            d.generator(),
            d.torqueNm(),
            d.loadOhm(),
            d.busVolt(),
            d.speedRadPerSecond(),
            d.currentAmpereRms(),
            d.switchingHertz(),
            d.bandwidthHertz(),
            d.ambientC(),
            copperLimitC,
            d.coolingWattPerSquareMetreKelvin());
    Spec s = Boards.spec(2, Optional.of(duty));
    Spec.Board p = s.board();
    Spec.Board board =
        new Spec.Board(
            p.layers(),
            p.thicknessMm(),
            p.outerCopper(),
            p.innerCopper(),
            p.stackupMm(),
            p.diameterMm(),
            p.boreMm(),
            p.holes(),
            p.terminals(),
            p.starPointOut(),
            p.finish(),
            p.mask(),
            tgC,
            p.tab());
    Spec spec =
        new Spec(
            s.title(),
            s.slug(),
            s.revision(),
            s.rotor(),
            s.winding(),
            s.coil(),
            s.rim(),
            s.via(),
            board,
            s.fab(),
            s.duty());
    return new Boards().check(spec, Boards.fab());
  }

  @Test
  void glassTransitionTooLow() {
    Finding f = Boards.only(laminate(125, 105), "laminate");
    assertEquals(125, f.measured(), 0);
    // 105 C and 25 K in hand.
    assertEquals(130, f.required(), 0);
    assertEquals("C", f.unit());
    assertTrue(laminate(130, 105).passed());
  }

  @Test
  void veryHotCopper_getsANoteOnTheLaminatesRating() {
    assertTrue(laminate(180, 105).notes().stream().noneMatch(n -> n.startsWith("laminate")));
    RuleReport hot = laminate(180, 140);
    assertTrue(hot.passed());
    assertTrue(hot.notes().stream().anyMatch(n -> n.startsWith("laminate: common epoxy-glass")));
  }

  @Test
  void withoutADuty_aNoteSaysThatTheLaminateIsNotChecked() {
    RuleReport r = new Boards().check();
    assertTrue(r.notes().stream().anyMatch(n -> n.contains("duty.copper-limit")));
    assertTrue(Boards.minimum(r, "laminate").isEmpty());
  }

  @Test
  void aBuildThatIsNotTheFabsOwn_getsANote() {
    assertTrue(new Boards().check().notes().stream().anyMatch(n -> n.startsWith("layers: 2 lay")));
  }
}
