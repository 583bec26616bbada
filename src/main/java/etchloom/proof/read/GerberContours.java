package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/** The contours of the region statement that is open. */
final class GerberContours {
  /** How far the end of a contour may miss its start and still be closed for the file, mm. */
  static final double CLOSING_SLACK_MM = 0.01;

  private final Reading reading;
  private final List<Path> contours = new ArrayList<>();
  private final List<Segment> current = new ArrayList<>();
  private int line;
  private int pieces;

  GerberContours(Reading reading) {
    this.reading = reading;
  }

  void draw(Segment segment, int at) {
    if (current.isEmpty()) {
      line = at;
    }
    current.add(segment);
  }

  /** Ends the contour, if one is begun. */
  void close() throws UnreadableFile {
    if (current.isEmpty()) {
      return;
    }
    Point start = current.get(0).start();
    Point end = current.get(current.size() - 1).end();
    double gap = start.distanceTo(end);
    if (gap > CLOSING_SLACK_MM) {
      throw reading.fail(
          line,
          "open-contour",
          "the contour ends " + Shown.mm(gap) + " mm from its start, at " + Shown.point(end));
    }
    if (!start.equals(end)) {
      reading.warn(
          line, "open-contour", "the contour ends " + Shown.mm(gap) + " mm from its start");
      current.add(new Line(/* start= */ end, /* end= */ start));
    }
    contours.add(new Path(current));
    pieces += current.size() + 1;
    current.clear();
  }

  int pieces() {
    return pieces;
  }

  /** All contours since the last call. */
  List<Path> taken() {
    List<Path> out = List.copyOf(contours);
    contours.clear();
    pieces = 0;
    return out;
  }
}
