package etchloom.electric.machine.emf;

/**
 * The rotor's field integrated along one conductor, entry i of each for the odd order ν = 2i + 1:
 * {@code G = ∫ r b e^(iνPφ) dr}, Wb, whose part of dλ/dθ is {@code Re Σ G e^(−iνPθ)}, and {@code ∫
 * b² dl}, T²·mm, in which wider stretches count by the cube of their width.
 */
final class TrackIntegral {
  private final double[] re;
  private final double[] im;
  private final double[] squares;

  /** The arrays are taken over, not copied. */
  TrackIntegral(double[] re, double[] im, double[] squares) {
    this.re = re;
    this.im = im;
    this.squares = squares;
  }

  double re(int i) {
    return re[i];
  }

  double im(int i) {
    return im[i];
  }

  double square(int i) {
    return squares[i];
  }

  FluxSeries series(int polePairs) {
    return new FluxSeries(polePairs, re, im);
  }

  /** The same conductor turned counter-clockwise about the shaft. */
  TrackIntegral rotated(int polePairs, double rad) {
    double[] c = new double[re.length];
    double[] s = new double[re.length];
    for (int i = 0; i < re.length; i++) {
      double a = (2 * i + 1) * polePairs * rad;
      c[i] = re[i] * Math.cos(a) - im[i] * Math.sin(a);
      s[i] = re[i] * Math.sin(a) + im[i] * Math.cos(a);
    }
    return new TrackIntegral(c, s, squares);
  }
}
