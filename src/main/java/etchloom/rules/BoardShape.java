package etchloom.rules;

import etchloom.geometry.Box;
import etchloom.geometry.Path;
import etchloom.geometry.Segment;
import java.util.List;
import java.util.Optional;

/** The board's outline: how large it is, and what lies on it. */
final class BoardShape {
  private BoardShape() {}

  /** The box round the outline; empty where there is none. */
  static Optional<Box> box(List<Path> profile) {
    Box all = null;
    for (Path path : profile) {
      for (Segment s : path.segments()) {
        all = all == null ? Box.of(s) : all.join(Box.of(s));
      }
    }
    return Optional.ofNullable(all);
  }

  /** The greater side of the box round the outline, mm; 0 where there is none. */
  static double sizeMm(List<Path> profile) {
    return box(profile).map(b -> Math.max(b.widthMm(), b.heightMm())).orElse(0.0);
  }
}
