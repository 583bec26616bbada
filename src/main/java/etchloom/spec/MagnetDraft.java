package etchloom.spec;

import etchloom.spec.Spec.Magnet;
import etchloom.spec.Spec.MagnetOutline;
import etchloom.units.Dimension;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The magnet's keys as read; a faulty or absent value is NaN. */
record MagnetDraft(
    Section section,
    Optional<MagnetOutline> outline,
    double diameter,
    double innerRadius,
    double outerRadius,
    double span,
    double length,
    double width,
    double pitchRadius,
    double thickness,
    double remanence,
    double drift,
    double temperature,
    double density,
    double limit) {

  static final Map<String, MagnetOutline> OUTLINES =
      Words.of("disc", MagnetOutline.DISC)
          .and("sector", MagnetOutline.SECTOR)
          .and("block", MagnetOutline.BLOCK)
          .map();

  /** The temperature that the remanence is stated for. */
  private static final double REMANENCE_C = 20;

  /** With less than this share left, a straight line says nothing about the magnet any more. */
  private static final double LEAST_REMANENCE = 0.1;

  private static final List<String> SIZE_KEYS =
      List.of(
          "diameter", "inner-radius", "outer-radius", "span", "length", "width", "pitch-radius");

  static MagnetDraft read(Section s) {
    Optional<MagnetOutline> outline = s.word("outline", OUTLINES).required();
    outline.ifPresent(o -> onlyKeysOf(s, o));
    MagnetDraft draft =
        new MagnetDraft(
            s,
            outline,
            size(s, "diameter", outline),
            size(s, "inner-radius", outline),
            size(s, "outer-radius", outline),
            span(s, outline),
            size(s, "length", outline),
            size(s, "width", outline),
            size(s, "pitch-radius", outline),
            s.length("thickness", Limits.MAGNET_SIZE).required(),
            s.number("remanence", Dimension.FLUX_DENSITY, Limits.REMANENCE).required(),
            s.number("remanence-drift", Dimension.RATIO, Limits.DRIFT).or(-0.0012),
            s.number("temperature", Dimension.TEMPERATURE, Limits.TEMPERATURES).or(20),
            s.bare("density", Limits.DENSITY).or(7500),
            s.number("limit", Dimension.TEMPERATURE, Limits.TEMPERATURES).or(80));
    s.close();
    draft.checkHeat();
    draft.checkRemanence();
    return draft;
  }

  /** The keys that give an outline its size. */
  static List<String> keysOf(MagnetOutline outline) {
    return switch (outline) {
      case DISC -> List.of("diameter", "pitch-radius");
      case SECTOR -> List.of("inner-radius", "outer-radius", "span");
      case BLOCK -> List.of("length", "width", "pitch-radius");
    };
  }

  private static void onlyKeysOf(Section s, MagnetOutline outline) {
    for (String key : SIZE_KEYS) {
      if (s.has(key) && !keysOf(outline).contains(key)) {
        String takes = Show.allOf(keysOf(outline));
        s.error(
            Codes.KEY_CONFLICT,
            key,
            "a magnet of outline "
                + Words.wordFor(OUTLINES, outline)
                + " has no such size; it takes "
                + takes);
      }
    }
  }

  private static double size(Section s, String key, Optional<MagnetOutline> outline) {
    return field(s.length(key, Limits.MAGNET_SIZE), outline);
  }

  private static double span(Section s, Optional<MagnetOutline> outline) {
    return field(s.number("span", Dimension.ANGLE, Limits.SPAN), outline);
  }

  private static double field(NumberField f, Optional<MagnetOutline> outline) {
    boolean needed = outline.isPresent() && keysOf(outline.get()).contains(f.key());
    return needed ? f.required() : f.value();
  }

  private void checkHeat() {
    if (temperature > limit) {
      section.warning(
          Codes.MAGNET_HEAT,
          "temperature",
          "the magnet runs at "
              + Show.celsius(temperature)
              + ", above its limit of "
              + Show.celsius(limit)
              + ": it may lose its magnetisation for good");
    }
  }

  /** The drift is a straight line, which no magnet follows down to nought. */
  private void checkRemanence() {
    double share = 1 + drift * (temperature - REMANENCE_C);
    if (share < LEAST_REMANENCE) {
      section.error(
          Codes.MAGNET_HEAT,
          section.has("remanence-drift") ? "remanence-drift" : "temperature",
          "at "
              + Show.celsius(temperature)
              + " this drift leaves "
              + Numbers.trimmed(100 * share, 1)
              + " % of the remanence; at least "
              + Numbers.trimmed(100 * LEAST_REMANENCE, 0)
              + " % must be left");
    }
  }

  /** Called only when nothing was faulty: a NaN left here belongs to another outline. */
  Magnet build() {
    return new Magnet(
        outline.orElseThrow(),
        orZero(diameter),
        orZero(innerRadius),
        orZero(outerRadius),
        orZero(span),
        orZero(length),
        orZero(width),
        orZero(pitchRadius),
        thickness,
        remanence,
        drift,
        temperature,
        density,
        limit);
  }

  private static double orZero(double v) {
    return Double.isNaN(v) ? 0 : v;
  }
}
