package etchloom.rules;

import etchloom.geometry.Arc;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;

/**
 * How near two pieces of one track can come to each other by its own bends, without a search.
 *
 * <p>Let m be the direction half-way between those in which the track leaves the first piece and
 * enters the second, f the angle from m to either. A point u before the end of the first piece,
 * which bends by k per length, lies behind that end by at least g(u) = (sin(f + k·u) - sin f)/k,
 * seen along m, and so for a point v after the start of the second. The two are then at least g(u)
 * + c + g(v) apart, c being what lies between the pieces, seen along m. The sum is concave, so over
 * a polygon of u and v it is least at a corner. The polygon is what the pieces' lengths allow, less
 * the points too near along the track to count.
 */
final class Run {
  private final double firstMm;
  private final double secondMm;
  private final double sin;
  private final double cos;
  private final double firstBend;
  private final double secondBend;
  private final double betweenMm;
  private double least = Double.POSITIVE_INFINITY;

  private Run(Piece p, Piece q) {
    firstMm = p.lengthMm();
    secondMm = q.lengthMm();
    firstBend = bend(p.shape());
    secondBend = bend(q.shape());
    Point out = p.shape().tangent(1);
    Point in = q.shape().tangent(0);
    double dot = Math.max(-1, Math.min(1, out.dot(in)));
    sin = Math.sqrt((1 - dot) / 2);
    cos = Math.sqrt((1 + dot) / 2);
    Point middle = out.plus(in);
    Point across = q.shape().start().minus(p.shape().end());
    double norm = middle.norm();
    betweenMm = norm > 0 ? across.dot(middle) / norm : 0;
  }

  private static double bend(Segment s) {
    return s instanceof Arc a ? 1 / a.radiusMm() : 0;
  }

  /**
   * A lower bound, mm, on the distance of points that are more than {@code near} apart along the
   * track; infinite where there are none; not positive where it says nothing, as for pieces of
   * different tracks and for pads.
   */
  static double leastMm(Piece p, Piece q, double near) {
    if (p.isPad() || p.conductor() != q.conductor()) {
      return 0;
    }
    boolean forward = p.fromMm() <= q.fromMm();
    Piece first = forward ? p : q;
    Piece second = forward ? q : p;
    double apart = near - (second.fromMm() - first.toMm());
    if (first.lengthMm() + second.lengthMm() < apart) {
      return Double.POSITIVE_INFINITY;
    }
    return apart > 0 ? new Run(first, second).least(apart) : 0;
  }

  private double least(double apartMm) {
    double angle = Math.asin(sin);
    if (angle + firstBend * firstMm > Math.PI || angle + secondBend * secondMm > Math.PI) {
      return 0;
    }
    corner(firstMm, secondMm);
    double u = Math.min(firstMm, apartMm);
    corner(u, apartMm - u);
    corner(firstMm, Math.max(0, apartMm - firstMm));
    double v = Math.min(secondMm, apartMm);
    corner(apartMm - v, v);
    corner(Math.max(0, apartMm - secondMm), secondMm);
    return least;
  }

  private void corner(double u, double v) {
    least = Math.min(least, behind(u, firstBend) + betweenMm + behind(v, secondBend));
  }

  private double behind(double lengthMm, double bend) {
    double t = bend * lengthMm;
    // For the smallest angles the quotient loses its digits; the angle is then overstated.
    return t < 1e-6
        ? lengthMm * (cos - t * sin)
        : (sin * Math.cos(t) + cos * Math.sin(t) - sin) / bend;
  }
}
