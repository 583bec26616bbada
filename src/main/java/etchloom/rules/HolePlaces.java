package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.artwork.MountingHole;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import etchloom.rules.Verdicts.Measured;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code hole-gap} and {@code edge} for holes, plated or not: from a finished hole's edge to the
 * next hole's, and to the board's edge and bore.
 */
final class HolePlaces implements Rule {
  private record Hole(Point at, double radiusMm, String what) {}

  @Override
  public void check(Board board, Verdicts verdicts) {
    List<Hole> holes = holes(board.artwork());
    gaps(board, holes, verdicts);
    if (!board.outline().edges().isEmpty()) {
      for (int i = 0; i < holes.size(); i++) {
        edge(board, i, holes.get(i), verdicts);
      }
    }
  }

  private static List<Hole> holes(Artwork artwork) {
    List<Hole> out = new ArrayList<>();
    for (Joint j : artwork.joints()) {
      if (j.hole().isPresent()) {
        out.add(new Hole(j.at(), j.hole().get() / 2, LayerCopper.jointWords(j)));
      }
    }
    int number = 0;
    for (MountingHole h : artwork.mountingHoles()) {
      out.add(new Hole(h.at(), h.diameterMm() / 2, "mounting hole " + ++number));
    }
    return out;
  }

  private static void gaps(Board board, List<Hole> holes, Verdicts verdicts) {
    double required = board.fab().hole().gapMm();
    List<Segment> points = new ArrayList<>();
    double[] radii = new double[holes.size()];
    for (int i = 0; i < radii.length; i++) {
      points.add(new Line(holes.get(i).at(), holes.get(i).at()));
      radii[i] = holes.get(i).radiusMm();
    }
    new ShapeTree(points, radii)
        .pairs(
            Double.POSITIVE_INFINITY,
            (i, j, limit) -> {
              Hole a = holes.get(i);
              Hole b = holes.get(j);
              double gap = a.at().distanceTo(b.at()) - a.radiusMm() - b.radiusMm();
              if (gap > limit) {
                return limit;
              }
              Nearest n = new Nearest(gap + radii[i] + radii[j], a.at(), b.at());
              verdicts.add(
                  Measured.atLeast(
                          RuleName.HOLE_GAP,
                          0,
                          Board.middle(n, radii[i], radii[j]),
                          gap,
                          required,
                          Words.of(a.what(), " and ", b.what()))
                      .ids(i, j));
              return Math.max(required, Math.min(limit, gap));
            });
  }

  private static void edge(Board board, int i, Hole hole, Verdicts verdicts) {
    Outline.Depth d = board.outline().depth(hole.at());
    verdicts.add(
        Measured.atLeast(
                RuleName.EDGE,
                0,
                hole.at(),
                d.depthMm() - hole.radiusMm(),
                board.fab().edge().holeMm(),
                Words.of("hole of ", hole.what(), " and ", d.what()))
            .byMargin()
            .ids(i, 0));
  }
}
