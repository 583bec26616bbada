package etchloom.coil;

import etchloom.geometry.Point;
import java.util.List;
import java.util.Optional;

/**
 * The turns of a wedge coil: for each the distance of its sides from the sector's rays, the radii
 * of its outer and inner arc, and one fillet radius for all its corners. Lengths in mm.
 *
 * <p>Turn 0 is the outermost. A turn is the set of points at a fixed distance inside the sector, so
 * neighbouring turns, and neighbouring coils, keep an even gap along their sides.
 */
final class WedgeTurns {
  private static final int BISECTIONS = 50;

  private final CoilSize size;
  private final double sinHalf;
  private final double cosHalf;
  private final double[] fillet;
  private final Optional<WedgeFan> fan;

  private WedgeTurns(CoilSize size, double[] fillet, Optional<WedgeFan> fan) {
    this.size = size;
    this.fillet = fillet;
    this.fan = fan;
    sinHalf = Math.sin(size.halfSpanRad());
    cosHalf = Math.cos(size.halfSpanRad());
  }

  /**
   * The turns with the largest fillets that fit, at most the wanted one.
   *
   * <p>A fillet that must shrink at one turn lowers those outside it too: a fillet smaller than the
   * next outer one by more than a pitch would close the gap between the two corners.
   *
   * @return empty where {@code count} turns do not fit
   */
  static Optional<WedgeTurns> fit(CoilSize size, int count) {
    WedgeTurns t = new WedgeTurns(size, new double[count], Optional.empty());
    double least = size.pitchMm() / 2;
    double cap = size.wedgeCornerMm();
    for (int i = count - 1; i >= 0; i--) {
      if (!t.fits(i, least, count)) {
        return Optional.empty();
      }
      t.fillet[i] = t.largest(i, least, Math.max(cap, least), count);
      cap = Math.min(size.wedgeCornerMm(), t.fillet[i] + size.pitchMm());
    }
    return t.joins() ? Optional.of(t) : Optional.empty();
  }

  /**
   * The same turns with sides that widen outwards.
   *
   * @param share of the full bend, 0 to 1
   */
  WedgeTurns widening(double share) {
    return new WedgeTurns(size, fillet, WedgeFan.of(size, this, share));
  }

  private double largest(int turn, double low, double high, int count) {
    if (fits(turn, high, count)) {
      return high;
    }
    double good = low;
    double bad = high;
    for (int k = 0; k < BISECTIONS; k++) {
      double mid = (good + bad) / 2;
      if (fits(turn, mid, count)) {
        good = mid;
      } else {
        bad = mid;
      }
    }
    return good;
  }

  private boolean fits(int turn, double r, int count) {
    double outer = outerTangent(side(turn), outerArc(turn), r);
    if (!(outer > innerTangent(turn, r)) || !(cornerAngle(side(turn), outerArc(turn), r) > 0)) {
      return false;
    }
    return turn < count - 1 || eyeFits(turn, r);
  }

  /** The last turn must leave room for its eye vias, and for the way in to the innermost one. */
  private boolean eyeFits(int last, double r) {
    double clear = size.eyeClearanceMm();
    double m = Math.max(r, clear);
    double least = (side(last) + m) / sinHalf - m + clear;
    if (hasInnerArc(last, r)) {
      least = Math.max(least, innerArc(last) + clear);
    }
    double innermost = eyeRadius(last, size.eyes() - 1);
    if (!(innermost >= least)) {
      return false;
    }
    double exit = exitFillet(r);
    double foot = outerTangent(side(last), innermost, exit);
    return foot >= innerTangent(last, r) && cornerAngle(side(last), innermost, exit) > 0;
  }

  /** Every right side runs up to the next turn's outer arc with that turn's fillet. */
  private boolean joins() {
    for (int i = 0; i + 1 < fillet.length; i++) {
      double top = outerTangent(side(i), outerArc(i + 1), fillet[i + 1]);
      if (!(top > innerTangent(i, fillet[i]))) {
        return false;
      }
    }
    return true;
  }

  int count() {
    return fillet.length;
  }

  double fillet(int turn) {
    return fillet[turn];
  }

  /** Distance of a turn's sides from the sector's rays. */
  double side(int turn) {
    return (size.spaceMm() + size.trackMm()) / 2 + turn * size.pitchMm();
  }

  double outerArc(int turn) {
    return size.outerRadiusMm() - size.trackMm() / 2 - turn * size.pitchMm();
  }

  double innerArc(int turn) {
    return size.innerRadiusMm() + size.trackMm() / 2 + turn * size.pitchMm();
  }

  /** Radius of eye via {@code j}, counted from outside. */
  double eyeRadius(int j) {
    return eyeRadius(count() - 1, j);
  }

  private double eyeRadius(int last, int j) {
    return outerArc(last) - size.eyeClearanceMm() - j * size.eyePitchMm();
  }

  /** Fillet with which the last right side turns in to its eye via. */
  double exitFillet() {
    return exitFillet(fillet[count() - 1]);
  }

  /** No sharper than the corner around it by more than a pitch, which would close their gap. */
  private double exitFillet(double r) {
    return Math.max(size.pitchMm() / 2, r - size.pitchMm());
  }

  boolean hasInnerArc(int turn, double r) {
    return side(turn) + r < (innerArc(turn) + r) * sinHalf;
  }

  boolean hasInnerArc(int turn) {
    return hasInnerArc(turn, fillet[turn]);
  }

  /** Radius of the single fillet's centre on the axis, where the inner arc is gone. */
  double apexRadius(int turn) {
    return (side(turn) + fillet[turn]) / sinHalf;
  }

  /** Where a side leaves its inner fillet, measured along the ray from the shaft. */
  double innerTangent(int turn) {
    return innerTangent(turn, fillet[turn]);
  }

  private double innerTangent(int turn, double r) {
    double d = side(turn) + r;
    if (hasInnerArc(turn, r)) {
      return leg(innerArc(turn) + r, d);
    }
    return d * cosHalf / sinHalf;
  }

  /**
   * Where a side at distance {@code d} from the ray meets its fillet of radius {@code r} under an
   * arc of radius {@code arc}, measured along the ray from the shaft; NaN where there is none.
   */
  static double outerTangent(double d, double arc, double r) {
    return leg(arc - r, d + r);
  }

  /** Angle of that fillet's centre from the axis; NaN where there is none. */
  double cornerAngle(double d, double arc, double r) {
    return size.halfSpanRad() - Math.asin((d + r) / (arc - r));
  }

  /**
   * A turn's left side, up to its fillet of radius {@code r} under an arc of radius {@code arc}.
   */
  Flank flank(int turn, double arc, double r) {
    double d = side(turn);
    double along = outerTangent(d, arc, r);
    if (fan.isPresent() && fan.get().bends(turn, along, r)) {
      return fan.get().flank(turn, arc, r);
    }
    return new Flank(cornerAngle(d, arc, r), List.of(left(along, d)), List.of(size.trackMm()));
  }

  /** The point {@code along} the left ray and {@code d} inside it. */
  Point left(double along, double d) {
    return new Point(along * cosHalf + d * sinHalf, along * sinHalf - d * cosHalf);
  }

  /** The other leg of a right triangle; NaN where there is none. */
  private static double leg(double hypotenuse, double leg) {
    return hypotenuse > 0 ? Math.sqrt(hypotenuse * hypotenuse - leg * leg) : Double.NaN;
  }
}
