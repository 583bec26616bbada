package etchloom.coil;

import etchloom.geometry.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/** Sector-shaped coils, their layers in series. */
public final class Wedge {
  /** More turns than any board holds; bounds the search. */
  private static final int MOST_TURNS = 2000;

  private Wedge() {}

  /** The largest number of turns a layer that fits, 0 where none does. */
  public static int mostTurns(CoilSize size) {
    int low = 0;
    int high = 1;
    while (high <= MOST_TURNS && turns(size, high).isPresent()) {
      low = high;
      high *= 2;
    }
    while (high - low > 1) {
      int mid = (low + high) / 2;
      if (turns(size, mid).isPresent()) {
        low = mid;
      } else {
        high = mid;
      }
    }
    return low;
  }

  /**
   * The coil with a given number of turns a layer, or empty where they do not fit.
   *
   * <p>L1 winds inwards; every even layer is an inward spiral mirrored in the coil's axis and run
   * backwards, so that the current turns the same way on all layers.
   */
  public static Optional<CoilPlan> draw(CoilSize size, int turnCount) {
    return turns(size, turnCount).map(t -> draw(size, t));
  }

  private static CoilPlan draw(CoilSize size, WedgeTurns turns) {
    int pairs = size.layers() / 2;
    List<CoilPlan.Spiral> spirals = new ArrayList<>();
    List<Double> eyes = new ArrayList<>();
    for (int j = 0; j < pairs; j++) {
      spirals.add(WedgeSpiral.draw(size, turns, size.nodeAngleRad(j), j));
      spirals.add(backwards(WedgeSpiral.draw(size, turns, -size.nodeAngleRad(j + 1), j)));
      eyes.add(turns.eyeRadius(j));
    }
    List<Double> nodes = new ArrayList<>();
    for (int j = 0; j < size.nodes(); j++) {
      nodes.add(size.nodeAngleRad(j));
    }
    return new CoilPlan(turns.count(), spirals, eyes, size.nodeRadiusMm(), nodes);
  }

  private static CoilPlan.Spiral backwards(CoilPlan.Spiral inward) {
    Path path = inward.path().mirrored().reversed();
    List<Integer> turnOf = new ArrayList<>(inward.turnOf());
    Collections.reverse(turnOf);
    return new CoilPlan.Spiral(path, turnOf);
  }

  private static Optional<WedgeTurns> turns(CoilSize size, int count) {
    return WedgeTurns.fit(size, count).filter(t -> leadsFit(size, t));
  }

  private static boolean leadsFit(CoilSize size, WedgeTurns turns) {
    for (int j = 0; j < size.layers() / 2; j++) {
      if (!WedgeSpiral.leadFits(size, turns, size.nodeAngleRad(j))
          || !WedgeSpiral.leadFits(size, turns, -size.nodeAngleRad(j + 1))) {
        return false;
      }
    }
    return true;
  }
}
