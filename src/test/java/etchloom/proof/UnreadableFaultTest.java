package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.geometry.Arc;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Files of a clean set that are cut short, wrong in themselves, or gone. */
class UnreadableFaultTest {
  private final Artwork wheel = EditedSet.wheel().art;

  @Test
  void arcWhoseRadiiDisagree_cannotBeRead() {
    Conductor c = FaultPlaces.spiral(wheel, 2, 1);
    Arc a =
        (Arc) c.path().segments().stream().filter(s -> s instanceof Arc).skip(7).findFirst().get();
    EditedSet e = EditedSet.wheel();
    String draw = EditedSet.drawTo(a, e.text(EditedSet.copper(1)));
    int i = draw.indexOf('I');
    int j = draw.indexOf('J');
    long off = Long.parseLong(draw.substring(i + 1, j)) + 60_000;
    e.replace(EditedSet.copper(1), draw, draw.substring(0, i + 1) + off + draw.substring(j));
    ProofReport r = e.prove();
    ProofFinding f = EditedSet.only(r, ProofNames.UNREADABLE);
    assertTrue(f.line() > 20, f.text());
  }

  @Test
  void missingEnd_cannotBeRead() {
    ProofFinding f =
        EditedSet.only(
            EditedSet.wheel().replace(EditedSet.copper(3), "M02*\n", "").prove(),
            ProofNames.UNREADABLE);
    assertEquals(wheel.slug() + EditedSet.copper(3), f.file());
    assertTrue(f.message().contains("M02"), f.text());
  }

  @Test
  void truncatedFile_cannotBeRead() {
    for (String suffix : List.of(EditedSet.copper(2), "-plated.xnc", "-profile.gbr")) {
      EditedSet e = EditedSet.wheel();
      String t = e.text(suffix);
      ProofReport r = e.put(suffix, t.substring(0, t.length() * 2 / 3)).prove();
      assertEquals(wheel.slug() + suffix, EditedSet.only(r, ProofNames.UNREADABLE).file());
    }
  }

  @Test
  void missingFile_isNamed() {
    EditedSet e = EditedSet.wheel();
    e.files.remove(wheel.slug() + EditedSet.copper(2));
    ProofFinding f = EditedSet.only(e.prove(), ProofNames.MISSING_FILE);
    assertTrue(f.message().contains("L2"), f.text());
  }
}
