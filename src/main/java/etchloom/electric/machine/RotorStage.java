package etchloom.electric.machine;

import etchloom.electric.field.MagnetArray;
import etchloom.electric.machine.Ledger.Given;
import etchloom.electric.machine.rotor.AxialPull;
import etchloom.electric.machine.rotor.MagnetPull;
import etchloom.spec.Spec;
import etchloom.units.Numbers;
import java.util.Optional;
import java.util.OptionalDouble;

/** Forces on the rotor, and what its reader must be told. */
final class RotorStage {
  /** Shear that glue is commonly designed for, with its safety in it: 1 to 3 MPa, no standard. */
  private static final double GLUE_PASCAL = 1e6;

  /** From here on a pull is worth a word. */
  private static final double PULL_NEWTON = 1;

  private RotorStage() {}

  static RotorFigures figures(Setting s, Optional<MagnetArray> array) {
    Spec.Rotor rotor = s.spec().rotor();
    Given magnet = new Given("rotor.magnet", rotor.magnet().isPresent());
    OptionalDouble none = OptionalDouble.empty();
    OptionalDouble axial = axial(s, rotor, array);
    s.ledger().has("rotor.bondStressPascal", magnet, s.speed());
    if (!s.ledger().has("rotor.magnetPullNewton", magnet, s.speed())) {
      OptionalDouble mass =
          rotor.magnet().isPresent()
              ? OptionalDouble.of(MagnetPull.of(rotor.magnet().get(), 0).kilogram())
              : none;
      return new RotorFigures(mass, none, none, axial);
    }
    MagnetPull pull = MagnetPull.of(rotor.magnet().orElseThrow(), s.radPerSecond());
    if (pull.shearPascal() > GLUE_PASCAL) {
      s.ledger()
          .caution(
              "bond-stress",
              "centrifugal force shears each magnet's bond by "
                  + Numbers.engineering(pull.shearPascal(), "Pa", 3)
                  + "; glue alone is commonly trusted with 1 to 3 MPa: give the magnets a rim");
    }
    return new RotorFigures(
        OptionalDouble.of(pull.kilogram()),
        OptionalDouble.of(pull.newton()),
        OptionalDouble.of(pull.shearPascal()),
        axial);
  }

  private static OptionalDouble axial(Setting s, Spec.Rotor rotor, Optional<MagnetArray> array) {
    if (array.isEmpty()) {
      return OptionalDouble.empty();
    }
    MagnetArray a = array.get();
    OptionalDouble plane = rotor.twoSided() ? OptionalDouble.of(0) : a.iron().belowMm();
    if (plane.isEmpty()) {
      s.ledger().absent("rotor.axialPullNewton", "rotor.counter-plate");
      return OptionalDouble.empty();
    }
    double newton = AxialPull.newton(a, plane.getAsDouble());
    if (newton >= PULL_NEWTON) {
      s.ledger()
          .caution(
              "axial-pull",
              (rotor.twoSided() ? "the two rotors pull at each other" : "the iron pulls the rotor")
                  + " with "
                  + Numbers.engineering(newton, "N", 3)
                  + ": a load for the bearings, and mind your fingers when you bring them together");
    }
    return OptionalDouble.of(newton);
  }
}
