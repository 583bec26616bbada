package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.artwork.MountingHole;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class KeepOutTest {
  private static final double TINY = 1e-9;

  @Test
  void copperUnderAScrewHead_onTheOuterLayersOnly() {
    for (int layer = 1; layer <= 4; layer++) {
      Boards b = new Boards();
      b.layers = 4;
      b.holes.add(new MountingHole(new Point(30, 0), 3, 6));
      b.track(layer, Path.of(new Line(new Point(20, 2.9), new Point(39, 2.9))), 5);
      RuleReport r = b.check();
      if (layer == 1 || layer == 4) {
        Finding f = Boards.only(r, "keep-out");
        // 2.9 - 3 - 0.1.
        assertEquals(-0.2, f.measured(), TINY);
        assertEquals(0, f.required(), 0);
        assertEquals("L" + layer, f.layer());
        assertEquals("mounting hole 1's screw head and phase U, coil 5, turn 1", f.what());
      } else {
        assertEquals(0, r.findings().size());
      }
    }
  }

  private static RuleReport withDisc(Boards b, double diameterMm) {
    return b.check(
        Boards.spec(2, Optional.empty(), OptionalDouble.of(diameterMm), Boards.SPACE),
        Boards.fab());
  }

  @Test
  void screwHeadUnderTheRotor() {
    Boards b = new Boards();
    b.holes.add(new MountingHole(new Point(0, 33), 3, 6.4));
    Finding f = Boards.only(withDisc(b, 60), "keep-out");
    // 33 - 3.2 - 30.
    assertEquals(-0.2, f.measured(), TINY);
    assertEquals("L1", f.layer());
    assertEquals("mounting hole 1's screw head and the rotor's disc", f.what());
    assertEquals(0, withDisc(b, 59.5).findings().size());
  }

  @Test
  void terminalUnderTheRotor() {
    Boards b = new Boards();
    b.terminal("W1", new Point(-30, 0), 2, 1);
    Finding f = Boards.only(withDisc(b, 60), "keep-out");
    // 30 - 1 - 30.
    assertEquals(-1, f.measured(), TINY);
    assertEquals("terminal W1 and the rotor's disc", f.what());
  }

  @Test
  void screwHeadsOverEachOther() {
    Boards b = new Boards();
    b.holes.add(new MountingHole(new Point(0, 33), 3, 6.4));
    b.holes.add(new MountingHole(new Point(6, 33), 3, 6.4));
    Finding f = Boards.only(b.check(), "keep-out");
    // 6 - 3.2 - 3.2.
    assertEquals(-0.4, f.measured(), TINY);
    assertEquals("screw heads of mounting holes 1 and 2", f.what());
    assertEquals(3, f.at().x(), TINY);
  }
}
