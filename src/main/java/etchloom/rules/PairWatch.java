package etchloom.rules;

/** Looks at the pairs of one layer's pieces that a {@link PairSearch} finds. */
interface PairWatch {
  /** Wider gaps are of no interest any more, mm; may shrink while the search goes on. */
  double wantedMm();

  /** Told of a pair, perhaps more than once, perhaps with a gap wider than wanted. */
  void see(Close pair);

  /** Whether to search on when all pairs up to a gap have been seen. */
  default boolean more(double searchedMm) {
    return wantedMm() > searchedMm;
  }
}
