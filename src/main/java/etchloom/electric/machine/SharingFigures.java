package etchloom.electric.machine;

import java.util.List;
import java.util.OptionalDouble;

/**
 * How the current of a coil splits among layers side by side.
 *
 * @param layers in the order of their groups: the inward ones, then the outward ones
 * @param worstOverload by how much the most loaded layer exceeds its even share, as a ratio
 * @param circulatingAmpereRms the greatest current that unequal voltages drive through a layer at
 *     the duty's speed, copper hot
 */
public record SharingFigures(
    List<Layer> layers, double worstOverload, OptionalDouble circulatingAmpereRms) {
  public SharingFigures {
    layers = List.copyOf(layers);
  }

  /**
   * @param currentShare of the coil's current
   * @param evenShare if all layers of its group were alike
   * @param linkageRatio its flux linkage over its group's mean; absent without magnets
   * @param circulatingAmpereRms of this layer
   */
  public record Layer(
      int layer,
      double currentShare,
      double evenShare,
      OptionalDouble linkageRatio,
      OptionalDouble circulatingAmpereRms) {}
}
