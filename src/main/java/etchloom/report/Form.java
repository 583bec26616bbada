package etchloom.report;

import etchloom.units.Numbers;

/** How a figure is shown to people. */
enum Form {
  MILLIMETRE("mm"),
  OHM("ohm"),
  HENRY("H"),
  WEBER("Wb"),
  EMF("V s/rad"),
  AMPERE("A"),
  VOLT("V"),
  WATT("W"),
  TORQUE("N m"),
  TORQUE_PER_AMPERE("N m/A"),
  MOTOR_CONSTANT("N m/sqrt(W)"),
  HERTZ("Hz"),
  SECOND("s"),
  NEWTON("N"),
  PASCAL("Pa"),
  GAIN("V/A"),
  INTEGRAL_GAIN("V/(A s)"),
  RPM("rpm"),
  RPM_PER_VOLT("rpm/V"),
  PERCENT("%"),
  RATIO(""),
  CELSIUS("C"),
  COUNT(""),
  YES_NO("");

  /** Enough for any instrument that will be held against them. */
  private static final int DIGITS = 4;

  private final String unit;

  Form(String unit) {
    this.unit = unit;
  }

  String show(Object value) {
    if (value instanceof Boolean b) {
      return b ? "yes" : "no";
    }
    if (!(value instanceof Number n)) {
      return String.valueOf(value);
    }
    double v = n.doubleValue();
    return switch (this) {
      case RPM -> Numbers.trimmed(v, 0) + " rpm";
      case MILLIMETRE -> Numbers.trimmed(v, 3) + " mm";
      case PERCENT -> Numbers.fixed(v, 2) + " %";
      case RATIO -> Numbers.fixed(v, 4);
      case CELSIUS -> Numbers.trimmed(v, 1) + " C";
      case COUNT -> Numbers.trimmed(v, 0);
      case RPM_PER_VOLT, INTEGRAL_GAIN -> Numbers.significant(v, DIGITS) + " " + unit;
      default -> Numbers.engineering(v, unit, DIGITS);
    };
  }
}
