package etchloom.electric.inductance;

import java.util.List;

/**
 * Filaments laid out for sums over pairs, in an order that keeps neighbours together. Lengths in
 * mm.
 *
 * <p>{@code qxx} and the like are half the second moments of the piece as a bar (length, width,
 * thickness), {@code reach} the square of its size, for pairs some sizes apart.
 */
final class Pieces {
  /** A width weighs so much more than a length: expansions go to higher order along than across. */
  private static final double ACROSS = 1.6;

  final int size;
  final double[] x;
  final double[] y;
  final double[] ux;
  final double[] uy;
  final double[] length;
  final double[] ampere;
  final double[] jx;
  final double[] jy;
  final double[] qxx;
  final double[] qxy;
  final double[] qyy;
  final double[] qzz;
  final double[] height;
  final double[] width;
  final double[] reach;
  final int[] section;

  /**
   * @param order for each place the filament that goes there
   */
  Pieces(Filaments f, List<CrossSection> sections, int[] order) {
    size = f.size();
    x = new double[size];
    y = new double[size];
    ux = new double[size];
    uy = new double[size];
    length = new double[size];
    ampere = new double[size];
    jx = new double[size];
    jy = new double[size];
    qxx = new double[size];
    qxy = new double[size];
    qyy = new double[size];
    qzz = new double[size];
    height = new double[size];
    width = new double[size];
    reach = new double[size];
    section = new int[size];
    for (int i = 0; i < size; i++) {
      copy(f, order[i], i);
      shape(sections.get(section[i]), i);
    }
  }

  /** Those of another, turned; what does not turn is shared. */
  private Pieces(Pieces o, double c, double s) {
    size = o.size;
    length = o.length;
    ampere = o.ampere;
    height = o.height;
    width = o.width;
    reach = o.reach;
    section = o.section;
    qzz = o.qzz;
    x = new double[size];
    y = new double[size];
    ux = new double[size];
    uy = new double[size];
    jx = new double[size];
    jy = new double[size];
    qxx = new double[size];
    qxy = new double[size];
    qyy = new double[size];
    for (int i = 0; i < size; i++) {
      x[i] = c * o.x[i] - s * o.y[i];
      y[i] = s * o.x[i] + c * o.y[i];
      ux[i] = c * o.ux[i] - s * o.uy[i];
      uy[i] = s * o.ux[i] + c * o.uy[i];
      jx[i] = c * o.jx[i] - s * o.jy[i];
      jy[i] = s * o.jx[i] + c * o.jy[i];
      double mixed = 2 * s * c * o.qxy[i];
      qxx[i] = c * c * o.qxx[i] + s * s * o.qyy[i] - mixed;
      qyy[i] = s * s * o.qxx[i] + c * c * o.qyy[i] + mixed;
      qxy[i] = s * c * (o.qxx[i] - o.qyy[i]) + (c * c - s * s) * o.qxy[i];
    }
  }

  /**
   * The same pieces turned counter-clockwise about the shaft.
   *
   * @param c cosine of the angle
   * @param s sine of the angle
   */
  Pieces turned(double c, double s) {
    return new Pieces(this, c, s);
  }

  private void copy(Filaments f, int from, int i) {
    x[i] = f.x(from);
    y[i] = f.y(from);
    ux[i] = f.ux(from);
    uy[i] = f.uy(from);
    length[i] = f.length(from);
    ampere[i] = f.ampere(from);
    section[i] = f.section(from);
    jx[i] = ampere[i] * length[i] * ux[i];
    jy[i] = ampere[i] * length[i] * uy[i];
  }

  private void shape(CrossSection s, int i) {
    double along = length[i] * length[i] / 24;
    double across = s.widthMm() * s.widthMm() / 24;
    qxx[i] = along * ux[i] * ux[i] + across * uy[i] * uy[i];
    qxy[i] = (along - across) * ux[i] * uy[i];
    qyy[i] = along * uy[i] * uy[i] + across * ux[i] * ux[i];
    qzz[i] = s.thicknessMm() * s.thicknessMm() / 24;
    height[i] = s.heightMm();
    width[i] = s.widthMm();
    double size = Math.max(length[i], ACROSS * Math.max(s.widthMm(), s.thicknessMm()));
    reach[i] = size * size;
  }
}
