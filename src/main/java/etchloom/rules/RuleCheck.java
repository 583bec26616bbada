package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.List;

/**
 * May this board be made? Holds an artwork against the fab's rules.
 *
 * <p>Distances between lines and arcs are exact and compared with 1 nm of slack; the artwork must
 * be the one before rounding to the grid, where drawn gaps are exact too. The cost grows close to
 * linearly with the number of segments.
 */
public final class RuleCheck {
  private static final List<Rule> RULES =
      List.of(new TrackRule(), new SpaceRule(), new HoleRules());

  private RuleCheck() {}

  /**
   * @param artwork before rounding to the grid
   */
  public static RuleReport check(Artwork artwork, Spec spec, FabRules fab, RuleContext context) {
    Board board = new Board(artwork, spec, fab, context);
    Verdicts verdicts = new Verdicts();
    for (Rule rule : RULES) {
      rule.check(board, verdicts);
    }
    return verdicts.report();
  }
}
