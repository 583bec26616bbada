package etchloom.rules;

import etchloom.artwork.Artwork;
import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.artwork.Stroke;
import etchloom.geometry.Line;
import etchloom.geometry.Nearest;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.geometry.ShapeTree;
import etchloom.rules.Verdicts.Measured;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code legend}: the width of its lines, the height of its letters, and how far it stays from the
 * mask's openings, from holes that are not tented, and from the board's edges. Over an opening or
 * beyond an edge the distance is below 0.
 */
final class LegendRule implements Rule {
  @Override
  public void check(Board board, Verdicts verdicts) {
    List<Stroke> legend = board.artwork().legend();
    for (int i = 0; i < legend.size(); i++) {
      size(board, legend.get(i), i, verdicts);
    }
    if (!legend.isEmpty()) {
      new Places(board, verdicts).check();
    }
  }

  private static void size(Board board, Stroke s, int i, Verdicts verdicts) {
    double line = board.fab().legend().lineMm();
    Words what = Words.of("legend '", s.what(), "'");
    Point at = s.path().start();
    verdicts.add(
        Measured.atLeast(RuleName.LEGEND, 1, at, s.widthMm(), line, Words.of(what, ": line width"))
            .byMargin()
            .ids(i, 0));
    if (s.letterMm().isPresent()) {
      double least = board.fab().legend().heightMm();
      double high = s.letterMm().getAsDouble();
      verdicts.add(
          Measured.atLeast(RuleName.LEGEND, 1, at, high, least, Words.of(what, ": letter height"))
              .byMargin()
              .ids(i, 1));
    }
  }

  /** The distances of one legend. */
  private static final class Places {
    private final Board board;
    private final Verdicts verdicts;
    private final List<Stroke> owner = new ArrayList<>();
    private final List<Segment> shapes = new ArrayList<>();
    private final double[] fatMm;
    private final Nearby nearby;

    Places(Board board, Verdicts verdicts) {
      this.board = board;
      this.verdicts = verdicts;
      for (Stroke s : board.artwork().legend()) {
        for (Segment piece : ArcPieces.of(s.path())) {
          owner.add(s);
          shapes.add(piece);
        }
      }
      fatMm = new double[shapes.size()];
      for (int i = 0; i < fatMm.length; i++) {
        fatMm[i] = owner.get(i).widthMm() / 2;
      }
      nearby = new Nearby(new ShapeTree(shapes, fatMm), shapes, fatMm, Double.POSITIVE_INFINITY);
    }

    void check() {
      Artwork a = board.artwork();
      for (Opening o : a.maskTop()) {
        round(o.at(), o.diameterMm() / 2, Words.of("the opening of ", o.what()));
      }
      int number = 0;
      for (MountingHole h : a.mountingHoles()) {
        round(h.at(), h.diameterMm() / 2, Words.of("mounting hole ", ++number));
      }
      for (Outline.Edge e : board.outline().edges()) {
        look(
            e.shape(),
            0,
            (i, gap, n) -> {
              boolean beyond = board.outline().beyond(e, n.onSecond());
              return add(i, n, 0, beyond ? -n.distanceMm() - fatMm[i] : gap, e.what());
            });
      }
      for (int i = 0; i < shapes.size(); i++) {
        stray(i);
      }
    }

    private void round(Point at, double radiusMm, Words what) {
      look(new Line(at, at), radiusMm, (i, gap, n) -> add(i, n, radiusMm, gap, what));
    }

    private void look(Segment thing, double thingFatMm, Nearby.Hit hit) {
      nearby.look(thing, thingFatMm, board.fab().legend().gapMm(), hit);
    }

    private double add(int i, Nearest n, double thingFatMm, double gapMm, Object what) {
      add(i, Board.middle(n, thingFatMm, fatMm[i]), gapMm, what);
      return gapMm;
    }

    /** A stroke that lies beyond the edge as a whole. */
    private void stray(int i) {
      Point at = shapes.get(i).start();
      if (!board.outline().inside(at)) {
        Outline.Depth d = board.outline().depth(at);
        add(i, at, d.depthMm() - fatMm[i], d.what());
      }
    }

    private void add(int i, Point at, double gapMm, Object what) {
      verdicts.add(
          Measured.atLeast(
                  RuleName.LEGEND,
                  1,
                  at,
                  gapMm,
                  board.fab().legend().gapMm(),
                  Words.of("legend '", owner.get(i).what(), "' and ", what))
              .byMargin()
              .ids(i, 2));
    }
  }
}
