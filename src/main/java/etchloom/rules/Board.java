package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.Optional;

/** What is judged, what it is judged by, and measurements that several rules share. */
final class Board {
  /** Drawn gaps equal the space exactly but for rounding in the last digits of a double. */
  static final double SLACK_MM = 1e-6;

  private final Artwork artwork;
  private final Spec spec;
  private final FabRules fab;
  private final Outline outline;
  private final Potentials potentials;
  private final Exposure exposure;

  Board(Artwork artwork, Spec spec, FabRules fab, RuleContext context) {
    this.artwork = artwork;
    this.spec = spec;
    this.fab = fab;
    outline = new Outline(artwork.profile());
    potentials = new Potentials(artwork, spec, context);
    exposure = new Exposure(artwork);
  }

  Artwork artwork() {
    return artwork;
  }

  Spec spec() {
    return spec;
  }

  FabRules fab() {
    return fab;
  }

  Outline outline() {
    return outline;
  }

  Potentials potentials() {
    return potentials;
  }

  Exposure exposure() {
    return exposure;
  }

  boolean outer(int layer) {
    return layer == 1 || layer == artwork.layers();
  }

  /** The fab's row for a layer's copper; empty where the fab does not offer it. */
  Optional<FabRules.CopperRow> row(int layer) {
    boolean outer = outer(layer);
    return fab.row(outer ? spec.board().outerCopper() : spec.board().innerCopper(), outer);
  }

  /** The space that the fab asks for on a layer, mm; the drawn one where it says nothing. */
  double spaceMm(int layer) {
    return row(layer).map(FabRules.CopperRow::spaceMm).orElse(spec.coil().spaceMm());
  }

  /** The middle of the gap between two fat shapes. */
  static Point middle(Nearest centres, double firstFatMm, double secondFatMm) {
    double d = centres.onFirst().distanceTo(centres.onSecond());
    if (!(d > 0)) {
      return centres.onFirst();
    }
    double share = (d + firstFatMm - secondFatMm) / (2 * d);
    return centres
        .onFirst()
        .plus(centres.onSecond().minus(centres.onFirst()).times(Math.min(1, Math.max(0, share))));
  }
}
