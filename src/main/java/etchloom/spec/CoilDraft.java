package etchloom.spec;

import etchloom.spec.Spec.Coil;
import etchloom.spec.Spec.CoilOutline;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** The coil's keys as read; a faulty or absent length is NaN. */
record CoilDraft(
    Section section,
    Optional<CoilOutline> outline,
    double innerRadius,
    double outerRadius,
    OptionalDouble width,
    OptionalInt turns,
    double track,
    double space,
    OptionalDouble corner,
    boolean parallelLayers,
    boolean taper) {

  static final Map<String, CoilOutline> OUTLINES =
      Words.of("wedge", CoilOutline.WEDGE)
          .and("round", CoilOutline.ROUND)
          .and("racetrack", CoilOutline.RACETRACK)
          .map();
  static final Map<String, Boolean> LAYERS = Words.of("series", false).and("parallel", true).map();

  /** Whether the track widens where the wedge has room for it. */
  static final Map<String, Boolean> TAPER = Words.of("off", false).and("on", true).map();

  static CoilDraft read(Section s) {
    CoilDraft draft =
        new CoilDraft(
            s,
            s.word("outline", OUTLINES).required(),
            s.length("inner-radius", Limits.RADIUS).required(),
            s.length("outer-radius", Limits.RADIUS).required(),
            s.length("width", Limits.RADIUS).optional(),
            turns(s),
            s.length("track", Limits.COPPER_SIZE).required(),
            s.length("space", Limits.COPPER_SIZE).required(),
            s.length("corner", Limits.FILLET).optional(),
            s.word("layers", LAYERS).or(false),
            s.word("taper", TAPER).or(false));
    s.close();
    draft.check();
    return draft;
  }

  /** Empty for {@code fill}. */
  private static OptionalInt turns(Section s) {
    String wanted = "`fill` or a whole number, 1 to " + Limits.TURNS_MAX;
    s.missing("turns", wanted);
    return s.scalar("turns")
        .filter(v -> !v.text().equals("fill"))
        .flatMap(v -> s.reader("turns").countOrWord(v, 1, Limits.TURNS_MAX, "fill"))
        .map(OptionalInt::of)
        .orElseGet(OptionalInt::empty);
  }

  private void check() {
    if (innerRadius >= outerRadius) {
      section.error(
          Codes.RADII,
          "inner-radius",
          Show.mm(innerRadius) + " is not less than outer-radius, " + Show.mm(outerRadius));
    } else if (outerRadius - innerRadius < 2 * track) {
      section.error(
          Codes.RADII,
          "track",
          "a track of "
              + Show.mm(track)
              + " has no room for a turn between the radii, "
              + Show.mm(outerRadius - innerRadius)
              + " apart");
    }
    if (outline.isPresent() && outline.get() == CoilOutline.ROUND && section.has("corner")) {
      section.error(Codes.KEY_CONFLICT, "corner", "a coil of outline round has no corners");
    }
    if (taper && outline.isPresent() && outline.get() != CoilOutline.WEDGE) {
      section.error(
          Codes.KEY_CONFLICT,
          "taper",
          "only the sides of a wedge run apart and have room to widen; with outline "
              + Words.wordFor(OUTLINES, outline.get())
              + " it can only be `off`");
    }
    boolean racetrack = outline.isPresent() && outline.get() == CoilOutline.RACETRACK;
    if (racetrack) {
      section.missing("width", "a length: the tangential size over the copper");
    } else if (outline.isPresent() && section.has("width")) {
      section.error(
          Codes.KEY_CONFLICT, "width", "only a coil of outline racetrack has a width of its own");
    }
  }

  Coil build() {
    return new Coil(
        outline.orElseThrow(),
        innerRadius,
        outerRadius,
        width,
        turns,
        track,
        space,
        corner,
        parallelLayers,
        taper);
  }
}
