package etchloom.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RoundStepTest {
  @ParameterizedTest
  @CsvSource({
    "1, 1",
    "1.01, 2",
    "2.4, 5",
    "5.1, 10",
    "0.011, 0.02",
    "0.05, 0.05",
    "4.9e-7, 5e-7",
    "99, 100",
    "101, 200",
    "0.1, 0.1",
    "1e9, 1e9"
  })
  void smallestNotLess(double least, double step) {
    assertEquals(step, RoundStep.atLeast(least), 0);
  }

  @Test
  void nothingToStep_isRefused() {
    for (double v : new double[] {0, -1, Double.NaN, Double.POSITIVE_INFINITY}) {
      assertThrows(IllegalArgumentException.class, () -> RoundStep.atLeast(v));
    }
  }
}
