package etchloom.electric.machine.emf;

/**
 * The change of a phase's flux linkage with the rotor's angle, as a series over odd orders: {@code
 * dλ/dθ = Re Σ G e^(−iνPθ)}. In V·s/rad: times the speed it is the open-circuit voltage.
 */
public final class FluxSeries {
  private final int polePairs;
  private final double[] re;
  private final double[] im;

  /**
   * @param re of each odd order, the fundamental first, V·s/rad
   */
  public FluxSeries(int polePairs, double[] re, double[] im) {
    this.polePairs = polePairs;
    this.re = re.clone();
    this.im = im.clone();
  }

  public int polePairs() {
    return polePairs;
  }

  /** How many odd orders there are, the first the fundamental. */
  public int orders() {
    return re.length;
  }

  /** Real part of G of the order 2i + 1. */
  public double re(int i) {
    return re[i];
  }

  public double im(int i) {
    return im[i];
  }

  /** Peak of the order 2i + 1, V·s/rad. */
  public double amplitude(int i) {
    return Math.hypot(re[i], im[i]);
  }

  /**
   * dλ/dθ at a rotor angle, Wb.
   *
   * @param rotorRad mechanical, counter-clockwise
   */
  public double slope(double rotorRad) {
    double sum = 0;
    for (int i = 0; i < re.length; i++) {
      double a = (2 * i + 1) * polePairs * rotorRad;
      sum += re[i] * Math.cos(a) + im[i] * Math.sin(a);
    }
    return sum;
  }

  /** The flux linkage itself at a rotor angle, Wb. */
  public double linkage(double rotorRad) {
    double sum = 0;
    for (int i = 0; i < re.length; i++) {
      int n = (2 * i + 1) * polePairs;
      double a = n * rotorRad;
      sum += (re[i] * Math.sin(a) - im[i] * Math.cos(a)) / n;
    }
    return sum;
  }

  /**
   * Mechanical angle at which current into the phase makes field out of L1, by the copper itself,
   * rad in [0, 2π/pole pairs). There the phase's flux is least when a north face looks at it.
   */
  public double axisRad() {
    double turn = 2 * Math.PI;
    // λ = −λ̂ cos P(axis − θ), since a north face sends its field into L1; so G = i P λ̂ e^(iP
    // axis).
    double a = Math.atan2(-re[0], im[0]);
    a = a < 0 ? a + turn : a;
    return (turn - a < 1e-9 ? 0 : a + 0.0) / polePairs;
  }
}
