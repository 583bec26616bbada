package etchloom.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.units.Quantity.Fault;
import java.time.Duration;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Numbers with units, read and written. */
class QuantityTest {
  /**
   * NIST SP 811 (2008), appendix B.8: inch 2.54 E-02 m, mil 2.54 E-05 m, revolution per minute
   * 1.047198 E-01 rad/s, degree 1.745329 E-02 rad; 0 C = 273.15 K (recalled). The rest are SI
   * prefixes.
   */
  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "1 in, LENGTH, 25.4",
    "1 mil, LENGTH, 0.0254",
    "8 mil, LENGTH, 0.2032",
    "35 um, LENGTH, 0.035",
    "35 \u00b5m, LENGTH, 0.035",
    "35 \u03bcm, LENGTH, 0.035",
    "2 cm, LENGTH, 20",
    "1 m, LENGTH, 1000",
    "2 oz, COPPER, 2",
    "70 um, COPPER, 0.07",
    "1 rpm, SPEED, 0.1047198",
    "1 deg, ANGLE, 0.01745329",
    "1 rad, ANGLE, 1",
    "40 kHz, FREQUENCY, 40000",
    "1 MHz, FREQUENCY, 1000000",
    "1 mV, VOLTAGE, 0.001",
    "250 mA, CURRENT, 0.25",
    "5 mW, POWER, 0.005",
    "293.15 K, TEMPERATURE, 20",
    "-5 C, TEMPERATURE, -5",
    "1300 mT, FLUX_DENSITY, 1.3",
    "10 mohm, RESISTANCE, 0.01",
    "12 mN m, TORQUE, 0.012",
    "3 N m, TORQUE, 3",
    "12 W/m2K, HEAT_TRANSFER, 12",
    "-0.12 %, RATIO, -0.0012",
    "0.2, RATIO, 0.2",
    "+.5e1 mm, LENGTH, 5",
    "5. mm, LENGTH, 5",
    "0e99999 mm, LENGTH, 0"
  })
  void values(String text, Dimension dimension, double base) {
    Quantity q = Quantity.read(text, dimension);
    assertEquals(Fault.NONE, q.fault());
    assertEquals(base, q.value(), 5e-7 * Math.abs(base)); // as many digits as the tables have
  }

  /** The double next to the decimal, not one beside it that a product of doubles would give. */
  @Test
  void decimals_areTheNearestDouble() {
    assertEquals(0.035, Quantity.read("35 um", Dimension.LENGTH).value(), 0);
    assertEquals(0.0012, Quantity.read("0.12 %", Dimension.RATIO).value(), 0);
    assertEquals(0.127, Quantity.read("5 mil", Dimension.LENGTH).value(), 0);
    assertEquals(20, Quantity.read("293.15 K", Dimension.TEMPERATURE).value(), 0);
  }

  @ParameterizedTest(name = "[{0}]")
  @CsvSource({
    "'', NOT_A_NUMBER",
    "mm, NOT_A_NUMBER",
    "., NOT_A_NUMBER",
    "-, NOT_A_NUMBER",
    "e5 mm, NOT_A_NUMBER",
    "NaN, NOT_FINITE",
    "-.inf mm, NOT_FINITE",
    "1e400 mm, NOT_FINITE",
    "5, MISSING_UNIT",
    "'5 ', MISSING_UNIT",
    "5 V, WRONG_UNIT",
    "5 MM, WRONG_UNIT",
    "5 mm mm, WRONG_UNIT",
    "5mm, SPACING",
    "5  mm, SPACING",
    "'5 mm ', SPACING",
    "'5\u00a0mm', SPACING",
    "'1,5 mm', DECIMAL_COMMA",
    "0x10 mm, WRONG_UNIT",
    "1_000 mm, WRONG_UNIT",
    "--5 mm, NOT_A_NUMBER",
    "11111111111111111111111111111111111111111 mm, NOT_FINITE"
  })
  void faults(String text, Fault fault) {
    Quantity q = Quantity.read(text, Dimension.LENGTH);
    assertEquals(fault, q.fault());
    assertTrue(Double.isNaN(q.value()));
  }

  /** A big decimal of a thousand million digits would take minutes, or all memory. */
  @Test
  void exponentsBeyondSense_costNothing() {
    assertTimeoutPreemptively(
        Duration.ofSeconds(10),
        () -> {
          for (String e : new String[] {"999999999", "2147483647", "99999999999999999999"}) {
            assertEquals(
                Fault.NOT_FINITE, Quantity.read("1e" + e + " K", Dimension.TEMPERATURE).fault());
            assertEquals(0, Quantity.read("1e-" + e + " mm", Dimension.LENGTH).value(), 0);
            assertEquals(0, Quantity.read("0e" + e + " mm", Dimension.LENGTH).value(), 0);
          }
        });
  }

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "0.2mm, 0.2 mm",
    "0.2 mm, 0.2 mm",
    "0.2   mm, 0.2 mm",
    "12mN m, 12 mN m",
    "-5e1deg, -5e1 deg",
    "5xx, 5xx",
    "mm, mm",
    "7, 7",
    "2A, 2 A"
  })
  void spaced(String text, String with) {
    assertEquals(with, Quantity.spaced(text));
  }

  @ParameterizedTest(name = "{0} in {2}")
  @CsvSource({
    "0.035, LENGTH, um, 35 um",
    "0.2, LENGTH, mm, 0.2 mm",
    "0, LENGTH, mm, 0 mm",
    "-0.0012, RATIO, %, -0.12 %",
    "40000, FREQUENCY, kHz, 40 kHz",
    "0.004, TORQUE, mN m, 4 mN m",
    "1e-7, LENGTH, mm, 0.0000001 mm",
    "1e-30, LENGTH, mm, 1E-30 mm",
    "-40, TEMPERATURE, C, -40 C",
    "1.5707963267948966, ANGLE, deg, 90 deg",
    "0.785398163397448309, ANGLE, deg, 45 deg",
    "1, ANGLE, rad, 1 rad"
  })
  void written(double base, Dimension dimension, String unit, String text) {
    assertEquals(text, QuantityText.of(base, dimension, unit));
  }

  @ParameterizedTest(name = "{0}")
  @EnumSource
  void written_readsBackToTheLastBit(Dimension d) {
    Random random = new Random(5);
    for (int i = 0; i < 1_000; i++) {
      Unit unit = d.units().get(random.nextInt(d.units().size()));
      double base = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(12) - 6);
      String text = QuantityText.of(base, d, unit.symbol());
      assertEquals(base, Quantity.read(text, d).value(), 0, text);
      assertEquals(base, Quantity.readBare(QuantityText.bare(base)).value(), 0);
    }
  }

  @Test
  void whatIsNotFinite_isNotWritten() {
    assertThrows(IllegalArgumentException.class, () -> QuantityText.bare(Double.NaN));
    assertThrows(
        IllegalArgumentException.class,
        () -> QuantityText.of(Double.POSITIVE_INFINITY, Dimension.LENGTH, "mm"));
    assertThrows(IllegalArgumentException.class, () -> QuantityText.of(1, Dimension.LENGTH, "V"));
  }
}
