package etchloom.proof.rules;

import etchloom.geometry.Point;
import etchloom.proof.copper.Connectivity;
import etchloom.proof.copper.Hole;
import etchloom.proof.plane.Figure;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;

/** Measures the fab's rules on a board as its files show it. */
public final class CopperRules {
  private final Connectivity board;
  private final CopperLimits limits;
  private final Names names;
  private final Measures out = new Measures();

  private CopperRules(Connectivity board, CopperLimits limits, Names names) {
    this.board = board;
    this.limits = limits;
    this.names = names;
  }

  /**
   * @param holes all of the board, the not plated ones as well
   * @param sheets profile and mask of the board
   * @param thicknessMm of the board, where it is known
   * @param names what a piece of copper is called, by layer and island
   */
  public static CopperRuleReport check(
      Connectivity board,
      List<Hole> holes,
      BoardSheets sheets,
      CopperLimits limits,
      Optional<Double> thicknessMm,
      Names names) {
    return new CopperRules(board, limits, names).check(holes, sheets, thicknessMm);
  }

  private CopperRuleReport check(List<Hole> all, BoardSheets sheets, Optional<Double> thicknessMm) {
    HoleRules holes = new HoleRules(all, board, limits, out);
    Optional<EdgeRules> edge = sheets.edge().map(e -> new EdgeRules(e, limits, out));
    for (int l = 1; l <= board.layers(); l++) {
      int layer = l;
      Outline outline = new Outline(board.copper(l));
      widthsAndGaps(l, outline);
      holes.layer(l, outline, names);
      edge.ifPresent(e -> e.copper(layer, outline, names));
    }
    holes.board(thicknessMm);
    layers();
    edge.ifPresent(e -> e.holes(all));
    edge.ifPresent(EdgeRules::size);
    if (edge.isEmpty()) {
      out.note("there is no profile: distances to the edge were not measured");
    }
    sheets.maskTop().ifPresent(f -> mask(f, 1));
    sheets.maskBottom().ifPresent(f -> mask(f, board.layers()));
    return out.report();
  }

  private void layers() {
    int is = board.layers();
    if (!limits.layerCounts().contains(is)) {
      int nearest =
          limits.layerCounts().stream()
              .min(Comparator.<Integer>comparingInt(n -> Math.abs(n - is)).thenComparingInt(n -> n))
              .orElse(0);
      String what = "the fab builds " + limits.layerCounts() + " layers";
      out.refuse(new CopperFinding("layers", "", Point.ORIGIN, is, nearest, "1", what));
    }
  }

  /** The mask left between two openings, or between two sides of one. */
  private void mask(Figure openings, int layer) {
    Facing facing = new Facing(new Outline(openings), 0, limits.maskWebMm());
    String what = layer == 1 ? "mask openings, top" : "mask openings, bottom";
    List<Facing.Close> all = new ArrayList<>(facing.broken());
    if (facing.least(true) != null) {
      all.add(facing.least(true));
    }
    all.forEach(c -> out.add("mask-web", layer, c.at(), c.mm(), limits.maskWebMm(), what));
  }

  private void widthsAndGaps(int layer, Outline outline) {
    CopperLimits.Layer row = limits.layers().get(layer - 1);
    Facing facing = new Facing(outline, row.trackMm(), row.spaceMm());
    for (boolean gap : new boolean[] {false, true}) {
      Facing.Close least = facing.least(gap);
      if (least != null && !facing.broken().contains(least)) {
        add(layer, outline, row, least);
      }
    }
    facing.broken().forEach(c -> add(layer, outline, row, c));
  }

  private void add(int layer, Outline outline, CopperLimits.Layer row, Facing.Close c) {
    double required = c.gap() ? row.spaceMm() : row.trackMm();
    String rule = c.gap() ? "space" : "track";
    out.add(rule, layer, c.at(), c.mm(), required, words(layer, outline, c));
  }

  private String words(int layer, Outline outline, Facing.Close c) {
    Figure f = outline.figure;
    TreeSet<Integer> islands = new TreeSet<>();
    islands.add(f.island(outline.ring.get(c.first())));
    islands.add(f.island(outline.ring.get(c.second())));
    String first = names.of(layer, islands.first());
    if (islands.size() == 1) {
      return c.gap() ? "within one piece of " + first : first;
    }
    return first + " and " + names.of(layer, islands.last());
  }
}
