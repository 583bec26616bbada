package etchloom.rim;

import java.util.ArrayList;
import java.util.List;

/** Which of the concentric lanes outside the last ring each terminal's lead runs along on L1. */
final class Lane {
  private Lane() {}

  /**
   * Leads that run the same way and share an angle take different lanes: the one whose terminal is
   * nearer along its way the outer one, so that none crosses another.
   *
   * @param exits angles where the leads leave the rings, in the terminals' order
   * @param targets angles of the terminals, in the same order
   * @param marginRad by which each lead is lengthened at both ends
   * @return lanes from 0, innermost; -1 for a lead that runs straight out
   */
  static List<Integer> deal(List<Double> exits, List<Double> targets, double marginRad) {
    int n = exits.size();
    Integer[] lane = new Integer[n];
    double[] turn = new double[n];
    for (int i = 0; i < n; i++) {
      turn[i] = Angles.signed(targets.get(i) - exits.get(i));
      lane[i] = Math.abs(turn[i]) <= Angles.SAME ? -1 : 0;
    }
    for (int i = n - 1; i >= 0; i--) {
      for (int j = i + 1; turn[i] > Angles.SAME && j < n; j++) {
        if (turn[j] > Angles.SAME
            && Angles.positive(exits.get(j) - exits.get(i)) < turn[i] + 2 * marginRad) {
          lane[i] = Math.max(lane[i], lane[j] + 1);
        }
      }
    }
    for (int i = 0; i < n; i++) {
      for (int j = 0; turn[i] < -Angles.SAME && j < i; j++) {
        if (turn[j] < -Angles.SAME
            && Angles.positive(exits.get(i) - exits.get(j)) < -turn[i] + 2 * marginRad) {
          lane[i] = Math.max(lane[i], lane[j] + 1);
        }
      }
    }
    return new ArrayList<>(List.of(lane));
  }
}
