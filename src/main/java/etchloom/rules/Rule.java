package etchloom.rules;

/** A rule, or rules that share their measurements, about the board as a whole. */
@FunctionalInterface
interface Rule {
  void check(Board board, Verdicts verdicts);
}
