package etchloom.electric.machine.emf;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.artwork.Artwork;
import etchloom.artwork.Coil;
import etchloom.artwork.Conductor;
import etchloom.electric.field.AxialField;
import etchloom.electric.field.FieldHarmonics;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.field.RotorField;
import etchloom.electric.machine.TestMachine;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.winding.Winding;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The drawn copper in a rotor's field, each figure by a second road. */
class CouplingTest {
  private static TestMachine wheel;
  private static MagnetArray magnets;
  private static RotorField field;
  private static Coupling coupling;

  @BeforeAll
  static void drawTheFilterWheelWithFourTurns() {
    wheel = TestMachine.of("filter-wheel", "turns: fill ", "turns: 4 ");
    magnets = magnets(wheel);
    field = field(wheel, magnets);
    coupling = Coupling.of(wheel.assembly().artwork(), field);
  }

  private static MagnetArray magnets(TestMachine m) {
    return MagnetArray.of(m.spec().rotor(), m.assembly().artwork().stackup().thicknessMm());
  }

  private static RotorField field(TestMachine m, MagnetArray magnets) {
    Artwork art = m.assembly().artwork();
    double[] height = new double[art.layers()];
    for (int i = 0; i < height.length; i++) {
      height[i] = art.stackup().heightMm(i + 1);
    }
    RadialReach reach = RadialReach.of(art);
    return new RotorField(magnets, height, reach.innerMm(), reach.outerMm());
  }

  private static Conductor spiral(int coil, int layer) {
    Artwork art = wheel.assembly().artwork();
    return art.conductors().get(art.coils().get(coil - 1).conductors().get(layer - 1));
  }

  /** A field with one harmonic, the same everywhere: {@code B cos P(φ − θ)}. */
  private record Cosine(int polePairs, double tesla) implements AxialField {
    @Override
    public int orders() {
      return 1;
    }

    @Override
    public void amplitudes(int layer, double radiusMm, double[] out) {
      out[0] = tesla;
    }

    @Override
    public double scaleMm(int layer) {
      return 1;
    }
  }

  private static Path sector(double inner, double outer, double span) {
    Point a = Point.polar(inner, -span / 2);
    Point b = Point.polar(outer, -span / 2);
    Point c = Point.polar(outer, span / 2);
    Point d = Point.polar(inner, span / 2);
    return Path.of(
        new Line(a, b),
        new Arc(b, c, Point.ORIGIN, true),
        new Line(c, d),
        new Arc(d, a, Point.ORIGIN, false));
  }

  private static FluxSeries along(AxialField f, int layer, Path path) {
    return new PathIntegrator(f, PathIntegrator.PANEL).along(layer, path).series(f.polePairs());
  }

  /** Check values EMF-1 and EMF-2: a sector turn r 15..30 mm, 18°, 0.5 T, 8 pole pairs; exact. */
  @Test
  void sectorTurnInACosine() {
    FluxSeries s = along(new Cosine(8, 0.5), 1, sector(15, 30, Math.toRadians(18)));
    assertEquals(4.01226968e-05, s.amplitude(0) / 8, 1e-9 * 4.0e-5);
    assertEquals(0.000320981574, s.amplitude(0), 1e-9 * 3.2e-4);
    assertEquals(4.01226968e-05, s.linkage(0), 1e-9 * 4.0e-5);
  }

  /**
   * A turn as wide as a pole: flux 2/π B times the pole's area, EMF π√2 f Φ rms (Gieras, Wang and
   * Kamper, Axial Flux Permanent Magnet Brushless Machines, 2nd edition 2008, EMF of the winding;
   * recalled).
   */
  @Test
  void fullPitchTurn_textbook() {
    int p = 6;
    FluxSeries s = along(new Cosine(p, 0.6), 1, sector(20, 40, Math.PI / p));
    double area = Math.PI * (0.040 * 0.040 - 0.020 * 0.020) / (2 * p);
    double flux = 2 / Math.PI * 0.6 * area;
    double speed = 2 * Math.PI * 50;
    double rms = Math.PI * Math.sqrt(2) * p * 50 * flux;
    assertEquals(rms, speed * s.amplitude(0) / Math.sqrt(2), 1e-9 * rms);
  }

  /**
   * Flux through the drawn spirals, row by row with solid angles: no harmonics, no line integral.
   */
  @Test
  void linkageOfADrawnCoilIsTheFieldThroughItsTurns() {
    for (int layer : new int[] {1, 4}) {
      Path open = spiral(1, layer).path();
      Path closed = closed(open);
      FluxSeries s = along(field, layer, closed);
      double z = wheel.assembly().artwork().stackup().heightMm(layer);
      for (double theta : new double[] {0, 0.11}) {
        double want = SurfaceFlux.weber(closed, magnets, z, theta, 250);
        double peak = s.amplitude(0) / 6;
        assertEquals(want, s.linkage(theta), 2e-4 * peak, "layer " + layer + " angle " + theta);
      }
    }
  }

  private static Path closed(Path open) {
    var segments = new java.util.ArrayList<>(open.segments());
    segments.add(new Line(open.end(), open.start()));
    return new Path(segments);
  }

  /**
   * Torque on the copper by Lorentz's force, summed over short pieces in the solid angles' field.
   */
  @Test
  void slopeIsTheTorqueOfAnAmpere() {
    double theta = 0.2;
    Conductor c = spiral(2, 1);
    double z = wheel.assembly().artwork().stackup().heightMm(1);
    double torque = 0;
    for (var seg : c.path().segments()) {
      int n = (int) Math.ceil(seg.lengthMm() / 0.1);
      for (int i = 0; i < n; i++) {
        Point a = seg.at((double) i / n);
        Point b = seg.at((i + 1.0) / n);
        Point m = a.plus(b).times(0.5);
        Point r = m.rotated(-theta);
        double bz = magnets.axialTesla(r.x(), r.y(), z);
        double fx = (b.y() - a.y()) * bz;
        double fy = -(b.x() - a.x()) * bz;
        torque += (m.x() * fy - m.y() * fx) * 1e-6;
      }
    }
    double got = coupling.track(c.id()).slope(theta);
    assertEquals(-torque, got, 5e-4 * Math.abs(got), "the rotor feels the opposite");
  }

  /** Finer panels and the field itself instead of its tables, with twice the orders. */
  @Test
  void fundamentalHasConverged() {
    Path path = spiral(1, 1).path();
    double z = wheel.assembly().artwork().stackup().heightMm(1);
    FieldHarmonics h = new FieldHarmonics(magnets, 2);
    AxialField direct =
        new AxialField() {
          @Override
          public int polePairs() {
            return 6;
          }

          @Override
          public int orders() {
            return 2;
          }

          @Override
          public void amplitudes(int layer, double radiusMm, double[] out) {
            System.arraycopy(h.at(radiusMm, z), 0, out, 0, 2);
          }

          @Override
          public double scaleMm(int layer) {
            return field.scaleMm(layer) / 2;
          }
        };
    FluxSeries want = along(direct, 1, path);
    FluxSeries got = along(field, 1, path);
    assertEquals(want.amplitude(0), got.amplitude(0), 1e-4 * want.amplitude(0));
    TrackIntegral fine = new PathIntegrator(field, PathIntegrator.PANEL / 2).along(1, path);
    double half = Math.hypot(fine.re(0), fine.im(0));
    assertEquals(half, got.amplitude(0), 1e-5 * half);
  }

  /** Coils that are turned instead of integrated come out the same as integrated ones. */
  @Test
  void turnedCoilsAreTheSame() {
    for (int coil : new int[] {2, 5, 9}) {
      Conductor c = spiral(coil, 3);
      FluxSeries want = along(field, 3, c.path());
      FluxSeries got = coupling.track(c.id());
      for (int i = 0; i < 3; i++) {
        assertEquals(want.re(i), got.re(i), 1e-9 * want.amplitude(0));
        assertEquals(want.im(i), got.im(i), 1e-9 * want.amplitude(0));
      }
    }
  }

  /** Rounded to the grid of the files the figures stay the same. */
  @Test
  void artworkOnTheGrid() {
    Coupling grid = Coupling.of(wheel.assembly().artwork().onGrid(), field);
    for (int k = 0; k < 3; k++) {
      double want = coupling.phases().get(k).amplitude(0);
      assertEquals(want, grid.phases().get(k).amplitude(0), 1e-6 * want);
    }
  }

  /** V lags U and W lags V by a third of an electrical turn, and the axes are the winding's. */
  @Test
  void phaseOrderAndAxes() {
    for (String[] change :
        new String[][] {
          {"turns: fill ", "turns: 2 "},
          {"turns: fill ", "turns: 2 ", "coils: 9 ", "coils: 12 ", "poles: 12 ", "poles: 10 "},
          {
            "turns: fill ",
            "turns: 2 ",
            "coils: 9 ",
            "coils: 12 ",
            "poles: 12 ",
            "poles: 14 ",
            "diameter: 10 mm\n",
            "diameter: 9 mm\n"
          }
        }) {
      TestMachine m = TestMachine.of("filter-wheel", change);
      Coupling c = Coupling.of(m.assembly().artwork(), field(m, magnets(m)));
      Winding w = m.assembly().winding();
      int p = w.poles() / 2;
      double first = c.phases().get(0).axisRad() * p;
      for (int k = 0; k < 3; k++) {
        double axis = c.phases().get(k).axisRad() * p;
        assertEquals(0, turn(axis - w.axisRad().get(k) * p), Math.toRadians(0.5), "axis " + k);
        assertEquals(0, turn(axis - first - k * 2 * Math.PI / 3), Math.toRadians(0.1));
      }
    }
  }

  private static double turn(double a) {
    return Math.IEEEremainder(a, 2 * Math.PI);
  }

  /**
   * Coils of a phase add up by the distribution factor, 0.9659 for 12 coils and 10 poles (tables in
   * the literature: Cros and Viarouge 2002, Bianchi et al. 2006, recalled).
   */
  @Test
  void distributionFactorComesFromTheCopper() {
    TestMachine m =
        TestMachine.of(
            "filter-wheel",
            "turns: fill ",
            "turns: 3 ",
            "coils: 9 ",
            "coils: 12 ",
            "poles: 12 ",
            "poles: 10 ");
    Artwork art = m.assembly().artwork();
    Coupling c = Coupling.of(art, field(m, magnets(m)));
    double arms = 0;
    double sumRe = 0;
    double sumIm = 0;
    for (Coil coil : art.coils()) {
      if (coil.phase().equals("U")) {
        double re = 0;
        double im = 0;
        for (int id : coil.conductors()) {
          re += c.track(id).re(0);
          im += c.track(id).im(0);
        }
        arms += Math.hypot(re, im);
        sumRe += coil.sign() * re;
        sumIm += coil.sign() * im;
      }
    }
    double sum = Math.hypot(sumRe, sumIm);
    assertEquals(0.9659, sum / arms, 1e-4);
    assertEquals(sum, c.phases().get(0).amplitude(0), 2e-3 * sum, "leads and links add little");
  }
}
