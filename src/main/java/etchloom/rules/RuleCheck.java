package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ForkJoinTask;
import java.util.concurrent.RecursiveTask;

/**
 * May this board be made? Holds an artwork against the fab's rules.
 *
 * <p>Distances between lines and arcs are exact and compared with 1 nm of slack; the artwork must
 * be the one before rounding to the grid, where drawn gaps are exact too. The cost grows close to
 * linearly with the number of segments. Layers are looked at side by side; the result does not
 * depend on which is done first.
 */
public final class RuleCheck {
  private static final List<LayerRule> LAYER_RULES =
      List.of(
          new SpaceRule(),
          new VoltageRule(),
          new HoleCopperRule(),
          new ScrewRule(),
          new EdgeRule(),
          new MaskRule());

  private static final List<Rule> RULES =
      List.of(
          new TrackRule(),
          new HoleRules(),
          new HolePlaces(),
          new LegendRule(),
          new OrderRules(),
          new VoltageNotes(),
          new KeepOutRule(),
          new LaminateRule());

  /** Further apart than anything on a board. */
  private static final double FAR_MM = 3000;

  private RuleCheck() {}

  /**
   * @param artwork before rounding to the grid
   */
  public static RuleReport check(Artwork artwork, Spec spec, FabRules fab, RuleContext context) {
    Board board = new Board(artwork, spec, fab, context);
    List<OneLayer> layers = new ArrayList<>();
    for (int layer = 1; layer <= artwork.layers(); layer++) {
      layers.add(new OneLayer(board, layer));
    }
    layers.forEach(ForkJoinTask::fork);
    Verdicts verdicts = new Verdicts();
    for (Rule rule : RULES) {
      rule.check(board, verdicts);
    }
    for (OneLayer layer : layers) {
      verdicts.take(layer.join());
    }
    return verdicts.report();
  }

  /** One layer's rules, on their own verdicts. */
  private static final class OneLayer extends RecursiveTask<Verdicts> {
    private static final long serialVersionUID = 1;

    private final transient Board board;
    private final int number;

    OneLayer(Board board, int number) {
      this.board = board;
      this.number = number;
    }

    @Override
    protected Verdicts compute() {
      LayerCopper copper = new LayerCopper(board.artwork(), number, board.spaceMm(number));
      Layer layer = new Layer(board, copper, board.row(number));
      Verdicts verdicts = new Verdicts();
      List<PairWatch> watches = new ArrayList<>();
      for (LayerRule rule : LAYER_RULES) {
        watches.addAll(rule.watches(layer, verdicts));
      }
      double start = Math.max(board.spaceMm(number), board.spec().coil().spaceMm());
      new PairSearch(copper, board.spaceMm(number), watches).run(start + Board.SLACK_MM, FAR_MM);
      for (LayerRule rule : LAYER_RULES) {
        rule.check(layer, verdicts);
      }
      return verdicts;
    }
  }
}
