package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.rules.Verdicts.Measured;
import etchloom.spec.FabRules;
import java.util.Optional;

/**
 * {@code space}: the gap between any two pieces of copper on a layer, whatever their nets, for a
 * winding is one net and a short between its turns is still a short.
 */
final class SpaceRule implements Rule {
  @Override
  public void check(Board board, Verdicts verdicts) {
    for (LayerCopper copper : board.copper()) {
      Optional<FabRules.CopperRow> row = board.row(copper.layer());
      if (row.isPresent()) {
        check(board, copper, row.get().spaceMm(), verdicts);
      }
    }
  }

  private static void check(Board board, LayerCopper copper, double required, Verdicts verdicts) {
    double limit = Math.max(required, board.spec().coil().spaceMm()) + Board.SLACK_MM;
    for (Close c : board.close(copper.layer()).nearest(limit, board.sizeMm())) {
      if (!c.bend() || c.gapMm() < required - Board.SLACK_MM) {
        verdicts.add(
            Measured.atLeast(
                    RuleName.SPACE,
                    copper.layer(),
                    c.at(),
                    c.gapMm(),
                    required,
                    () -> words(board.artwork(), copper, c))
                .ids(c.first(), c.second()));
      }
    }
  }

  static String words(Artwork artwork, LayerCopper copper, Close c) {
    return LayerCopper.words(artwork, copper.pieces().get(c.first()))
        + " and "
        + LayerCopper.words(artwork, copper.pieces().get(c.second()));
  }
}
