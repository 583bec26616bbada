package etchloom.electric.machine;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * How warm the copper gets.
 *
 * @param copperC where loss and surface balance; empty without a current or a balance
 * @param maxContinuousAmpereRms of one winding at the copper's limit, other losses at the duty's
 *     speed and bus included
 * @param stable whether there is a balance at all; empty without a current
 * @param chartAmpere IPC-2221 for one narrowest track alone at the same rise
 * @param hotC the temperature that hot figures hold for: copperC, else the limit
 * @param settlesUpToAmpereRms of one winding: above it no temperature below copper's melting point
 *     carries the loss away; empty where the other losses alone see to that
 * @param byCurrent where the copper settles by the current, the other losses at the duty's speed
 * @param surfaceM2 both faces from the bore to the outermost ring
 */
public record ThermalFigures(
    OptionalDouble copperC,
    OptionalDouble maxContinuousAmpereRms,
    Optional<Boolean> stable,
    double chartAmpere,
    double hotC,
    OptionalDouble settlesUpToAmpereRms,
    List<AtCurrent> byCurrent,
    double surfaceM2) {
  public ThermalFigures {
    byCurrent = List.copyOf(byCurrent);
  }

  /**
   * @param ampereRms of one winding
   * @param copperC empty where it never settles
   */
  public record AtCurrent(double ampereRms, OptionalDouble copperC) {}
}
