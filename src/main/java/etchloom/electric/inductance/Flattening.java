package etchloom.electric.inductance;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;

/**
 * Cuts centre lines into straight filaments.
 *
 * <p>A chord is as long as one between two of the arc's points, so that it is the arc's own current
 * vector, but stands further out, so that it encloses the arc's own area about the centre: what a
 * coil sees from afar is then exact, and what is left is an order smaller than with chords between
 * points. A chord's ends stand up to the chord error apart from its neighbours'.
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
    int n = (int) Math.max(1, Math.ceil(Math.abs(sweep) / widest));
    double half = sweep / n / 2;
    // The chord stands for the arc's own current vector and for its moment about the centre.
    double halfChord = r * Math.sin(half);
    double middle = r * half / Math.sin(half);
    double start = arc.startRad();
    Point c = arc.centre();
    for (int i = 0; i < n; i++) {
      double a = start + (2 * i + 1) * half;
      double x = c.x() + Math.cos(a) * middle;
      double y = c.y() + Math.sin(a) * middle;
      double dx = -Math.sin(a) * halfChord;
      double dy = Math.cos(a) * halfChord;
      out.add(x - dx, y - dy, x + dx, y + dy, section, ampere);
    }
  }
}
