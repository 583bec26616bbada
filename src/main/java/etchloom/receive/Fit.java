package etchloom.receive;

/**
 * How well a board's pairs agree with a pattern when all are taken times one common factor.
 *
 * @param possible whether the same pairs are open
 * @param common mean of {@code ln(measured / pattern)}; nought where all are open
 * @param misfit the largest difference between two pairs' departures over what is allowed; up to 1
 *     the pattern explains the readings
 */
record Fit(boolean possible, double common, double misfit) {

  /** What two pairs' departures from a pattern may differ by. */
  interface Allowance {
    double of(int pair, int other);
  }

  /**
   * @param ohm measured, at 20 °C, by pair; NaN where it was not, infinite where it is open
   */
  static Fit of(double[] ohm, double[] pattern, Allowance allowance) {
    double[] off = new double[ohm.length];
    double sum = 0;
    int n = 0;
    for (int p = 0; p < ohm.length; p++) {
      off[p] = Double.NaN;
      if (Double.isNaN(ohm[p])) {
        continue;
      }
      boolean open = Double.isInfinite(ohm[p]);
      if (open != Double.isInfinite(pattern[p])) {
        return new Fit(false, 0, Double.POSITIVE_INFINITY);
      }
      if (!open) {
        off[p] = Math.log(ohm[p] / pattern[p]);
        sum += off[p];
        n++;
      }
    }
    double misfit = 0;
    for (int p = 0; p < off.length; p++) {
      for (int q = p + 1; q < off.length; q++) {
        double apart = Math.abs(off[p] - off[q]); // NaN where either is missing
        if (apart > 0) {
          misfit = Math.max(misfit, apart / allowance.of(p, q));
        }
      }
    }
    return new Fit(true, n == 0 ? 0 : sum / n, misfit);
  }

  boolean explains() {
    return possible && misfit <= 1;
  }
}
