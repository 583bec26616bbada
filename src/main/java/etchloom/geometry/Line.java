package etchloom.geometry;

import java.util.function.Function;
import java.util.function.UnaryOperator;

/** A straight piece. */
public record Line(Point start, Point end) implements Segment {
  @Override
  public double lengthMm() {
    return start.distanceTo(end);
  }

  @Override
  public Line reversed() {
    return new Line(end, start);
  }

  @Override
  public Point at(double t) {
    return t == 1 ? end : start.plus(end.minus(start).times(t));
  }

  @Override
  public Line part(double from, double to) {
    return new Line(at(from), at(to));
  }

  @Override
  public Point tangent(double t) {
    return end.minus(start).times(1 / lengthMm());
  }

  @Override
  public Line rotated(double rad) {
    return new Line(start.rotated(rad), end.rotated(rad));
  }

  @Override
  public Line mirrored() {
    return new Line(start.mirrored(), end.mirrored());
  }

  @Override
  public Line mapped(UnaryOperator<Point> map) {
    return new Line(map.apply(start), map.apply(end));
  }

  @Override
  public <R> R match(Function<Line, R> line, Function<Arc, R> arc) {
    return line.apply(this);
  }
}
