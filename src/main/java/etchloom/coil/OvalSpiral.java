package etchloom.coil;

import etchloom.geometry.Distance;
import etchloom.geometry.Line;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Draws one inward spiral of a round or racetrack coil: from its rim node radially in, over the
 * turns, and square to the axis into its eye via. The eye vias stand in a row along the axis, in
 * the middle of the void. Whether all this has room is measured on the drawn line.
 */
final class OvalSpiral {
  private static final double ROUNDING_MM = 1e-9;

  private final CoilSize size;
  private final OvalTurns turns;
  private final double startRad;
  private final Point end;
  private final PathBuilder path;
  private final List<Integer> turnOf = new ArrayList<>();
  private int exitFrom;

  private OvalSpiral(CoilSize size, OvalTurns turns, double startRad, int eye) {
    this.size = size;
    this.turns = turns;
    this.startRad = startRad;
    end = new Point(eyeMm(size, turns, eye), 0);
    path = new PathBuilder(Point.polar(size.nodeRadiusMm(), startRad));
  }

  /** The whole coil, or empty where any of its layers has no room. */
  static Optional<CoilPlan> plan(CoilSize size, OvalTurns turns) {
    for (int j = 0; j < size.pairs(); j++) {
      int first = j * size.viaCount();
      int last = first + size.viaCount() - 1;
      if (!new OvalSpiral(size, turns, size.startRad(j), first).fits(1)
          || !new OvalSpiral(size, turns, -size.finishRad(j), last).fits(-1)) {
        return Optional.empty();
      }
    }
    return Optional.of(
        Layout.plan(
            size,
            turns.count(),
            k -> eyeMm(size, turns, k),
            (startRad, eye) -> new OvalSpiral(size, turns, startRad, eye).spiral()));
  }

  private static double eyeMm(CoilSize size, OvalTurns turns, int eye) {
    return turns.middleMm() + ((size.eyes() - 1) / 2.0 - eye) * size.eyePitchMm();
  }

  private CoilPlan.Spiral spiral() {
    if (!draw()) {
      throw new IllegalStateException("a spiral that was found to fit does not");
    }
    return new CoilPlan.Spiral(path.build(), turnOf);
  }

  private boolean draw() {
    if (!lead()) {
      return false;
    }
    int last = turns.count() - 1;
    for (int i = 0; i <= last; i++) {
      turns.turn(i, i < last, path);
      label(i);
    }
    boolean out = exit();
    label(last);
    return out;
  }

  private void label(int turn) {
    while (turnOf.size() < path.size()) {
      turnOf.add(turn + 1);
    }
  }

  /** Radially in from the node and counter-clockwise on to the outermost turn. */
  private boolean lead() {
    Point along = Point.polar(1, startRad);
    Point beside = new Point(-along.y(), along.x());
    Bend right = turns.startRight();
    Bend left = turns.startLeft();
    double side = left.outer().x();
    double f =
        Math.min(
            size.nodeRadiusMm() - size.outerRadiusMm() + size.trackMm() / 2,
            Math.max(size.trackMm(), size.leastCornerMm()));
    double foot = (side + f + f * along.y()) / along.x();
    Point centre = along.times(foot).plus(beside.times(f));
    Point landing = new Point(side, centre.y());
    if (centre.y() < right.centre().y() || centre.y() > left.centre().y()) {
      Bend bend = centre.y() > left.centre().y() ? left : right;
      double off = f - bend.centre().dot(beside);
      double far = bend.radiusMm() + f;
      foot = bend.centre().dot(along) + Math.sqrt(far * far - off * off);
      centre = along.times(foot).plus(beside.times(f));
      Point out = centre.minus(bend.centre());
      landing = bend.centre().plus(out.times(bend.radiusMm() / far));
      if (!(out.x() > 0)) {
        return false;
      }
    }
    if (!(foot <= size.nodeRadiusMm() + ROUNDING_MM)) {
      return false;
    }
    path.lineTo(along.times(foot));
    path.arcTo(landing, centre, false);
    return true;
  }

  /**
   * On along the way that a further turn would take, off it by a fillet of half a pitch as soon as
   * that ends square under the eye via, and straight in.
   */
  private boolean exit() {
    double f = size.leastCornerMm();
    Bend in = turns.exitInner();
    Bend out = turns.exitOuter();
    double x = end.x() - f;
    if (x < in.centre().x()) {
      return leave(in, x, f);
    }
    in.to(in.right(), path);
    if (x <= out.centre().x()) {
      Point foot = new Point(x, in.right().y());
      path.lineTo(foot);
      return fillet(foot.plus(new Point(0, f)));
    }
    if (!(out.centre().x() >= in.centre().x() - ROUNDING_MM)) {
      return false;
    }
    path.lineTo(out.right());
    return leave(out, x, f);
  }

  private boolean leave(Bend bend, double x, double f) {
    double inside = bend.radiusMm() - f;
    double cos = (x - bend.centre().x()) / inside;
    if (!(inside > 0 && Math.abs(cos) <= 1)) {
      return false;
    }
    Point unit = new Point(cos, -Math.sqrt(1 - cos * cos));
    bend.to(bend.centre().plus(unit.times(bend.radiusMm())), path);
    return fillet(bend.centre().plus(unit.times(inside)));
  }

  private boolean fillet(Point centre) {
    exitFrom = path.size();
    path.arcTo(new Point(end.x(), centre.y()), centre, true);
    path.lineTo(end);
    return centre.y() < -ROUNDING_MM;
  }

  /**
   * @param mirror -1 for an outward layer, which is drawn in its mirror image
   */
  private boolean fits(int mirror) {
    if (!draw()) {
      return false;
    }
    List<Segment> all = path.build().segments();
    return inSector(all) && clearOfEyes(all) && clearOfNodes(all, mirror);
  }

  private boolean inSector(List<Segment> all) {
    double least = size.pitchMm() / 2;
    Line left = new Line(Point.ORIGIN, Point.polar(2 * size.nodeRadiusMm(), size.halfSpanRad()));
    for (int k = 0; k < all.size() && turnOf.get(k) == 1; k++) {
      if (!clear(all.get(k), left, least) || !clear(all.get(k), left.mirrored(), least)) {
        return false;
      }
    }
    return true;
  }

  private boolean clearOfEyes(List<Segment> all) {
    for (int j = 0; j < size.eyes(); j++) {
      Point at = new Point(eyeMm(size, turns, j), 0);
      boolean own = at.equals(end);
      int until = own ? exitFrom : all.size();
      double least = own ? size.eyeClearanceMm() : size.padClearanceMm();
      for (int k = 0; k < until; k++) {
        if (!clear(all.get(k), new Line(at, at), least)) {
          return false;
        }
      }
    }
    return true;
  }

  private boolean clearOfNodes(List<Segment> all, int mirror) {
    for (int j = 0; j < size.nodes(); j++) {
      for (Point p : Layout.node(size, j).at()) {
        Point at = mirror > 0 ? p : p.mirrored();
        if (at.distanceTo(all.get(0).start()) < ROUNDING_MM) {
          continue;
        }
        for (int k = 0; k < all.size() && turnOf.get(k) == 1; k++) {
          if (!clear(all.get(k), new Line(at, at), size.padClearanceMm())) {
            return false;
          }
        }
      }
    }
    return true;
  }

  private static boolean clear(Segment s, Segment other, double least) {
    return Distance.between(s, other).distanceMm() >= least - ROUNDING_MM;
  }
}
