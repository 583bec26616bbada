package etchloom.electric.inductance;

import etchloom.electric.field.GaussRule;
import java.util.Arrays;
import java.util.List;

/**
 * Filaments in a tree of clusters: each is halved across its longest side until few are left. Every
 * cluster knows the ball that holds its filaments and its multipole moments.
 */
final class Clusters {
  /** A cluster of no more filaments is not halved. */
  static final int LEAF = 20;

  /** Exact for the moments of a straight piece up to the fifth degree. */
  private static final GaussRule ALONG = new GaussRule(3);

  final Pieces pieces;
  private final List<CrossSection> sections;
  private final Filaments filaments;
  private final int[] order;

  /** Range of pieces, and the first child (the other follows it) or 0 for a leaf. */
  int[] from = new int[64];

  int[] to = new int[64];
  int[] child = new int[64];
  double[] x = new double[64];
  double[] y = new double[64];
  double[] z = new double[64];
  double[] radius = new double[64];
  double[] moment;
  private int count;

  Clusters(Filaments f, List<CrossSection> sections) {
    if (f.size() == 0) {
      throw new IllegalArgumentException("no filaments");
    }
    this.filaments = f;
    this.sections = sections;
    order = new int[f.size()];
    for (int i = 0; i < order.length; i++) {
      order[i] = i;
    }
    add(0, order.length);
    for (int c = 0; c < count; c++) {
      halve(c);
    }
    pieces = new Pieces(f, sections, order);
    moment = new double[count * 2 * Expansion.TERMS];
    Expansion expansion = new Expansion();
    for (int c = count - 1; c >= 0; c--) {
      if (child[c] == 0) {
        leaf(c, expansion);
      } else {
        join(c, expansion);
      }
    }
  }

  int size() {
    return pieces.size;
  }

  /** Where a cluster's moments begin. */
  static int moments(int cluster) {
    return cluster * 2 * Expansion.TERMS;
  }

  private int add(int first, int last) {
    if (count == from.length) {
      from = Arrays.copyOf(from, 2 * count);
      to = Arrays.copyOf(to, 2 * count);
      child = Arrays.copyOf(child, 2 * count);
      x = Arrays.copyOf(x, 2 * count);
      y = Arrays.copyOf(y, 2 * count);
      z = Arrays.copyOf(z, 2 * count);
      radius = Arrays.copyOf(radius, 2 * count);
    }
    from[count] = first;
    to[count] = last;
    return count++;
  }

  /** Finds a cluster's centre and, if it is large, cuts it in two. */
  private void halve(int c) {
    double[] least = {Double.MAX_VALUE, Double.MAX_VALUE, Double.MAX_VALUE};
    double[] most = {-Double.MAX_VALUE, -Double.MAX_VALUE, -Double.MAX_VALUE};
    for (int k = from[c]; k < to[c]; k++) {
      for (int axis = 0; axis < 3; axis++) {
        double at = place(order[k], axis);
        double half = axis == 2 ? 0 : halfExtent(order[k], axis);
        least[axis] = Math.min(least[axis], at - half);
        most[axis] = Math.max(most[axis], at + half);
      }
    }
    x[c] = (least[0] + most[0]) / 2;
    y[c] = (least[1] + most[1]) / 2;
    z[c] = (least[2] + most[2]) / 2;
    int n = to[c] - from[c];
    if (n <= LEAF) {
      return;
    }
    int axis = 0;
    for (int k = 1; k < 3; k++) {
      if (most[k] - least[k] > most[axis] - least[axis]) {
        axis = k;
      }
    }
    int middle = part(from[c], to[c], axis, (least[axis] + most[axis]) / 2);
    if (middle == from[c] || middle == to[c]) {
      middle = from[c] + n / 2;
    }
    child[c] = add(from[c], middle);
    add(middle, to[c]);
  }

  private double place(int i, int axis) {
    return axis == 0
        ? filaments.x(i)
        : axis == 1 ? filaments.y(i) : sections.get(filaments.section(i)).heightMm();
  }

  private double halfExtent(int i, int axis) {
    return Math.abs(axis == 0 ? filaments.ux(i) : filaments.uy(i)) * filaments.length(i) / 2;
  }

  /** Those below the cut first; gives where the others begin. */
  private int part(int first, int last, int axis, double cut) {
    int low = first;
    int high = last - 1;
    while (low <= high) {
      if (place(order[low], axis) < cut) {
        low++;
      } else {
        int swap = order[low];
        order[low] = order[high];
        order[high--] = swap;
      }
    }
    return low;
  }

  private void leaf(int c, Expansion expansion) {
    Pieces p = pieces;
    int at = moments(c);
    double r2 = 0;
    for (int i = from[c]; i < to[c]; i++) {
      double half = p.length[i] / 2;
      double dx = p.x[i] - x[c];
      double dy = p.y[i] - y[c];
      double dz = p.height[i] - z[c];
      for (int g = 0; g < ALONG.size(); g++) {
        double t = half * ALONG.node(g);
        double w = ALONG.weight(g) / 2;
        expansion.addPoint(
            dx + t * p.ux[i], dy + t * p.uy[i], dz, w * p.jx[i], w * p.jy[i], moment, at);
      }
      CrossSection s = sections.get(p.section[i]);
      double across = s.widthMm() * s.widthMm() / 24;
      double xx = across * p.uy[i] * p.uy[i];
      double xy = -across * p.ux[i] * p.uy[i];
      double yy = across * p.ux[i] * p.ux[i];
      Expansion.addSpread(xx, xy, yy, p.qzz[i], p.jx[i], moment, at);
      Expansion.addSpread(xx, xy, yy, p.qzz[i], p.jy[i], moment, at + Expansion.TERMS);
      double end = Math.abs(dx * p.ux[i] + dy * p.uy[i]) + half;
      double aside = dx * p.uy[i] - dy * p.ux[i];
      r2 = Math.max(r2, end * end + aside * aside + dz * dz);
    }
    radius[c] = Math.sqrt(r2);
  }

  private void join(int c, Expansion expansion) {
    for (int k = child[c]; k < child[c] + 2; k++) {
      double dx = x[k] - x[c];
      double dy = y[k] - y[c];
      double dz = z[k] - z[c];
      expansion.addShifted(dx, dy, dz, moment, moments(k), moment, moments(c));
      double far = Math.sqrt(dx * dx + dy * dy + dz * dz) + radius[k];
      radius[c] = Math.max(radius[c], far);
    }
  }
}
