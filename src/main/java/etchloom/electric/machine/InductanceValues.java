package etchloom.electric.machine;

/**
 * The winding's inductances, H.
 *
 * @param phaseSelfHenry one winding alone
 * @param phaseMutualHenry between two windings, with its sign
 * @param synchronousHenry self less mutual
 * @param terminalHenry between two terminals
 */
public record InductanceValues(
    double phaseSelfHenry, double phaseMutualHenry, double synchronousHenry, double terminalHenry) {
  public InductanceValues {
    positive("self", phaseSelfHenry);
    positive("synchronous", synchronousHenry);
    positive("terminal", terminalHenry);
    if (!(Math.abs(phaseMutualHenry) < phaseSelfHenry)) {
      throw new IllegalArgumentException(
          "mutual inductance " + phaseMutualHenry + " H beside a self one of " + phaseSelfHenry);
    }
  }

  private static void positive(String what, double henry) {
    if (!(henry > 0 && henry < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(what + " inductance of " + henry + " H");
    }
  }
}
