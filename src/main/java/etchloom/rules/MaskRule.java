package etchloom.rules;

import etchloom.artwork.Joint;
import etchloom.artwork.Opening;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.rules.Verdicts.Measured;
import java.util.List;

/**
 * {@code mask-web}: the strip of mask left between two openings, and between an opening and copper
 * that it is not for.
 *
 * <p>An opening is grown round its pad by what the mask may be off; foreign copper must stay under
 * the mask even then, so it keeps that growth once more.
 */
final class MaskRule implements LayerRule {
  /** Tells copper from openings where two places are equally tight. */
  private static final long COPPER = 1L << 32;

  @Override
  public void check(Layer layer, Verdicts verdicts) {
    if (layer.number() == 1) {
      check(layer, layer.board().artwork().maskTop(), verdicts);
    }
    if (layer.number() == layer.board().artwork().layers()) {
      check(layer, layer.board().artwork().maskBottom(), verdicts);
    }
  }

  private static void check(Layer layer, List<Opening> openings, Verdicts verdicts) {
    for (int i = 0; i < openings.size(); i++) {
      for (int j = i + 1; j < openings.size(); j++) {
        web(layer, openings, i, j, verdicts);
      }
      copper(layer, openings.get(i), i, verdicts);
    }
  }

  private static void web(Layer layer, List<Opening> openings, int i, int j, Verdicts verdicts) {
    Opening a = openings.get(i);
    Opening b = openings.get(j);
    Nearest n = new Nearest(a.at().distanceTo(b.at()), a.at(), b.at());
    verdicts.add(
        Measured.atLeast(
                RuleName.MASK_WEB,
                layer.number(),
                Board.middle(n, a.diameterMm() / 2, b.diameterMm() / 2),
                n.distanceMm() - (a.diameterMm() + b.diameterMm()) / 2,
                layer.board().fab().mask().webMm(),
                Words.of("openings of ", a.what(), " and ", b.what()))
            .byMargin()
            .ids(i, j));
  }

  private static void copper(Layer layer, Opening o, int number, Verdicts verdicts) {
    double radius = o.diameterMm() / 2;
    double required = layer.board().fab().mask().expansionMm();
    int own = own(layer, o);
    Piece opening = Piece.pad(o.at(), radius, own);
    Gaps gaps = new Gaps(layer.copper().walk(), required);
    layer
        .copper()
        .nearby(layer.board().spec().coil().spaceMm())
        .look(
            new Line(o.at(), o.at()),
            radius,
            required,
            (i, gap, n) -> {
              Piece p = layer.copper().pieces().get(i);
              Gaps.Gap g = foreign(gaps, opening, p, gap, n, required);
              if (g == null) {
                return Double.POSITIVE_INFINITY;
              }
              double clear = g.centres().distanceMm() - radius - p.fatMm();
              verdicts.add(
                  Measured.atLeast(
                          RuleName.MASK_WEB,
                          layer.number(),
                          Board.middle(g.centres(), radius, p.fatMm()),
                          clear,
                          required,
                          Words.of("opening of ", o.what(), " and ", layer.words(p)))
                      .byMargin()
                      .ids(number, COPPER + i));
              return clear;
            });
  }

  /** The gap that counts; null for the opening's own pad and the tracks that lead from it. */
  private static Gaps.Gap foreign(
      Gaps gaps, Piece opening, Piece p, double gapMm, Nearest n, double requiredMm) {
    if (!opening.isPad()) {
      return new Gaps.Gap(n, false);
    }
    if (p.joint() == opening.joint()) {
      return null;
    }
    return gaps.gap(opening, p, gapMm, requiredMm - Board.SLACK_MM);
  }

  /** The joint whose pad the opening lays bare; -1 where it lies over none. */
  private static int own(Layer layer, Opening o) {
    for (Joint j : layer.board().artwork().joints()) {
      if (j.on(layer.number()) && Exposure.owns(o, j)) {
        return j.id();
      }
    }
    return -1;
  }
}
