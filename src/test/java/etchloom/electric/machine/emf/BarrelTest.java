package etchloom.electric.machine.emf;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import etchloom.artwork.Joint;
import etchloom.artwork.Phase;
import etchloom.artwork.Stackup;
import etchloom.electric.field.AxialField;
import etchloom.electric.field.RadialField;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Plated holes in the flux linkage. */
class BarrelTest {
  private static final int P = 3;

  /**
   * The field of the potential {@code −r³ z cos 3(φ − θ)}, free of curl and divergence: {@code Bz =
   * r³ cos}, {@code Br = 3 r² z cos}, lengths in mm here.
   */
  private static final class Known implements AxialField, RadialField {
    @Override
    public int polePairs() {
      return P;
    }

    @Override
    public int orders() {
      return 1;
    }

    @Override
    public void amplitudes(int layer, double radiusMm, double[] out) {
      out[0] = radiusMm * radiusMm * radiusMm;
    }

    @Override
    public double scaleMm(int layer) {
      return 1;
    }

    @Override
    public void radialAmplitudes(double radiusMm, double heightMm, double[] out) {
      out[0] = 3 * radiusMm * radiusMm * heightMm;
    }
  }

  private static Joint joint(int id, Joint.Kind kind, Point at, int layer, String mark) {
    boolean hole = layer == 0;
    return new Joint(
        id,
        kind,
        at,
        0.6,
        hole ? Optional.of(0.3) : Optional.empty(),
        hole ? 1 : layer,
        hole ? 2 : layer,
        "",
        mark,
        "");
  }

  private static Conductor track(int id, int layer, Point a, Point b, int from, int to) {
    Feature what = new Feature(Feature.Kind.SPIRAL, "U", 1, List.of());
    return new Conductor(id, layer, 0.2, Path.of(new Line(a, b)), from, to, "", what);
  }

  /**
   * Out along a ray on L1, down the hole, back on L2. The two tracks cancel, and by Stokes the hole
   * alone makes the change of flux through the upright rectangle: {@code −∫ r Br dz = 3 r³ (z1² −
   * z2²)/2} from z1 down to z2.
   */
  @Test
  void holeClosesTheUprightLoop() {
    Stackup.Copper c = new Stackup.Copper(0.035, 1, 0);
    Stackup stackup = new Stackup(List.of(c, c), List.of(1.5), 0.02);
    double angle = 0.4;
    Point inner = Point.polar(2, angle);
    Point outer = Point.polar(5, angle);
    List<Joint> joints =
        List.of(
            joint(0, Joint.Kind.TERMINAL, inner, 1, "U1"),
            joint(1, Joint.Kind.EYE, outer, 0, ""),
            joint(2, Joint.Kind.TERMINAL, inner, 2, "U2"));
    List<Conductor> tracks =
        List.of(track(0, 1, inner, outer, 0, 1), track(1, 2, outer, inner, 1, 2));
    Phase phase = new Phase("U", 0, 2, List.of(new Phase.Step(0, true), new Phase.Step(1, true)));
    Artwork art =
        new Artwork(
            "T",
            "t",
            "A",
            false,
            stackup,
            List.of(),
            joints,
            tracks,
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(phase),
            1,
            0);
    FluxSeries s = Coupling.of(art, new Known()).phases().get(0);
    double z1 = stackup.heightMm(1);
    double z2 = stackup.heightMm(2);
    assertEquals(0, s.slope(0.1), 1e-15, "the board's middle is the field's: nothing");
    assertEquals(0, z1 + z2, 1e-15);
    Stackup lopsided = new Stackup(List.of(new Stackup.Copper(0.535, 1, 0), c), List.of(1.0), 0.02);
    Artwork other =
        new Artwork(
            "T",
            "t",
            "A",
            false,
            lopsided,
            List.of(),
            joints,
            tracks,
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(phase),
            1,
            0);
    double a = lopsided.heightMm(1);
    double b = lopsided.heightMm(2);
    double want = 3 * 125 * (a * a - b * b) / 2 * Math.cos(3 * (angle - 0.1)) * 1e-6;
    FluxSeries t = Coupling.of(other, new Known()).phases().get(0);
    assertEquals(want, t.slope(0.1), 1e-9 * Math.abs(want));
  }
}
