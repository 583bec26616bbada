package etchloom.geometry;

import java.util.ArrayList;
import java.util.List;

/** Builds a path piece by piece, so that each piece starts at the very point the last one ended. */
public final class PathBuilder {
  /** Pieces shorter than this are rounding left-overs of the construction, mm. */
  private static final double NOTHING_MM = 1e-9;

  private final List<Segment> segments = new ArrayList<>();
  private Point at;

  public PathBuilder(Point start) {
    at = start;
  }

  public Point at() {
    return at;
  }

  /** How many pieces there are so far. */
  public int size() {
    return segments.size();
  }

  public PathBuilder lineTo(Point end) {
    if (at.distanceTo(end) > NOTHING_MM) {
      segments.add(new Line(at, end));
      at = end;
    }
    return this;
  }

  /** An arc of less than a full turn about {@code centre}. */
  public PathBuilder arcTo(Point end, Point centre, boolean counterClockwise) {
    if (at.distanceTo(end) > NOTHING_MM) {
      segments.add(new Arc(at, end, centre, counterClockwise));
      at = end;
    }
    return this;
  }

  public Path build() {
    return new Path(segments);
  }
}
