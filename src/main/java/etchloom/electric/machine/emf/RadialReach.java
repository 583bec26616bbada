package etchloom.electric.machine.emf;

import etchloom.artwork.Artwork;
import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;

/** Bounds of the copper's distance from the shaft, mm: never short, and tight but for fillets. */
public record RadialReach(double innerMm, double outerMm) {
  private static final double CENTRED_MM = 1e-9;

  /** All tracks and pads of a board. */
  public static RadialReach of(Artwork artwork) {
    RadialReach tracks = of(artwork.conductors().stream().map(c -> c.path()).toList());
    double outer =
        artwork.joints().stream().mapToDouble(j -> j.at().norm()).max().orElse(tracks.outerMm);
    return new RadialReach(tracks.innerMm, Math.max(outer, tracks.outerMm));
  }

  /** The centre lines of some paths. */
  public static RadialReach of(List<Path> paths) {
    double inner = Double.POSITIVE_INFINITY;
    double outer = 0;
    for (Path p : paths) {
      for (Segment s : p.segments()) {
        RadialReach r = s.match(RadialReach::line, RadialReach::arc);
        inner = Math.min(inner, r.innerMm);
        outer = Math.max(outer, r.outerMm);
      }
    }
    return new RadialReach(inner, outer);
  }

  private static RadialReach line(Line l) {
    Point along = l.end().minus(l.start());
    double t = -l.start().dot(along) / along.dot(along);
    double inner = l.at(Math.max(0, Math.min(1, t))).norm();
    return new RadialReach(inner, Math.max(l.start().norm(), l.end().norm()));
  }

  private static RadialReach arc(Arc a) {
    double start = a.start().norm();
    if (a.centre().norm() < CENTRED_MM) {
      return new RadialReach(start, start);
    }
    double end = a.end().norm();
    // No point is farther than half the length from the nearer end.
    double half = a.lengthMm() / 2;
    return new RadialReach(Math.max(0, Math.min(start, end) - half), Math.max(start, end) + half);
  }
}
