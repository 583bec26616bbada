package etchloom.rules;

/** One rule, or rules that share their measurements. */
@FunctionalInterface
interface Rule {
  void check(Board board, Verdicts verdicts);
}
