package etchloom.spec;

import static etchloom.units.Dimension.ANGLE;
import static etchloom.units.Dimension.COPPER_WEIGHT;
import static etchloom.units.Dimension.CURRENT;
import static etchloom.units.Dimension.FLUX_DENSITY;
import static etchloom.units.Dimension.FREQUENCY;
import static etchloom.units.Dimension.HEAT_TRANSFER;
import static etchloom.units.Dimension.LENGTH;
import static etchloom.units.Dimension.RATIO;
import static etchloom.units.Dimension.RESISTANCE;
import static etchloom.units.Dimension.SPEED;
import static etchloom.units.Dimension.TEMPERATURE;
import static etchloom.units.Dimension.TORQUE;
import static etchloom.units.Dimension.VOLTAGE;

/**
 * What the keys may hold. The limits are wide: they stop slips of the pen and amounts that would
 * exhaust memory, not unusual designs.
 */
final class Limits {
  private Limits() {}

  static final int POLES_MIN = 2;
  static final int POLES_MAX = 200;
  static final int COILS_MAX = 360;
  static final int WEDGE_COILS_MIN = 3;
  static final int PATHS_MAX = 180;
  static final int TURNS_MAX = 2000;
  static final int LAYERS_MIN = 2;
  static final int LAYERS_MAX = 16;
  static final int VIAS_MAX = 16;
  static final int HOLES_MAX = 64;
  static final int TITLE_MAX = 120;
  static final int REVISION_MAX = 16;
  static final int WORDS_MAX = 40;
  static final int PATH_MAX = 1000;

  /** Copper widths, gaps and fillets, and everything else that is drawn in copper. */
  static final Range COPPER_SIZE = Range.of(LENGTH, "0.02 mm", "20 mm");

  static final Range FILLET = Range.of(LENGTH, "0.01 mm", "100 mm");
  static final Range RADIUS = Range.of(LENGTH, "0.1 mm", "500 mm");
  static final Range DIAMETER = Range.of(LENGTH, "1 mm", "1000 mm");
  static final Range TAB = Range.of(LENGTH, "1 mm", "500 mm");
  static final Range DIAMETER_OR_NONE = Range.of(LENGTH, "0 mm", "1000 mm");
  static final Range HOLE = Range.of(LENGTH, "0.05 mm", "10 mm");
  static final Range SCREW_HOLE = Range.of(LENGTH, "0.2 mm", "100 mm");
  static final Range PAD = Range.of(LENGTH, "0.1 mm", "20 mm");
  static final Range PITCH = Range.of(LENGTH, "0.2 mm", "50 mm");
  static final Range BOARD_THICKNESS = Range.of(LENGTH, "0.1 mm", "10 mm");
  static final Range DIELECTRIC = Range.of(LENGTH, "0.01 mm", "10 mm");
  static final Range ORDERED_COPPER =
      Range.of(LENGTH, "5 um", "500 um").named("0.1 oz to 15 oz or 5 um to 500 um");
  static final Range FINISHED_COPPER = Range.of(LENGTH, "5 um", "500 um");
  static final Range WEIGHT = Range.of(COPPER_WEIGHT, "0.1 oz", "15 oz");

  /** A magnet that touches the board cannot turn. */
  static final Range GAP = Range.of(LENGTH, "0.01 mm", "100 mm");

  static final Range MAGNET_SIZE = Range.of(LENGTH, "0.1 mm", "500 mm");
  static final Range ANY_ANGLE = Range.of(ANGLE, "-360 deg", "360 deg");
  static final Range SPAN = Range.of(ANGLE, "0.1 deg", "180 deg");

  /** No permanent magnet comes near 2 T; sintered neodymium ends at about 1.5 T. */
  static final Range REMANENCE = Range.of(FLUX_DENSITY, "0.01 T", "2 T");

  static final Range DRIFT = Range.of(RATIO, "-2 %", "2 %");
  static final Range TEMPERATURES = Range.of(TEMPERATURE, "-200 C", "500 C");
  static final Range DENSITY = Range.of(RATIO, "100", "30000");
  static final Range TORQUES = Range.of(TORQUE, "0.0001 mN m", "10000 N m");
  static final Range LOAD = Range.of(RESISTANCE, "0.1 mohm", "1000000 ohm");
  static final Range BUS = Range.of(VOLTAGE, "1 mV", "10000 V");
  static final Range SPEEDS = Range.of(SPEED, "0.01 rpm", "200000 rpm");
  static final Range CURRENTS = Range.of(CURRENT, "0.01 mA", "1000 A");
  static final Range FREQUENCIES = Range.of(FREQUENCY, "1 Hz", "10 MHz");
  static final Range COOLING = Range.of(HEAT_TRANSFER, "0.01 W/m2K", "100000 W/m2K");

  static final Range RULE = Range.of(LENGTH, "0 mm", "20 mm");
  static final Range PLATING = Range.of(LENGTH, "1 um", "200 um");
  static final Range ASPECT = Range.of(RATIO, "1", "40");
  static final Range ETCH_FACTOR = Range.of(RATIO, "0.5", "100");
  static final Range TOLERANCE = Range.of(RATIO, "0 %", "90 %");
}
