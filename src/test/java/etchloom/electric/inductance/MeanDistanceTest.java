package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MeanDistanceTest {
  private static double own(double width, double thickness) {
    return Math.exp(MeanDistance.lnRectangles(0, 0, width, thickness, width, thickness));
  }

  /** Lyle 1914, table I: mean distance of a rectangle from itself over the sum of its sides. */
  @ParameterizedTest(name = "sides as {0} to 1")
  @CsvSource({"0.05, 0.223455", "0.2, 0.223686", "1, 0.223525"})
  void rectangleFromItself_lyle(double ratio, double expected) {
    assertEquals(expected, own(ratio, 1) / (1 + ratio), 1e-5 * expected);
    assertEquals(expected, own(3, 3 * ratio) / (3 * (1 + ratio)), 1e-5 * expected);
  }

  /** Maxwell, Treatise, art. 692 (1): a line of length a has a·e^(-3/2). */
  @Test
  void thinStrip_maxwell() {
    assertEquals(Math.exp(-1.5), own(1, 1e-4), 5e-4 * 0.2231);
  }

  /** Rosa 1908: two equal coplanar strips touching edge to edge, ln R = ln w + 2 ln 2 - 3/2. */
  @Test
  void touchingStrips_rosa() {
    double expected = 2 * Math.log(2) - 1.5;
    assertEquals(expected, MeanDistance.lnRectangles(1, 0, 1, 1e-4, 1, 1e-4), 5e-4);
  }

  /** Maxwell, art. 692 (8): a circle from itself r·e^(-1/4), a thin ring its radius. */
  @Test
  void roundSections_maxwell() {
    assertEquals(2 * Math.exp(-0.25), MeanDistance.annulusMm(2, 0), 1e-12);
    assertEquals(2, MeanDistance.annulusMm(2, 1.9999), 1e-4);
  }

  /** The mean of the logarithm by midpoints over both sections. */
  @ParameterizedTest(name = "offset {0}, {1}")
  @CsvSource({"0.4, 0", "0.1, 0.235", "0.25, 0.1", "0, 0.9", "1.1, 0.4"})
  void rectanglesAgainstQuadrature(double x, double z) {
    double w1 = 0.19;
    double t1 = 0.035;
    double w2 = 0.29;
    double t2 = 0.03;
    int n = 24;
    double sum = 0;
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        double dx = x + w1 * ((i + 0.5) / n - 0.5) + w2 * ((j + 0.5) / n - 0.5);
        for (int k = 0; k < n; k++) {
          for (int l = 0; l < n; l++) {
            double dz = z + t1 * ((k + 0.5) / n - 0.5) + t2 * ((l + 0.5) / n - 0.5);
            sum += Math.log(dx * dx + dz * dz) / 2;
          }
        }
      }
    }
    assertEquals(sum / Math.pow(n, 4), MeanDistance.lnRectangles(x, z, w1, t1, w2, t2), 2e-4);
  }

  /** The tables against the closed form, across their end, and for images. */
  @Test
  void tables() {
    CrossSection a = new CrossSection(0.19, 0.035, 0.3);
    CrossSection b = new CrossSection(0.38, 0.03, 0.1);
    for (Mirror m : List.of(Mirror.NONE, new Mirror(-1, 0.7))) {
      Distances d = new Distances(List.of(a, b), m);
      for (int from = 0; from < 2; from++) {
        for (int to = 0; to < 2; to++) {
          CrossSection s = from == 0 ? a : b;
          CrossSection t = to == 0 ? a : b;
          double dz = m.heightMm(t.heightMm()) - s.heightMm();
          for (double x = -0.01; x < 1.6; x += 0.0317) {
            double ln =
                MeanDistance.lnRectangles(
                    x, dz, s.widthMm(), s.thicknessMm(), t.widthMm(), t.thicknessMm());
            assertEquals(ln, Math.log(d.squaredMm2(from, to, x)) / 2, 1e-3, "x = " + x);
          }
        }
      }
    }
  }
}
