package etchloom.electric.machine.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.artwork.Stackup;
import etchloom.electric.field.AxialField;
import etchloom.electric.field.RadialField;
import etchloom.electric.machine.emf.Coupling;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class EddyLossTest {
  /** Amplitudes that are the same everywhere. */
  private static final class Even implements AxialField, RadialField {
    private final double[] tesla;

    private Even(double... tesla) {
      this.tesla = tesla;
    }

    @Override
    public int polePairs() {
      return 5;
    }

    @Override
    public int orders() {
      return tesla.length;
    }

    @Override
    public void amplitudes(int layer, double radiusMm, double[] out) {
      System.arraycopy(tesla, 0, out, 0, tesla.length);
    }

    @Override
    public double scaleMm(int layer) {
      return 100;
    }

    @Override
    public void radialAmplitudes(double radiusMm, double heightMm, double[] out) {
      java.util.Arrays.fill(out, 0);
    }
  }

  private static Artwork with(Artwork a, Conductor c) {
    return new Artwork(
        a.title(),
        a.slug(),
        a.revision(),
        false,
        a.stackup(),
        a.profile(),
        a.joints(),
        List.of(c),
        a.mountingHoles(),
        a.maskTop(),
        a.maskBottom(),
        a.legend(),
        a.coils(),
        a.phases(),
        1,
        0);
  }

  private static Artwork track(double padMm) {
    Stackup.Copper c = new Stackup.Copper(0.035, 1, 0);
    Point a = new Point(1000, -500);
    Point b = new Point(1000, 500);
    List<Joint> joints = List.of(joint(0, a, padMm, "U1"), joint(1, b, padMm, "U2"));
    Feature what = new Feature(Feature.Kind.SPIRAL, "U", 1, List.of());
    Conductor t = new Conductor(0, 1, 0.3, Path.of(new Line(a, b)), 0, 1, "", what);
    return new Artwork(
        "T",
        "t",
        "A",
        false,
        new Stackup(List.of(c, c), List.of(1.5), 0.02),
        List.of(),
        joints,
        List.of(t),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(new Phase("U", 0, 1, List.of(new Phase.Step(0, true)))),
        1,
        0);
  }

  private static Joint joint(int id, Point at, double padMm, String mark) {
    Optional<Double> hole = padMm > 0 ? Optional.of(0.4) : Optional.empty();
    int last = padMm > 0 ? 2 : 1;
    return new Joint(id, Joint.Kind.TERMINAL, at, padMm, hole, 1, last, "", mark, "");
  }

  private static EddyLoss loss(Artwork art, double... tesla) {
    return EddyLoss.of(art, Coupling.of(art, new Even(tesla)));
  }

  /** Check value ED-T-1: 1 m of 0.3 × 0.035 mm in 0.6 T peak at 1 kHz. */
  @Test
  void oneMetreOfTrack() {
    double w = 2 * Math.PI * 1000 / 5;
    assertEquals(0.032457181, loss(track(0), 0.6).watt(w, 20), 1e-6 * 0.0325);
  }

  /** Half the length twice as wide: a strip's loss goes with the cube of its width. */
  @Test
  void widerStretches() {
    Artwork plain = track(0);
    Conductor c = plain.conductors().get(0);
    Path path =
        new PathBuilder(c.path().start())
            .lineTo(new Point(1000, -250))
            .lineTo(new Point(1000, 250))
            .lineTo(c.path().end())
            .build();
    Conductor wide = new Conductor(0, 1, 0.3, List.of(0.3, 0.6, 0.3), path, 0, 1, "", c.what());
    double w = 2 * Math.PI * 1000 / 5;
    double even = loss(plain, 0.6).watt(w, 20);
    assertEquals(4.5 * even, loss(with(plain, wide), 0.6).watt(w, 20), 1e-9);
  }

  /** Orders add up with the square of their frequency; warm copper loses less. */
  @Test
  void ordersAndTemperature() {
    EddyLoss e = loss(track(0), 0.6, 0.2);
    double w = 2 * Math.PI * 1000 / 5;
    assertEquals(0.032457181, e.watt(1, 0, w, 20), 1e-6 * 0.0325);
    assertEquals(0.032457181, e.watt(1, 1, w, 20), 1e-6 * 0.0325, "a third, three times as fast");
    assertEquals(0, e.watt(2, 0, w, 20), 0);
    assertEquals(e.watt(w, 20) / 1.3144, e.watt(w, 100), 1e-9);
  }

  /** A round pad by the mean of the squared induced field over its ring, by brute force. */
  @Test
  void pads() {
    double w = 2 * Math.PI * 1000 / 5;
    double both = loss(track(2.0), 0.6).watt(w, 20) - loss(track(0), 0.6).watt(w, 20);
    double rho = 1 / 58e6;
    double sum = 0;
    int n = 2000;
    for (int i = 0; i < n; i++) {
      double r = 0.2e-3 + 0.8e-3 * (i + 0.5) / n;
      double e = 2 * Math.PI * 1000 * 0.6 * r / 2;
      sum += e * e / (2 * rho) * 2 * Math.PI * r * 0.8e-3 / n * 0.035e-3;
    }
    // Two pads on each of two layers.
    assertEquals(4 * sum, both, 1e-5 * both);
  }

  /** Skin depth of copper at 100 kHz: 0.209 mm (check value ED-D-100000). */
  @Test
  void skinDepth() {
    EddyLoss e = loss(track(0), 0.6);
    assertTrue(e.beyondSkinDepth(2 * Math.PI * 100e3 / 5));
    assertFalse(e.beyondSkinDepth(2 * Math.PI * 40e3 / 5));
  }
}
