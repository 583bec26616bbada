package etchloom.geometry;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/**
 * An unbroken run of lines and arcs: each piece starts where the one before it ends, exactly the
 * same two doubles.
 */
public record Path(List<Segment> segments) {
  public Path {
    segments = List.copyOf(segments);
    if (segments.isEmpty()) {
      throw new IllegalArgumentException("a path needs at least one piece");
    }
    for (int i = 1; i < segments.size(); i++) {
      Point a = segments.get(i - 1).end();
      Point b = segments.get(i).start();
      if (!a.equals(b)) {
        throw new IllegalArgumentException("path breaks between " + a + " and " + b);
      }
    }
  }

  public static Path of(Segment... segments) {
    return new Path(List.of(segments));
  }

  /** A full circle as two half circles, counter-clockwise from angle 0. */
  public static Path circle(Point centre, double radiusMm) {
    Point a = centre.plus(new Point(radiusMm, 0));
    Point b = centre.plus(new Point(-radiusMm, 0));
    return of(new Arc(a, b, centre, true), new Arc(b, a, centre, true));
  }

  public Point start() {
    return segments.get(0).start();
  }

  public Point end() {
    return segments.get(segments.size() - 1).end();
  }

  public boolean closed() {
    return start().equals(end());
  }

  public double lengthMm() {
    double sum = 0;
    for (Segment s : segments) {
      sum += s.lengthMm();
    }
    return sum;
  }

  public Path reversed() {
    List<Segment> out = new ArrayList<>(segments.size());
    for (int i = segments.size() - 1; i >= 0; i--) {
      out.add(segments.get(i).reversed());
    }
    return new Path(out);
  }

  /** Turned counter-clockwise about the origin; joints stay the same two doubles. */
  public Path rotated(double rad) {
    return new Path(segments.stream().map(s -> s.rotated(rad)).toList());
  }

  /** Mirrored in the x axis. */
  public Path mirrored() {
    return new Path(segments.stream().map(Segment::mirrored).toList());
  }

  public Path mapped(UnaryOperator<Point> map) {
    return new Path(segments.stream().map(s -> s.mapped(map)).toList());
  }
}
