package etchloom.rules;

import etchloom.geometry.ShapeTree;
import java.util.List;

/**
 * Finds the pairs of a layer's pieces that come near each other, for several rules at once.
 *
 * <p>The gap up to which pairs are looked for starts narrow and widens as long as a rule wants
 * more; within a round it shrinks with the tightest gaps found, which cuts most of the work off: on
 * a wound board thousands of gaps are equal to the last digit.
 */
final class PairSearch implements ShapeTree.PairVisitor {
  /** By how much each round looks further than the one before. */
  private static final double WIDEN = 4;

  private final LayerCopper copper;
  private final Gaps gaps;
  private final double bendMm;
  private final List<PairWatch> watches;
  private double capMm;

  /**
   * @param spaceMm the space by which neighbours along the copper are told, and which bends must
   *     keep
   */
  PairSearch(LayerCopper copper, double spaceMm, List<PairWatch> watches) {
    this.copper = copper;
    this.gaps = new Gaps(copper.walk(), spaceMm);
    this.bendMm = spaceMm - Board.SLACK_MM;
    this.watches = watches;
  }

  /**
   * @param startMm gap of the first round
   * @param endMm gap beyond which there is nothing more to find
   */
  void run(double startMm, double endMm) {
    capMm = startMm;
    copper.tree().pairs(capMm, this);
    while (capMm < endMm && more()) {
      capMm *= WIDEN;
      copper.tree().pairs(capMm, this);
    }
  }

  private boolean more() {
    for (PairWatch w : watches) {
      if (w.more(capMm)) {
        return true;
      }
    }
    return false;
  }

  @Override
  public double visit(int i, int j, double limitMm) {
    Piece p = copper.pieces().get(i);
    Piece q = copper.pieces().get(j);
    Gaps.Gap g = gaps.gap(p, q, limitMm, bendMm);
    if (g == null) {
      return limitMm;
    }
    double gap = g.centres().distanceMm() - p.fatMm() - q.fatMm();
    Close pair = new Close(i, j, p, q, gap, g.centres(), g.bend());
    double wanted = 0;
    for (PairWatch w : watches) {
      w.see(pair);
      wanted = Math.max(wanted, w.wantedMm());
    }
    return Math.min(capMm, wanted);
  }
}
