package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Sums by clusters against sums over every pair. */
class ClustersTest {
  private static final List<CrossSection> SECTIONS =
      List.of(
          new CrossSection(0.2, 0.035, 0.58),
          new CrossSection(0.2, 0.03, 0.36),
          new CrossSection(0.4, 0.03, -0.36));

  /** Closed polygons of random corners on random layers. */
  private static Filaments polygons(long seed, int count) {
    Random random = new Random(seed);
    Filaments out = new Filaments();
    for (int k = 0; k < count; k++) {
      double cx = 30 * random.nextDouble();
      double cy = 20 * random.nextDouble();
      int corners = 3 + random.nextInt(6);
      double[] xy = new double[2 * corners + 2];
      for (int i = 0; i < corners; i++) {
        double a = 2 * Math.PI * (i + random.nextDouble()) / corners;
        double r = 1 + 8 * random.nextDouble();
        xy[2 * i] = cx + r * Math.cos(a);
        xy[2 * i + 1] = cy + r * Math.sin(a);
      }
      xy[2 * corners] = xy[0];
      xy[2 * corners + 1] = xy[1];
      double ampere = random.nextBoolean() ? 1 : -0.5;
      out.addTurned(Bodies.polyline(0.6, random.nextInt(3), xy), 0, ampere);
    }
    return out;
  }

  @ParameterizedTest(name = "seed {0}")
  @ValueSource(longs = {1, 2, 3})
  void randomPolygons(long seed) {
    Filaments f = polygons(seed, 40);
    Filaments g = polygons(seed + 100, 30);
    double self = Bodies.direct(f, SECTIONS);
    assertEquals(self, Bodies.clustered(f, SECTIONS), 1e-3 * self);
    double scale = Math.sqrt(self * Bodies.direct(g, SECTIONS));
    for (Mirror m :
        List.of(Mirror.NONE, new Mirror(-1, 3), new Mirror(1, 12), new Mirror(1, -40))) {
      double mutual = Bodies.direct(f, g, SECTIONS, m);
      assertEquals(mutual, Bodies.clustered(f, g, SECTIONS, m), 3e-4 * scale, m.toString());
    }
    assertTrue(self > 0);
  }

  /** A spiral like a coil's: much the better case, and the one that counts. */
  @Test
  void nestedWedges() {
    Filaments f = wedges(20, 3);
    double self = Bodies.direct(f, SECTIONS);
    assertEquals(self, Bodies.clustered(f, SECTIONS), 1e-4 * self);
    Filaments next = new Filaments();
    next.addTurned(f, Math.toRadians(40), 1);
    double mutual = Bodies.direct(f, next, SECTIONS);
    assertEquals(mutual, Bodies.clustered(f, next, SECTIONS, Mirror.NONE), 1e-3 * -mutual);
    assertTrue(mutual < 0, "side by side they oppose each other");
  }

  static Filaments wedges(int turns, int layers) {
    Filaments f = new Filaments();
    for (int layer = 0; layer < layers; layer++) {
      for (int k = 0; k < turns; k++) {
        double in = 0.2 + 0.4 * k;
        double off = in / Math.cos(Math.toRadians(20));
        double ya = Math.max(0.2, (12 + in) * Math.tan(Math.toRadians(20)) - off);
        double yb = (30 - in) * Math.tan(Math.toRadians(20)) - off;
        double a = 12 + in;
        double b = 30 - in;
        f.addTurned(Bodies.polyline(0.6, layer, a, -ya, b, -yb, b, yb, a, ya, a, -ya), 0, 1);
      }
    }
    return f;
  }

  /**
   * A coil mirrored in the plane and walked as its path then runs: the same inductance, the flux
   * through a ring the other way; with its current reversed the first sign again.
   */
  @Test
  void mirroredCoil() {
    Filaments coil = wedges(10, 2);
    Filaments mirrored = new Filaments();
    Filaments reversed = new Filaments();
    for (int i = 0; i < coil.size(); i++) {
      double dx = coil.ux(i) * coil.length(i) / 2;
      double dy = coil.uy(i) * coil.length(i) / 2;
      double x = coil.x(i);
      double y = -coil.y(i);
      mirrored.add(x - dx, y + dy, x + dx, y - dy, coil.section(i), 1);
      reversed.add(x + dx, y - dy, x - dx, y + dy, coil.section(i), 1);
    }
    double self = Bodies.clustered(coil, SECTIONS);
    assertEquals(self, Bodies.clustered(mirrored, SECTIONS), 2e-5 * self);
    Filaments ring = Bodies.circle(35, 0.02, 2);
    double flux = Bodies.clustered(coil, ring, SECTIONS, Mirror.NONE);
    assertTrue(flux > 0, "counter-clockwise within counter-clockwise");
    assertEquals(-flux, Bodies.clustered(mirrored, ring, SECTIONS, Mirror.NONE), 1e-3 * flux);
    assertEquals(flux, Bodies.clustered(reversed, ring, SECTIONS, Mirror.NONE), 1e-3 * flux);
  }

  /** Both ways round the same, whichever body comes first. */
  @Test
  void mutualIsSymmetric() {
    Filaments f = polygons(5, 20);
    Filaments g = polygons(6, 20);
    double one = Bodies.clustered(f, g, SECTIONS, Mirror.NONE);
    double other = Bodies.clustered(g, f, SECTIONS, Mirror.NONE);
    assertEquals(one, other, 1e-5 * Bodies.direct(f, SECTIONS));
  }

  /**
   * Running it again changes nothing; another order of the filaments only which of two equally long
   * ones takes the quadrature.
   */
  @Test
  void sameEveryTime() {
    Filaments f = polygons(8, 30);
    double first = Bodies.clustered(f, SECTIONS);
    for (int i = 0; i < 5; i++) {
      assertEquals(first, Bodies.clustered(f, SECTIONS), 0, "bit for bit");
    }
    List<Integer> order = new ArrayList<>();
    for (int i = f.size() - 1; i >= 0; i--) {
      order.add(i);
    }
    Filaments back = new Filaments();
    for (int i : order) {
      double dx = f.ux(i) * f.length(i) / 2;
      double dy = f.uy(i) * f.length(i) / 2;
      back.add(f.x(i) - dx, f.y(i) - dy, f.x(i) + dx, f.y(i) + dy, f.section(i), f.ampere(i));
    }
    assertEquals(first, Bodies.clustered(back, SECTIONS), 1e-4 * first);
  }

  /** Many filaments in one place end in a tree all the same. */
  @Test
  void allInOnePlace() {
    Filaments f = new Filaments();
    for (int i = 0; i < 500; i++) {
      f.add(1, 1, 2, 1, 0, 1);
    }
    double one = Bodies.direct(Bodies.polyline(9, 0, 1, 1, 2, 1), SECTIONS);
    assertEquals(250_000 * one, Bodies.clustered(f, SECTIONS), 1e-9 * 250_000 * one);
  }
}
