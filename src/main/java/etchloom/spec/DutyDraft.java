package etchloom.spec;

import etchloom.spec.Spec.Duty;
import etchloom.units.Dimension;
import java.util.Map;
import java.util.OptionalDouble;

/** The duty's keys as read. */
record DutyDraft(
    boolean generator,
    OptionalDouble torque,
    OptionalDouble load,
    OptionalDouble bus,
    OptionalDouble speed,
    OptionalDouble current,
    OptionalDouble switching,
    OptionalDouble bandwidth,
    double ambient,
    double copperLimit,
    double cooling) {

  static final Map<String, Boolean> USES = Words.of("motor", false).and("generator", true).map();

  /** The default of the current loop's bandwidth: a twentieth of the switching frequency. */
  private static final double BANDWIDTH_SHARE = 20;

  static DutyDraft read(Section s) {
    WordField<Boolean> use = s.word("use", USES);
    OptionalDouble torque = s.number("torque", Dimension.TORQUE, Limits.TORQUES).optional();
    OptionalDouble load = s.number("load", Dimension.RESISTANCE, Limits.LOAD).optional();
    OptionalDouble bus = s.number("bus", Dimension.VOLTAGE, Limits.BUS).optional();
    OptionalDouble speed = s.number("speed", Dimension.SPEED, Limits.SPEEDS).optional();
    OptionalDouble current = s.number("current", Dimension.CURRENT, Limits.CURRENTS).optional();
    OptionalDouble switching =
        s.number("switching", Dimension.FREQUENCY, Limits.FREQUENCIES).optional();
    OptionalDouble bandwidth = bandwidth(s, switching);
    double ambient = s.number("ambient", Dimension.TEMPERATURE, Limits.TEMPERATURES).or(25);
    double limit = s.number("copper-limit", Dimension.TEMPERATURE, Limits.TEMPERATURES).or(105);
    double cooling = s.number("cooling", Dimension.HEAT_TRANSFER, Limits.COOLING).or(12);
    s.close();
    checkUse(s, use);
    if (limit <= ambient) {
      s.error(
          Codes.DUTY,
          s.has("copper-limit") ? "copper-limit" : "ambient",
          "copper-limit, "
              + Show.celsius(limit)
              + ", is not above ambient, "
              + Show.celsius(ambient));
    }
    return new DutyDraft(
        use.or(false),
        torque,
        load,
        bus,
        speed,
        current,
        switching,
        bandwidth,
        ambient,
        limit,
        cooling);
  }

  private static OptionalDouble bandwidth(Section s, OptionalDouble switching) {
    NumberField given = s.number("bandwidth", Dimension.FREQUENCY, Limits.FREQUENCIES);
    if (!given.present()) {
      return switching.isPresent()
          ? OptionalDouble.of(switching.getAsDouble() / BANDWIDTH_SHARE)
          : OptionalDouble.empty();
    }
    if (switching.isPresent() && given.value() >= switching.getAsDouble() / 2) {
      s.error(
          Codes.DUTY,
          "bandwidth",
          "a current loop must stay below half the switching frequency; a twentieth is usual");
    }
    return given.optional();
  }

  private static void checkUse(Section s, WordField<Boolean> use) {
    if (use.present() && use.value().isEmpty()) {
      return;
    }
    if (use.or(false) && s.has("torque")) {
      s.warning(Codes.UNUSED_KEY, "torque", "has no effect with `use: generator`");
    }
    if (!use.or(false) && s.has("load")) {
      s.warning(Codes.UNUSED_KEY, "load", "has no effect without `use: generator`");
    }
  }

  Duty build() {
    return new Duty(
        generator,
        torque,
        load,
        bus,
        speed,
        current,
        switching,
        bandwidth,
        ambient,
        copperLimit,
        cooling);
  }
}
