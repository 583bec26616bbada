package etchloom.survey;

/** Is told how far a survey is. */
public interface Progress {
  /**
   * @param done variants finished in this run
   * @param todo variants that this run has to do
   * @param best what there is to say of the best so far; empty for a grid
   */
  void at(long done, long todo, String best);

  /** Our own fault in one variant. */
  void fault(long variant, RuntimeException e);
}
