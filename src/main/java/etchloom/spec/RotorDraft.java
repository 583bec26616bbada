package etchloom.spec;

import etchloom.spec.Spec.Rotor;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** The rotor's keys as read. */
record RotorDraft(
    int poles,
    boolean twoSided,
    OptionalDouble airGap,
    Optional<MagnetDraft> magnet,
    OptionalDouble outerDiameter,
    boolean iron,
    OptionalDouble counterPlateGap) {

  static final Map<String, Boolean> SIDES = Words.of("one", false).and("two", true).map();
  static final Map<String, Boolean> IRON =
      Words.of("none", false).and("behind-magnets", true).map();

  static RotorDraft read(Section s) {
    int poles = s.count("poles", Limits.POLES_MIN, Limits.POLES_MAX, true).required();
    Optional<Boolean> sides = s.word("sides", SIDES).value();
    OptionalDouble gap = s.length("air-gap", Limits.GAP).optional();
    Optional<MagnetDraft> magnet = s.optionalGroup("magnet").map(MagnetDraft::read);
    OptionalDouble disc = s.length("outer-diameter", Limits.DIAMETER).optional();
    boolean iron = s.word("iron", IRON).or(false);
    OptionalDouble plate =
        s.optionalGroup("counter-plate").map(RotorDraft::plate).orElse(OptionalDouble.empty());
    if (s.has("counter-plate") && sides.orElse(false)) {
      s.error(
          Codes.KEY_CONFLICT,
          "counter-plate",
          "a counter-plate stands on the board's far side, where `sides: two` has magnets; it goes"
              + " with `sides: one` only");
    }
    s.close();
    magnet.ifPresent(m -> MagnetFit.check(m, poles, disc.orElse(Double.NaN)));
    return new RotorDraft(poles, sides.orElse(false), gap, magnet, disc, iron, plate);
  }

  private static OptionalDouble plate(Section s) {
    double gap = s.length("gap", Limits.GAP).required();
    s.close();
    return OptionalDouble.of(gap);
  }

  Rotor build() {
    return new Rotor(
        poles,
        twoSided,
        airGap,
        magnet.map(MagnetDraft::build),
        outerDiameter,
        iron,
        counterPlateGap);
  }
}
