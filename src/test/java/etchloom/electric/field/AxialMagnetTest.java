package etchloom.electric.field;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/**
 * Single magnets against textbook closed forms on their axes (charge model, permeability 1), and
 * against values from an independent quadrature of the surface charge off them.
 */
class AxialMagnetTest {
  private static final double PITCH = 100;

  private static double near(
      MagnetShape shape, double thick, double br, double x, double y, double z) {
    return new AxialMagnet(shape, -thick, 0, br).axialTesla(PITCH + x, y, z);
  }

  /** B = Br/2 [(z+h)/sqrt(R²+(z+h)²) − z/sqrt(R²+z²)]. */
  @Test
  void cylinderOnItsAxis() {
    MagnetShape disc = new DiscShape(PITCH, 5);
    double[][] known = {{0, 0.459619408}, {1, 0.371868344}, {2, 0.287522817}, {5, 0.121758266}};
    for (double[] k : known) {
      assertEquals(k[1], near(disc, 5, 1.30, 0, 0, k[0]), 1e-6 * k[1]);
    }
  }

  /** B = Br/π [F(z) − F(z+h)], F(t) = atan(ab / (2t sqrt(4t²+a²+b²))). */
  @Test
  void blockOnItsAxis() {
    MagnetShape cube = new BlockShape(PITCH, 10, 10);
    double[][] known = {{1, 0.360122348}, {2, 0.287476857}, {5, 0.133344185}};
    for (double[] k : known) {
      assertEquals(k[1], near(cube, 5, 1.30, 0, 0, k[0]), 1e-6 * k[1]);
    }
    MagnetShape bar = new BlockShape(PITCH, 20, 10);
    assertEquals(0.146152171, near(bar, 3, 1.20, 0, 0, 3), 1e-6 * 0.146152171);
  }

  @Test
  void blockOffItsAxisAndInside() {
    MagnetShape cube = new BlockShape(PITCH, 10, 10);
    assertEquals(0.28795, near(cube, 5, 1.30, 3, 2, 1.5), 5e-6 * 0.28795 + 5e-6);
    assertEquals(0.06247, near(cube, 5, 1.30, 5, 5, 1), 5e-6);
    assertEquals(-0.005556, near(cube, 5, 1.30, 8, 0, 2), 2e-4 * 0.005556);
    assertEquals(0.532565, near(cube, 5, 1.30, 0, 0, -2.5), 2e-6 * 0.532565);
  }

  @Test
  void sectorOverItsMiddle() {
    MagnetShape sector = new SectorShape(15, 30, Math.toRadians(30));
    double got = new AxialMagnet(sector, -4, 0, 1.30).axialTesla(22.5, 0, 1);
    assertEquals(0.277596, got, 1e-5 * 0.277596);
  }

  /** A slender magnet far off is a dipole: Bz = 2 Br V / (4π z³) on the axis. */
  @Test
  void farOffItIsADipole() {
    MagnetShape sector = new SectorShape(99, 101, 0.02);
    double volume = sector.areaMm2() * 2;
    double z = 300;
    double dipole = 2 * 1.2 * volume / (4 * Math.PI * z * z * z);
    double got = new AxialMagnet(sector, -1, 1, 1.2).axialTesla(sector.centroidMm(), 0, z);
    assertEquals(dipole, got, 1e-3 * dipole);
  }

  @Test
  void areasAndCentroids() {
    MagnetShape half = new SectorShape(1e-9, 10, Math.PI);
    assertEquals(Math.PI * 50, half.areaMm2(), 1e-6);
    // A half disc's centroid: 4R / 3π.
    assertEquals(40 / (3 * Math.PI), half.centroidMm(), 1e-9);
    assertEquals(25 * Math.PI, new DiscShape(21, 5).areaMm2(), 1e-9);
  }
}
