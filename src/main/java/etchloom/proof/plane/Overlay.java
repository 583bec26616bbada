package etchloom.proof.plane;

/** Figures laid over each other. */
public final class Overlay {
  /** Keeps the winding number of a base figure apart from that of what is laid over it. */
  private static final int BASE = 1 << 20;

  private Overlay() {}

  /** All that the rings wind round at least once, counter-clockwise. */
  public static Figure union(EdgeSet rings) {
    return new Figure(new Arrangement(rings), rings.circles(), w -> w > 0);
  }

  /** All that the rings wind round, either way. */
  public static Figure nonZero(EdgeSet rings) {
    return new Figure(new Arrangement(rings), rings.circles(), w -> w != 0);
  }

  /** A figure with more laid on. */
  public static Figure add(Figure base, EdgeSet rings) {
    EdgeSet all = base.toEdges(base.circles(), 1);
    all.addAll(rings, 0, 0, 1);
    return union(all);
  }

  /** A figure less all that the rings wind round. */
  public static Figure subtract(Figure base, EdgeSet rings) {
    EdgeSet all = base.toEdges(base.circles(), BASE);
    all.addAll(rings, 0, 0, 1);
    return new Figure(new Arrangement(all), all.circles(), w -> based(w) && over(w) <= 0);
  }

  private static boolean based(int w) {
    return Math.floorDiv(w + BASE / 2, BASE) > 0;
  }

  private static int over(int w) {
    return w - Math.floorDiv(w + BASE / 2, BASE) * BASE;
  }

  /**
   * What two figures do not have in common.
   *
   * @param toleranceNm corners no farther apart, or beside an edge, are taken for the same, so that
   *     figures that differ by rounding alone cancel
   */
  public static Difference compare(Figure a, Figure b, int toleranceNm) {
    EdgeSet all = Snap.difference(a, b, toleranceNm);
    Arrangement parts = new Arrangement(all.cancelled());
    return new Difference(
        new Figure(parts, all.circles(), w -> w > 0), new Figure(parts, all.circles(), w -> w < 0));
  }

  /**
   * @param onlyFirst what only the first figure covers
   * @param onlySecond what only the second covers
   */
  public record Difference(Figure onlyFirst, Figure onlySecond) {
    public double areaMm2() {
      return onlyFirst.areaMm2() + onlySecond.areaMm2();
    }
  }
}
