package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.geometry.Distance;
import etchloom.geometry.Segment;
import java.util.List;
import org.junit.jupiter.api.Test;

/** One fault at a time in the drawings of a clean set. */
class PictureFaultTest {
  private final Artwork wheel = EditedSet.wheel().art;

  @Test
  void removedDxfEntity_isFound() {
    EditedSet e = EditedSet.wheel();
    e.put(".dxf", EditedSet.withoutEntity(e.text(".dxf"), "COPPER_L2", 4));
    Conductor c = wheel.conductorsOn(2).get(4);
    Segment s = c.path().segments().get(FaultPlaces.longest(c));
    ProofFinding f = e.mustFind(ProofNames.DXF, 2, s.at(0.5), 1e-3);
    assertTrue(f.message().contains("lacks"), f.text());
  }

  @Test
  void removedOutline_isFound() {
    EditedSet e = EditedSet.wheel();
    e.put("-outlines.dxf", EditedSet.withoutEntity(e.text("-outlines.dxf"), "COPPER_L3", 0));
    ProofReport r = e.prove();
    ProofFinding f = EditedSet.only(r, ProofNames.OUTLINES);
    assertEquals("L3", f.layer());
    assertTrue(f.message().contains("leave out"), f.text());
    assertTrue(r.gerberDxfAreaDifferenceMm2().orElseThrow() > 0.2, r::toString);
  }

  @Test
  void widerOutline_isFoundByItsArea() {
    EditedSet e = EditedSet.wheel();
    // one end of a long side moved by 4 um: within what flattening bears at a point
    String t = e.text("-outlines.dxf");
    int at = t.indexOf("LWPOLYLINE", t.indexOf("ENTITIES"));
    int x = t.indexOf(".", t.indexOf("10\r\n", at) > 0 ? t.indexOf("\n 10", at) : at);
    String moved =
        t.substring(0, x + 1)
            + (char) (t.charAt(x + 1) == '9' ? '8' : t.charAt(x + 1) + 1)
            + t.substring(x + 2);
    ProofReport r = e.put("-outlines.dxf", moved).prove();
    assertTrue(
        r.findings().stream().anyMatch(f -> f.name().equals(ProofNames.OUTLINES)), r::toString);
  }

  @Test
  void removedSvgPath_isFound() {
    EditedSet e = EditedSet.wheel();
    String t = e.text(".svg");
    int group = t.indexOf("id=\"copper-L4\"");
    int from = t.indexOf("<path", group);
    int to = t.indexOf("</path>", from) + 7;
    e.put(".svg", t.substring(0, from) + t.substring(to));
    Conductor c = wheel.conductorsOn(4).get(0);
    List<ProofFinding> told =
        e.prove().findings().stream().filter(f -> f.name().equals(ProofNames.SVG)).toList();
    assertEquals(Math.min(50, c.path().segments().size()), told.size());
    for (ProofFinding f : told) {
      assertTrue(
          c.path().segments().stream()
              .anyMatch(s -> Distance.between(f.at().orElseThrow(), s).distanceMm() < 1e-3),
          f.text());
    }
  }
}
