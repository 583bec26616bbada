package etchloom.rules;

import etchloom.spec.FabRules;
import java.util.Optional;

/**
 * One layer's copper and what it is judged by.
 *
 * @param copper its pieces
 * @param row the fab's row for its copper; empty where the fab does not offer that
 */
record Layer(Board board, LayerCopper copper, Optional<FabRules.CopperRow> row) {
  int number() {
    return copper.number();
  }

  boolean outer() {
    return board.outer(number());
  }

  /** What two pieces are, in the user's words. */
  Words words(Piece p, Piece q) {
    return Words.of(words(p), " and ", words(q));
  }

  String words(Piece p) {
    return LayerCopper.words(board.artwork(), p);
  }
}
