package etchloom.electric.machine.heat;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Feature;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/**
 * The board at one temperature, its loss leaving through both faces: {@code P(T) = h A (T − Ta)}.
 *
 * <p>The loss grows with the copper's resistance, so there may be no answer. But for the ripple's
 * small share, which follows the modulation, no part of it grows faster than copper's own law, and
 * where loss and cooling meet the cooling is then always the steeper: there is one meeting point at
 * most. The one found is stable in any case: below it the loss is the greater, above it the
 * cooling.
 *
 * @param areaM2 both faces from the bore to the outermost ring
 * @param wattPerSquareMetreKelvin mean surface coefficient
 */
public record HeatBalance(double areaM2, double wattPerSquareMetreKelvin, double ambientC) {
  /** Melting point of copper, °C (recalled): no board comes near it, so no balance ends there. */
  public static final double MELTING_C = 1085;

  /** The copper's two faces, m². */
  public static double surfaceM2(Artwork artwork) {
    double outer = 0;
    boolean ring = artwork.conductors().stream().anyMatch(HeatBalance::isRing);
    for (Conductor c : artwork.conductors()) {
      if (isRing(c) || !ring) {
        double reach = Math.max(c.path().start().norm(), c.path().end().norm());
        outer = Math.max(outer, reach + c.widthMm() / 2);
      }
    }
    double bore = artwork.profile().size() > 1 ? artwork.profile().get(1).start().norm() : 0;
    return 2 * Math.PI * (outer * outer - bore * bore) * 1e-6;
  }

  private static boolean isRing(Conductor c) {
    return c.what().kind() == Feature.Kind.RING;
  }

  public double wattPerKelvin() {
    return areaM2 * wattPerSquareMetreKelvin;
  }

  /** What leaves at a temperature, W. */
  public double leavingWatt(double tempC) {
    return wattPerKelvin() * (tempC - ambientC);
  }

  /**
   * The temperature at which a loss is carried away, °C; empty where there is none below copper's
   * melting point.
   *
   * @param watt loss at a copper temperature in °C
   */
  public OptionalDouble solve(DoubleUnaryOperator watt) {
    double low = ambientC;
    double high = MELTING_C;
    if (!(leavingWatt(high) > watt.applyAsDouble(high))) {
      return OptionalDouble.empty();
    }
    for (int i = 0; i < 60; i++) {
      double mid = (low + high) / 2;
      if (leavingWatt(mid) >= watt.applyAsDouble(mid)) {
        high = mid;
      } else {
        low = mid;
      }
    }
    return OptionalDouble.of(high);
  }
}
