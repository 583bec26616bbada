package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Two straight pieces, and shapes of few, against published closed forms. */
class PairSumTest {
  private static double mutual(double height, double[] a, double[] b) {
    List<CrossSection> sections = List.of(Bodies.thin(0), Bodies.thin(height));
    Filaments f = new Filaments();
    f.add(a[0], a[1], a[2], a[3], 0, 1);
    Filaments g = new Filaments();
    g.add(b[0], b[1], b[2], b[3], 1, 1);
    double m = Bodies.direct(f, g, sections);
    assertEquals(m, Bodies.direct(g, f, sections), 1e-4 * m, "both ways");
    return m;
  }

  /** Rosa 1908, two equal parallel filaments of 50 mm. */
  @ParameterizedTest(name = "{0} mm apart")
  @CsvSource({"1, 3.62507019e-8", "5, 2.09323539e-8", "20, 9.70198185e-9"})
  void parallel_rosa(double apart, double expected) {
    double side = mutual(0, new double[] {0, 0, 50, 0}, new double[] {0, apart, 50, apart});
    assertEquals(expected, side, 1e-7 * expected);
    double above = mutual(apart, new double[] {0, 0, 50, 0}, new double[] {0, 0, 50, 0});
    assertEquals(expected, above, 1e-7 * expected);
  }

  /** Neumann's closed form as in Grover 1946, chapter 6: staggered; in line, touching. */
  @Test
  void staggered_grover() {
    double m = mutual(0, new double[] {0, 0, 30, 0}, new double[] {10, 2, 30, 2});
    assertEquals(1.0094097e-8, m, 1e-7 * m);
    double line = mutual(0, new double[] {0, 0, 30, 0}, new double[] {30, 0, 50, 0});
    assertEquals(3.36505834e-9, line, 1e-5 * line);
  }

  /** Grover 1946, chapter 7: two filaments meeting at a point at 60 and at 30 degrees. */
  @Test
  void meeting_grover() {
    double a = Math.toRadians(60);
    double[] other = {0, 0, 6 * Math.cos(a), 6 * Math.sin(a)};
    double m = mutual(0, new double[] {0, 0, 10, 0}, other);
    assertEquals(8.29115e-10, m, 2e-3 * m);
    double b = Math.toRadians(30);
    other = new double[] {0, 0, 20 * Math.cos(b), 20 * Math.sin(b)};
    m = mutual(0, new double[] {0, 0, 20, 0}, other);
    assertEquals(5.479516e-9, m, 2e-3 * m);
  }

  /** Campbell 1915, Grover 1946, chapter 7: filaments in parallel planes at an angle. */
  @Test
  void skew_campbell() {
    double a = Math.toRadians(40);
    double m =
        mutual(
            1,
            new double[] {3, 0, 13, 0},
            new double[] {2 * Math.cos(a), 2 * Math.sin(a), 10 * Math.cos(a), 10 * Math.sin(a)});
    assertEquals(1.107533e-9, m, 1e-3 * m);
    double b = Math.toRadians(75);
    m =
        mutual(
            1.6,
            new double[] {-5, 0, 15, 0},
            new double[] {2 * Math.cos(b), 2 * Math.sin(b), 12 * Math.cos(b), 12 * Math.sin(b)});
    assertEquals(6.26684e-10, m, 2e-3 * m);
  }

  /** Hoer and Love, J. Res. NBS 69C (1965): exact self-inductance of a rectangular bar. */
  @ParameterizedTest(name = "{0} by {1} by {2} mm")
  @CsvSource({
    "10, 1, 0.035, 6.98638222e-9",
    "50, 0.2, 0.035, 6.55226929e-8",
    "10, 1, 1, 5.70425359e-9",
    "5, 2, 0.035, 2.21823989e-9"
  })
  void bar_hoerLove(double length, double width, double thickness, double expected) {
    List<CrossSection> sections = List.of(new CrossSection(width, thickness, 0));
    double whole = Bodies.direct(Bodies.polyline(1e9, 0, 0, 0, length, 0), sections);
    assertEquals(expected, whole, 1e-3 * expected);
    double cut = Bodies.direct(Bodies.polyline(width / 2, 0, 0, 0, length, 0), sections);
    assertEquals(whole, cut, 3e-4 * whole, "cut into pieces shorter than the width");
  }

  /** The same from filaments across the width. */
  @Test
  void wideBarOfStrips_hoerLove() {
    int strips = 10;
    List<CrossSection> sections = List.of(new CrossSection(2.0 / strips, 0.035, 0));
    Filaments f = new Filaments();
    for (int i = 0; i < strips; i++) {
      double y = 2 * (i + 0.5) / strips;
      f.add(0, y, 5, y, 0, 1.0 / strips);
    }
    assertEquals(2.21823989e-9, Bodies.direct(f, sections), 5e-4 * 2.21823989e-9);
  }

  /** A square section with the mean distance that Maxwell gives for a circle, r e^(-1/4). */
  private static CrossSection round(double radius) {
    double side = radius * Math.exp(-0.25) / (2 * 0.223525);
    return new CrossSection(side, side, 0);
  }

  /** Rosa 1908: straight round wire, 2 mm thick, 304.8 cm long; 4.8557 µH. */
  @Test
  void wire_rosa() {
    double l = Bodies.direct(Bodies.polyline(1e9, 0, 0, 0, 3048, 0), List.of(round(1)));
    assertEquals(4.8557e-6, l, 3e-4 * l);
  }

  /**
   * Rosa 1908: rectangle of round wire, in cm and nH 4 ((a + b) ln(2ab/r) - a ln(a + d) - b ln(b +
   * d) - 7/4 (a + b) + 2 (d + r)), d the diagonal; recalled. (Handbooks that leave out the last r
   * come 0.6 % lower here.)
   */
  @Test
  void rectangleOfWire_rosa() {
    double a = 3;
    double b = 2;
    double r = 0.05;
    double d = Math.hypot(a, b);
    double logs = (a + b) * Math.log(2 * a * b / r) - a * Math.log(a + d) - b * Math.log(b + d);
    double expected = 4e-9 * (logs - 1.75 * (a + b) + 2 * (d + r));
    Filaments f = Bodies.polyline(1e9, 0, 0, 0, 30, 0, 30, 20, 0, 20, 0, 0);
    assertEquals(expected, Bodies.direct(f, List.of(round(0.5))), 0.002 * expected);
  }

  /** Grover 1946: L = 0.2 l (ln(2 l / r) - α) nH, l the way round in mm, r the mean distance. */
  @ParameterizedTest(name = "{0} sides")
  @CsvSource({"4, 2.853", "6, 2.636"})
  void polygon_grover(int sides, double alpha) {
    double radius = 20;
    double way = sides * 2 * radius * Math.sin(Math.PI / sides);
    double r = Math.exp(MeanDistance.lnRectangles(0, 0, 0.1, 0.1, 0.1, 0.1));
    double expected = 0.2e-9 * way * (Math.log(2 * way / r) - alpha);
    List<CrossSection> sections = List.of(new CrossSection(0.1, 0.1, 0));
    double l = Bodies.direct(Bodies.polygon(sides, radius, 3, 0), sections);
    assertEquals(expected, l, 5e-4 * expected);
  }

  /** Maxwell, Rosa: circular loop, µ0 R (ln(8R/r) - 2), r the section's mean distance. */
  @Test
  void circle_maxwell() {
    double r = Math.exp(MeanDistance.lnRectangles(0, 0, 0.2, 0.035, 0.2, 0.035));
    double expected = 4e-10 * Math.PI * 20 * (Math.log(8 * 20 / r) - 2);
    List<CrossSection> sections = List.of(new CrossSection(0.2, 0.035, 0));
    assertEquals(expected, Bodies.direct(Bodies.circle(20, 0.01, 0), sections), 2e-4 * expected);
  }

  /** Flattening: a small ring of 32 chords, and one of 142. */
  @Test
  void chordErrorHardlyMatters() {
    List<CrossSection> sections = List.of(new CrossSection(0.2, 0.035, 0));
    double fine = Bodies.direct(Bodies.circle(2, 0.0005, 0), sections);
    assertEquals(fine, Bodies.direct(Bodies.circle(2, 0.01, 0), sections), 5e-4 * fine);
  }

  /** Circular 74 of the Bureau of Standards, Terman 1943: square loop of tape, 40 mm, 140.36 nH. */
  @Test
  void squareOfTape_terman() {
    Filaments f = Bodies.polyline(1e9, 0, 0, 0, 40, 0, 40, 40, 0, 40, 0, 0);
    double l = Bodies.direct(f, List.of(new CrossSection(1, 0.035, 0)));
    assertEquals(1.404e-7, l, 0.003 * l);
  }

  /** Rosa and Grover 1912: two equal coaxial squares, 40 mm, 2 mm apart. */
  @Test
  void coaxialSquares_rosaGrover() {
    List<CrossSection> sections = List.of(Bodies.thin(0), Bodies.thin(2));
    Filaments f = Bodies.polyline(1e9, 0, 0, 0, 40, 0, 40, 40, 0, 40, 0, 0);
    Filaments g = Bodies.polyline(1e9, 1, 0, 0, 40, 0, 40, 40, 0, 40, 0, 0);
    assertEquals(7.269157e-8, Bodies.direct(f, g, sections), 1e-4 * 7.269157e-8);
  }

  /**
   * Coaxial circles. Rosa and Grover, Bulletin of the Bureau of Standards 8 (1912), example A = 25,
   * a = 20, d = 10 cm: 248.787 cm (recalled; Maxwell's elliptic integrals agree); and Maxwell's own
   * M/µ0 for radii 1, 1 and 0.5, 2, 1 apart.
   */
  @ParameterizedTest(name = "{0} and {1}, {2} apart")
  @CsvSource({
    "250, 200, 100, 2.48787359e-7",
    "1000, 1000, 1000, 4.94078463e-7",
    "500, 2000, 1000, 1.76449238e-7"
  })
  void coaxialCircles_maxwell(double a, double b, double apart, double expected) {
    List<CrossSection> sections = List.of(Bodies.thin(0), Bodies.thin(apart));
    Filaments f = Bodies.circle(a, a * 1e-4, 0);
    Filaments g = Bodies.circle(b, b * 1e-4, 1);
    assertEquals(expected, Bodies.direct(f, g, sections), 1e-4 * expected);
  }
}
