package etchloom.electric.machine.rotor;

import etchloom.electric.field.GaussRule;
import etchloom.electric.field.MagnetArray;
import etchloom.electric.field.RotorField;
import etchloom.units.Constants;

/**
 * The pull along the shaft between a rotor and what it faces: the magnets' charge sheets against
 * the other rotor's, or against their images in iron, all images of all plates included.
 *
 * <p>Taken on the plane of symmetry between the two, the board's mid-plane or the iron's face:
 * there the field is all axial, and Maxwell's stress {@code Bz² / 2μ0} over the plane is the force
 * between the charges on its two sides (textbook). In harmonics: {@code π/(2μ0) Σ ∫ b² r dr}.
 */
public final class AxialPull {
  /** Beyond the magnets the field falls as the radius to the pole pairs and more. */
  private static final double REACH = 4;

  /** Panels of the sum over the radius, over the distance in which the field changes. */
  private static final double PANEL = 0.5;

  private AxialPull() {}

  /**
   * N, pulling together.
   *
   * @param planeMm height of the plane of symmetry over the board's mid-plane
   */
  public static double newton(MagnetArray array, double planeMm) {
    double away = REACH / array.polePairs();
    double outer = (1 + away) * array.shape().outerMm();
    double inner = Math.max(0, 1 - away) * array.shape().innerMm();
    RotorField field = new RotorField(array, new double[] {planeMm}, inner, outer);
    GaussRule rule = new GaussRule(4);
    double[] b = new double[field.orders()];
    int panels = (int) Math.ceil((outer - inner) / (PANEL * field.scaleMm(1)));
    double half = (outer - inner) / panels / 2;
    double sum = 0;
    for (int k = 0; k < panels; k++) {
      for (int j = 0; j < rule.size(); j++) {
        double r = inner + half * (2 * k + 1 + rule.node(j));
        field.amplitudes(1, r, b);
        for (double v : b) {
          sum += v * v * r * half * rule.weight(j);
        }
      }
    }
    return Math.PI / (2 * Constants.MU_0) * sum * 1e-6;
  }
}
