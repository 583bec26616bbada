package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Multipole moments and the derivatives of 1/r. */
class ExpansionTest {
  private final Terms terms = Terms.all();

  private static double[] at(double x, double y, double z) {
    return new Expansion().derivatives(x, y, z).clone();
  }

  /** Each derivative is the central difference of the one with one power fewer. */
  @Test
  void derivatives_differences() {
    double[] p = {1.3, -0.7, 0.4};
    double h = 1e-5;
    double[] all = at(p[0], p[1], p[2]);
    assertEquals(1 / Math.sqrt(1.69 + 0.49 + 0.16), all[0], 1e-15);
    for (int m = 1; m < Terms.COUNT; m++) {
      for (int axis = 0; axis < 3; axis++) {
        if (terms.power(axis, m) > 0) {
          double[] up = p.clone();
          double[] down = p.clone();
          up[axis] += h;
          down[axis] -= h;
          int less = terms.oneLess(axis, m);
          double d =
              (at(up[0], up[1], up[2])[less] - at(down[0], down[1], down[2])[less]) / (2 * h);
          assertEquals(d, all[m], 1e-6 * (1 + Math.abs(d)), "term " + m + " axis " + axis);
        }
      }
    }
  }

  /** Clusters turned, against clusters of the turned filaments: same centres, same moments. */
  @Test
  void turnedMoments() {
    List<CrossSection> sections =
        List.of(new CrossSection(0.2, 0.03, 0.5), new CrossSection(0.3, 0.03, -0.5));
    Random random = new Random(7);
    Filaments f = new Filaments();
    for (int i = 0; i < 15; i++) {
      double x = random.nextDouble();
      double y = random.nextDouble();
      f.add(x, y, x + 0.3 * random.nextDouble(), y + 0.2 * random.nextDouble(), i % 2, 1);
    }
    double rad = 2.1;
    Filaments g = new Filaments();
    g.addTurned(f, rad, 1);
    Clusters turned = new Clusters(f, sections).turned(rad);
    Clusters built = new Clusters(g, sections);
    assertEquals(built.x[0], turned.x[0], 1e-12);
    assertEquals(built.y[0], turned.y[0], 1e-12);
    for (int m = 0; m < Expansion.VALUES; m++) {
      assertEquals(built.moment[m], turned.moment[m], 1e-12, "value " + m);
    }
    for (int i = 0; i < f.size(); i++) {
      assertEquals(built.pieces.qxy[i], turned.pieces.qxy[i], 1e-12);
      assertEquals(built.pieces.qxx[i], turned.pieces.qxx[i], 1e-12);
    }
  }
}
