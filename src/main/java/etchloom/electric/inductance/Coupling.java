package etchloom.electric.inductance;

/** Neumann's integral between two bodies of filaments, mm, clusters far apart taken as wholes. */
final class Coupling {
  private final Clusters a;
  private final Clusters b;
  private final Mirror mirror;
  private final PairSum pairs;
  private final Expansion expansion = new Expansion();

  Coupling(Clusters a, Clusters b, Mirror mirror, Distances distances) {
    this.a = a;
    this.b = b;
    this.mirror = mirror;
    pairs = new PairSum(a.pieces, b.pieces, mirror, distances);
  }

  /** A cluster with itself; of one body and its own place only. */
  double within(int c) {
    int child = a.child[c];
    if (child == 0) {
      return pairs.within(a.from[c], a.to[c]);
    }
    return within(child) + within(child + 1) + 2 * between(child, child + 1);
  }

  /** One cluster of the first body with one of the second. */
  double between(int i, int j) {
    if (far(i, j)) {
      return expansion.couple(
          b.x[j] - a.x[i],
          b.y[j] - a.y[i],
          mirror.heightMm(b.z[j]) - a.z[i],
          a.moment,
          i * Expansion.VALUES,
          b.moment,
          j * Expansion.VALUES,
          mirror.sign() < 0);
    }
    int ci = a.child[i];
    int cj = b.child[j];
    if (ci == 0 && cj == 0) {
      return pairs.block(a.from[i], a.to[i], b.from[j], b.to[j]);
    }
    return splitFirst(i, j)
        ? between(ci, j) + between(ci + 1, j)
        : between(i, cj) + between(i, cj + 1);
  }

  boolean far(int i, int j) {
    double dx = b.x[j] - a.x[i];
    double dy = b.y[j] - a.y[i];
    double dz = mirror.heightMm(b.z[j]) - a.z[i];
    double reach = a.reach[i] + b.reach[j];
    return reach * reach < dx * dx + dy * dy + dz * dz;
  }

  /** Whether the first is to be halved rather than the second; not both leaves. */
  boolean splitFirst(int i, int j) {
    return b.child[j] == 0 || a.child[i] != 0 && a.reach[i] >= b.reach[j];
  }
}
