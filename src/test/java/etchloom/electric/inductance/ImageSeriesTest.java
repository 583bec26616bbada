package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import etchloom.electric.field.IronPlanes;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Iron planes. */
class ImageSeriesTest {
  private static IronPlanes planes(double above, double below) {
    return new IronPlanes(
        Double.isNaN(above) ? OptionalDouble.empty() : OptionalDouble.of(above),
        Double.isNaN(below) ? OptionalDouble.empty() : OptionalDouble.of(below));
  }

  /** What the images add to a body's self-inductance. */
  private static double images(Filaments f, List<CrossSection> sections, IronPlanes iron) {
    Clusters c = new Clusters(f, sections);
    double[] sum =
        ImageSeries.sum(
            iron,
            1,
            mirrors -> {
              Sums sums = new Sums();
              mirrors.forEach(m -> sums.add(c, c, m, new Distances(sections, m)));
              double total = 0;
              for (double v : sums.run()) {
                total += v;
              }
              return new double[] {total};
            });
    return Bodies.HENRY_A_MM * sum[0];
  }

  /**
   * A ring over ideal iron, by Maxwell's coaxial circles with an image at twice the height: L over
   * L without iron; R = 20 mm, tape of 1 by 0.035 mm. The ratio takes the image for a thin circle,
   * so it is held with a thin section; what the tape's own width adds, about 1 % at half a width
   * from the iron and next to nothing farther off, is held against strips below.
   */
  @ParameterizedTest(name = "{0} mm")
  @CsvSource({"5, 1.19503512", "2, 1.37756018", "0.5, 1.67789556"})
  void ringOverIron_maxwell(double height, double ratio) {
    List<CrossSection> sections = List.of(new CrossSection(1, 0.035, 0));
    Filaments f = Bodies.circle(20, 0.05, 0);
    double alone = Bodies.direct(f, sections);
    assertEquals(1.14093389e-7, alone, 1e-3 * alone);
    List<CrossSection> thin = List.of(new CrossSection(0.01, 0.01, 0));
    double image = images(f, thin, planes(Double.NaN, -height));
    assertEquals(ratio, 1 + image / alone, 1e-3 * ratio);
    assertEquals(image, images(f, thin, planes(height, Double.NaN)), 1e-9 * image);
    if (height > 1) {
      double tape = images(f, sections, planes(Double.NaN, -height));
      assertEquals(ratio, 1 + tape / alone, 1e-3 * ratio);
    }
  }

  /** Half a width from the iron: the tape's section against strips of the same tape. */
  @Test
  void nearIron_strips() {
    int strips = 8;
    List<CrossSection> whole = List.of(new CrossSection(1, 0.035, 0));
    List<CrossSection> narrow = List.of(new CrossSection(1.0 / strips, 0.035, 0));
    Filaments f = new Filaments();
    for (int i = 0; i < strips; i++) {
      f.addTurned(Bodies.circle(20 + (i + 0.5) / strips - 0.5, 0.01, 0), 0, 1.0 / strips);
    }
    IronPlanes iron = planes(0.5, Double.NaN);
    double expected = images(f, narrow, iron);
    assertEquals(expected, images(Bodies.circle(20, 0.05, 0), whole, iron), 1e-3 * expected);
  }

  /** Towards the iron a coil of no height comes to twice its inductance. */
  @Test
  void onIron_twice() {
    List<CrossSection> sections = List.of(new CrossSection(1, 0.035, 0));
    Filaments f = Bodies.circle(20, 0.05, 0);
    double alone = Bodies.clustered(f, sections);
    assertEquals(2 * alone, alone + images(f, sections, planes(0, Double.NaN)), 1e-6 * alone);
  }

  /** A ring midway between two plates 10 mm apart, images at every 10 mm: 1.8084 (series). */
  @Test
  void ringBetweenPlates() {
    List<CrossSection> sections = List.of(new CrossSection(1, 0.035, 0));
    Filaments f = Bodies.circle(20, 0.05, 0);
    double alone = Bodies.direct(f, sections);
    double with = alone + images(f, sections, planes(5, -5));
    assertEquals(1.8084, with / alone, 1e-3 * 1.8084);
  }

  /** Images against copies of the body at the images' places, many of them. */
  @Test
  void betweenPlates_copies() {
    List<CrossSection> one =
        List.of(new CrossSection(0.3, 0.035, 0.4), new CrossSection(0.3, 0.035, -0.6));
    Filaments f =
        Bodies.all(Bodies.polygon(5, 8, 0.5, 0), Bodies.polygon(3, 10, 0.5, 1), ring(9, 1));
    double above = 2;
    double below = -3;
    double sum = 0;
    for (int k = -60; k <= 60; k++) {
      for (int sign = -1; sign <= 1; sign += 2) {
        double shift = 2 * k * (above - below) + (sign < 0 ? 2 * above : 0);
        if (sign > 0 && k == 0) {
          continue;
        }
        // Sections moved to the image's height; the bodies are the same seen from above.
        List<CrossSection> all =
            List.of(
                one.get(0),
                one.get(1),
                moved(one.get(0), sign, shift),
                moved(one.get(1), sign, shift));
        sum += Bodies.direct(f, raised(f), all);
      }
    }
    double images = images(f, one, planes(above, below));
    assertEquals(sum, images, 5e-4 * (images + Bodies.direct(f, one)));
  }

  private static Filaments ring(double r, int section) {
    return Bodies.circle(r, 0.05, section);
  }

  private static CrossSection moved(CrossSection s, int sign, double shift) {
    return new CrossSection(s.widthMm(), s.thicknessMm(), sign * s.heightMm() + shift);
  }

  private static Filaments raised(Filaments f) {
    Filaments out = new Filaments();
    for (int i = 0; i < f.size(); i++) {
      double dx = f.ux(i) * f.length(i) / 2;
      double dy = f.uy(i) * f.length(i) / 2;
      out.add(f.x(i) - dx, f.y(i) - dy, f.x(i) + dx, f.y(i) + dy, f.section(i) + 2, f.ampere(i));
    }
    return out;
  }

  /** Square spiral of 8 turns 1 mm from iron: a sum of bars with images apart from this code. */
  @Test
  void spiralOverIron() {
    List<CrossSection> sections = List.of(new CrossSection(0.3, 0.035, 0));
    double pitch = 0.5;
    double d = 20 - 0.3;
    double[] xy = new double[2 * 33];
    int[][] way = {{1, 0}, {0, 1}, {-1, 0}, {0, -1}};
    for (int i = 0; i < 32; i++) {
      double length = d - (i < 3 ? 0 : (i - 1) / 2) * pitch;
      xy[2 * i + 2] = xy[2 * i] + way[i % 4][0] * length;
      xy[2 * i + 3] = xy[2 * i + 1] + way[i % 4][1] * length;
    }
    Filaments f = Bodies.polyline(0.9, 0, xy);
    double alone = Bodies.direct(f, sections);
    double with = alone + images(f, sections, planes(1, Double.NaN));
    assertEquals(1.5651, with / alone, 0.003 * 1.5651);
  }

  @Test
  void platesInTheWrongOrder_refused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> ImageSeries.sum(planes(-1, 1), 1, m -> new double[] {0}));
  }
}
