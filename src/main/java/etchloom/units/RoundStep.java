package etchloom.units;

/** Steps that people read with ease. */
public final class RoundStep {
  private RoundStep() {}

  /**
   * The smallest of 1, 2 and 5 times a power of ten that is not less.
   *
   * @param least positive and finite
   */
  public static double atLeast(double least) {
    if (!(least > 0 && Double.isFinite(least))) {
      throw new IllegalArgumentException("a step must be positive and finite, got " + least);
    }
    int power = (int) Math.floor(Math.log10(least)) - 1;
    while (true) {
      for (int k : new int[] {1, 2, 5}) {
        double step = decimal(k, power);
        if (step >= least) {
          return step;
        }
      }
      power++;
    }
  }

  /** Exact where a double can be: 3 hundredths are 3 / 100, not 3 times 0.01. */
  private static double decimal(int k, int power) {
    return power < 0 ? k / Math.pow(10, -power) : k * Math.pow(10, power);
  }
}
