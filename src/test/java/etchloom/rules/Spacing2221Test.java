package etchloom.rules;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * IPC-2221A/B table 6-1, mm, up to and including the voltage in the first column. Three independent
 * transcriptions agree digit for digit; the standard itself was not at hand.
 */
class Spacing2221Test {
  @ParameterizedTest(name = "{0} V")
  @CsvSource({
    "15,  0.05, 0.05, 0.13",
    "30,  0.05, 0.05, 0.25",
    "50,  0.1,  0.13, 0.4",
    "100, 0.1,  0.13, 0.5",
    "150, 0.2,  0.4,  0.8",
    "170, 0.2,  0.4,  0.8",
    "250, 0.2,  0.4,  0.8",
    "300, 0.2,  0.4,  0.8",
    "500, 0.25, 0.8,  1.5",
    // Above 500 V, value at 500 V plus slope times the excess:
    // 0.25 + 0.0025·100, 0.8 + 0.00305·100, 1.5 + 0.00305·100.
    "600, 0.5,  1.105, 1.805",
    "1000, 1.5, 2.325, 3.025",
  })
  void tableOfTheStandard(double volt, double b1, double b4, double a6) {
    assertEquals(b1, Spacing2221.B1.requiredMm(volt), 1e-12);
    assertEquals(b4, Spacing2221.B4.requiredMm(volt), 1e-12);
    assertEquals(a6, Spacing2221.A6.requiredMm(volt), 1e-12);
  }

  @Test
  void rowsHoldUpToAndIncludingTheirVoltage() {
    assertEquals(0.05, Spacing2221.B4.requiredMm(0), 0);
    assertEquals(0.05, Spacing2221.B4.requiredMm(30), 0);
    assertEquals(0.13, Spacing2221.B4.requiredMm(30.001), 0);
    assertEquals(0.25, Spacing2221.B1.requiredMm(300.001), 0);
  }
}
