package etchloom.units;

import java.util.List;
import java.util.Optional;

/**
 * What a quantity measures, with the units that the spec page accepts for it. The first unit is the
 * base unit: the one the spec's records are in, and the one messages use.
 *
 * <p>Factors: 1 in = 25.4 mm exactly and 1 mil = 0.001 in (international yard and pound agreement,
 * 1959); 0 C = 273.15 K exactly (SI brochure, 9th edition, 2019).
 */
public enum Dimension {
  LENGTH("a length", Unit.exact("mm", "1"), Lengths.REST),
  /** Copper as ordered: a weight in ounces per square foot, or a finished thickness in mm. */
  COPPER(
      "a copper weight or thickness",
      Unit.exact("oz", "1"),
      join(Unit.exact("mm", "1"), Lengths.REST)),
  /** Copper by weight alone, ounces per square foot. */
  COPPER_WEIGHT("a copper weight", Unit.exact("oz", "1"), List.of()),
  ANGLE("an angle", Unit.scaled("deg", Math.PI / 180), List.of(Unit.exact("rad", "1"))),
  SPEED("a speed", Unit.scaled("rpm", 2 * Math.PI / 60), List.of(Unit.exact("rad/s", "1"))),
  VOLTAGE("a voltage", Unit.exact("V", "1"), List.of(Unit.exact("mV", "0.001"))),
  CURRENT("a current", Unit.exact("A", "1"), List.of(Unit.exact("mA", "0.001"))),
  POWER("a power", Unit.exact("W", "1"), List.of(Unit.exact("mW", "0.001"))),
  FREQUENCY(
      "a frequency",
      Unit.exact("Hz", "1"),
      List.of(Unit.exact("kHz", "1000"), Unit.exact("MHz", "1000000"))),
  TEMPERATURE("a temperature", Unit.exact("C", "1"), List.of(Unit.shifted("K", "-273.15"))),
  FLUX_DENSITY("a flux density", Unit.exact("T", "1"), List.of(Unit.exact("mT", "0.001"))),
  RESISTANCE("a resistance", Unit.exact("ohm", "1"), List.of(Unit.exact("mohm", "0.001"))),
  TORQUE("a torque", Unit.exact("N m", "1"), List.of(Unit.exact("mN m", "0.001"))),
  HEAT_TRANSFER("a heat transfer coefficient", Unit.exact("W/m2K", "1"), List.of()),
  /** The unit is optional: a bare number is the ratio itself. */
  RATIO("a ratio", Unit.exact("%", "0.01"), List.of());

  private final String phrase;

  @SuppressWarnings("ImmutableEnumChecker") // List.of never changes
  private final List<Unit> units;

  Dimension(String phrase, Unit first, List<Unit> others) {
    this.phrase = phrase;
    this.units = join(first, others);
  }

  /** With its article, for messages: {@code a length}. */
  public String phrase() {
    return phrase;
  }

  /** In the order in which messages list them, the usual one first. */
  public List<Unit> units() {
    return units;
  }

  /** Whether a number may stand without a unit. */
  public boolean bareAllowed() {
    return this == RATIO;
  }

  /** The unit written that way; upper and lower case differ ({@code mV} and {@code MV}). */
  public Optional<Unit> unit(String symbol) {
    return units.stream().filter(u -> u.symbol().equals(symbol)).findFirst();
  }

  /** Whether any dimension has a unit written that way. */
  static boolean anyHas(String symbol) {
    for (Dimension d : values()) {
      if (d.unit(symbol).isPresent()) {
        return true;
      }
    }
    return false;
  }

  /** A value in the base unit turned back into the usual written unit, for messages. */
  public double inUsualUnit(double base) {
    Unit u = units.get(0);
    return base / u.scale() / u.factor().doubleValue();
  }

  private static List<Unit> join(Unit first, List<Unit> others) {
    Unit[] all = new Unit[others.size() + 1];
    all[0] = first;
    for (int i = 0; i < others.size(); i++) {
      all[i + 1] = others.get(i);
    }
    return List.of(all);
  }

  /** A nested class, because an enum's own constants cannot read its static fields. */
  private static final class Lengths {
    static final List<Unit> REST =
        List.of(
            Unit.exact("cm", "10"),
            Unit.exact("m", "1000"),
            Unit.exact("um", "0.001"),
            Unit.exact("\u00b5m", "0.001"), // the micro sign
            Unit.exact("\u03bcm", "0.001"), // the Greek letter, which looks the same
            Unit.exact("mil", "0.0254"),
            Unit.exact("in", "25.4"));
  }
}
