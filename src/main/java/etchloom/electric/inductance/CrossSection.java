package etchloom.electric.inductance;

/**
 * The rectangle that stands for a track's copper, across its run.
 *
 * @param widthMm mean width after etching, in the board's plane
 * @param thicknessMm across the board
 * @param heightMm its middle over the board's mid-plane
 */
record CrossSection(double widthMm, double thicknessMm, double heightMm) {
  CrossSection {
    if (!(widthMm > 0 && thicknessMm > 0 && Math.abs(heightMm) < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(
          "no cross-section: " + widthMm + " mm by " + thicknessMm + " mm at " + heightMm + " mm");
    }
  }
}
