package etchloom.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Which rows are shown, and in what order.
 *
 * @param keepText the condition as typed; empty where there is none
 */
record Listing(String keepText, Optional<Expression> keep, Optional<Ranking> rank) {

  boolean keeps(Row row) {
    return keep.isEmpty() || keep.get().holds(row.figures());
  }

  /** The figures that were asked about, the ranked one first. */
  List<FigureName> names() {
    List<FigureName> out = new ArrayList<>();
    rank.ifPresent(r -> out.add(r.name()));
    keep.ifPresent(k -> k.names().stream().filter(n -> !out.contains(n)).forEach(out::add));
    return out;
  }
}
