package etchloom.electric.inductance;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;

/**
 * Cuts centre lines into straight filaments.
 *
 * <p>An arc becomes a run of chords from its start to its end, whose corners in between stand a
 * little outside it, so that the run encloses the arc's own area about the centre. Current, way and
 * area are then those of the arc, and what is left of the error is an order smaller than with all
 * corners on the arc.
 *
 * @param chordErrorMm largest distance between an arc and a chord between two of its points
 * @param longestMm no filament is longer, so that clusters can be small
 */
record Flattening(double chordErrorMm, double longestMm) {
  /** The sharpest turn of one chord, rad. */
  private static final double WIDEST_RAD = Math.PI / 4;

  Flattening {
    if (!(chordErrorMm > 0 && longestMm > 0)) {
      throw new IllegalArgumentException(
          "no flattening: chord error " + chordErrorMm + " mm, longest " + longestMm + " mm");
    }
  }

  void add(Path path, int section, double ampere, Filaments out) {
    for (Segment s : path.segments()) {
      if (s instanceof Arc arc) {
        addArc(arc, section, ampere, out);
      } else if (s instanceof Line line) {
        addLine(line.start(), line.end(), section, ampere, out);
      }
    }
  }

  void addLine(Point from, Point to, int section, double ampere, Filaments out) {
    int n = (int) Math.max(1, Math.ceil(from.distanceTo(to) / longestMm));
    double dx = (to.x() - from.x()) / n;
    double dy = (to.y() - from.y()) / n;
    for (int i = 0; i < n; i++) {
      out.add(
          from.x() + i * dx,
          from.y() + i * dy,
          from.x() + (i + 1) * dx,
          from.y() + (i + 1) * dy,
          section,
          ampere);
    }
  }

  private void addArc(Arc arc, int section, double ampere, Filaments out) {
    double r = arc.radiusMm();
    double sweep = arc.sweepRad();
    if (sweep == 0) {
      return;
    }
    double widest = 2 * Math.acos(1 - Math.min(1, chordErrorMm / r));
    widest = Math.min(widest, Math.min(WIDEST_RAD, longestMm / r));
    int n = (int) Math.max(2, Math.ceil(Math.abs(sweep) / widest));
    double corner = cornerRadius(r, Math.abs(sweep) / n, n);
    double x = arc.start().x();
    double y = arc.start().y();
    double start = arc.startRad();
    for (int i = 1; i <= n; i++) {
      double a = start + sweep * i / n;
      double nextX = i == n ? arc.end().x() : arc.centre().x() + corner * Math.cos(a);
      double nextY = i == n ? arc.end().y() : arc.centre().y() + corner * Math.sin(a);
      out.add(x, y, nextX, nextY, section, ampere);
      x = nextX;
      y = nextY;
    }
  }

  /**
   * Where the corners between chords stand: two triangles at the ends with one corner each, all
   * others with two, together as large as the arc's sector.
   *
   * @param step angle of one chord
   */
  private static double cornerRadius(double r, double step, int n) {
    double area = n * step / Math.sin(step);
    return n == 2 ? r * area / 2 : r * (Math.sqrt(1 + (n - 2) * area) - 1) / (n - 2);
  }
}
