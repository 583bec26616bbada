package etchloom.coil;

import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The sides of a wedge whose tracks widen outwards. Lengths in mm.
 *
 * <p>With even tracks the gaps between turns, and between coils, are even too; what grows with the
 * radius is the void in the middle. Here the sides take it up, down to a channel that leaves the
 * eye vias their space. From the place on where the void is as wide as that channel, the middle
 * lines of the gaps fan out: that to the neighbouring coil stays parallel to the sector's ray, that
 * to the channel runs along it, those between share the angle evenly. Inside of that place, and so
 * at its inner end, every turn is as without taper.
 *
 * <p>A track's centre line runs half-way between the middle lines beside it, and its width grows
 * with their distance, in steps: each piece is as wide as its inner end allows, so that two
 * neighbours are nowhere nearer than the space, and exactly so far apart where their steps begin.
 * All turns share the same widths, in equal ratios: {@link #FINEST}, or as much more as keeps a
 * piece longer than wide, and their number at most {@link #MOST}. Over a side that falls short of
 * an even taper's conductance by about half that ratio.
 */
final class WedgeFan {
  /** Ratio of two neighbouring widths: an average loss of two and a half per cent. */
  private static final double FINEST = 1.05;

  /** Steps at most, so that files stay small. */
  private static final int MOST = 24;

  /** A piece's length over its width, at least: round ends then touch the next piece only. */
  private static final double LONG = 1.15;

  /** How often the fan begins a little farther out, where it would begin in a corner. */
  private static final int SHIFTS = 64;

  /** The sharpest bend of all, rad; boards of few turns and large bores would exceed it. */
  private static final double SHARPEST_RAD = 1.5;

  private final CoilSize size;
  private final WedgeTurns turns;
  private final double stepRad;
  private final double[] kink;
  private final double growth;
  private final double[] width;

  private WedgeFan(CoilSize size, WedgeTurns turns, double lastMm, double bendRad) {
    this.size = size;
    this.turns = turns;
    int n = turns.count();
    stepRad = bendRad / n;
    growth = 2 * Math.sin(stepRad / 2);
    kink = new double[n];
    // The middle lines on both sides of a track touch one circle about its kink.
    double middle = lastMm;
    for (int i = n - 1; i >= 0; i--) {
      kink[i] = middle + size.pitchMm() / 2 * Math.tan((i + 1) * stepRad / 2);
      middle = kink[i] + size.pitchMm() / 2 * Math.tan(i * stepRad / 2);
    }
    width = widths();
  }

  /**
   * @param share how much of the full bend is wanted, 0 to 1
   * @return empty where there is nothing to widen
   */
  static Optional<WedgeFan> of(CoilSize size, WedgeTurns turns, double share) {
    int n = turns.count();
    double a = size.halfSpanRad();
    double p = size.pitchMm();
    double r = turns.fillet(n - 1);
    double channel = Math.max((size.jointMm() + size.spaceMm()) / 2, r - p / 2);
    double start = (channel + n * p * Math.cos(a)) / Math.sin(a);
    // Not before the last turn has left its inner fillet.
    start = Math.max(start, turns.innerTangent(n - 1) + size.trackMm());
    for (int shift = 0; shift < SHIFTS; shift++) {
      double last = start + shift * p / 8;
      Point from = inside(a, last, n * p);
      double room = turns.outerArc(n - 1) - from.x();
      if (!(room > size.trackMm())) {
        return Optional.empty();
      }
      double bend = Math.min(SHARPEST_RAD, a + Math.atan2(from.y() - channel, room));
      WedgeFan fan = new WedgeFan(size, turns, last, share * bend);
      if (fan.corners()) {
        return fan.width.length > 1 ? Optional.of(fan) : Optional.empty();
      }
    }
    return Optional.empty();
  }

  /** Whether every corner keeps its space to the next turn outside it. */
  private boolean corners() {
    int last = kink.length - 1;
    boolean all = true;
    for (int i = 0; i <= last; i++) {
      all &= corner(i, turns.outerArc(i), turns.fillet(i));
      all &= i == last || corner(i, turns.outerArc(i + 1), turns.fillet(i + 1));
    }
    for (int k = 0; k < size.eyes(); k++) {
      all &= corner(last, turns.eyeRadius(k), turns.exitFillet());
    }
    return all;
  }

  /** A corner too near to where its side bends is on neither the one side of it nor the other. */
  private boolean corner(int turn, double arc, double r) {
    return !bends(turn, WedgeTurns.outerTangent(turns.side(turn), arc, r), r)
        || tangent(turn, arc, r) >= r * Math.tan(stepRad / 4);
  }

  /** The point {@code along} a ray from the shaft and {@code in} to its right. */
  private static Point inside(double rayRad, double along, double in) {
    Point u = Point.polar(1, rayRad);
    return u.times(along).plus(new Point(u.y(), -u.x()).times(in));
  }

  private double[] widths() {
    double track = size.trackMm();
    double longest = 0;
    for (int i = 0; i < kink.length; i++) {
      longest = Math.max(longest, turns.outerArc(i) - kink[i]);
    }
    double most = track + growth * longest;
    double ratio =
        Math.max(
            Math.max(FINEST, 1 + LONG * growth),
            Math.pow(Math.max(1, most / track), 1.0 / MOST) + 1e-9);
    List<Double> out = new ArrayList<>(List.of(track));
    for (double w = track * ratio; w <= most; w *= ratio) {
      out.add(Math.floor(w * 5e5) / 5e5); // a whole number of nanometres on either side
    }
    return out.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /**
   * Whether a side that without taper would reach so far, along its ray, gets to where it bends. A
   * fillet of radius r that ends before still keeps clear of the gap's middle line, bent too.
   */
  boolean bends(int turn, double plainTangent, double r) {
    return plainTangent > kink[turn] - r * Math.tan(turn * stepRad / 2);
  }

  /** How far from its bend a side meets its fillet; negative or NaN where it does not. */
  private double tangent(int turn, double arc, double r) {
    Point u = Point.polar(1, rayRad(turn));
    Point c = bend(turn);
    double in = c.x() * u.y() - c.y() * u.x();
    return WedgeTurns.outerTangent(in, arc, r) - c.dot(u);
  }

  private double rayRad(int turn) {
    return size.halfSpanRad() - (turn + 0.5) * stepRad;
  }

  private Point bend(int turn) {
    return inside(size.halfSpanRad(), kink[turn], turns.side(turn));
  }

  /** A turn's side up to its fillet of radius {@code r} under an arc of radius {@code arc}. */
  Flank flank(int turn, double arc, double r) {
    double ray = rayRad(turn);
    Point u = Point.polar(1, ray);
    Point c = bend(turn);
    double in = c.x() * u.y() - c.y() * u.x();
    double from = c.dot(u);
    double tangent = tangent(turn, arc, r);
    List<Point> at = new ArrayList<>(List.of(c));
    List<Double> widths = new ArrayList<>(List.of(width[0]));
    int last = width.length - 1;
    double end = 0;
    for (; last > 0; last--) {
      // Round ends keep clear of the fillet, and of the arc beyond it.
      double half = width[last] / 2;
      double under = arc - size.trackMm() / 2 - size.spaceMm() - half;
      end = Math.min(tangent - half, Math.sqrt(under * under - in * in) - from);
      if (end - begins(last) >= width[last]) {
        break;
      }
    }
    for (int k = 1; k <= last; k++) {
      at.add(c.plus(u.times(begins(k))));
      widths.add(width[k - 1]);
    }
    if (last > 0) {
      at.add(c.plus(u.times(end)));
      widths.add(width[last]);
    }
    at.add(c.plus(u.times(tangent)));
    widths.add(width[0]);
    return new Flank(ray - Math.asin((in + r) / (arc - r)), at, widths);
  }

  /** How far from the kink there is room for a width. */
  private double begins(int k) {
    return (width[k] - width[0]) / growth;
  }
}
