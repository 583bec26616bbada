package etchloom.winding;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ParallelPathsTest {
  /**
   * The counts are the divisors of the winding's repeats, twice as many where half a repeat is the
   * other mirrored: textbook on fractional-slot windings (Vogt, Müller, Ponick, Berechnung
   * elektrischer Maschinen; recalled). Repeats by hand: the common part of coils and pole pairs;
   * halves mirror where coils over that part is even.
   */
  @ParameterizedTest(name = "{0} phases, {1} coils, {2} poles")
  @CsvSource({
    "3,9,8,'[1]'",
    "3,9,12,'[1, 3]'",
    "3,12,8,'[1, 2, 4]'",
    "3,12,10,'[1, 2]'",
    "3,18,24,'[1, 2, 3, 6]'",
    "3,24,20,'[1, 2, 4]'",
    "3,18,16,'[1, 2]'",
    "1,6,6,'[1, 2, 3, 6]'",
    "2,8,6,'[1, 2]'",
    "2,16,12,'[1, 2, 4]'",
    "5,20,16,'[1, 2, 4]'",
    "5,20,18,'[1, 2]'",
    "6,12,10,'[1, 2]'",
    "6,24,20,'[1, 2, 4]'"
  })
  void possibleCountsAreTheRepeats(int m, int coils, int poles, String want) {
    Winding w = StarOfSlots.wind(m, coils, poles).orElseThrow();
    assertEquals(want, ParallelPaths.possible(w).toString());
  }

  /** The paths' phasor sums, in floating point: equal where possible, else not. */
  @Test
  void equalPathsHaveEqualPhasorSums() {
    for (int[] c : new int[][] {{3, 24, 20}, {3, 18, 16}, {2, 16, 12}, {5, 20, 18}, {6, 24, 20}}) {
      Winding w = StarOfSlots.wind(c[0], c[1], c[2]).orElseThrow();
      int n = w.coils() / w.phases();
      for (int paths = 1; paths <= n; paths++) {
        if (n % paths == 0) {
          assertEquals(spread(w, paths) < 1e-9, ParallelPaths.equal(w, paths), c[1] + "/" + paths);
        }
      }
    }
  }

  private static double spread(Winding w, int paths) {
    double most = 0;
    for (int p = 0; p < w.phases(); p++) {
      int n = w.coilsOf(p).size() / paths;
      double[] first = null;
      for (int k = 0; k < paths; k++) {
        double[] sum = new double[2];
        for (PhaseCoil c : w.coilsOf(p).subList(k * n, (k + 1) * n)) {
          double a = Math.PI * w.poles() * (c.coil() - 1) / w.coils();
          sum[0] += c.sign() * Math.cos(a);
          sum[1] += c.sign() * Math.sin(a);
        }
        first = first == null ? sum : first;
        most = Math.max(most, Math.hypot(sum[0] - first[0], sum[1] - first[1]));
      }
    }
    return most;
  }
}
