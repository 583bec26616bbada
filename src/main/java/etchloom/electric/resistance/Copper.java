package etchloom.electric.resistance;

/**
 * The metal: resistivity by the International Annealed Copper Standard, IEC 60028:1925 (recalled,
 * no text at hand): 1/58 Ω·mm²/m and 0.00393 per kelvin, both at 20 °C.
 *
 * <p>Plated copper is often 1 to 3 % worse; the standard's value is used for foil and barrels
 * alike.
 */
public final class Copper {
  /** Ω·m at 20 °C. */
  public static final double RESISTIVITY_20_OHM_METRE = 1 / 58e6;

  /** Per kelvin, referred to 20 °C. */
  public static final double TEMPERATURE_COEFFICIENT_20 = 0.00393;

  /** The temperature at which catalogue values are given, °C. */
  public static final double REFERENCE_C = 20;

  /** Where the linear law reaches nought, °C; it means nothing from there down. */
  private static final double ZERO_C = REFERENCE_C - 1 / TEMPERATURE_COEFFICIENT_20;

  private Copper() {}

  /**
   * Resistance at a temperature over that at 20 °C, the linear law.
   *
   * @throws IllegalArgumentException at or below -234.5 °C, and for what is no number
   */
  public static double factor(double tempC) {
    if (!(tempC > ZERO_C && tempC < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException("no copper resistance at " + tempC + " C");
    }
    return 1 + TEMPERATURE_COEFFICIENT_20 * (tempC - REFERENCE_C);
  }

  /** Ω·m. */
  public static double resistivityOhmMetre(double tempC) {
    return RESISTIVITY_20_OHM_METRE * factor(tempC);
  }
}
