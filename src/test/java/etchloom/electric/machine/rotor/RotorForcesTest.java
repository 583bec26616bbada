package etchloom.electric.machine.rotor;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.electric.field.GaussRule;
import etchloom.electric.field.MagnetArray;
import etchloom.spec.Spec;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class RotorForcesTest {
  private static final double MU_0 = 4e-7 * Math.PI;

  private static Spec.Magnet disc(double diameter, double pitch, double thickness) {
    return new Spec.Magnet(
        Spec.MagnetOutline.DISC,
        diameter,
        0,
        0,
        0,
        0,
        0,
        pitch,
        thickness,
        1.3,
        -0.0012,
        20,
        7500,
        80);
  }

  private static Spec.Rotor rotor(
      int poles, Spec.Magnet m, boolean two, double gap, boolean iron, OptionalDouble plate) {
    return new Spec.Rotor(
        poles, two, OptionalDouble.of(gap), Optional.of(m), OptionalDouble.empty(), iron, plate);
  }

  /** 7.5 g/cm³, 10 mm by 3 mm: 1.767 g; at 300 rad/s on 21 mm: m ω² r. */
  @Test
  void centrifugalPull() {
    MagnetPull p = MagnetPull.of(disc(10, 21, 3), 300);
    double kilogram = 7500 * Math.PI * 0.005 * 0.005 * 0.003;
    assertEquals(kilogram, p.kilogram(), 1e-12);
    assertEquals(kilogram * 300 * 300 * 0.021, p.newton(), 1e-9);
    assertEquals(p.newton() / (Math.PI * 0.005 * 0.005), p.shearPascal(), 1e-6);
  }

  /** Two rotors of discs by Coulomb's law between all faces: no field, no harmonics. */
  @Test
  void pullBetweenRotors() {
    Spec.Rotor r = rotor(4, disc(8, 9, 3), true, 1, false, OptionalDouble.empty());
    double want = coulomb(4, 4, 9, new double[] {0, 3}, new double[] {3.6, 6.6});
    double got = AxialPull.newton(MagnetArray.of(r, 1.6), 0);
    assertEquals(want, got, 3e-4 * want);
  }

  /** Iron on the far side pulls like a mirrored rotor twice as far off. */
  @Test
  void pullToIron() {
    Spec.Rotor r = rotor(4, disc(8, 9, 3), false, 0.8, false, OptionalDouble.of(0.6));
    double want = coulomb(4, 4, 9, new double[] {0, 3}, new double[] {6, 9});
    MagnetArray a = MagnetArray.of(r, 1.6);
    double got = AxialPull.newton(a, -0.8 - 0.6);
    assertEquals(want, got, 3e-4 * want);
  }

  /**
   * Force between two rotors of alternating discs, N.
   *
   * @param upper distances of the upper rotor's near and far face from its near face
   * @param lower distances of the lower rotor's near and far face from there
   */
  private static double coulomb(
      int poles, double radius, double pitch, double[] upper, double[] lower) {
    GaussRule rule = new GaussRule(12);
    int turns = 24;
    double sum = 0;
    for (int k = 0; k < poles; k++) {
      double a = 2 * Math.PI * k / poles;
      for (int f = 0; f < 2; f++) {
        for (int g = 0; g < 2; g++) {
          double d = lower[g] + upper[f];
          double sign = (k % 2 == 0 ? 1 : -1) * (f == g ? 1 : -1);
          double cx = pitch * (Math.cos(a) - 1);
          double cy = pitch * Math.sin(a);
          sum += sign * faces(rule, turns, radius, cx, cy, d);
        }
      }
    }
    double sigma = 1.3 / MU_0;
    return poles * MU_0 * sigma * sigma / (4 * Math.PI) * sum * 1e-6;
  }

  /** ∬∬ d/s³ over two discs, mm². */
  private static double faces(
      GaussRule rule, int turns, double radius, double cx, double cy, double d) {
    double sum = 0;
    for (int i = 0; i < rule.size(); i++) {
      double p = radius / 2 * (1 + rule.node(i));
      for (int j = 0; j < rule.size(); j++) {
        double q = radius / 2 * (1 + rule.node(j));
        double w = p * q * rule.weight(i) * rule.weight(j) * radius * radius / 4;
        for (int m = 0; m < turns; m++) {
          double s = 2 * Math.PI * m / turns;
          for (int n = 0; n < turns; n++) {
            double t = 2 * Math.PI * (n + 0.5) / turns;
            double x = cx + q * Math.cos(t) - p * Math.cos(s);
            double y = cy + q * Math.sin(t) - p * Math.sin(s);
            double r2 = x * x + y * y + d * d;
            sum += w * d / (r2 * Math.sqrt(r2));
          }
        }
      }
    }
    double step = 2 * Math.PI / turns;
    return sum * step * step;
  }

  /** Wide magnets between plates: B by the magnetic circuit, and B²A/2μ0; fringes take 1.5 %. */
  @Test
  void wideMagnetsByTheMagneticCircuit() {
    Spec.Magnet m =
        new Spec.Magnet(
            Spec.MagnetOutline.SECTOR,
            0,
            100,
            600,
            Math.PI * 0.999,
            0,
            0,
            0,
            5,
            1.3,
            -0.0012,
            20,
            7500,
            80);
    Spec.Rotor r = rotor(2, m, false, 1, true, OptionalDouble.of(0.4));
    double b = 1.3 * 5 / 8;
    double area = Math.PI * (0.6 * 0.6 - 0.1 * 0.1);
    double want = b * b * area / (2 * MU_0);
    assertEquals(want, AxialPull.newton(MagnetArray.of(r, 1.6), -0.8 - 0.4), 0.02 * want);
  }
}
