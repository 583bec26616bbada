package etchloom.electric.inductance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.spec.Spec;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Textbook combinations of phase inductances. */
class PhaseMatrixTest {
  private static PhaseMatrix ring(double... row) {
    int n = row.length;
    double[][] l = new double[n][n];
    for (int p = 0; p < n; p++) {
      for (int q = 0; q < n; q++) {
        l[p][q] = row[Math.floorMod(q - p, n)];
      }
    }
    return new PhaseMatrix(l);
  }

  /** L - M, 2 (L - M), two thirds of (L - M), L. */
  @Test
  void threePhases() {
    PhaseMatrix m = ring(100, -7, -7);
    assertEquals(100, m.self());
    assertEquals(-7, m.mutual().orElseThrow());
    assertEquals(107, m.synchronous(), 1e-12);
    assertEquals(214, m.terminal(Spec.Connection.STAR), 1e-12);
    assertEquals(2 * 107 / 3.0, m.terminal(Spec.Connection.DELTA), 1e-12);
    assertEquals(100, m.terminal(Spec.Connection.OPEN));
  }

  /** A flux common to all phases shifts self and mutual alike and never the synchronous value. */
  @ParameterizedTest
  @ValueSource(ints = {3, 5})
  void commonFlux_leavesTheSynchronousValue(int phases) {
    double[] row = new double[phases];
    double[] shifted = new double[phases];
    for (int i = 0; i < phases; i++) {
      row[i] = i == 0 ? 50 : i == 1 || i == phases - 1 ? -3 : -5;
      shifted[i] = row[i] + 11;
    }
    assertEquals(ring(row).synchronous(), ring(shifted).synchronous(), 1e-12);
  }

  /** Unequal phases: the delta's current shares out so that its energy is least (Thomson). */
  @Test
  void delta_leastEnergy() {
    double[][] l = {{10, -1, -2}, {-1, 12, 0.5}, {-2, 0.5, 11}};
    double sum = 0;
    for (int p = 0; p < 3; p++) {
      double least = Double.POSITIVE_INFINITY;
      for (double x = 0; x <= 1; x += 1e-4) {
        double[] i = {-x, -x, -x};
        i[p] = 1 - x;
        double energy = 0;
        for (int a = 0; a < 3; a++) {
          for (int b = 0; b < 3; b++) {
            energy += l[a][b] * i[a] * i[b];
          }
        }
        least = Math.min(least, energy);
      }
      sum += least / 3;
    }
    assertEquals(sum, new PhaseMatrix(l).terminal(Spec.Connection.DELTA), 1e-5);
  }

  @Test
  void onePhase() {
    PhaseMatrix m = new PhaseMatrix(new double[][] {{42}});
    assertTrue(m.mutual().isEmpty());
    assertEquals(42, m.synchronous());
    assertEquals(42, m.terminal(Spec.Connection.OPEN));
    assertEquals(42, m.terminal(Spec.Connection.STAR));
  }

  /** Phases at right angles leave each other alone. */
  @Test
  void twoPhases() {
    PhaseMatrix m = new PhaseMatrix(new double[][] {{40, 0.3}, {0.3, 42}});
    assertEquals(41, m.synchronous(), 1e-12);
    assertEquals(0.3, m.mutual().orElseThrow());
    assertEquals(82 - 0.6, m.terminal(Spec.Connection.STAR), 1e-12);
  }

  /** Two sets of three 30 degrees apart: each set's own L - M, and what the other set adds. */
  @Test
  void sixPhases() {
    double[][] l = new double[6][6];
    for (int p = 0; p < 6; p++) {
      for (int q = 0; q < 6; q++) {
        double degrees = (q % 3 - p % 3) * 120 + (q / 3 - p / 3) * 30;
        l[p][q] = (p == q ? 5 : 0) + 20 * Math.cos(Math.toRadians(degrees));
      }
    }
    PhaseMatrix m = new PhaseMatrix(l);
    assertEquals(25, m.self(), 1e-12);
    assertEquals(-10, m.mutual().orElseThrow(), 1e-12);
    // Leakage, and half of all six phases' sine-spread flux.
    assertEquals(5 + 3 * 20, m.synchronous(), 1e-12);
    assertEquals(2 * (25 + 10), m.terminal(Spec.Connection.STAR), 1e-12);
  }

  /** Sine-spread mutual inductances of five phases: half of five times the main inductance. */
  @Test
  void fivePhases() {
    double[] row = new double[5];
    for (int i = 0; i < 5; i++) {
      row[i] = (i == 0 ? 3 : 0) + 16 * Math.cos(2 * Math.PI * i / 5);
    }
    assertEquals(3 + 2.5 * 16, ring(row).synchronous(), 1e-12);
    assertEquals(19, ring(row).self(), 1e-12);
  }
}
