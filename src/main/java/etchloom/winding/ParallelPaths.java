package etchloom.winding;

import java.util.ArrayList;
import java.util.List;

/**
 * Which parallel paths a winding can have: each must carry the same EMF phasors as the others, or
 * the paths drive currents through each other.
 *
 * <p>The paths of a phase are neighbouring stretches of the board, the phase's coils in order cut
 * into equal parts. They match where each coil has, as many coils on as a path is long, one of the
 * same phasor: the winding repeats, or repeats mirrored with the coils wired in reverse. In whole
 * numbers, so nothing is close to being equal.
 */
public final class ParallelPaths {
  private ParallelPaths() {}

  /** Whether the paths are of one length and carry the same phasors. */
  public static boolean equal(Winding w, int paths) {
    for (int p = 0; p < w.phases(); p++) {
      List<PhaseCoil> coils = w.coilsOf(p);
      int n = coils.size();
      if (n % paths != 0) {
        return false;
      }
      for (int i = 0; i < n; i++) {
        if (phasor(w, coils.get(i)) != phasor(w, coils.get((i + n / paths) % n))) {
          return false;
        }
      }
    }
    return true;
  }

  /** All counts of paths that are equal, from 1. */
  public static List<Integer> possible(Winding w) {
    List<Integer> out = new ArrayList<>();
    for (int k = 1; k <= w.coils() / w.phases(); k++) {
      if (equal(w, k)) {
        out.add(k);
      }
    }
    return out;
  }

  /** Angle of the coil's signed phasor, in parts of 1/(2 coils) of a turn. */
  private static long phasor(Winding w, PhaseCoil c) {
    long turns = (long) (c.coil() - 1) * w.poles();
    return Math.floorMod(turns + (c.sign() < 0 ? w.coils() : 0), 2L * w.coils());
  }
}
