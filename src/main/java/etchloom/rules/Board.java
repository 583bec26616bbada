package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.spec.FabRules;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What is judged, what it is judged by, and measurements that several rules share. */
final class Board {
  /** Drawn gaps equal the space exactly but for rounding in the last digits of a double. */
  static final double SLACK_MM = 1e-6;

  private final Artwork artwork;
  private final Spec spec;
  private final FabRules fab;
  private final RuleContext context;
  private final List<LayerCopper> copper = new ArrayList<>();
  private final List<CloseSearch> close = new ArrayList<>();

  Board(Artwork artwork, Spec spec, FabRules fab, RuleContext context) {
    this.artwork = artwork;
    this.spec = spec;
    this.fab = fab;
    this.context = context;
    double space = spec.coil().spaceMm();
    for (FabRules.CopperRow row : fab.copper()) {
      space = Math.max(space, row.spaceMm());
    }
    for (int layer = 1; layer <= artwork.layers(); layer++) {
      LayerCopper c = new LayerCopper(artwork, layer, space);
      copper.add(c);
      close.add(new CloseSearch(c, spaceMm(layer)));
    }
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

  RuleContext context() {
    return context;
  }

  List<LayerCopper> copper() {
    return copper;
  }

  CloseSearch close(int layer) {
    return close.get(layer - 1);
  }

  /** Greatest extent of the board's edge, mm. */
  double sizeMm() {
    return BoardShape.sizeMm(artwork.profile());
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
