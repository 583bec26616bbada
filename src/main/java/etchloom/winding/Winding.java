package etchloom.winding;

import java.util.List;

/**
 * Which coil belongs to which phase, and how well they add up.
 *
 * @param marks the phases' letters, {@code U V W}
 * @param sequence one entry a coil, in coil order
 * @param distributionFactor of each phase's coils
 * @param pitchFactor of full-sector coils; for the eye only, the copper's own EMF has it already
 * @param axisRad mechanical angle of each phase's axis, in [0, 2π/polePairs): the angle of its
 *     phasor sum, where current into its start makes field out of L1
 */
public record Winding(
    int phases,
    int coils,
    int poles,
    List<String> marks,
    List<PhaseCoil> sequence,
    double distributionFactor,
    double pitchFactor,
    List<Double> axisRad) {
  public Winding {
    marks = List.copyOf(marks);
    sequence = List.copyOf(sequence);
    axisRad = List.copyOf(axisRad);
  }

  /** A phase's coils, counter-clockwise from coil 1. */
  public List<PhaseCoil> coilsOf(int phase) {
    return sequence.stream().filter(c -> c.phase() == phase).toList();
  }

  public double windingFactor() {
    return distributionFactor * pitchFactor;
  }
}
