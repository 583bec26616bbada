package etchloom.rules;

import etchloom.artwork.Conductor;
import etchloom.geometry.Segment;
import etchloom.rules.Verdicts.Measured;

/** {@code track}: the width of every track, by its layer's copper. */
final class TrackRule implements Rule {
  @Override
  public void check(Board board, Verdicts verdicts) {
    for (Conductor c : board.artwork().conductors()) {
      Segment middle = c.path().segments().get(c.path().segments().size() / 2);
      board
          .row(c.layer())
          .ifPresent(
              row ->
                  verdicts.add(
                      Measured.atLeast(
                              RuleName.TRACK,
                              c.layer(),
                              middle.at(0.5),
                              c.widthMm(),
                              row.trackMm(),
                              Words.of(c.what().describe(-1)))
                          .ids(c.id(), 0)));
    }
  }
}
