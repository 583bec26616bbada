package etchloom.write.outline;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.operation.buffer.BufferOp;
import org.locationtech.jts.operation.buffer.BufferParameters;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/** Areas of outlines in closed form, and of the same copper by JTS. */
public final class Areas {
  private static final GeometryFactory FACTORY = new GeometryFactory();

  /** Greatest distance of a chord from its arc, mm. */
  private static final double SAGITTA_MM = 1e-4;

  private static final int QUARTER = 100;

  private Areas() {}

  /**
   * Signed: the polygon through the corners, and for each arc the sliver between it and its chord.
   */
  public static double signedMm2(Path path) {
    double a = 0;
    for (Segment s : path.segments()) {
      a += s.start().cross(s.end()) / 2;
      if (s instanceof Arc c) {
        double w = c.sweepRad();
        a += c.radiusMm() * c.radiusMm() / 2 * (w - Math.sin(w));
      }
    }
    return a;
  }

  public static Geometry jts(Artwork art, int layer) {
    BufferParameters round = new BufferParameters(QUARTER);
    // JTS thins out its input by a hundredth of the distance; along a bent track that adds 0.2 %.
    round.setSimplifyFactor(1e-5);
    List<Geometry> parts = new ArrayList<>();
    for (Conductor c : art.conductorsOn(layer)) {
      parts.add(BufferOp.bufferOp(line(c.path()), c.widthMm() / 2, round));
    }
    for (Joint j : art.padsOn(layer)) {
      parts.add(FACTORY.createPoint(coordinate(j.at())).buffer(j.padMm() / 2, 4 * QUARTER));
    }
    return UnaryUnionOp.union(parts);
  }

  private static Geometry line(Path path) {
    List<Coordinate> at = new ArrayList<>();
    at.add(coordinate(path.start()));
    for (Segment s : path.segments()) {
      int n = s.match(l -> 1, Areas::chords);
      for (int i = 1; i <= n; i++) {
        at.add(coordinate(s.at((double) i / n)));
      }
    }
    return FACTORY.createLineString(at.toArray(new Coordinate[0]));
  }

  private static int chords(Arc a) {
    double share = Math.min(1, SAGITTA_MM / a.radiusMm());
    return (int) Math.ceil(Math.abs(a.sweepRad()) / (2 * Math.acos(1 - share)));
  }

  private static Coordinate coordinate(Point p) {
    return new Coordinate(p.x(), p.y());
  }
}
