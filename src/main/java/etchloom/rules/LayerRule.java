package etchloom.rules;

import java.util.List;

/** A rule, or rules that share their measurements, about the copper of one layer. */
interface LayerRule {
  /** Who looks at the layer's pairs of pieces for this rule; often nobody. */
  default List<PairWatch> watches(Layer layer, Verdicts verdicts) {
    return List.of();
  }

  /** All else that the rule has to say about the layer. */
  default void check(Layer layer, Verdicts verdicts) {}
}
