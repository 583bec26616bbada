package etchloom.electric.resistance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Stackup;
import etchloom.board.Assembler;
import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import etchloom.spec.Positions;
import etchloom.testing.Specs;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Tracks that widen, against the closed form of a strip with straight edges, from {@code dR = ρ
 * dx/(t w)} with w growing from a to b over the length L: {@code R = ρ L ln(b/a) / (t (b − a))}. A
 * standard exercise of texts on current in conductors (recalled), as for a truncated cone {@code ρ
 * L/(π a b)}. Copper: IEC 60028, 1/58 Ω mm²/m at 20 °C.
 */
class TracksTest {
  private static final double OHM_MM = 1 / 58e3;
  private static final double THICK_MM = 0.035;
  private static final Stackup.Copper STRAIGHT = new Stackup.Copper(THICK_MM, 1, 0);
  private static final Stackup.Copper ETCHED = new Stackup.Copper(THICK_MM, 1, 0.02);

  /** From a to b and back to a, in steps each as wide as the strip's middle there. */
  private static Conductor strip(double a, double b, double lengthMm, int steps) {
    PathBuilder path = new PathBuilder(Point.ORIGIN).lineTo(new Point(0, 1));
    List<Double> widths = new ArrayList<>(List.of(a));
    for (int i = 0; i < 2 * steps; i++) {
      int k = i < steps ? i : 2 * steps - 1 - i;
      path.lineTo(new Point((i + 1) * lengthMm / steps, 1));
      widths.add(a + (b - a) * (k + 0.5) / steps);
    }
    path.lineTo(path.at().plus(new Point(0, 1)));
    widths.add(a);
    Path line = path.build();
    Feature what = new Feature(Feature.Kind.SPIRAL, "U", 1, List.of());
    return new Conductor(0, 1, a, widths, line, 0, 1, "U", what);
  }

  @Test
  void aWideningStrip_resistsAsItsClosedForm() {
    double a = 0.2;
    double b = 1.1;
    double one = OHM_MM * 15 * Math.log(b / a) / (THICK_MM * (b - a));
    double ends = OHM_MM * 2 / (THICK_MM * a);
    double ohm = Tracks.ohm(strip(a, b, 15, 400), STRAIGHT, 20);
    assertEquals(2 * one + ends, ohm, 1e-5 * ohm);
    // Etched, both widths less by the undercut: the same form.
    double less = OHM_MM * 15 * Math.log((b - 0.02) / (a - 0.02)) / (THICK_MM * (b - a));
    double lessEnds = OHM_MM * 2 / (THICK_MM * (a - 0.02));
    ohm = Tracks.ohm(strip(a, b, 15, 400), ETCHED, 20);
    assertEquals(2 * less + lessEnds, ohm, 1e-5 * ohm);
  }

  @Test
  void toleranceMovesEveryWidth() {
    Conductor c = strip(0.2, 1.1, 15, 40);
    double drawn = Tracks.ohm(c, ETCHED, Variation.NONE, 20);
    double thin = Tracks.ohm(c, ETCHED, new Variation(0.9, 1, 1), 20);
    assertEquals(thin / drawn, Tracks.factor(Tracks.widths(c), ETCHED, 0.9), 1e-12);
    double little = Tracks.factor(Tracks.widths(c), ETCHED, 1 - 1e-6) - 1;
    assertEquals(little / 1e-6, Tracks.sensitivity(Tracks.widths(c), ETCHED), 1e-4);
  }

  /**
   * Every side of a drawn coil, from where its first step begins to where its last one does. The
   * steps lie inside the strip, so they resist more, by no more than the ratio of their widths.
   */
  @Test
  void drawnSides_resistAsStrips() {
    Artwork art =
        Assembler.assemble(
                Specs.turning(Specs.spec(Specs.wheel(2)), 6, true),
                Specs.fab(),
                Positions.unknown(""))
            .value()
            .orElseThrow()
            .artwork();
    int sides = 0;
    for (int id : art.coils().get(0).conductors()) {
      Conductor c = art.conductors().get(id);
      for (List<Tracks.Width> side : sides(c)) {
        double a = side.get(0).widthMm();
        double b = side.get(side.size() - 1).widthMm();
        double length = 0;
        double stepped = 0;
        double ratio = 1;
        for (int k = 0; k + 1 < side.size(); k++) {
          length += side.get(k).lengthMm();
          stepped += side.get(k).lengthMm() / side.get(k).widthMm();
          ratio = Math.max(ratio, side.get(k + 1).widthMm() / side.get(k).widthMm());
        }
        double strip = length * Math.log(b / a) / (b - a);
        assertTrue(ratio < 1.1, "ratio " + ratio);
        double more = stepped / strip - 1;
        assertTrue(more > 0 && more < 0.6 * (ratio - 1), more + " of " + ratio);
        sides++;
      }
    }
    assertEquals(2 * 2 * 6, sides);
  }

  /** The runs of lines wider than the rest, each from its narrow to its wide end. */
  private static List<List<Tracks.Width>> sides(Conductor c) {
    List<List<Tracks.Width>> out = new ArrayList<>();
    List<Tracks.Width> side = new ArrayList<>();
    for (int k = 0; k < c.widthsMm().size(); k++) {
      if (c.widthMm(k) > c.widthMm()) {
        side.add(new Tracks.Width(c.widthMm(k), c.path().segments().get(k).lengthMm()));
      } else if (!side.isEmpty()) {
        if (side.get(0).widthMm() > side.get(side.size() - 1).widthMm()) {
          java.util.Collections.reverse(side);
        }
        out.add(side);
        side = new ArrayList<>();
      }
    }
    return out;
  }
}
