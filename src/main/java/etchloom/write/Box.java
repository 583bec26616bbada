package etchloom.write;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;

/** A bounding box, mm. */
record Box(double minX, double minY, double maxX, double maxY) {
  private static final Box NOTHING =
      new Box(
          Double.POSITIVE_INFINITY,
          Double.POSITIVE_INFINITY,
          Double.NEGATIVE_INFINITY,
          Double.NEGATIVE_INFINITY);

  /** Of a path's centre line; arcs by their outermost points, not only their ends. */
  static Box of(Path path) {
    Box b = NOTHING;
    for (Segment s : path.segments()) {
      b = b.with(s.start()).with(s.end());
      b = b.with(s.match(l -> NOTHING, Box::quarters));
    }
    return b;
  }

  double width() {
    return maxX - minX;
  }

  double height() {
    return maxY - minY;
  }

  private static Box quarters(Arc a) {
    Box b = NOTHING;
    double r = a.radiusMm();
    double sweep = a.sweepRad();
    double from = sweep > 0 ? a.startRad() : a.startRad() + sweep;
    int first = (int) Math.ceil(from / (Math.PI / 2));
    for (int q = first; q * Math.PI / 2 <= from + Math.abs(sweep); q++) {
      int side = Math.floorMod(q, 4);
      double dx = side == 0 ? r : side == 2 ? -r : 0;
      double dy = side == 1 ? r : side == 3 ? -r : 0;
      b = b.with(a.centre().plus(new Point(dx, dy)));
    }
    return b;
  }

  private Box with(Point p) {
    return with(new Box(p.x(), p.y(), p.x(), p.y()));
  }

  private Box with(Box o) {
    return new Box(
        Math.min(minX, o.minX),
        Math.min(minY, o.minY),
        Math.max(maxX, o.maxX),
        Math.max(maxY, o.maxY));
  }
}
