package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Stroke;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Mask: growth 0.05, web 0.1. Legend: line 0.15, height 0.8, gap 0.15. */
class MaskAndLegendTest {
  private static final double TINY = 1e-9;

  private static Path line(double x0, double y0, double x1, double y1) {
    return Path.of(new Line(new Point(x0, y0), new Point(x1, y1)));
  }

  private static Opening over(double x, double y, double diameter, String what) {
    return new Opening(new Point(x, y), diameter, what);
  }

  @Test
  void narrowWeb() {
    Boards b = new Boards();
    b.terminal("U1", new Point(0, 30), 1.8, 1);
    b.terminal("V1", new Point(2.15, 30), 1.8, 1);
    b.maskBottom.add(over(0, 30, 2.2, "terminal U1"));
    b.maskBottom.add(over(2.15, 30, 2.0, "terminal V1"));
    Finding f = Boards.only(b.check(), "mask-web");
    // 2.15 - 1.1 - 1.0.
    assertEquals(0.05, f.measured(), TINY);
    assertEquals(0.1, f.required(), TINY);
    assertEquals("L2", f.layer());
  }

  @Test
  void openingsThatRunTogether() {
    Boards b = new Boards();
    b.maskTop.add(over(0, 30, 2, "terminal U1"));
    b.maskTop.add(over(2.06, 30, 2, "terminal V1"));
    Finding f = Boards.only(b.check(), "mask-web");
    // 2.06 - 1 - 1.
    assertEquals(0.06, f.measured(), TINY);
    assertEquals("L1", f.layer());
    assertEquals(1.03, f.at().x(), TINY);
    assertEquals("openings of terminal U1 and terminal V1", f.what());
  }

  @Test
  void openingThatMayBareForeignCopper() {
    Boards b = new Boards();
    b.terminal("U1", new Point(0, 30), 2, 1);
    b.maskTop.add(over(0, 30, 2.4, "terminal U1"));
    b.track(1, line(-5, 31.32, 5, 31.32), 3);
    Finding f = Boards.only(b.check(), "mask-web");
    // 1.32 - 1.2 - 0.1, while pad and track keep 0.22.
    assertEquals(0.02, f.measured(), TINY);
    assertEquals(0.05, f.required(), TINY);
    assertEquals("opening of terminal U1 and phase U, coil 3, turn 1", f.what());
  }

  @Test
  void ownTrackOfAnOpening_isNotForeign() {
    Boards b = new Boards();
    int t = b.terminal("U1", new Point(0, 30), 2, 1);
    b.maskTop.add(over(0, 30, 2.1, "terminal U1"));
    b.maskBottom.add(over(0, 30, 2.1, "terminal U1"));
    b.track(1, 0.4, line(0, 30, 0, 20), t, b.bare(1, new Point(0, 20), 0.4), "U", 1);
    assertEquals(List.of(), b.check().findings());
  }

  private static Stroke mark(Path p, double width) {
    return new Stroke(p, width, "datum");
  }

  @Test
  void thinLegendLine() {
    Boards b = new Boards();
    b.legend.add(mark(line(20, 0, 22, 0), 0.1));
    Finding f = Boards.only(b.check(), "legend");
    assertEquals(0.1, f.measured(), TINY);
    assertEquals(0.15, f.required(), TINY);
    assertEquals("L1", f.layer());
    assertEquals("legend 'datum': line width", f.what());
  }

  @Test
  void smallLetters() {
    Boards b = new Boards();
    b.legend.add(new Stroke(line(20, 0, 20, 0.7), 0.15, "mark U1", OptionalDouble.of(0.7)));
    Finding f = Boards.only(b.check(), "legend");
    assertEquals(0.7, f.measured(), TINY);
    assertEquals(0.8, f.required(), TINY);
    assertEquals("legend 'mark U1': letter height", f.what());
  }

  @Test
  void legendTooNearAnOpening_andOverOne() {
    for (double x : new double[] {21.2, 20.5}) {
      Boards b = new Boards();
      b.maskTop.add(over(20, 0, 2, "terminal U1"));
      // The bottom's openings do not matter to a legend on top.
      b.maskBottom.add(over(30, 0, 2, "terminal U2"));
      b.legend.add(mark(line(x, -3, x, 3), 0.2));
      b.legend.add(mark(line(30, -3, 30, 3), 0.2));
      Finding f = Boards.only(b.check(), "legend");
      // x - 20 - 1 - 0.1: too near at 21.2, over the opening at 20.5.
      assertEquals(x - 21.1, f.measured(), TINY);
      assertEquals(0.15, f.required(), TINY);
      assertEquals("legend 'datum' and the opening of terminal U1", f.what());
      assertEquals(0, f.at().y(), TINY);
    }
  }

  @Test
  void legendTooNearAMountingHole() {
    Boards b = new Boards();
    b.holes.add(new MountingHole(new Point(30, 0), 3, 3));
    b.legend.add(mark(line(31.7, -3, 31.7, 3), 0.2));
    Finding f = Boards.only(b.check(), "legend");
    // 1.7 - 1.5 - 0.1.
    assertEquals(0.1, f.measured(), TINY);
    assertEquals("legend 'datum' and mounting hole 1", f.what());
  }

  @Test
  void legendTooNearTheEdge_acrossIt_andBeyondIt() {
    // The bore's edge at 7: 7.2 - 7 - 0.1; from 7.2 inwards to 5; wholly inside it.
    double[][] fromTo = {{7.2, 10}, {5, 10}, {1, 3}};
    double[] expected = {0.1, -2.1, -6.1};
    for (int i = 0; i < fromTo.length; i++) {
      Boards b = new Boards();
      b.legend.add(mark(line(fromTo[i][0], 0, fromTo[i][1], 0), 0.2));
      RuleReport r = b.check();
      Finding f = Boards.only(r, "legend");
      assertEquals(expected[i], f.measured(), TINY);
      assertEquals("legend 'datum' and the bore", f.what());
    }
  }

  @Test
  void legendMinimum_isFoundWhereAllIsWell() {
    Boards b = new Boards();
    b.legend.add(mark(line(20, 0, 22, 0), 0.15));
    Finding f = Boards.minimum(b.check(), "legend").orElseThrow();
    // Its width keeps the rule with nothing to spare.
    assertEquals(0.15, f.measured(), TINY);
    assertTrue(f.what().contains("line width"));
  }
}
