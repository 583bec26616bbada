package etchloom.electric.resistance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import etchloom.artwork.Stackup;
import org.junit.jupiter.api.Test;

/** Metal and cross-sections against the copper standard and against geometry. */
class CopperTest {
  /** IEC 60028:1925 (recalled): 1/58 Ω·mm²/m, 0.00393 per kelvin at 20 °C. */
  @Test
  void resistivityAndItsTemperature() {
    assertEquals(1.72413793e-8, Copper.resistivityOhmMetre(20), 1e-4 * 1.72413793e-8);
    assertEquals(1.3144, Copper.factor(100), 1e-4);
    assertEquals(1.01965, Copper.factor(25), 1e-5);
    // The same law seen from 0 and 25 °C, as handbooks print it, and its zero at -234.5 °C.
    assertEquals(0.004265, Copper.TEMPERATURE_COEFFICIENT_20 / Copper.factor(0), 5e-7);
    assertEquals(0.003854, Copper.TEMPERATURE_COEFFICIENT_20 / Copper.factor(25), 5e-7);
    assertThrows(IllegalArgumentException.class, () -> Copper.factor(-234.5));
    assertThrows(IllegalArgumentException.class, () -> Copper.factor(Double.NaN));
  }

  /** One square is a piece as long as wide; 1 oz as 1.37 mil is 34.8 µm (industry nominal). */
  @Test
  void sheetResistance() {
    assertEquals(4.95441934e-4, square(0.0348), 1e-3 * 4.95441934e-4);
    assertEquals(4.92610837e-4, square(0.035), 1e-3 * 4.92610837e-4);
  }

  private static double square(double thicknessMm) {
    Stackup.Copper copper = new Stackup.Copper(thicknessMm, 1, 0);
    return Section.ohm(0.7, Section.trackAreaMm2(0.7, copper), 20);
  }

  /** 100 mm of 0.2 mm track: 0.0172414 · 0.1 / (0.2 · 0.035) at 20 °C. */
  @Test
  void hundredMillimetresOfTrack() {
    double area = Section.trackAreaMm2(0.2, new Stackup.Copper(0.035, 1, 0));
    assertEquals(0.246305419, Section.ohm(100, area, 20), 1e-4 * 0.2463);
    assertEquals(0.323743842, Section.ohm(100, area, 100), 1e-4 * 0.3237);
    // Least finished inner 1 oz copper, 24.9 µm: IPC-6012 by way of a fabricator's page.
    double least = Section.trackAreaMm2(0.2, new Stackup.Copper(0.0249, 1, 0));
    assertEquals(0.346212436, Section.ohm(100, least, 20), 1e-4 * 0.3462);
  }

  /** An etch factor is thickness over the undercut of one side, so area = t·(base - t/factor). */
  @Test
  void etchedTrapezoid() {
    Stackup.Copper oneOunce = new Stackup.Copper(0.035, 1, 0.035 / 2);
    assertEquals(6.3875e-3, Section.trackAreaMm2(0.2, oneOunce), 1e-6 * 6.3875e-3);
    Stackup.Copper twoOunces = new Stackup.Copper(0.070, 2, 0.070 / 2);
    assertEquals(0.825, Section.trackAreaMm2(0.2, twoOunces) / (0.2 * 0.07), 1e-6);
    assertThrows(IllegalArgumentException.class, () -> Section.trackAreaMm2(0.03, twoOunces));
  }

  /** The ring of plating, exactly: inwards of a drilled diameter, outside the finished one. */
  @Test
  void viaBarrels() {
    assertEquals(1.27723089e-3, drilled(0.30, 0.025), 1e-4 * 1.277e-3);
    assertEquals(1.568029e-3, drilled(0.30, 0.020), 1e-4 * 1.568e-3);
    assertEquals(2.43915622e-3, drilled(0.20, 0.020), 1e-4 * 2.439e-3);
    // Taking 0.30 mm for the finished hole gives 15 % less: 1.081 mΩ.
    double finished = Section.ohm(1.6, Section.barrelAreaMm2(0.30, 0.025), 20);
    assertEquals(1.081e-3, finished, 1e-3 * 1.081e-3);
  }

  private static double drilled(double drillMm, double platingMm) {
    return Section.ohm(1.6, Section.barrelAreaMm2(drillMm - 2 * platingMm, platingMm), 20);
  }
}
