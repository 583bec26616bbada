package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Phase;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/**
 * A fab that etches 0.1 mm, so that only the voltage asks for more. IPC-2221 table 6-1: at 48 V B1
 * 0.1, B4 0.13, A6 0.4; at 150 V B1 0.2, B4 0.4, A6 0.8.
 */
class VoltageRuleTest {
  private static final double TINY = 1e-9;
  private static final FabRules FAB =
      Boards.fab(List.of(Boards.row(1, true, 0.1), Boards.row(1, false, 0.1)));

  private static Path line(double x0, double y0, double x1, double y1) {
    return Path.of(new Line(new Point(x0, y0), new Point(x1, y1)));
  }

  private static RuleReport check(Boards b, double bus) {
    return check(b, OptionalDouble.of(bus), OptionalDouble.empty());
  }

  private static RuleReport check(Boards b, OptionalDouble bus, OptionalDouble emf) {
    Spec spec =
        Boards.spec(b.layers, Optional.of(Boards.duty(bus)), OptionalDouble.empty(), Boards.SPACE);
    return RuleCheck.check(b.artwork(), spec, FAB, new RuleContext(emf));
  }

  /** Two tracks of two phases, 0.12 mm apart, on one layer. */
  private static Boards twoPhases(int layer) {
    Boards b = new Boards();
    b.layers = 4;
    for (int k = 0; k < 2; k++) {
      double y = 0.32 * k;
      int from = b.bare(layer, new Point(10, y));
      int to = b.bare(layer, new Point(20, y));
      String mark = k == 0 ? "U" : "V";
      int c = b.track(layer, 0.2, line(10, y, 20, y), from, to, mark, k + 1);
      b.phases.add(new Phase(mark, from, to, List.of(new Phase.Step(c, true))));
    }
    return b;
  }

  @Test
  void betweenPhases_outsideAndInside() {
    Finding f =
        check(twoPhases(1), 48).findings().stream()
            .filter(x -> x.what().startsWith("phase U, coil 1, turn 1 and phase V"))
            .findFirst()
            .orElseThrow();
    assertEquals("voltage", f.rule());
    assertEquals("L1", f.layer());
    assertEquals(0.12, f.measured(), TINY);
    assertEquals(0.13, f.required(), TINY);
    assertEquals(
        "phase U, coil 1, turn 1 and phase V, coil 2, turn 1: 48.0 V, column B4", f.what());
    assertEquals(0.16, f.at().y(), TINY);
    // Inside the board 0.1 is enough at 48 V, and 0.2 is needed at 150 V.
    assertEquals(List.of(), check(twoPhases(2), 48).findings());
    assertTrue(
        check(twoPhases(2), 150).findings().stream()
            .allMatch(x -> x.required() == 0.2 && x.what().endsWith("150 V, column B1")));
    assertFalse(check(twoPhases(2), 150).passed());
  }

  @Test
  void upToThirtyVolt_halfATenthIsEnough() {
    RuleReport r = check(twoPhases(1), 30);
    assertTrue(r.passed());
    Finding f = Boards.minimum(r, "voltage").orElseThrow();
    assertEquals(0.12, f.measured(), TINY);
    assertEquals(0.05, f.required(), TINY);
  }

  /** One phase, there and back by a wide U: 20 + 2 + 20 mm, the legs 0.12 apart over 10 mm. */
  private static Boards onePhase() {
    Boards b = new Boards();
    Point[] at = {
      new Point(10, 0),
      new Point(20, 0),
      new Point(20, 5),
      new Point(25, 5),
      new Point(25, 0.32),
      new Point(10, 0.32)
    };
    int from = b.bare(1, at[0]);
    int to = b.bare(1, at[5]);
    Path p =
        Path.of(
            new Line(at[0], at[1]),
            new Line(at[1], at[2]),
            new Line(at[2], at[3]),
            new Line(at[3], at[4]),
            new Line(at[4], at[5]));
    int c = b.track(1, 0.2, p, from, to, "U", 1);
    b.phases.add(new Phase("U", from, to, List.of(new Phase.Step(c, true))));
    return b;
  }

  @Test
  void withinAPhase_theShareOfItsLengthCounts() {
    // The first and the last leg: no more than the whole phase apart, 100 V, 0.13 mm.
    RuleReport r = check(onePhase(), 100);
    Finding f =
        r.findings().stream()
            .filter(x -> x.what().startsWith("phase U, coil 1, turn 1 and phase U, coil 1, turn 5"))
            .findFirst()
            .orElseThrow();
    assertEquals(0.12, f.measured(), TINY);
    assertEquals(0.13, f.required(), TINY);
    assertTrue(f.what().endsWith("100 V, column B4"), f.what());
  }

  @Test
  void withinAPhase_aSmallShareAsksForLittle() {
    // Two tracks in series that lie side by side, in a phase of 1020 mm: 20/1020 of 300 V is less
    // than 15 V, so 0.05 is enough where 300 V would ask for 0.4.
    Boards b = new Boards();
    int[] joints = new int[4];
    joints[0] = b.bare(1, new Point(10, 0));
    joints[1] = b.bare(1, new Point(20, 0));
    int first = b.track(1, 0.2, line(10, 0, 20, 0), joints[0], joints[1], "U", 1);
    joints[2] = b.bare(1, new Point(10, 0.32));
    joints[3] = b.bare(1, new Point(20, 0.32));
    int second = b.track(1, 0.2, line(10, 0.32, 20, 0.32), joints[2], joints[3], "U", 1);
    int far = b.bare(2, new Point(-500, 30));
    int end = b.bare(2, new Point(500, 30));
    int third = b.track(2, 0.2, line(-500, 30, 500, 30), far, end, "U", 2);
    b.phases.add(
        new Phase(
            "U",
            joints[0],
            end,
            List.of(
                new Phase.Step(first, true),
                new Phase.Step(second, true),
                new Phase.Step(third, true))));
    assertEquals(List.of(), Boards.findings(check(b, 300), "voltage"));
    // The same two tracks at the two ends of the phase.
    b.phases.set(
        0,
        new Phase(
            "U",
            joints[0],
            end,
            List.of(
                new Phase.Step(first, true),
                new Phase.Step(third, true),
                new Phase.Step(second, true))));
    assertTrue(
        Boards.findings(check(b, 300), "voltage").stream().anyMatch(f -> f.required() == 0.4));
  }

  @Test
  void bareTerminals_needColumnA6() {
    Boards b = new Boards();
    b.terminal("U1", new Point(0, 30), 2, 1);
    b.terminal("V1", new Point(2.35, 30), 2, 1);
    // Under the mask 0.35 would do for 48 V.
    assertEquals(List.of(), check(b, 48).findings());
    b.maskTop.add(new Opening(new Point(0, 30), 2.1, "terminal U1"));
    b.maskTop.add(new Opening(new Point(2.35, 30), 2.1, "terminal V1"));
    Finding f = Boards.only(check(b, 48), "voltage");
    assertEquals(0.35, f.measured(), TINY);
    assertEquals(0.4, f.required(), TINY);
    assertEquals("L1", f.layer());
    assertEquals("terminal U1 and terminal V1: 48.0 V, column A6", f.what());
  }

  @Test
  void theScrewMayBeEarthed() {
    Boards b = new Boards();
    b.layers = 4;
    b.holes.add(new MountingHole(new Point(30, 0), 3, 6));
    // From the head's edge at 3: 3.2 - 3 - 0.1 = 0.1 under the mask.
    b.track(4, line(25, 3.2, 35, 3.2), 2);
    Finding f =
        Boards.findings(check(b, 48), "voltage").stream()
            .filter(x -> x.what().contains("turn 1"))
            .findFirst()
            .orElseThrow();
    assertEquals(0.1, f.measured(), TINY);
    assertEquals(0.13, f.required(), TINY);
    assertEquals("L4", f.layer());
    assertTrue(f.what().startsWith("mounting hole 1's screw and phase U, coil 2"), f.what());
  }

  @Test
  void backEmfWithATenthInHand_countsWhereItIsMore() {
    // 1.1 · 45 = 49.5 V asks for 0.13, the bus of 24 V for 0.05.
    RuleReport r = check(twoPhases(1), OptionalDouble.of(24), OptionalDouble.of(45));
    assertTrue(r.findings().stream().allMatch(f -> f.required() == 0.13));
    assertFalse(r.passed());
    assertTrue(check(twoPhases(1), OptionalDouble.of(24), OptionalDouble.of(27)).passed());
    // 1.1 · 27.3 = 30.03 V: the tenth alone leads into the next row.
    assertFalse(check(twoPhases(1), OptionalDouble.empty(), OptionalDouble.of(27.3)).passed());
  }

  @Test
  void withoutABus_aNoteSaysSo() {
    RuleReport r = check(twoPhases(1), OptionalDouble.empty(), OptionalDouble.empty());
    assertTrue(r.passed());
    assertTrue(Boards.minimum(r, "voltage").isEmpty());
    assertTrue(r.notes().stream().anyMatch(n -> n.contains("duty.bus")), r.notes()::toString);
  }

  @Test
  void notes_nameTheColumnsAndWhatTheCheckIsNot() {
    String low = String.join("\n", check(twoPhases(1), 24).notes());
    assertTrue(low.contains("column B1 (inner layers)"), low);
    assertTrue(low.contains("column B4"), low);
    assertTrue(low.contains("column A6"), low);
    assertTrue(low.contains("no safety insulation"), low);
    assertFalse(low.contains("60 V"), low);
    String high = String.join("\n", check(twoPhases(1), 80).notes());
    assertTrue(high.contains("60 V d.c."), high);
    assertTrue(high.contains("IEC 60664-1"), high);
  }

  @Test
  void anAbsurdVoltage_endsQuickly() {
    Boards b = Wedges.board(9, 2, 20, 12, 30, 0.4);
    RuleReport r = check(b, 10000);
    assertFalse(r.passed());
    assertTrue(r.findings().size() <= 200);
  }
}
