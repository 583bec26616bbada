package etchloom.electric.machine.emf;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Stackup;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.field.RotorField;
import etchloom.spec.Spec;
import java.util.List;

/**
 * How the flux linkage changes when a layer's copper comes out thicker: layers below it lie deeper,
 * and whatever stands on the board's far side stands farther off. First order, by finite
 * differences of the fundamental along the first coil; all coils are alike in this.
 */
public final class HeightSensitivity {
  /** Step of the differences, mm: small beside any air gap's field, large beside rounding. */
  private static final double STEP_MM = 0.01;

  private final Artwork artwork;
  private final double innerMm;
  private final double outerMm;

  private HeightSensitivity(Artwork artwork) {
    this.artwork = artwork;
    RadialReach reach =
        RadialReach.of(spirals().stream().map(id -> artwork.conductors().get(id).path()).toList());
    innerMm = reach.innerMm();
    outerMm = reach.outerMm();
  }

  private List<Integer> spirals() {
    return artwork.coils().get(0).conductors();
  }

  /**
   * The relative change of the flux linkage with the thickness of each layer's copper, 1/mm, L1
   * first.
   */
  public static double[] perMm(Artwork artwork, Spec.Rotor rotor) {
    return new HeightSensitivity(artwork).perMm(rotor);
  }

  private double[] perMm(Spec.Rotor rotor) {
    Stackup stackup = artwork.stackup();
    double board = stackup.thicknessMm();
    double[][] now = parts(MagnetArray.of(rotor, board), 0);
    double[][] deeper = parts(MagnetArray.of(rotor, board), -STEP_MM);
    // The same depths under L1's face in a board that is thicker: its middle lies half a step off.
    double[][] thicker = parts(MagnetArray.of(rotor, board + STEP_MM), STEP_MM / 2);
    double re = 0;
    double im = 0;
    double byThickness = 0;
    for (double[] g : now) {
      re += g[0];
      im += g[1];
    }
    double square = re * re + im * im;
    double[] byDepth = new double[now.length];
    for (int j = 0; j < now.length; j++) {
      byDepth[j] = along(now[j], deeper[j], re, im) / square / STEP_MM;
      byThickness += along(now[j], thicker[j], re, im) / square / STEP_MM;
    }
    double[] out = new double[now.length];
    for (int k = 0; k < out.length; k++) {
      out[k] = byThickness + byDepth[k] / 2;
      for (int j = k + 1; j < out.length; j++) {
        out[k] += byDepth[j];
      }
    }
    return out;
  }

  private static double along(double[] now, double[] then, double re, double im) {
    return (then[0] - now[0]) * re + (then[1] - now[1]) * im;
  }

  /** The fundamental of each layer's part, all layers moved up by so much. */
  private double[][] parts(MagnetArray array, double upMm) {
    double[] height = new double[artwork.layers()];
    for (int i = 0; i < height.length; i++) {
      height[i] = artwork.stackup().heightMm(i + 1) + upMm;
    }
    RotorField field = new RotorField(array, height, innerMm, outerMm, 1);
    PathIntegrator integrator = new PathIntegrator(field, PathIntegrator.PANEL);
    double[][] out = new double[height.length][2];
    for (int id : spirals()) {
      Conductor c = artwork.conductors().get(id);
      TrackIntegral t = integrator.along(c.layer(), c.path());
      out[c.layer() - 1][0] += t.re()[0];
      out[c.layer() - 1][1] += t.im()[0];
    }
    return out;
  }
}
