package etchloom.electric.field;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Harmonics against the Fourier solutions of endless arrays, and against our own solid angles. */
class FieldHarmonicsTest {
  private static final double TAU = 12;
  private static final double BR = 1.3;

  /** Faces of one rotor above the height 0: near face at {@code gap}, thickness 5 mm. */
  private static List<ChargeSheet> oneSided(double gap) {
    return List.of(new ChargeSheet(gap, 1), new ChargeSheet(gap + 5, -1));
  }

  private static List<ChargeSheet> twoSided(double gap) {
    return List.of(
        new ChargeSheet(gap, 1),
        new ChargeSheet(gap + 5, -1),
        new ChargeSheet(-gap, -1),
        new ChargeSheet(-gap - 5, 1));
  }

  private static MagnetArray array(int p, double arc, List<ChargeSheet> sheets, IronPlanes iron) {
    double mid = TAU * p / Math.PI;
    MagnetShape shape = new SectorShape(mid - 50, mid + 50, arc * Math.PI / p);
    return new MagnetArray(shape, p, BR, sheets, iron);
  }

  /**
   * The first harmonic at the pole pitch 12 mm on ever larger wheels, carried on to an endless
   * straight array: the curvature's share falls as 1/radius².
   */
  private static double straight(double arc, List<ChargeSheet> sheets, IronPlanes iron, double z) {
    double a = at(100, arc, sheets, iron, z);
    double b = at(200, arc, sheets, iron, z);
    assertEquals(a, b, 2e-3 * Math.abs(b));
    return b + (b - a) / 3;
  }

  private static double at(int p, double arc, List<ChargeSheet> sheets, IronPlanes iron, double z) {
    return new FieldHarmonics(array(p, arc, sheets, iron), 1).at(TAU * p / Math.PI, z)[0];
  }

  private static IronPlanes planes(double above, double below) {
    return new IronPlanes(OptionalDouble.of(above), OptionalDouble.of(below));
  }

  /** (2 Br/π) sin(α π/2) e^(−πz/τ) (1 − e^(−πh/τ)), 2 mm off the faces; pointing down here. */
  @Test
  void openArray() {
    double full = straight(1, oneSided(2), IronPlanes.NONE, 0);
    assertEquals(-0.357846053, full, 2e-5 * 0.357846053);
    double part = straight(0.8, oneSided(2), IronPlanes.NONE, 0);
    assertEquals(-0.34033182, part, 2e-5 * 0.34033182);
  }

  @Test
  void twoFacingOpenArrays() {
    double mid = straight(1, twoSided(3), IronPlanes.NONE, 0);
    assertEquals(-0.55084346, mid, 2e-5 * 0.55084346);
  }

  /** An iron back doubles the magnet's thickness. */
  @Test
  void arrayOnIron() {
    IronPlanes back = new IronPlanes(OptionalDouble.of(7), OptionalDouble.empty());
    double got = straight(1, oneSided(2), back, 0);
    assertEquals(-0.454496993, got, 2e-5 * 0.454496993);
  }

  /** (4 Br/π) sinh(kh)/sinh(kG/2) cosh(kz), yoke to yoke 16 mm. */
  @Test
  void ironBackedPair() {
    assertEquals(-0.710394088, straight(1, twoSided(3), planes(8, -8), 0), 2e-5 * 0.71);
    assertEquals(-0.810018562, straight(1, twoSided(3), planes(8, -8), 2), 2e-5 * 0.81);
  }

  /** A magnet array facing an iron plate is one half of an iron-free pair facing each other. */
  @Test
  void counterPlateMirrorsTheArray() {
    MagnetArray plate =
        array(20, 0.8, oneSided(3), new IronPlanes(OptionalDouble.empty(), OptionalDouble.of(0)));
    MagnetArray pair = array(20, 0.8, twoSided(3), IronPlanes.NONE);
    double[] a = new FieldHarmonics(plate, 9).at(75, 0.5);
    double[] b = new FieldHarmonics(pair, 9).at(75, 0.5);
    for (int i = 0; i < 9; i++) {
      assertEquals(b[i], a[i], 1e-12);
    }
  }

  /** One pole pair between two plates: the slowest image series, by both roads. */
  @Test
  void twoPlatesAndOnePolePair() {
    MagnetShape shape = new SectorShape(6, 20, 0.7 * Math.PI);
    MagnetArray a = new MagnetArray(shape, 1, BR, oneSided(3), planes(8, -4));
    double want = a.axialTesla(10, 4, 0);
    double[] b = new FieldHarmonics(a, 60).at(Math.hypot(10, 4), 0);
    assertEquals(want, sum(b, 1, Math.atan2(4, 10)), 2e-5 * Math.abs(want));
  }

  /** Reluctance of a wide gap: magnet thickness over magnet and gap, all in iron. */
  @Test
  void wideMagnetsBetweenPlatesGiveTheMagneticCircuitsField() {
    MagnetShape shape = new SectorShape(100, 600, 0.999 * Math.PI);
    MagnetArray a = new MagnetArray(shape, 1, BR, oneSided(3), planes(8, 0));
    double circuit = -BR * 5 / 8;
    assertEquals(circuit, a.axialTesla(350, 0, 1), 2e-3 * Math.abs(circuit));
  }

  private static double sum(double[] b, int p, double angle) {
    double s = 0;
    for (int i = 0; i < b.length; i++) {
      s += b[i] * Math.cos((2 * i + 1) * p * angle);
    }
    return s;
  }

  /** The series added up gives the solid angles' field, for every outline, on and off magnets. */
  @Test
  void seriesAgreesWithSolidAngles() {
    MagnetShape[] shapes = {
      new DiscShape(21, 5),
      new SectorShape(14, 28, Math.toRadians(26)),
      new BlockShape(21, 12, 7),
      new BlockShape(21, 3, 9.5)
    };
    for (MagnetShape shape : shapes) {
      MagnetArray a = new MagnetArray(shape, 6, BR, oneSided(0.8), IronPlanes.NONE);
      FieldHarmonics h = new FieldHarmonics(a, 80);
      for (double r : new double[] {11, 15.9, 19.5, 21, 26.1, 31}) {
        double[] b = h.at(r, 0);
        for (double deg : new double[] {0, 3.1, 11, 14, 22, 61}) {
          double angle = Math.toRadians(deg);
          double want = a.axialTesla(r * Math.cos(angle), r * Math.sin(angle), 0);
          String what = shape + " r " + r + " angle " + deg;
          assertEquals(want, sum(b, 6, angle), 3e-5 * 0.3, what);
        }
      }
    }
  }

  /** The table over the radius keeps the harmonics. */
  @Test
  void tableAgreesWithTheHarmonics() {
    MagnetArray a = new MagnetArray(new DiscShape(21, 5), 6, BR, oneSided(1.4), IronPlanes.NONE);
    RotorField f = new RotorField(a, new double[] {0.58, -0.58}, 12, 34);
    FieldHarmonics h = new FieldHarmonics(a, f.orders());
    double[] got = new double[f.orders()];
    for (double r = 12.03; r < 34; r += 0.37) {
      double[] want = h.at(r, 0.58);
      f.amplitudes(1, r, got);
      for (int i = 0; i < want.length; i++) {
        assertEquals(want[i], got[i], 2e-4 * 0.4, "r " + r + " order " + i);
      }
    }
  }

  /** Tables by distance lose no image, with plates close by and magnets wide beside the gap. */
  @Test
  void tableBetweenPlatesAgreesWithTheHarmonics() {
    MagnetArray[] arrays = {
      new MagnetArray(new SectorShape(20, 60, 0.9 * Math.PI), 1, BR, oneSided(1), planes(6, -1)),
      new MagnetArray(new DiscShape(21, 5), 6, BR, twoSided(1.4), planes(6.4, -6.4))
    };
    for (MagnetArray a : arrays) {
      double[] height = {0.3, -0.3};
      RotorField f = new RotorField(a, height, 12, 34, 5);
      FieldHarmonics h = new FieldHarmonics(a, 5);
      double[] got = new double[5];
      for (int layer = 1; layer <= 2; layer++) {
        for (double r = 12.03; r < 34; r += 1.37) {
          double[] want = h.at(r, height[layer - 1]);
          f.amplitudes(layer, r, got);
          for (int i = 0; i < 5; i++) {
            assertEquals(want[i], got[i], 2e-4, "L" + layer + " r " + r + " order " + i);
          }
        }
      }
    }
  }

  /** A north face looking down on L1 sends its field down. */
  @Test
  void northFaceOverTheBoardMakesADownwardField() {
    MagnetArray a = new MagnetArray(new DiscShape(21, 5), 6, BR, oneSided(0.8), IronPlanes.NONE);
    assertTrue(a.axialTesla(21, 0, 0) < -0.3);
    assertTrue(new FieldHarmonics(a, 1).at(21, 0)[0] < -0.3);
  }

  /**
   * No current flows in the gap: the radial field's rise with height is the axial one's outwards.
   */
  @Test
  void radialFieldHasNoCurl() {
    MagnetShape shape = new DiscShape(21, 5);
    MagnetArray[] arrays = {
      new MagnetArray(shape, 6, BR, oneSided(1.4), IronPlanes.NONE),
      new MagnetArray(shape, 6, BR, twoSided(1.4), planes(6.4, -6.4))
    };
    for (MagnetArray a : arrays) {
      FieldHarmonics h = new FieldHarmonics(a, 3);
      for (double r : new double[] {14, 17, 25}) {
        double e = 1e-3;
        double[] up = h.radialAt(r, 0.2 + e);
        double[] down = h.radialAt(r, 0.2 - e);
        double[] out = h.at(r + e, 0.2);
        double[] in = h.at(r - e, 0.2);
        for (int i = 0; i < 3; i++) {
          double want = (out[i] - in[i]) / (2 * e);
          assertEquals(want, (up[i] - down[i]) / (2 * e), 1e-4 * Math.abs(want) + 1e-6);
        }
      }
    }
  }

  /** The radial field itself, by Coulomb's law over the faces' charge. */
  @Test
  void radialFieldAgreesWithCoulombsLaw() {
    MagnetArray a = new MagnetArray(new DiscShape(21, 5), 2, BR, oneSided(1.4), IronPlanes.NONE);
    double[] b = new FieldHarmonics(a, 60).radialAt(18, 0);
    for (double angle : new double[] {0, 0.1, 0.5}) {
      double want = 0;
      for (ChargeSheet s : a.sheets()) {
        for (int k = 0; k < 4; k++) {
          want += (k % 2 == 0 ? 1 : -1) * s.charge() * coulomb(angle - k * Math.PI / 2, s);
        }
      }
      assertEquals(want, sum(b, 2, angle), 1e-4 * 0.3, "angle " + angle);
    }
  }

  private static double coulomb(double angle, ChargeSheet sheet) {
    double x = 18 * Math.cos(angle);
    double y = 18 * Math.sin(angle);
    int n = 400;
    double sum = 0;
    for (int i = 0; i < n; i++) {
      double q = 5 * (i + 0.5) / n;
      for (int j = 0; j < n; j++) {
        double t = 2 * Math.PI * (j + 0.5) / n;
        double dx = x - 21 - q * Math.cos(t);
        double dy = y - q * Math.sin(t);
        double d3 = Math.pow(dx * dx + dy * dy + sheet.heightMm() * sheet.heightMm(), 1.5);
        sum += (dx * Math.cos(angle) + dy * Math.sin(angle)) / d3 * q;
      }
    }
    return BR / (4 * Math.PI) * sum * 5.0 / n * 2 * Math.PI / n;
  }
}
