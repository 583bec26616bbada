package etchloom.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.geometry.Point;
import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import etchloom.spec.Spec;
import etchloom.testing.Specs;
import etchloom.testing.ToyBoards;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The area by widths and lengths against the copper merged as polygons, a wholly other road. */
class CopperAreaTest {
  private static final RuleReport KEPT = new RuleReport(List.of(), List.of(), List.of());

  @Test
  void drawnBoard_agreesWithMergedPolygons() {
    Artwork art = Samples.template(Samples.SMALL).artwork();
    List<Double> areas = CopperArea.of(art, KEPT);
    for (int layer = 1; layer <= art.layers(); layer++) {
      double merged = MergedCopper.areaMm2(art, layer);
      assertEquals(merged, areas.get(layer - 1), 2e-4 * merged, "L" + layer);
    }
  }

  @Test
  void toyBoard_cornersAndOddJoints_agreeWithMergedPolygons() {
    Artwork art = ToyBoards.twoLayers();
    List<Double> areas = CopperArea.of(art, KEPT);
    for (int layer = 1; layer <= art.layers(); layer++) {
      double merged = MergedCopper.areaMm2(art, layer);
      assertEquals(merged, areas.get(layer - 1), 2e-3 * merged, "L" + layer);
    }
  }

  /** Steps of a widening track, and a bend where it begins to widen. */
  @Test
  void tracksThatWiden_agreeWithMergedPolygons() {
    Spec wheel = Specs.spec(Specs.wheel(2));
    Artwork art = Samples.bare(Specs.turning(wheel, 6, true)).artwork();
    List<Double> areas = CopperArea.of(art, KEPT);
    List<Double> even = CopperArea.of(Samples.bare(Specs.turning(wheel, 6, false)).artwork(), KEPT);
    for (int layer = 1; layer <= art.layers(); layer++) {
      double merged = MergedCopper.areaMm2(art, layer);
      assertEquals(merged, areas.get(layer - 1), 2e-4 * merged, "L" + layer);
      assertTrue(areas.get(layer - 1) > 1.2 * even.get(layer - 1));
    }
  }

  @Test
  void touchingCopper_isCountedOnce() {
    Artwork art = ToyBoards.twoLayers();
    Finding touch = new Finding("space", "L2", Point.ORIGIN, -0.1, 0.2, "mm", "two things");
    RuleReport broken = new RuleReport(List.of(), List.of(touch), List.of());
    List<Double> areas = CopperArea.of(art, broken);
    assertEquals(CopperArea.of(art, KEPT).get(0), areas.get(0), 0);
    assertEquals(MergedCopper.areaMm2(art, 2), areas.get(1), 0);
  }
}
