package etchloom.electric.field;

/**
 * Harmonics of the field of one sheet of alternating magnets: the magnets' charge, as a Fourier
 * series round the shaft at each radius, times the ring kernel, integrated over the radius.
 *
 * <p>Panels shrink towards the field point to the distance from the sheet, and a cosine stretch
 * takes the square roots out of the outlines' ends; the relative error is below 1e-6 while the
 * point is at least a hundredth of the magnet's size off the sheet (held against the solid angles
 * by a test).
 */
final class SheetHarmonics {
  private static final GaussRule RULE = new GaussRule(8);

  /** Panels this long at most, as a share of their distance from the point. */
  private static final double PANEL = 1.6;

  private static final int LEAST_DEPTH = 2;

  /**
   * A point nearer to the sheet than this share of its radius is taken to be this far off: closer
   * by, the kernel's cost grows without bound, and no built air gap comes near it.
   */
  private static final double NEAREST = 1e-3;

  /** A stretch of the outline this small beside the whole needs no parting for its own sake. */
  private static final double SHORT = 0.1;

  private static final int MOST_DEPTH = 24;

  private final MagnetShape shape;
  private final int polePairs;
  private final double[] breaks;
  private final RingKernel kernel;
  private final double[][] kernelOut;
  private final int[] kernelCount;
  private final double[] rings;
  private final double[] weights;

  private double r;
  private double d;
  private double scale;
  private double[] out;
  private boolean radial;
  private double low;
  private double high;

  SheetHarmonics(MagnetShape shape, int polePairs, int orders) {
    this.shape = shape;
    this.polePairs = polePairs;
    breaks = shape.breaksMm();
    int n = RULE.size();
    kernel = new RingKernel(polePairs, orders, n);
    kernelOut = new double[n][orders];
    kernelCount = new int[n];
    rings = new double[n];
    weights = new double[n];
  }

  /**
   * Adds a sheet's part to the amplitudes at one place.
   *
   * @param radiusMm of the place
   * @param heightMm of the place over the sheet, not 0
   * @param chargeTesla the sheet's remanence with its sign
   * @param amplitudes T, entry i for order 2i + 1
   */
  void add(double radiusMm, double heightMm, double chargeTesla, double[] amplitudes) {
    radial = false;
    addAll(radiusMm, heightMm, chargeTesla, amplitudes);
  }

  /** The same for the field along the radius, outwards. */
  void addRadial(double radiusMm, double heightMm, double chargeTesla, double[] amplitudes) {
    radial = true;
    addAll(radiusMm, heightMm, chargeTesla, amplitudes);
  }

  private void addAll(double radiusMm, double heightMm, double chargeTesla, double[] amplitudes) {
    if (radiusMm <= 0) {
      return;
    }
    r = radiusMm;
    d = Math.copySign(Math.max(Math.abs(heightMm), NEAREST * radiusMm), heightMm);
    out = amplitudes;
    scale = chargeTesla / (4 * Math.PI) * 4 / Math.PI;
    double whole = breaks[breaks.length - 1] - breaks[0];
    for (int i = 0; i + 1 < breaks.length; i++) {
      low = breaks[i];
      high = breaks[i + 1];
      if (high - low > 1e-9 * high) {
        panel(0, 1, high - low > SHORT * whole ? 0 : LEAST_DEPTH);
      }
    }
  }

  private double radius(double t) {
    return low + (high - low) * 0.5 * (1 - Math.cos(Math.PI * t));
  }

  private void panel(double t0, double t1, int depth) {
    double s0 = radius(t0);
    double s1 = radius(t1);
    double off = Math.max(0, Math.max(s0 - r, r - s1));
    boolean fine = s1 - s0 <= PANEL * Math.hypot(d, off);
    if (depth < LEAST_DEPTH || (!fine && depth < MOST_DEPTH)) {
      double mid = (t0 + t1) / 2;
      panel(t0, mid, depth + 1);
      panel(mid, t1, depth + 1);
      return;
    }
    double half = (t1 - t0) / 2;
    for (int i = 0; i < RULE.size(); i++) {
      double t = t0 + half * (1 + RULE.node(i));
      double stretch = (high - low) * 0.5 * Math.PI * Math.sin(Math.PI * t);
      rings[i] = radius(t);
      weights[i] = half * RULE.weight(i) * stretch;
    }
    if (radial) {
      kernel.fillRadial(r, rings, d, kernelOut, kernelCount);
    } else {
      kernel.fill(r, rings, d, kernelOut, kernelCount);
    }
    for (int i = 0; i < RULE.size(); i++) {
      ring(rings[i], weights[i] * scale * rings[i], kernelCount[i], kernelOut[i]);
    }
  }

  /** One ring: charge of order ν is 4/(νπ) (sin νPb − sin νPa) between the outline's angles. */
  private void ring(double s, double w, int n, double[] values) {
    if (n == 0) {
      return;
    }
    series(shape.toRad(s), w, n, values);
    double from = shape.fromRad(s);
    if (from > 0) {
      series(from, -w, n, values);
    }
  }

  private void series(double angle, double w, int n, double[] values) {
    double x = polePairs * angle;
    double twice = 2 * Math.cos(2 * x);
    double now = Math.sin(x);
    double before = -now;
    for (int i = 0; i < n; i++) {
      out[i] += w * now / (2 * i + 1) * values[i];
      double next = twice * now - before;
      before = now;
      now = next;
    }
  }
}
