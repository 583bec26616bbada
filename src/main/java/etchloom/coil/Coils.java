package etchloom.coil;

import java.util.Optional;
import java.util.OptionalDouble;

/** Coils of any outline. */
public final class Coils {
  /** More turns than any board holds; bounds the search. */
  private static final int MOST_TURNS = 2000;

  private static final double TRACK_STEP_MM = 0.01;

  private Coils() {}

  /** The largest number of turns a layer that fits, 0 where none does. */
  public static int mostTurns(CoilSize size) {
    int low = 0;
    int high = 1;
    while (high <= MOST_TURNS && draw(size, high).isPresent()) {
      low = high;
      high *= 2;
    }
    while (high - low > 1) {
      int mid = (low + high) / 2;
      if (draw(size, mid).isPresent()) {
        low = mid;
      } else {
        high = mid;
      }
    }
    return low;
  }

  /**
   * The widest track, even all along, in which a coil still has room for its turns, in steps of a
   * hundredth of a millimetre; empty where that is no wider than its own.
   */
  public static OptionalDouble widestTrackMm(CoilSize size, int turns) {
    int low = (int) Math.floor(size.trackMm() / TRACK_STEP_MM + 1e-9);
    int high = (int) Math.ceil((size.outerRadiusMm() - size.innerRadiusMm()) / TRACK_STEP_MM);
    int own = low;
    while (high - low > 1) {
      int mid = (low + high) / 2;
      if (draw(size.withTrackMm(mid * TRACK_STEP_MM), turns).isPresent()) {
        low = mid;
      } else {
        high = mid;
      }
    }
    return low > own ? OptionalDouble.of(low * TRACK_STEP_MM) : OptionalDouble.empty();
  }

  /** How much a coil is too wide for its sector; a wedge never is. */
  public static double overhangMm(CoilSize size) {
    return switch (size.outline()) {
      case WEDGE -> 0;
      case ROUND -> Round.overhangMm(size);
      case RACETRACK -> Racetrack.overhangMm(size);
    };
  }

  /** The coil with a given number of turns a layer, or empty where they do not fit. */
  public static Optional<CoilPlan> draw(CoilSize size, int turns) {
    return switch (size.outline()) {
      case WEDGE -> Wedge.draw(size, turns);
      case ROUND -> Round.draw(size, turns);
      case RACETRACK -> Racetrack.draw(size, turns);
    };
  }
}
