package etchloom.spec;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * A spec file as read: every value checked on its own and in its own units, defaults filled in.
 * Lengths in mm, angles in rad, all else in SI; temperatures in degrees Celsius.
 */
public record Spec(
    String title,
    String slug,
    String revision,
    Rotor rotor,
    Winding winding,
    Coil coil,
    Rim rim,
    Via via,
    Board board,
    String fab,
    Optional<Duty> duty) {

  /** Everything but the poles may be absent; {@code magnet} empty means no field can be had. */
  public record Rotor(
      int poles,
      boolean twoSided,
      OptionalDouble airGapMm,
      Optional<Magnet> magnet,
      OptionalDouble outerDiameterMm,
      boolean ironBehindMagnets,
      OptionalDouble counterPlateGapMm) {}

  /** The magnet's outline seen along the shaft. */
  public enum MagnetOutline {
    DISC,
    SECTOR,
    BLOCK
  }

  /**
   * @param pitchRadiusMm disc and block: radius of the magnet's centre; sector: 0
   * @param diameterMm disc only, else 0
   * @param innerRadiusMm sector only, else 0
   * @param outerRadiusMm sector only, else 0
   * @param spanRad sector only, else 0
   * @param lengthMm block only: radial size, else 0
   * @param widthMm block only: tangential size, else 0
   * @param remanenceTesla at 20 C
   * @param remanenceDriftPerKelvin signed ratio, usually negative
   * @param density kg/m3
   */
  public record Magnet(
      MagnetOutline outline,
      double diameterMm,
      double innerRadiusMm,
      double outerRadiusMm,
      double spanRad,
      double lengthMm,
      double widthMm,
      double pitchRadiusMm,
      double thicknessMm,
      double remanenceTesla,
      double remanenceDriftPerKelvin,
      double temperatureC,
      double density,
      double limitC) {}

  /** How the phases are joined. */
  public enum Connection {
    STAR,
    DELTA,
    OPEN
  }

  public record Winding(int phases, int coils, Connection connection, int parallelPaths) {}

  /** The coil's outline. */
  public enum CoilOutline {
    WEDGE,
    ROUND,
    RACETRACK
  }

  /**
   * @param turns absent: as many as fit
   * @param corner fillet radius on the centre line; absent: the default of the outline
   * @param taper whether a wedge's sides widen outwards
   */
  public record Coil(
      CoilOutline outline,
      double innerRadiusMm,
      double outerRadiusMm,
      OptionalDouble widthMm,
      OptionalInt turns,
      double trackMm,
      double spaceMm,
      OptionalDouble cornerMm,
      boolean parallelLayers,
      boolean taper) {

    /** The same with so many turns in tracks of one width; corners no sharper than they allow. */
    private Coil even(double widthMm, int count) {
      double least = (widthMm + spaceMm) / 2;
      return new Coil(
          outline,
          innerRadiusMm,
          outerRadiusMm,
          this.widthMm,
          OptionalInt.of(count),
          widthMm,
          spaceMm,
          cornerMm.isPresent()
              ? OptionalDouble.of(Math.max(cornerMm.getAsDouble(), least))
              : cornerMm,
          parallelLayers,
          false);
    }
  }

  /** The same board with so many turns in tracks of one width, without taper. */
  public Spec withEvenTrack(double trackMm, int turns) {
    return new Spec(
        title,
        slug,
        revision,
        rotor,
        winding,
        coil.even(trackMm, turns),
        rim,
        via,
        board,
        fab,
        duty);
  }

  public record Rim(double trackMm) {}

  public record Via(double holeMm, double padMm, int count) {}

  /** Copper as asked for: a weight in oz/ft2, or a finished thickness in mm. */
  public record Copper(OptionalDouble ounces, OptionalDouble thicknessMm) {}

  public record Holes(
      int count, double diameterMm, double circleMm, double startRad, double keepOutMm) {}

  /** Kind of terminal: plated hole, or a bare pad on L1. */
  public enum TerminalKind {
    HOLE,
    PAD
  }

  public record Terminals(
      TerminalKind kind, double startRad, double pitchMm, double holeMm, double padMm) {}

  /**
   * A rectangle that stands out of the round board and carries the terminals.
   *
   * @param lengthMm by how much its end stands beyond the round edge, along its middle
   */
  public record Tab(double angleRad, double widthMm, double lengthMm) {}

  /**
   * @param stackupMm dielectrics from L1 down; empty: the fab's, else equal
   * @param tab where there is one, the terminals' start is its angle
   */
  public record Board(
      int layers,
      double thicknessMm,
      Copper outerCopper,
      Copper innerCopper,
      List<Double> stackupMm,
      double diameterMm,
      double boreMm,
      Optional<Holes> holes,
      Terminals terminals,
      boolean starPointOut,
      String finish,
      String mask,
      double laminateTgC,
      Optional<Tab> tab) {
    public Board {
      stackupMm = List.copyOf(stackupMm);
    }
  }

  /** The electrical duty; every value may be absent but those with a default. */
  public record Duty(
      boolean generator,
      OptionalDouble torqueNm,
      OptionalDouble loadOhm,
      OptionalDouble busVolt,
      OptionalDouble speedRadPerSecond,
      OptionalDouble currentAmpereRms,
      OptionalDouble switchingHertz,
      OptionalDouble bandwidthHertz,
      double ambientC,
      double copperLimitC,
      double coolingWattPerSquareMetreKelvin) {}
}
