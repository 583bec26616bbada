package etchloom.board;

import etchloom.artwork.MountingHole;
import etchloom.artwork.Opening;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.spec.Spec;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Where the legend may go: clear of openings, holes, the edge, and what is already there. */
final class LegendRoom {
  /** Points along a stroke stand no further apart than this share of the gap. */
  private static final double STEP_MM = 0.1;

  private final double boardRadiusMm;
  private final double boreRadiusMm;
  private final Optional<Spec.Tab> tab;
  private final double gapMm;
  private final double lineMm;
  private final List<double[]> circles = new ArrayList<>();
  private final List<Point> taken = new ArrayList<>();

  LegendRoom(
      double boardRadiusMm,
      double boreRadiusMm,
      Optional<Spec.Tab> tab,
      List<MountingHole> holes,
      List<Opening> openings,
      double gapMm,
      double lineMm) {
    this.boardRadiusMm = boardRadiusMm;
    this.boreRadiusMm = boreRadiusMm;
    this.tab = tab;
    this.gapMm = gapMm;
    this.lineMm = lineMm;
    for (MountingHole h : holes) {
      circles.add(new double[] {h.at().x(), h.at().y(), h.keepOutMm() / 2});
    }
    for (Opening o : openings) {
      circles.add(new double[] {o.at().x(), o.at().y(), o.diameterMm() / 2});
    }
  }

  double gapMm() {
    return gapMm;
  }

  /** Largest radius for a stroke's centre line. */
  double outerMm() {
    return boardRadiusMm - gapMm - lineMm / 2;
  }

  /** Smallest radius for a stroke's centre line. */
  double innerMm() {
    return boreRadiusMm + gapMm + lineMm / 2;
  }

  boolean free(List<Path> paths) {
    return points(paths).stream().allMatch(this::free);
  }

  void take(List<Path> paths) {
    taken.addAll(points(paths));
  }

  private boolean free(Point p) {
    double r = p.norm();
    if (r > outerMm() && !onTab(p) || r < innerMm()) {
      return false;
    }
    // The points stand apart, so what lies between them is covered by half a step more.
    double keep = gapMm + lineMm / 2 + STEP_MM / 2;
    for (double[] c : circles) {
      if (Math.hypot(p.x() - c[0], p.y() - c[1]) < c[2] + keep) {
        return false;
      }
    }
    for (Point t : taken) {
      if (p.distanceTo(t) < keep + lineMm / 2) {
        return false;
      }
    }
    return true;
  }

  private boolean onTab(Point p) {
    if (tab.isEmpty()) {
      return false;
    }
    Point q = p.rotated(-tab.get().angleRad());
    double in = gapMm + lineMm / 2;
    return q.x() > 0
        && q.x() <= boardRadiusMm + tab.get().lengthMm() - in
        && Math.abs(q.y()) <= tab.get().widthMm() / 2 - in;
  }

  private static List<Point> points(List<Path> paths) {
    List<Point> out = new ArrayList<>();
    for (Path p : paths) {
      for (Segment s : p.segments()) {
        int n = (int) Math.ceil(s.lengthMm() / STEP_MM) + 1;
        for (int i = 0; i <= n; i++) {
          out.add(s.at(i / (double) n));
        }
      }
    }
    return out;
  }
}
