package etchloom.coil;

import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import java.util.Optional;

/**
 * Racetrack coils: four straight sides that step inwards in turn, with corners as round as the
 * turns' width or length allows, or as {@code corner} says. Lengths in mm.
 *
 * <p>All copper lies between the two radii: the outer side stands a little inside the outer one, so
 * that the corners touch it.
 */
final class Racetrack implements OvalTurns {
  private static final int BISECTIONS = 60;
  private static final double ROUNDING_MM = 1e-12;

  private final CoilSize size;
  private final int count;
  private final double wanted;
  private final double outerSide;

  private Racetrack(CoilSize size, int count) {
    this.size = size;
    this.count = count;
    wanted = size.cornerMm().orElse(Double.POSITIVE_INFINITY);
    outerSide = outerSide(firstCorner());
  }

  static Optional<CoilPlan> draw(CoilSize size, int count) {
    Racetrack r = new Racetrack(size, count);
    return r.fits() ? OvalSpiral.plan(size, r) : Optional.empty();
  }

  /** How much the coil is too wide for its sector, at its inner corners. */
  static double overhangMm(CoilSize size) {
    Racetrack r = new Racetrack(size, 1);
    double a = size.halfSpanRad();
    Point c = r.innerLeft(0).centre();
    double room = c.x() * Math.sin(a) - c.y() * Math.cos(a) - r.corner(0);
    return Math.max(0, 2 * (size.pitchMm() / 2 - room));
  }

  /** The largest corner of the outermost turn. */
  private double firstCorner() {
    double high = Math.min(wanted, half(0));
    if (!(roomFor(high) < 0)) {
      return high;
    }
    double low = 0;
    for (int k = 0; k < BISECTIONS; k++) {
      double mid = (low + high) / 2;
      if (roomFor(mid) < 0) {
        high = mid;
      } else {
        low = mid;
      }
    }
    return low;
  }

  private double roomFor(double corner) {
    return outerSide(corner) - inner(0) - 2 * corner;
  }

  /** The outer side's centre line where the corners' copper just reaches the outer radius. */
  private double outerSide(double corner) {
    double edge = corner + size.trackMm() / 2;
    double reach = size.outerRadiusMm() - edge;
    // A lead may come on to the outer side up to a pitch before the corner of the next turn.
    double off = size.widthMm().orElseThrow() / 2 - edge + size.pitchMm();
    return Math.sqrt(reach * reach - off * off) + corner;
  }

  private double half(int turn) {
    return (size.widthMm().orElseThrow() - size.trackMm()) / 2 - turn * size.pitchMm();
  }

  private double outer(int turn) {
    return outerSide - turn * size.pitchMm();
  }

  private double inner(int turn) {
    return size.innerRadiusMm() + size.trackMm() / 2 + turn * size.pitchMm();
  }

  /** The largest corner that a turn's sides leave room for. */
  private double room(int turn) {
    return Math.min(half(turn), (outer(turn) - inner(turn)) / 2);
  }

  private double corner(int turn) {
    return Math.max(size.leastCornerMm(), Math.min(wanted, room(turn)));
  }

  /** A corner sharper than the one around it by more than a pitch would close their gap. */
  private double nextCorner() {
    return Math.max(size.leastCornerMm(), corner(count - 1) - size.pitchMm());
  }

  private boolean fits() {
    for (int i = 0; i < count; i++) {
      // Phrased so that an outer side that is no number is refused too.
      if (!(room(i) >= corner(i) - ROUNDING_MM) || (i > 0 && !joins(i))) {
        return false;
      }
    }
    return true;
  }

  /** Whether the right side before a turn has room for both its corners. */
  private boolean joins(int turn) {
    return outerRight(turn, corner(turn)).centre().x()
        >= innerRight(turn - 1).centre().x() - ROUNDING_MM;
  }

  private Bend outerLeft(int i) {
    return new Bend(new Point(outer(i) - corner(i), half(i) - corner(i)), corner(i));
  }

  private Bend innerLeft(int i) {
    return new Bend(new Point(inner(i) + corner(i), half(i) - corner(i)), corner(i));
  }

  private Bend innerRight(int i) {
    return new Bend(new Point(inner(i) + corner(i), corner(i) - half(i)), corner(i));
  }

  /** From the right side of the turn before on to a turn's outer side. */
  private Bend outerRight(int i, double corner) {
    return new Bend(new Point(outer(i) - corner, corner - half(i - 1)), corner);
  }

  @Override
  public int count() {
    return count;
  }

  @Override
  public Bend startRight() {
    return outerRight(0, corner(0));
  }

  @Override
  public Bend startLeft() {
    return outerLeft(0);
  }

  @Override
  public void turn(int i, boolean whole, PathBuilder path) {
    // The first turn begins where the lead lands: on either corner or between them.
    if (i == 0 && path.at().y() < startRight().centre().y()) {
      startRight().to(startRight().outer(), path);
    }
    if (path.at().y() < outerLeft(i).centre().y()) {
      path.lineTo(outerLeft(i).outer());
    }
    outerLeft(i).to(outerLeft(i).left(), path);
    path.lineTo(innerLeft(i).left());
    innerLeft(i).to(innerLeft(i).inner(), path);
    path.lineTo(innerRight(i).inner());
    if (whole) {
      Bend next = outerRight(i + 1, corner(i + 1));
      innerRight(i).to(innerRight(i).right(), path);
      path.lineTo(next.right());
      next.to(next.outer(), path);
    }
  }

  @Override
  public Bend exitInner() {
    return innerRight(count - 1);
  }

  @Override
  public Bend exitOuter() {
    return outerRight(count, nextCorner());
  }

  @Override
  public double middleMm() {
    return (outer(count - 1) + inner(count - 1)) / 2;
  }
}
