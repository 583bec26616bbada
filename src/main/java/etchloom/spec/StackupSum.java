package etchloom.spec;

import etchloom.units.Numbers;
import java.util.List;

/**
 * A stackup's dielectrics and copper against the thickness they should add up to, mm.
 *
 * <p>Nominal copper differs from finished copper, and boards are ordered to a tenth of their
 * thickness, so a sum within {@link #TOLERANCE} passes.
 */
record StackupSum(double dielectrics, double copper, double thickness) {
  /** Share of the thickness by which the sum may be off: the usual tolerance of board thickness. */
  static final double TOLERANCE = 0.10;

  static StackupSum of(List<Double> dielectrics, double copper, double thickness) {
    double sum = 0;
    for (double d : dielectrics) {
      sum += d;
    }
    return new StackupSum(sum, copper, thickness);
  }

  /** True also where a value is NaN: that fault was reported. */
  boolean fits() {
    return !(Math.abs(dielectrics + copper - thickness) > TOLERANCE * thickness);
  }

  String message(String key) {
    return "dielectrics of "
        + Numbers.fixed(dielectrics, 3)
        + " mm and about "
        + Numbers.fixed(copper, 3)
        + " mm of copper make "
        + Numbers.fixed(dielectrics + copper, 3)
        + " mm; "
        + key
        + " is "
        + Show.mm(thickness)
        + ", and at most 10 % off is allowed";
  }
}
