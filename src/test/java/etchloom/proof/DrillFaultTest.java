package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.geometry.Point;
import org.junit.jupiter.api.Test;

/** One fault at a time in the holes of a clean set. */
class DrillFaultTest {
  private final Artwork wheel = EditedSet.wheel().art;

  @Test
  void viaNotDrilled_isAMissingHole() {
    Joint j = FaultPlaces.joint(wheel, Joint.Kind.EYE, 4);
    EditedSet e = EditedSet.wheel().replace("-plated.gbr", EditedSet.xy(j.at()) + "D03*\n", "");
    assertEquals("", e.mustFind(ProofNames.MISSING_HOLE, 0, j.at(), 1e-6).layer());
    ProofReport r = e.prove();
    assertTrue(r.findings().stream().anyMatch(f -> f.name().equals(ProofNames.OPEN)));
    // its pads on the two layers that no track leads to stand alone, and the coil is cut in two
    assertEquals(4, r.nets());
  }

  @Test
  void viaNotDrilledInOneFormat_isAMissingHole() {
    Joint j = FaultPlaces.joint(wheel, Joint.Kind.NODE, 2);
    EditedSet e = EditedSet.wheel();
    String hit =
        e.text("-plated.xnc")
            .lines()
            .filter(l -> l.startsWith("X") && away(l, j.at()) < 1e-6)
            .findFirst()
            .orElseThrow();
    e.replace("-plated.xnc", hit + "\n", "");
    ProofFinding f = e.mustFind(ProofNames.MISSING_HOLE, 0, j.at(), 1e-6);
    assertEquals(wheel.slug() + "-plated.xnc", f.file());
  }

  @Test
  void movedHole_isFoundWhereItIs() {
    Joint j = FaultPlaces.joint(wheel, Joint.Kind.NODE, 7);
    Point to = j.at().plus(new Point(0.12, -0.05));
    EditedSet e = EditedSet.wheel().replace("-plated.gbr", EditedSet.xy(j.at()), EditedSet.xy(to));
    ProofFinding f = e.mustFind(ProofNames.MOVED_HOLE, 0, to, 2e-6);
    assertTrue(f.message().contains("0.1300 mm"), f.text());
  }

  @Test
  void largerHole_isFound() {
    EditedSet e = EditedSet.wheel().replace("-nonplated.gbr", "C,3.2*", "C,3.4*");
    e.mustFind(ProofNames.HOLE_SIZE, 0, wheel.mountingHoles().get(0).at(), 100);
    assertEquals(
        4,
        e.prove().findings().stream().filter(f -> f.name().equals(ProofNames.HOLE_SIZE)).count());
  }

  private static double away(String hit, Point p) {
    int y = hit.indexOf('Y');
    return p.distanceTo(
        new Point(
            Double.parseDouble(hit.substring(1, y)), Double.parseDouble(hit.substring(y + 1))));
  }
}
