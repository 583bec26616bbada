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
  private final PathBuilder path;
  private final List<Integer> turnOf = new ArrayList<>();
  private final List<Double> widths = new ArrayList<>();

  private WedgeSpiral(CoilSize size, WedgeTurns turns, double startRad) {
    this.size = size;
    this.turns = turns;
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
    boolean even = s.widths.stream().allMatch(w -> w == size.trackMm());
    return new CoilPlan.Spiral(s.path.build(), s.turnOf, even ? List.of() : s.widths);
  }

  /** Whether the lead from a node lands on the outer arc before its left corner. */
  static boolean leadFits(CoilSize size, WedgeTurns turns, double startRad) {
    double lead = leadFillet(size, turns);
    double r = turns.fillet(0);
    double landing = startRad + Math.asin(lead / (turns.outerArc(0) + lead));
    return landing < turns.flank(0, turns.outerArc(0), r).cornerRad();
  }

  private static double leadFillet(CoilSize size, WedgeTurns turns) {
    double room = size.nodeRadiusMm() - turns.outerArc(0);
    return Math.min(room, Math.max(size.wedgeCornerMm(), size.pitchMm() / 2));
  }

  private void label(int turn) {
    while (turnOf.size() < path.size()) {
      turnOf.add(turn + 1);
    }
    width(size.trackMm());
  }

  /** Of all pieces that have none yet. */
  private void width(double mm) {
    while (widths.size() < path.size()) {
      widths.add(mm);
    }
  }

  private void side(Point end, double widthMm) {
    width(size.trackMm());
    path.lineTo(end);
    width(widthMm);
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
    Flank f = turns.flank(i, arc, r);
    int n = f.at().size();
    path.arcTo(Point.polar(arc, f.cornerRad()), Point.ORIGIN, true);
    path.arcTo(f.at().get(n - 1), Point.polar(arc - r, f.cornerRad()), true);
    for (int k = n - 1; k > 0; k--) {
      side(f.at().get(k - 1), f.widthMm().get(k));
    }
    side(turns.left(turns.innerTangent(i), d), f.widthMm().get(0));
  }

  /** Round the inner end, by the inner arc or by one fillet at the apex. */
  private void innerEnd(int i) {
    double d = turns.side(i);
    double r = turns.fillet(i);
    Point rightFoot = turns.left(turns.innerTangent(i), d).mirrored();
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
    corner(i, turns.outerArc(i + 1), turns.fillet(i + 1));
  }

  /** Up the right side as far as the eye via, and in to it along an arc about the shaft. */
  private void exit(int last, double eyeRadius) {
    corner(last, eyeRadius, turns.exitFillet());
    path.arcTo(new Point(eyeRadius, 0), Point.ORIGIN, true);
  }

  private void corner(int turn, double arc, double r) {
    Flank f = turns.flank(turn, arc, r);
    for (int k = 0; k < f.at().size(); k++) {
      side(f.at().get(k).mirrored(), f.widthMm().get(k));
    }
    double a = f.cornerRad();
    path.arcTo(Point.polar(arc, -a), Point.polar(arc - r, -a), true);
  }
}
