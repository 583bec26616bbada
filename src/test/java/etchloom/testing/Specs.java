package etchloom.testing;

import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** Specs and rules made in code, for tests that start after the reader. */
public final class Specs {
  private Specs() {}

  /** The numbers that most tests vary; the rest stays at a plain default. */
  public record Shape(
      int coils,
      int poles,
      int layers,
      Spec.Connection connection,
      double innerMm,
      double outerMm,
      double trackMm,
      double spaceMm,
      double padMm,
      double holeMm,
      double boardMm,
      double terminalsRad,
      boolean starPointOut,
      OptionalInt turns) {

    public Shape connected(Spec.Connection c) {
      return new Shape(
          coils,
          poles,
          layers,
          c,
          innerMm,
          outerMm,
          trackMm,
          spaceMm,
          padMm,
          holeMm,
          boardMm,
          terminalsRad,
          starPointOut,
          turns);
    }

    public Shape turned(double rad) {
      return new Shape(
          coils,
          poles,
          layers,
          connection,
          innerMm,
          outerMm,
          trackMm,
          spaceMm,
          padMm,
          holeMm,
          boardMm,
          rad,
          starPointOut,
          turns);
    }
  }

  /** Nine coils, twelve poles, star. */
  public static Shape wheel(int layers) {
    return new Shape(
        9,
        12,
        layers,
        Spec.Connection.STAR,
        12,
        30,
        0.2,
        0.2,
        0.6,
        0.3,
        84,
        Math.PI / 2,
        false,
        OptionalInt.empty());
  }

  public static Spec spec(Shape s) {
    return new Spec(
        "Test board",
        "test-board",
        "A",
        new Spec.Rotor(
            s.poles(),
            false,
            OptionalDouble.empty(),
            Optional.empty(),
            OptionalDouble.empty(),
            false,
            OptionalDouble.empty()),
        new Spec.Winding(3, s.coils(), s.connection(), 1),
        new Spec.Coil(
            Spec.CoilOutline.WEDGE,
            s.innerMm(),
            s.outerMm(),
            OptionalDouble.empty(),
            s.turns(),
            s.trackMm(),
            s.spaceMm(),
            OptionalDouble.empty(),
            false,
            false),
        new Spec.Rim(2 * s.trackMm()),
        new Spec.Via(s.holeMm(), s.padMm(), 1),
        new Spec.Board(
            s.layers(),
            1.6,
            new Spec.Copper(OptionalDouble.of(1), OptionalDouble.empty()),
            new Spec.Copper(OptionalDouble.of(1), OptionalDouble.empty()),
            List.of(),
            s.boardMm(),
            Math.min(14, s.innerMm()),
            Optional.empty(),
            new Spec.Terminals(Spec.TerminalKind.HOLE, s.terminalsRad(), 3.5, 1.0, 2.0),
            s.starPointOut(),
            "ENIG",
            "green",
            150,
            Optional.empty()),
        "standard",
        Optional.empty());
  }

  /** The same with so many turns, and sides that widen or do not. */
  public static Spec turning(Spec s, int turns, boolean taper) {
    Spec.Coil c = s.coil();
    return new Spec(
        s.title(),
        s.slug(),
        s.revision(),
        s.rotor(),
        s.winding(),
        new Spec.Coil(
            c.outline(),
            c.innerRadiusMm(),
            c.outerRadiusMm(),
            c.widthMm(),
            OptionalInt.of(turns),
            c.trackMm(),
            c.spaceMm(),
            c.cornerMm(),
            c.parallelLayers(),
            taper),
        s.rim(),
        s.via(),
        s.board(),
        s.fab(),
        s.duty());
  }

  /** Common-practice values of a plain fab, made for tests. */
  public static FabRules fab() {
    return new FabRules(
        "Test fab",
        List.of(2, 4, 6, 8, 10, 12, 14, 16),
        List.of(),
        0.4,
        3.2,
        400,
        List.of(
            new FabRules.CopperRow(1, true, 0.035, 0.127, 0.127, OptionalDouble.of(3)),
            new FabRules.CopperRow(1, false, 0.030, 0.127, 0.127, OptionalDouble.of(3))),
        new FabRules.Hole(0.2, 10, 0.25, 0.2, 0.02),
        new FabRules.Ring(0.13, 0.2),
        new FabRules.Edge(0.3, 0.5),
        new FabRules.Mask(0.05, 0.1),
        new FabRules.Legend(0.15, 0.8, 0.15),
        new FabRules.Tolerance(0.2, 0.1, 0.2));
  }
}
