package etchloom.coil;

import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/**
 * Draws one inward spiral over given turns: from its rim node along outer, left, inner and right
 * side, step by step inwards, to its eye via. Counter-clockwise, in the coil's own frame.
 */
final class WedgeSpiral {
  private final CoilSize size;
  private final WedgeTurns turns;
  private final Point leftRay;
  private final Point rightRay;
  private final PathBuilder path;
  private final List<Integer> turnOf = new ArrayList<>();

  private WedgeSpiral(CoilSize size, WedgeTurns turns, double startRad) {
    this.size = size;
    this.turns = turns;
    leftRay = Point.polar(1, size.halfSpanRad());
    rightRay = leftRay.mirrored();
    path = new PathBuilder(Point.polar(size.nodeRadiusMm(), startRad));
  }

  /**
   * @param startRad angle of the rim node from the axis
   * @param eye which eye via, from outside
   */
  static CoilPlan.Spiral draw(CoilSize size, WedgeTurns turns, double startRad, int eye) {
    WedgeSpiral s = new WedgeSpiral(size, turns, startRad);
    s.lead(startRad);
    int last = turns.count() - 1;
    for (int i = 0; i <= last; i++) {
      s.leftSide(i);
      s.innerEnd(i);
      if (i < last) {
        s.rightSide(i);
      }
      s.label(i);
    }
    s.exit(last, turns.eyeRadius(eye));
    s.label(last);
    return new CoilPlan.Spiral(s.path.build(), s.turnOf);
  }

  /** Whether the lead from a node lands on the outer arc before its left corner. */
  static boolean leadFits(CoilSize size, WedgeTurns turns, double startRad) {
    double lead = leadFillet(size, turns);
    double r = turns.fillet(0);
    double landing = startRad + Math.asin(lead / (turns.outerArc(0) + lead));
    return landing < turns.cornerAngle(turns.side(0), turns.outerArc(0), r);
  }

  private static double leadFillet(CoilSize size, WedgeTurns turns) {
    double room = size.nodeRadiusMm() - turns.outerArc(0);
    return Math.min(room, Math.max(size.wedgeCornerMm(), size.pitchMm() / 2));
  }

  private void label(int turn) {
    while (turnOf.size() < path.size()) {
      turnOf.add(turn + 1);
    }
  }

  /** Radially in from the node, and counter-clockwise on to the outer arc. */
  private void lead(double startRad) {
    double f = leadFillet(size, turns);
    double ro = turns.outerArc(0);
    double far = ro + f;
    double centreRad = startRad + Math.asin(f / far);
    Point centre = Point.polar(far, centreRad);
    path.lineTo(Point.polar(Math.sqrt(far * far - f * f), startRad));
    path.arcTo(Point.polar(ro, centreRad), centre, false);
  }

  /** Along the outer arc, round the left corner, down the left side. */
  private void leftSide(int i) {
    double d = turns.side(i);
    double r = turns.fillet(i);
    double arc = turns.outerArc(i);
    double a = turns.cornerAngle(d, arc, r);
    path.arcTo(Point.polar(arc, a), Point.ORIGIN, true);
    path.arcTo(left(WedgeTurns.outerTangent(d, arc, r), d), Point.polar(arc - r, a), true);
    path.lineTo(left(turns.innerTangent(i), d));
  }

  /** Round the inner end, by the inner arc or by one fillet at the apex. */
  private void innerEnd(int i) {
    double d = turns.side(i);
    double r = turns.fillet(i);
    Point rightFoot = right(turns.innerTangent(i), d);
    if (!turns.hasInnerArc(i)) {
      path.arcTo(rightFoot, new Point(turns.apexRadius(i), 0), true);
      return;
    }
    double arc = turns.innerArc(i);
    double a = size.halfSpanRad() - Math.asin((d + r) / (arc + r));
    path.arcTo(Point.polar(arc, a), Point.polar(arc + r, a), true);
    path.arcTo(Point.polar(arc, -a), Point.ORIGIN, false);
    path.arcTo(rightFoot, Point.polar(arc + r, -a), true);
  }

  /** Up the right side and round the corner on to the next turn's outer arc. */
  private void rightSide(int i) {
    double d = turns.side(i);
    double r = turns.fillet(i + 1);
    double arc = turns.outerArc(i + 1);
    corner(d, arc, r);
  }

  /** Up the right side as far as the eye via, and in to it along an arc about the shaft. */
  private void exit(int last, double eyeRadius) {
    corner(turns.side(last), eyeRadius, turns.exitFillet());
    path.arcTo(new Point(eyeRadius, 0), Point.ORIGIN, true);
  }

  private void corner(double d, double arc, double r) {
    double a = turns.cornerAngle(d, arc, r);
    path.lineTo(right(WedgeTurns.outerTangent(d, arc, r), d));
    path.arcTo(Point.polar(arc, -a), Point.polar(arc - r, -a), true);
  }

  /** The point {@code along} the left ray and {@code d} inside it. */
  private Point left(double along, double d) {
    return leftRay.times(along).plus(new Point(leftRay.y(), -leftRay.x()).times(d));
  }

  private Point right(double along, double d) {
    return rightRay.times(along).plus(new Point(-rightRay.y(), rightRay.x()).times(d));
  }
}
