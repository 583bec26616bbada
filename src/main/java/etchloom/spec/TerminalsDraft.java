package etchloom.spec;

import etchloom.spec.Spec.TerminalKind;
import etchloom.spec.Spec.Terminals;
import etchloom.units.Dimension;
import java.util.Map;
import java.util.Optional;

/**
 * The terminals' keys as read, with their defaults.
 *
 * @param placed whether the start is the file's own
 */
record TerminalsDraft(
    Optional<Section> section,
    TerminalKind kind,
    boolean placed,
    double start,
    double pitch,
    double hole,
    double pad) {
  static final Map<String, TerminalKind> KINDS =
      Words.of("hole", TerminalKind.HOLE).and("pad", TerminalKind.PAD).map();

  private static final double START_RAD = Math.PI / 2;
  private static final double PITCH_MM = 3.5;
  private static final double HOLE_MM = 1.0;
  private static final double PAD_MM = 2.0;

  static final TerminalsDraft DEFAULT =
      new TerminalsDraft(
          Optional.empty(), TerminalKind.HOLE, false, START_RAD, PITCH_MM, HOLE_MM, PAD_MM);

  static TerminalsDraft read(Section s) {
    WordField<TerminalKind> kind = s.word("kind", KINDS);
    NumberField start = s.number("start", Dimension.ANGLE, Limits.ANY_ANGLE);
    double pitch = s.length("pitch", Limits.PITCH).or(PITCH_MM);
    double hole = s.length("hole", Limits.HOLE).or(HOLE_MM);
    double pad = s.length("pad", Limits.PAD).or(PAD_MM);
    s.close();
    boolean drilled = !kind.present() || kind.value().equals(Optional.of(TerminalKind.HOLE));
    if (drilled && pad <= hole) {
      s.error(Codes.PAD, "pad", Show.mm(pad) + " is not more than the hole, " + Show.mm(hole));
    }
    if (pitch <= pad) {
      s.error(
          Codes.PAD,
          "pitch",
          Show.mm(pitch)
              + " is not more than the pad, "
              + Show.mm(pad)
              + ": terminals would touch");
    }
    return new TerminalsDraft(
        Optional.of(s),
        kind.or(TerminalKind.HOLE),
        start.present(),
        start.or(START_RAD),
        pitch,
        hole,
        pad);
  }

  Terminals build(double startRad) {
    return new Terminals(kind, startRad, pitch, hole, pad);
  }
}
