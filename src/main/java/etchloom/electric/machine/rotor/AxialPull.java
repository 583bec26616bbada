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
  private static final double REACH = 3;

  private AxialPull() {}

  /**
   * N, pulling together.
   *
   * @param planeMm height of the plane of symmetry over the board's mid-plane
   */
  public static double newton(MagnetArray array, double planeMm) {
    double outer = REACH * array.shape().outerMm();
    RotorField field = new RotorField(array, new double[] {planeMm}, 0, outer);
    GaussRule rule = new GaussRule(4);
    double[] b = new double[field.orders()];
    double step = 0.5 * field.scaleMm(1);
    double sum = 0;
    double from = 0;
    while (from < outer) {
      // Beyond the magnets the field only dies away, over a length that grows with the radius.
      double grown = from > array.shape().outerMm() + 4 * step ? Math.max(step, 0.05 * from) : step;
      double half = Math.min(grown, outer - from) / 2;
      for (int j = 0; j < rule.size(); j++) {
        double r = from + half * (1 + rule.node(j));
        field.amplitudes(1, r, b);
        for (double v : b) {
          sum += v * v * r * half * rule.weight(j);
        }
      }
      from += 2 * half;
    }
    return Math.PI / (2 * Constants.MU_0) * sum * 1e-6;
  }
}
