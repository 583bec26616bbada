package etchloom.electric.machine;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a board gains from tracks that widen outwards, over the same turns in tracks of one width.
 *
 * @param widestMm the widest track
 * @param widths how many widths there are
 * @param own the board itself
 * @param plain the same spec without taper
 * @param wider the same turns in the widest even track that has room for them; empty where that is
 *     no wider, or where no board can be drawn with it
 */
public record TaperFigures(
    double widestMm, int widths, Variant own, Variant plain, Optional<Variant> wider) {

  /**
   * @param trackMm the narrowest track of its coils
   * @param terminalOhm greatest between two terminals, at 20 °C
   * @param eddyWatt at the duty's speed
   */
  public record Variant(
      double trackMm,
      double terminalOhm,
      Optional<TorqueFigures> torque,
      OptionalDouble eddyWatt) {}

  /** Change of the resistance, per cent; negative where there is less. */
  public double resistancePercent() {
    return percent(own.terminalOhm(), plain.terminalOhm());
  }

  /** Change of the torque for each ampere, per cent. */
  public OptionalDouble torquePercent() {
    return own.torque().isPresent() && plain.torque().isPresent()
        ? OptionalDouble.of(
            percent(
                own.torque().get().newtonMetrePerAmperePeak(),
                plain.torque().get().newtonMetrePerAmperePeak()))
        : OptionalDouble.empty();
  }

  /** Change of the motor constant, torque over the root of the loss, per cent. */
  public OptionalDouble motorConstantPercent() {
    return own.torque().isPresent() && plain.torque().isPresent()
        ? OptionalDouble.of(
            percent(own.torque().get().motorConstant(), plain.torque().get().motorConstant()))
        : OptionalDouble.empty();
  }

  private static double percent(double now, double before) {
    return 100 * (now / before - 1);
  }
}
