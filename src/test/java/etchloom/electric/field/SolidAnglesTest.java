package etchloom.electric.field;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class SolidAnglesTest {
  /** Van Oosterom and Strackee 1983: an octant's triangle is an eighth of the sphere. */
  @Test
  void octant() {
    // The triangle (1,0,0) (0,1,0) (0,0,1) turned into a plane at the depth 1/sqrt 3.
    double s = Math.sqrt(2.0 / 3);
    double c = -s / 2;
    double y = s * Math.sqrt(3) / 2;
    double got = SolidAngles.triangle(s, 0, c, y, c, -y, 1 / Math.sqrt(3));
    assertEquals(Math.PI / 2, got, 1e-12);
  }

  /** A cube's face seen from the middle is a sixth of the sphere. */
  @Test
  void cubeFace() {
    double[] square = {-1, -1, 1, -1, 1, 1, -1, 1};
    assertEquals(4 * Math.PI / 6, SolidAngles.polygon(square, 0, 0, 0, 0, 1), 1e-12);
    assertEquals(-4 * Math.PI / 6, SolidAngles.polygon(square, 0.3, -0.2, 0, 0, -1), 1e-12);
  }

  /** On the axis a disc's angle is that of a cone: 2π (1 − cos of its half angle). */
  @Test
  void discOnItsAxisIsACone() {
    for (double h : new double[] {0.01, 0.5, 3, 40}) {
      double cone = 2 * Math.PI * (1 - h / Math.hypot(5, h));
      assertEquals(cone, SolidAngles.disc(5, 0, h), 1e-13);
      assertEquals(-cone, SolidAngles.disc(5, 0, -h), 1e-13);
    }
  }

  /** By another road: a fine polygon of the same area. */
  @Test
  void discOffItsAxisAgreesWithAPolygon() {
    int n = 20000;
    double step = 2 * Math.PI / n;
    double r = 5 * Math.sqrt(step / Math.sin(step));
    double[] xy = new double[2 * n];
    for (int i = 0; i < n; i++) {
      xy[2 * i] = r * Math.cos(i * step);
      xy[2 * i + 1] = r * Math.sin(i * step);
    }
    double[][] places = {{1, 0.7}, {4.9, 0.3}, {5, 0.3}, {5, 2}, {5.2, 0.3}, {9, 1}, {30, 4}};
    for (double[] p : places) {
      double polygon = SolidAngles.polygon(xy, 0, 0, p[0], 0, p[1]);
      assertEquals(polygon, SolidAngles.disc(5, p[0], p[1]), 2e-7, "at " + p[0] + ", " + p[1]);
    }
  }

  @Test
  void pointInTheDiscsPlaneCountsAsJustAbove() {
    assertEquals(2 * Math.PI, SolidAngles.disc(5, 1, 0), 0);
    assertEquals(0, SolidAngles.disc(5, 6, 0), 0);
  }
}
