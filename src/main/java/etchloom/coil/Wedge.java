package etchloom.coil;

import java.util.Optional;

/** Sector-shaped coils. */
final class Wedge {
  private Wedge() {}

  static Optional<CoilPlan> draw(CoilSize size, int count) {
    return WedgeTurns.fit(size, count)
        .filter(t -> leadsFit(size, t))
        .map(
            t ->
                Layout.plan(
                    size,
                    count,
                    t::eyeRadius,
                    (startRad, eye) -> WedgeSpiral.draw(size, t, startRad, eye)));
  }

  private static boolean leadsFit(CoilSize size, WedgeTurns turns) {
    for (int j = 0; j < size.pairs(); j++) {
      if (!WedgeSpiral.leadFits(size, turns, size.startRad(j))
          || !WedgeSpiral.leadFits(size, turns, -size.finishRad(j))) {
        return false;
      }
    }
    return true;
  }
}
