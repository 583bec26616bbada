package etchloom.rules;

/**
 * Least electrical spacing by working voltage, direct or peak, up to 3050 m above the sea: IPC-2221
 * table 6-1, the columns that a mask-covered winding needs.
 *
 * <p>Source: IPC-2221A and B, table 6-1, from three independent transcriptions that agree digit for
 * digit; the standard itself was not at hand. Above 500 V the table adds a slope times the excess
 * over 500 V to the value at 500 V; some transcriptions multiply the whole voltage, which is wrong.
 */
enum Spacing2221 {
  /** Inner layers. */
  B1(0.0025, 0.05, 0.05, 0.1, 0.1, 0.2, 0.2, 0.2, 0.2, 0.25),
  /** Outer layers under a permanent polymer coating: the solder mask. */
  B4(0.00305, 0.05, 0.05, 0.13, 0.13, 0.4, 0.4, 0.4, 0.4, 0.8),
  /** Bare terminations on the outside. */
  A6(0.00305, 0.13, 0.25, 0.4, 0.5, 0.8, 0.8, 0.8, 0.8, 1.5);

  private static final double[] UP_TO_VOLT = {15, 30, 50, 100, 150, 170, 250, 300, 500};

  private final double slopeMmPerVolt;

  @SuppressWarnings("ImmutableEnumChecker") // nobody writes to it
  private final double[] spacingMm;

  Spacing2221(double slopeMmPerVolt, double... spacingMm) {
    this.slopeMmPerVolt = slopeMmPerVolt;
    this.spacingMm = spacingMm;
  }

  /**
   * @param volt not negative
   * @return mm
   */
  double requiredMm(double volt) {
    for (int i = 0; i < UP_TO_VOLT.length; i++) {
      if (volt <= UP_TO_VOLT[i]) {
        return spacingMm[i];
      }
    }
    int last = UP_TO_VOLT.length - 1;
    return spacingMm[last] + slopeMmPerVolt * (volt - UP_TO_VOLT[last]);
  }
}
