package etchloom.write;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the files say beyond the artwork: plain values, lengths in mm.
 *
 * @param toolVersion as in {@code 0.1.0}
 * @param created the instant to write into the files; empty leaves every date out, so that the same
 *     spec gives the same bytes
 * @param boardThicknessMm as ordered, over the copper
 * @param finish surface finish in the trade's word, {@code ENIG}
 * @param maskColour in the trade's word, {@code green}
 * @param laminateTgC least glass transition temperature
 * @param holeTolerance on finished holes, as text, {@code +/-0.08 mm}
 * @param fabTitle title of the rules used
 * @param outer least track and space drawn on the outer layers
 * @param inner the same for inner layers; ignored where there are none
 * @param circuits how the winding is joined, as text, {@code star, one net}
 * @param resistanceLines expected resistances for incoming inspection, one a line, may be empty
 */
public record OrderInfo(
    String toolVersion,
    Optional<Instant> created,
    double boardThicknessMm,
    String finish,
    String maskColour,
    double laminateTgC,
    String holeTolerance,
    String fabTitle,
    Drawn outer,
    Optional<Drawn> inner,
    String circuits,
    List<String> resistanceLines) {
  public OrderInfo {
    resistanceLines = List.copyOf(resistanceLines);
  }

  /**
   * Least sizes of the copper as drawn.
   *
   * @param padMm least distance of two pads, where the caller has measured it
   */
  public record Drawn(double trackMm, double spaceMm, OptionalDouble padMm) {}
}
