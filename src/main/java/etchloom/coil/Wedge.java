package etchloom.coil;

import java.util.Optional;

/** Sector-shaped coils. */
final class Wedge {
  /** Shares of the full bend that are tried. */
  private static final int BENDS = 16;

  private Wedge() {}

  static Optional<CoilPlan> draw(CoilSize size, int count) {
    return WedgeTurns.fit(size, count)
        .filter(t -> leadsFit(size, t))
        .map(t -> size.taper() ? widening(size, t) : t)
        .map(
            t ->
                Layout.plan(
                    size,
                    count,
                    t::eyeRadius,
                    (startRad, eye) -> WedgeSpiral.draw(size, t, startRad, eye)));
  }

  /** Widening as far as it leaves the leads their landing on the outer arc. */
  private static WedgeTurns widening(CoilSize size, WedgeTurns plain) {
    for (int share = BENDS; share > 0; share--) {
      WedgeTurns t = plain.widening((double) share / BENDS);
      if (leadsFit(size, t)) {
        return t;
      }
    }
    return plain;
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
