package etchloom.rules;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** Finds all pairs of a layer's pieces that come near each other. */
final class CloseSearch {
  private final LayerCopper copper;
  private final Gaps gaps;
  private final double requiredMm;
  private double searchedMm = -1;
  private List<Close> found = List.of();

  /**
   * @param requiredMm space by which neighbours along the copper are told
   */
  CloseSearch(LayerCopper copper, double requiredMm) {
    this.copper = copper;
    this.gaps = new Gaps(copper.walk());
    this.requiredMm = requiredMm;
  }

  /** All pairs with a gap up to the limit, and perhaps more, in the order of the pieces. */
  List<Close> upTo(double limitMm) {
    if (limitMm > searchedMm) {
      List<Close> out = new ArrayList<>();
      copper
          .tree()
          .pairs(
              limitMm,
              (i, j, limit) -> {
                measure(i, j, limit).ifPresent(out::add);
                return limit;
              });
      out.sort(Comparator.comparingInt(Close::first).thenComparingInt(Close::second));
      found = List.copyOf(out);
      searchedMm = limitMm;
    }
    return found;
  }

  /** As {@link #upTo}, from the limit on as far as it takes to find any but bends. */
  List<Close> nearest(double limitMm, double boardMm) {
    double limit = limitMm;
    while (upTo(limit).stream().allMatch(Close::bend) && limit < 2 * boardMm) {
      limit *= 2;
    }
    return found;
  }

  private Optional<Close> measure(int i, int j, double limitMm) {
    Piece p = copper.pieces().get(i);
    Piece q = copper.pieces().get(j);
    return gaps.gap(p, q, requiredMm, limitMm)
        .map(
            g ->
                new Close(
                    i,
                    j,
                    g.centres().distanceMm() - p.fatMm() - q.fatMm(),
                    Board.middle(g.centres(), p.fatMm(), q.fatMm()),
                    g.bend()));
  }
}
