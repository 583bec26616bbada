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
  B1(1),
  /** Outer layers under a permanent polymer coating: the solder mask. */
  B4(2),
  /** Bare terminations on the outside. */
  A6(3);

  /** The voltage up to which a row holds, then mm in the columns B1, B4, A6. */
  private static final double[][] ROWS = {
    {15, 0.05, 0.05, 0.13},
    {30, 0.05, 0.05, 0.25},
    {50, 0.1, 0.13, 0.4},
    {100, 0.1, 0.13, 0.5},
    {150, 0.2, 0.4, 0.8},
    {170, 0.2, 0.4, 0.8},
    {250, 0.2, 0.4, 0.8},
    {300, 0.2, 0.4, 0.8},
    {500, 0.25, 0.8, 1.5},
  };

  /** The same for every volt above the last row. */
  private static final double[] SLOPE = {1, 0.0025, 0.00305, 0.00305};

  private final int column;

  Spacing2221(int column) {
    this.column = column;
  }

  /**
   * @param volt not negative
   * @return mm
   */
  double requiredMm(double volt) {
    for (double[] row : ROWS) {
      if (volt <= row[0]) {
        return row[column];
      }
    }
    double[] last = ROWS[ROWS.length - 1];
    return last[column] + SLOPE[column] * (volt - last[0]);
  }
}
