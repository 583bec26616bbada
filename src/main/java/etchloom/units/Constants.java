package etchloom.units;

/** Physical constants, each with its source. SI unless the name says otherwise. */
public final class Constants {
  private Constants() {}

  /**
   * Resistivity of standard annealed copper at 20 C, ohm m: 1/58 ohm mm2/m. IEC 60028:1925,
   * "International standard of resistance for copper" (recalled; universally quoted).
   */
  public static final double COPPER_RESISTIVITY_20C = 1 / 58e6;

  /** Temperature coefficient of that resistivity at 20 C, per kelvin. IEC 60028 (recalled). */
  public static final double COPPER_ALPHA_20C = 0.00393;

  /** The temperature the two figures above stand for, C. */
  public static final double COPPER_REFERENCE_C = 20;

  /**
   * Magnetic constant, H/m. 4π·1e-7 was exact until the SI of 2019 and is within 6e-10 of the
   * measured value since (CODATA 2018).
   */
  public static final double MU_0 = 4e-7 * Math.PI;

  /** Millimetres in an inch, exact: international yard and pound agreement, 1959. */
  public static final double MM_PER_INCH = 25.4;

  /**
   * Nominal thickness of 1 oz/ft2 copper foil, mm: 1.35 mil. IPC-4562 (secondhand). Finished copper
   * comes from the fab's row, not from this; it serves only to see whether a stackup can add up.
   */
  public static final double NOMINAL_OUNCE_MM = 0.0343;

  /** Zero of the thermodynamic scale, C, exact: SI brochure, 9th edition, 2019. */
  public static final double ABSOLUTE_ZERO_C = -273.15;

  /**
   * Resistivity of copper at a temperature, ohm m, linear about 20 C (IEC 60028). Good to about 1 %
   * between -50 C and 200 C.
   *
   * @param celsius the copper's temperature; finite
   */
  public static double copperResistivity(double celsius) {
    return COPPER_RESISTIVITY_20C * (1 + COPPER_ALPHA_20C * (celsius - COPPER_REFERENCE_C));
  }
}
