package etchloom.receive;

/**
 * One pair of terminals of one board, at the temperature at which it was measured.
 *
 * @param pair {@code U1-V1}
 * @param ohm as measured, leads taken off; infinite where nothing connects
 * @param leastOhm the least a good board may have; infinite where nothing should connect
 * @param mostOhm the most; infinite where there is no such limit
 */
public record PairVerdict(
    String pair,
    double ohm,
    double celsius,
    double leastOhm,
    double expectedOhm,
    double mostOhm,
    boolean within) {

  /** Whether the reading found no connection. */
  public boolean open() {
    return Double.isInfinite(ohm);
  }
}
