package etchloom.testing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.rules.Finding;
import etchloom.run.Drawn;

/** The space a board was asked for against the least that the rule check measured. */
public final class TightSpace {
  private TightSpace() {}

  /**
   * Never below the one asked for; where turns lie side by side, just that, to 1 µm.
   *
   * @return whether turns lie side by side
   */
  public static boolean held(Drawn d, String what) {
    double asked = d.spec().coil().spaceMm();
    double least =
        d.rules().minima().stream()
            .filter(f -> f.rule().equals("space"))
            .mapToDouble(Finding::measured)
            .min()
            .orElseThrow();
    assertTrue(least >= asked - 1e-6, () -> what + " space " + least);
    boolean tight = d.assembly().artwork().turnsPerLayer() > 1;
    if (tight) {
      assertEquals(asked, least, 1e-3, what);
    }
    return tight;
  }
}
