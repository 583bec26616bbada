package etchloom.rules;

import etchloom.geometry.Point;
import etchloom.rules.Verdicts.Measured;
import java.util.List;

/**
 * {@code edge} for copper: how far it stays from the board's edge and bore. Copper beyond them
 * counts as a distance below 0.
 */
final class EdgeRule implements LayerRule {
  @Override
  public void check(Layer layer, Verdicts verdicts) {
    Outline outline = layer.board().outline();
    Nearby copper = layer.copper().nearby(Double.POSITIVE_INFINITY);
    for (Outline.Edge e : outline.edges()) {
      copper.look(
          e.shape(),
          0,
          layer.board().fab().edge().copperMm(),
          (i, gap, n) -> {
            Piece p = layer.copper().pieces().get(i);
            boolean beyond = outline.beyond(e, n.onSecond());
            double depth = beyond ? -n.distanceMm() - p.fatMm() : gap;
            add(layer, verdicts, i, Board.middle(n, 0, p.fatMm()), depth, e.what());
            return depth;
          });
    }
    strays(layer, verdicts);
  }

  /**
   * Copper that lies beyond the edge as a whole, too far from it to be found along it: connected
   * copper that never comes near the edge is on one side of it, so one point tells.
   */
  private static void strays(Layer layer, Verdicts verdicts) {
    Outline outline = layer.board().outline();
    List<Piece> pieces = layer.copper().pieces();
    int conductor = -1;
    for (int i = 0; i < pieces.size(); i++) {
      Piece p = pieces.get(i);
      boolean first = p.isPad() || p.conductor() != conductor;
      conductor = p.conductor();
      Point at = p.shape().start();
      if (first && !outline.inside(at)) {
        Outline.Depth d = outline.depth(at);
        add(layer, verdicts, i, at, d.depthMm() - p.fatMm(), d.what());
      }
    }
  }

  private static void add(
      Layer layer, Verdicts verdicts, int i, Point at, double depthMm, String edge) {
    verdicts.add(
        Measured.atLeast(
                RuleName.EDGE,
                layer.number(),
                at,
                depthMm,
                layer.board().fab().edge().copperMm(),
                Words.of(layer.words(layer.copper().pieces().get(i)), " and ", edge))
            .byMargin()
            .ids(i, 0));
  }
}
