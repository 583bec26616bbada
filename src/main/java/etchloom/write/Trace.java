package etchloom.write;

import etchloom.geometry.Arc;
import etchloom.geometry.Grid;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/**
 * A path as whole nanometres, ready to print: the start, then a step for each piece.
 *
 * <p>Pieces of no length are gone. An arc whose chord is under {@link #SHORT_CHORD_NM} is a
 * straight step: readers may shift any coordinate by half a micrometre, and a tiny arc then flips
 * to a full circle. Arcs that sweep more than the format bears are cut in two.
 */
record Trace(long x, long y, List<Step> steps) {
  /** The Gerber Layer Format Specification asks for a draw below about 2 um; kept wider. */
  static final long SHORT_CHORD_NM = 5_000;

  /** Longest sweep in Gerber: nearly full arcs may turn into dots. */
  static final double GERBER_SWEEP_RAD = Math.toRadians(270);

  /** Longest sweep where a bulge must not exceed 1; the slack lets half circles pass. */
  static final double BULGE_SWEEP_RAD = Math.PI + 1e-6;

  /** Longest sweep in SVG, where a half circle's direction hangs on rounding. */
  static final double SVG_SWEEP_RAD = Math.toRadians(170);

  Trace {
    steps = List.copyOf(steps);
  }

  /**
   * @param cx centre of an arc; of a line 0
   * @param turn 1 counter-clockwise, -1 clockwise, 0 a line
   */
  record Step(long x, long y, long cx, long cy, int turn) {
    boolean arc() {
      return turn != 0;
    }

    /** Signed sweep of an arc that starts at the point given, rad. */
    double sweepRad(long fromX, long fromY) {
      double ax = fromX - cx;
      double ay = fromY - cy;
      double bx = x - cx;
      double by = y - cy;
      double s = StrictMath.atan2(ax * by - ay * bx, ax * bx + ay * by);
      if (turn > 0) {
        return s < 0 ? s + 2 * Math.PI : s;
      }
      return s > 0 ? s - 2 * Math.PI : s;
    }
  }

  /**
   * @param path on the grid
   * @throws IllegalArgumentException when a point is off the grid or the path has no length
   */
  static Trace of(Path path, double longestSweepRad) {
    long x = steps(path.start().x());
    long y = steps(path.start().y());
    List<Step> out = new ArrayList<>(path.segments().size());
    long atX = x;
    long atY = y;
    for (Segment s : path.segments()) {
      long toX = steps(s.end().x());
      long toY = steps(s.end().y());
      if (toX == atX && toY == atY) {
        continue;
      }
      Step whole = s.match(Trace::straight, Trace::round);
      add(out, atX, atY, whole, longestSweepRad);
      atX = toX;
      atY = toY;
    }
    if (out.isEmpty()) {
      throw new IllegalArgumentException("a path of no length at " + path.start());
    }
    return new Trace(x, y, out);
  }

  private static Step straight(Line l) {
    return new Step(steps(l.end().x()), steps(l.end().y()), 0, 0, 0);
  }

  private static Step round(Arc a) {
    return new Step(
        steps(a.end().x()),
        steps(a.end().y()),
        steps(a.centre().x()),
        steps(a.centre().y()),
        a.counterClockwise() ? 1 : -1);
  }

  private static void add(List<Step> out, long x, long y, Step s, double longestRad) {
    if (s.arc() && Math.abs(s.sweepRad(x, y)) > longestRad) {
      Step half = firstHalf(x, y, s);
      add(out, x, y, half, longestRad);
      add(out, half.x, half.y, s, longestRad);
    } else if (s.arc() && Math.hypot(s.x - x, s.y - y) < SHORT_CHORD_NM) {
      out.add(new Step(s.x, s.y, 0, 0, 0));
    } else {
      out.add(s);
    }
  }

  /** Up to the middle, at the mean of the two radii, which rounding may have set apart. */
  private static Step firstHalf(long x, long y, Step s) {
    double half = s.sweepRad(x, y) / 2;
    double ax = x - s.cx;
    double ay = y - s.cy;
    double r0 = Math.hypot(ax, ay);
    double k = (r0 + Math.hypot(s.x - s.cx, s.y - s.cy)) / (2 * r0);
    double cos = StrictMath.cos(half) * k;
    double sin = StrictMath.sin(half) * k;
    return new Step(
        s.cx + away(cos * ax - sin * ay), s.cy + away(sin * ax + cos * ay), s.cx, s.cy, s.turn);
  }

  private static long away(double v) {
    long half = (long) Math.floor(Math.abs(v) + 0.5);
    return v < 0 ? -half : half;
  }

  static long steps(double mm) {
    long nm = Grid.nm(mm);
    if (Grid.mm(nm) != mm) {
      throw new IllegalArgumentException("off the nanometre grid: " + mm + " mm");
    }
    return nm;
  }

  /** A point on the grid as {x, y} in nm. */
  static long[] steps(Point p) {
    return new long[] {steps(p.x()), steps(p.y())};
  }
}
