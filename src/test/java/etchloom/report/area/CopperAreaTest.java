package etchloom.report.area;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.CopperBuilder;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.board.Assembler;
import etchloom.board.Assembly;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.rules.Finding;
import etchloom.rules.RuleReport;
import etchloom.spec.FabReader;
import etchloom.spec.Positions;
import etchloom.spec.Spec;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import etchloom.spec.Templates;
import etchloom.testing.MixedSpecs;
import etchloom.testing.Specs;
import etchloom.testing.TemplateBoards;
import etchloom.testing.ToyBoards;
import etchloom.write.outline.Areas;
import etchloom.write.outline.Outline;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The area by widths and lengths against the copper merged as polygons, a wholly other road. */
class CopperAreaTest {
  private static final RuleReport KEPT = new RuleReport(List.of(), List.of(), List.of());

  @Test
  void drawnBoard_agreesWithMergedPolygons() {
    Artwork art = TemplateBoards.onGrid("dosing-pump");
    List<Double> areas = CopperArea.of(art, KEPT);
    for (int layer = 1; layer <= art.layers(); layer++) {
      double merged = MergedCopper.areaMm2(art, layer);
      assertEquals(merged, areas.get(layer - 1), 2e-4 * merged, "L" + layer);
    }
  }

  private static Artwork drawn(Spec spec) {
    return Assembler.assemble(spec, Specs.fab(), new Positions("", Map.of()))
        .value()
        .orElseThrow()
        .artwork();
  }

  static List<String> templates() {
    return Templates.names();
  }

  /** The outlines' closed form is exact; corners close beside a pad are what is left. */
  @ParameterizedTest
  @MethodSource("templates")
  void everyTemplate_agreesWithTheClosedFormOfItsOutlines(String name) {
    Artwork art = TemplateBoards.onGrid(name);
    List<Double> areas = CopperArea.of(art, KEPT);
    for (int layer = 1; layer <= art.layers(); layer++) {
      double outlines = Outline.of(art, layer).stream().mapToDouble(Areas::signedMm2).sum();
      assertEquals(outlines, areas.get(layer - 1), 2e-5 * outlines, "L" + layer);
    }
  }

  /** The limit to which the files of a set are held too; whole layers as polygons keep 1e-4. */
  @Test
  void randomBoards_agreeWithTheirOutlines() {
    int boards = 0;
    for (long seed = 30; seed < 50; seed++) {
      String yaml = MixedSpecs.yaml(seed);
      SpecFile f =
          SpecReader.read("mixed", yaml.getBytes(StandardCharsets.US_ASCII)).value().orElseThrow();
      Optional<Assembly> board =
          Assembler.assemble(f.spec(), FabReader.builtIn(f.spec().fab()), f.positions()).value();
      if (board.isEmpty()) {
        continue;
      }
      boards++;
      Artwork art = board.get().artwork().onGrid();
      List<Double> areas = CopperArea.of(art, KEPT);
      for (int layer = 1; layer <= art.layers(); layer++) {
        double outlines = Outline.of(art, layer).stream().mapToDouble(Areas::signedMm2).sum();
        assertEquals(outlines, areas.get(layer - 1), 2e-4 * outlines, "L" + layer + "\n" + yaml);
      }
    }
    assertTrue(boards >= 8, boards + " boards");
  }

  /**
   * Two pads of diameter 2r = 0.8 mm, 1 mm apart, a bar of 2r between them, and a track of 2h = 0.5
   * mm at a right angle from the first. The pads and the bar are 2r + πr²; the track's rectangle
   * above the bar's edge is all that it adds, its far end's half disc, and at the pad's open side
   * the corner between bar and pad that lies under it: the left half of the track leaves the disc
   * at sqrt(r² - x²), the right half the bar at r.
   */
  @Test
  void trackBesideABar_byHand() {
    double r = 0.4;
    double h = 0.25;
    double bar = 2 * r * 1 + Math.PI * r * r;
    double underLeftHalf = (h * Math.sqrt(r * r - h * h) + r * r * Math.asin(h / r)) / 2;
    double track = h * (5 - r) + (h * 5 - underLeftHalf) + Math.PI * h * h / 2;
    Artwork art = barAndTrack(2 * r, 2 * h, 5);
    // 2e-4 mm²: the polygons of the overlap, which is h·r less the part under the disc: 0.006 mm²
    assertEquals(bar + track, CopperArea.of(art, KEPT).get(0), 2e-4);
  }

  private static Artwork barAndTrack(double pad, double width, double length) {
    CopperBuilder b = new CopperBuilder();
    int first = b.drilled(Joint.Kind.NODE, Point.ORIGIN, pad, 0.3, 2, "U", "first");
    int last = b.drilled(Joint.Kind.NODE, new Point(1, 0), pad, 0.3, 2, "U", "last");
    int end = b.bare(Joint.Kind.NODE, new Point(0, length), 1, "U", "end");
    Feature link = new Feature(Feature.Kind.LINK, "U", 1, List.of());
    b.row(List.of(first, last), List.of(1), pad, "U", link);
    Path up = Path.of(new Line(Point.ORIGIN, new Point(0, length)));
    b.track(1, width, up, first, end, "U", new Feature(Feature.Kind.RADIAL, "U", 1, List.of()));
    Artwork toy = ToyBoards.twoLayers();
    return new Artwork(
        "Bar",
        "bar",
        "A",
        false,
        toy.stackup(),
        toy.profile(),
        b.joints(),
        b.conductors(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        1,
        0);
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
    Artwork art = drawn(Specs.turning(wheel, 6, true));
    List<Double> areas = CopperArea.of(art, KEPT);
    List<Double> even = CopperArea.of(drawn(Specs.turning(wheel, 6, false)), KEPT);
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
