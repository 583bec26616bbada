package etchloom.report;

/**
 * The unit in which a plot's values are read with ease.
 *
 * @param factor what values are multiplied by
 */
record Scale(double factor, String unit) {
  private static final String[] PREFIXES = {"p", "n", "\u00b5", "m", "", "k", "M"};
  private static final int PLAIN = 4;

  /**
   * @param most the largest size shown
   */
  static Scale of(double most, String unit) {
    int step = most > 0 ? (int) Math.floor(Math.log10(most) / 3) : 0;
    int i = Math.max(0, Math.min(PREFIXES.length - 1, PLAIN + step));
    return new Scale(Math.pow(10, 3.0 * (PLAIN - i)), PREFIXES[i] + unit);
  }
}
