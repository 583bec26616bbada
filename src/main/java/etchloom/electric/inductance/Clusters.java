package etchloom.electric.inductance;

import etchloom.electric.field.GaussRule;
import java.util.List;

/**
 * A body of filaments in a tree of clusters. Every cluster knows the ball that holds its copper and
 * its multipole moments.
 */
final class Clusters {
  /** Most filaments of a cluster without children: where pairs and moments cost about the same. */
  private static final int LEAF = 20;

  /**
   * Sum of radii over distance at which leaves count as far. With the fourth order this leaves a
   * coupling off by some 1e-5 of the bodies' self couplings.
   */
  private static final double OPENING = 0.75;

  /** Larger clusters must be further apart, by this power of their size: more is at stake. */
  private static final double GROWTH = 0.15;

  /** Exact for a straight piece's moments up to the fifth degree. */
  private static final GaussRule ALONG = new GaussRule(3);

  final Pieces pieces;

  /** Each cluster's range of pieces. */
  final int[] from;

  final int[] to;

  /** Each cluster's first child, the second follows it; 0 for a leaf. */
  final int[] child;

  /** Centres. */
  final double[] x;

  final double[] y;
  final double[] z;

  /** Two clusters are far when these two add up to less than the distance of their centres. */
  final double[] reach;

  /** All clusters' moments, {@link Expansion#VALUES} each. */
  final double[] moment;

  private final double[] radius;

  Clusters(Filaments filaments, List<CrossSection> sections) {
    if (filaments.size() == 0) {
      throw new IllegalArgumentException("no filaments");
    }
    Halving tree = new Halving(filaments, sections, LEAF);
    pieces = new Pieces(filaments, sections, tree.order);
    from = tree.from;
    to = tree.to;
    child = tree.child;
    int n = tree.count;
    x = new double[n];
    y = new double[n];
    z = new double[n];
    radius = new double[n];
    reach = new double[n];
    moment = new double[n * Expansion.VALUES];
    Expansion expansion = new Expansion();
    for (int c = n - 1; c >= 0; c--) {
      if (child[c] == 0) {
        leaf(c, expansion);
      } else {
        join(c, expansion);
      }
      double size = (double) (to[c] - from[c]) / LEAF;
      reach[c] = radius[c] * Math.pow(size, GROWTH) / OPENING;
    }
  }

  /** Another's clusters, turned. */
  private Clusters(Clusters other, double c, double s) {
    pieces = other.pieces.turned(c, s);
    from = other.from;
    to = other.to;
    child = other.child;
    z = other.z;
    radius = other.radius;
    reach = other.reach;
    x = new double[z.length];
    y = new double[z.length];
    for (int i = 0; i < z.length; i++) {
      x[i] = c * other.x[i] - s * other.y[i];
      y[i] = s * other.x[i] + c * other.y[i];
    }
    moment = new Turn(c, s).of(other.moment);
  }

  /** The same body turned counter-clockwise about the shaft. */
  Clusters turned(double rad) {
    return new Clusters(this, Math.cos(rad), Math.sin(rad));
  }

  int size() {
    return pieces.size;
  }

  private void leaf(int c, Expansion expansion) {
    Pieces p = pieces;
    for (int i = from[c]; i < to[c]; i++) {
      double share = 1.0 / (to[c] - from[c]);
      x[c] += share * p.x[i];
      y[c] += share * p.y[i];
      z[c] += share * p.height[i];
    }
    int at = c * Expansion.VALUES;
    double square = 0;
    for (int i = from[c]; i < to[c]; i++) {
      double half = p.length[i] / 2;
      double dx = p.x[i] - x[c];
      double dy = p.y[i] - y[c];
      double dz = p.height[i] - z[c];
      for (int g = 0; g < ALONG.size(); g++) {
        double t = half * ALONG.node(g);
        double w = ALONG.weight(g) / 2;
        double px = dx + t * p.ux[i];
        double py = dy + t * p.uy[i];
        expansion.addPoint(px, py, dz, w * p.jx[i], w * p.jy[i], moment, at);
      }
      double along = p.length[i] * p.length[i] / 24;
      double xx = p.qxx[i] - along * p.ux[i] * p.ux[i];
      double xy = p.qxy[i] - along * p.ux[i] * p.uy[i];
      double yy = p.qyy[i] - along * p.uy[i] * p.uy[i];
      expansion.addSpread(xx, xy, yy, p.qzz[i], p.jx[i], p.jy[i], moment, at);
      double end = Math.abs(dx * p.ux[i] + dy * p.uy[i]) + half;
      double aside = Math.abs(dx * p.uy[i] - dy * p.ux[i]) + p.width[i] / 2;
      square = Math.max(square, end * end + aside * aside + dz * dz);
    }
    radius[c] = Math.sqrt(square);
  }

  private void join(int c, Expansion expansion) {
    int first = child[c];
    int second = first + 1;
    double dx = x[second] - x[first];
    double dy = y[second] - y[first];
    double dz = z[second] - z[first];
    double apart = Math.sqrt(dx * dx + dy * dy + dz * dz);
    radius[c] = Math.max((apart + radius[first] + radius[second]) / 2, radius[first]);
    radius[c] = Math.max(radius[c], radius[second]);
    // The smallest ball round both: from the far side of the one to the far side of the other.
    double t = apart == 0 ? 0 : (radius[c] - radius[first]) / apart;
    t = Math.max(0, Math.min(1, t));
    x[c] = x[first] + t * dx;
    y[c] = y[first] + t * dy;
    z[c] = z[first] + t * dz;
    for (int k = first; k <= second; k++) {
      expansion.addShifted(
          x[k] - x[c],
          y[k] - y[c],
          z[k] - z[c],
          moment,
          k * Expansion.VALUES,
          c * Expansion.VALUES);
    }
  }
}
