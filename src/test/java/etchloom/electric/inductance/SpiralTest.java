package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Planar spirals and coils against published expressions and measurements. */
class SpiralTest {
  /** Square spiral, corner to corner on the centre line: sides D, D, D, D - p, D - p, D - 2p … */
  private static Filaments square(double sides, double longestSide, double pitch, double longest) {
    List<Double> xy = new ArrayList<>(List.of(0.0, 0.0));
    int[][] way = {{1, 0}, {0, 1}, {-1, 0}, {0, -1}};
    double x = 0;
    double y = 0;
    for (int i = 0; i < sides; i++) {
      double length = longestSide - (i < 3 ? 0 : (i - 1) / 2) * pitch;
      x += way[i % 4][0] * length;
      y += way[i % 4][1] * length;
      xy.add(x);
      xy.add(y);
    }
    double[] flat = xy.stream().mapToDouble(Double::doubleValue).toArray();
    return Bodies.polyline(longest, 0, flat);
  }

  /**
   * S. S. Mohan et al., "Simple accurate expressions for planar spiral inductances", IEEE JSSC 34
   * (1999): the current-sheet expression, equation 2 with the square's coefficients (1.27, 2.07,
   * 0.18, 0.13), good to a few per cent; and measured values of table IV (as transcribed in open
   * benchmark data; leads and substrate are in them). Last column: a sum of exact bars for the same
   * layout, computed apart from this code.
   */
  @ParameterizedTest(name = "{0} turns, {1} um")
  @CsvSource({
    "2.75, 344, 29.7, 1.9, 3.2e-9, 0.08, 2.98333571e-9",
    "3.75, 292, 13, 1.9, 6.0e-9, 0.03, 5.98953414e-9",
    "7, 300, 13, 7, 8.0e-9, 0.06, 7.64332188e-9",
    "4, 300, 5, 4, 9.2e-9, 0.07, 9.66251614e-9",
    "9, 210, 6.5, 5.5, 7.7e-9, 0.05, 7.41415739e-9",
    "6.5, 217, 5.4, 1.9, 12.5e-9, 0.06, 12.0235966e-9"
  })
  void squareSpiral_mohan(
      double n,
      double outerUm,
      double wUm,
      double sUm,
      double measured,
      double measuredTolerance,
      double bars) {
    double pitch = (wUm + sUm) / 1000;
    double outer = outerUm / 1000;
    Filaments f = square(4 * n, outer - wUm / 1000, pitch, 3 * wUm / 1000);
    List<CrossSection> sections = List.of(new CrossSection(wUm / 1000, 0.001, 0));
    double l = Bodies.direct(f, sections);
    double inner = outerUm - 2 * n * wUm - 2 * (n - 1) * sUm;
    double mean = (outerUm + inner) / 2 * 1e-6;
    double rho = (outerUm - inner) / (outerUm + inner);
    double sheet =
        4e-7
            * Math.PI
            * n
            * n
            * mean
            * 1.27
            / 2
            * (Math.log(2.07 / rho) + 0.18 * rho + 0.13 * rho * rho);
    assertEquals(sheet, l, 0.03 * sheet);
    assertEquals(measured, l, measuredTolerance * measured);
    assertEquals(bars, l, 0.005 * bars);
    assertEquals(l, Bodies.clustered(f, sections), 1e-3 * l);
  }

  /** The same source, circle (1, 2.46, 0, 0.2): rings of tape stand for the spiral. */
  @ParameterizedTest(name = "{0} turns")
  @CsvSource({"8, 20, 0.3, 0.2, 1.5170144e-6", "10, 30, 0.5, 0.3, 2.75441325e-6"})
  void rings_mohan(int n, double outer, double w, double s, double rings) {
    List<CrossSection> sections = List.of(new CrossSection(w, 0.035, 0));
    Filaments f = new Filaments();
    for (int k = 0; k < n; k++) {
      double r = (outer - w) / 2 - k * (w + s);
      f.addTurned(Bodies.circle(r, 0.1 * w, 0), 0, 1);
    }
    double l = Bodies.direct(f, sections);
    double inner = outer - 2 * n * w - 2 * (n - 1) * s;
    double rho = (outer - inner) / (outer + inner);
    double sheet =
        4e-10 * Math.PI * n * n * (outer + inner) / 4 * (Math.log(2.46 / rho) + 0.2 * rho * rho);
    assertEquals(sheet, l, 0.03 * sheet);
    // Maxwell's mutual inductances averaged over the widths, computed apart from this code.
    assertEquals(rings, l, 0.003 * rings);
    assertEquals(l, Bodies.clustered(f, sections), 1e-3 * l);
  }

  /**
   * Aebischer, Advanced Electromagnetics 8 (2019), closed form for square spirals on boards; track
   * and gap 0.7 mm, terminals in the middle of a side.
   */
  @ParameterizedTest(name = "{0} turns")
  @CsvSource({"5, 38.8, 2.35438946e-6", "15, 10.8, 7.01139823e-6"})
  void boardSpiral_aebischer(int n, double innerSide, double expected) {
    double pitch = 1.4;
    List<Double> xy = new ArrayList<>();
    double outer = innerSide / 2 + (n - 1) * pitch;
    xy.addAll(List.of(0.0, -outer));
    for (int turn = 0; turn < n; turn++) {
      double h = outer - turn * pitch;
      xy.addAll(List.of(h, -h, h, h, -h, h, -h, pitch - h, 0.0, pitch - h));
    }
    Filaments f = Bodies.polyline(2.1, 0, xy.stream().mapToDouble(Double::doubleValue).toArray());
    double length = 0;
    for (int i = 0; i < f.size(); i++) {
      length += f.length(i);
    }
    assertEquals(
        4 * n * innerSide + (4 * n * n - 5 * n) * pitch, length, 1e-9, "the paper's length");
    double l = Bodies.direct(f, List.of(new CrossSection(0.7, 0.035, 0)));
    assertEquals(expected, l, 0.01 * expected);
  }

  /**
   * Two layers of five nested trapezoids, 1.6 mm apart: a filament computation apart from this code
   * (not published).
   */
  @Test
  void wedgeLayers() {
    List<CrossSection> sections =
        List.of(new CrossSection(0.3, 0.035, 0), new CrossSection(0.3, 0.035, 1.6));
    Filaments[] layer = {new Filaments(), new Filaments()};
    double length = 0;
    for (int s = 0; s < 2; s++) {
      for (int k = 0; k < 5; k++) {
        double in = 0.5 + 0.5 * k;
        double a = 15 + in;
        double b = 30 - in;
        double t = Math.tan(Math.toRadians(18));
        double off = in / Math.cos(Math.toRadians(18));
        double ya = a * t - off;
        double yb = b * t - off;
        Filaments f = Bodies.polyline(0.9, s, a, -ya, b, -yb, b, yb, a, ya, a, -ya);
        for (int i = 0; s == 0 && i < f.size(); i++) {
          length += f.length(i);
        }
        layer[s].addTurned(f, 0, 1);
      }
    }
    assertEquals(240.8455, length, 1e-3);
    assertEquals(5.6019e-7, Bodies.direct(layer[0], sections), 0.01 * 5.6019e-7);
    double m = Bodies.direct(layer[0], layer[1], sections);
    assertEquals(2.863e-7, m, 0.005 * 2.863e-7);
    Filaments reversed = new Filaments();
    reversed.addTurned(layer[1], 0, -1);
    double both = Bodies.direct(Bodies.all(layer[0], reversed), sections);
    assertTrue(both < 2 * 5.6019e-7, "layers against each other");
  }
}
