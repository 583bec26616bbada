package etchloom.electric.machine.emf;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.field.RotorField;
import etchloom.electric.resistance.Chains;
import etchloom.electric.resistance.Copper;
import etchloom.electric.resistance.Currents;
import etchloom.spec.Spec;
import java.util.List;

/**
 * How the flux linkage changes when a layer's copper comes out thicker: layers below it lie deeper,
 * and whatever stands on the board's far side stands farther off. First order, by finite
 * differences of the fundamental along the first coil; all coils are alike in this.
 */
public final class HeightSensitivity {
  /**
   * Step of the differences, mm: small beside any air gap's field, large beside the tables' error.
   */
  private static final double STEP_MM = 0.04;

  private final Artwork artwork;
  private final Coupling now;
  private final Currents shares;
  private final RadialReach reach;
  private double re;
  private double im;

  private HeightSensitivity(Artwork artwork, Coupling now) {
    this.artwork = artwork;
    this.now = now;
    shares = Chains.coil(artwork, artwork.coils().get(0), Copper.REFERENCE_C);
    reach =
        RadialReach.of(spirals().stream().map(id -> artwork.conductors().get(id).path()).toList());
    for (int id : spirals()) {
      re += share(id) * now.track(id).re(0);
      im += share(id) * now.track(id).im(0);
    }
  }

  /** What the spiral carries of the coil's current. */
  private double share(int id) {
    return shares.ofConductor(id);
  }

  private List<Integer> spirals() {
    return artwork.coils().get(0).conductors();
  }

  /**
   * The relative change of the flux linkage with the thickness of each layer's copper, 1/mm, L1
   * first.
   *
   * @param now the same board in the same rotor's field as it is drawn
   */
  public static double[] perMm(Artwork artwork, Spec.Rotor rotor, Coupling now) {
    return new HeightSensitivity(artwork, now).perMm(rotor);
  }

  private double[] perMm(Spec.Rotor rotor) {
    double board = artwork.stackup().thicknessMm();
    double[] byDepth = changes(MagnetArray.of(rotor, board), -STEP_MM);
    double byThickness = 0;
    if (rotor.twoSided() || rotor.counterPlateGapMm().isPresent()) {
      // The same depths under L1's face in a board that is thicker: its middle lies half a step
      // off.
      for (double c : changes(MagnetArray.of(rotor, board + STEP_MM), STEP_MM / 2)) {
        byThickness += c;
      }
    }
    double[] out = new double[byDepth.length];
    for (int k = 0; k < out.length; k++) {
      out[k] = byThickness + byDepth[k] / 2;
      for (int j = k + 1; j < out.length; j++) {
        out[k] += byDepth[j];
      }
    }
    return out;
  }

  /** The relative change for each step of a millimetre, by layers, all layers moved up. */
  private double[] changes(MagnetArray array, double upMm) {
    double[] height = new double[artwork.layers()];
    for (int i = 0; i < height.length; i++) {
      height[i] = artwork.stackup().heightMm(i + 1) + upMm;
    }
    RotorField field = new RotorField(array, height, reach.innerMm(), reach.outerMm(), 1);
    PathIntegrator integrator = new PathIntegrator(field, PathIntegrator.PANEL);
    double[] out = new double[height.length];
    for (int id : spirals()) {
      Conductor c = artwork.conductors().get(id);
      TrackIntegral t = integrator.along(c.layer(), c.path());
      FluxSeries was = now.track(id);
      double along = share(id) * ((t.re(0) - was.re(0)) * re + (t.im(0) - was.im(0)) * im);
      out[c.layer() - 1] += along / (re * re + im * im) / STEP_MM;
    }
    return out;
  }
}
