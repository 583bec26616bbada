package etchloom.report.area;

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

/**
 * The copper of a layer merged as polygons, whatever lies over what. Seconds for a large board.
 *
 * <p>Discs are polygons of the same area; a track's outer and inner chords balance: good to 1e-4.
 */
final class MergedCopper {
  private static final GeometryFactory GEOMETRY = new GeometryFactory();
  private static final double CHORD_ERROR_MM = 5e-4;
  private static final int QUADRANT = 16;

  /** Makes a disc's polygon as large as the disc. */
  private static final double EQUAL_AREA =
      Math.sqrt(Math.PI / (2 * QUADRANT) / Math.sin(Math.PI / (2 * QUADRANT)));

  private MergedCopper() {}

  static double areaMm2(Artwork artwork, int layer) {
    List<Geometry> all = new ArrayList<>();
    for (Conductor c : artwork.conductorsOn(layer)) {
      for (Conductor.Stretch s : c.stretches()) {
        all.add(track(s.path(), s.widthMm(), CHORD_ERROR_MM, QUADRANT));
      }
    }
    for (Joint j : artwork.padsOn(layer)) {
      all.add(disc(j.at(), EQUAL_AREA * j.padMm() / 2, QUADRANT));
    }
    return UnaryUnionOp.union(all, GEOMETRY).getArea();
  }

  /**
   * A disc as a polygon with its corners on the circle.
   *
   * @param quadrant sides to a quarter turn
   */
  static Geometry disc(Point at, double radiusMm, int quadrant) {
    return point(at).buffer(radiusMm, quadrant);
  }

  static Geometry point(Point at) {
    return GEOMETRY.createPoint(coordinate(at));
  }

  /** A track with round ends; its centre line's chords have their corners on the arcs. */
  static Geometry track(Path path, double width, double chordErrorMm, int quadrant) {
    List<Coordinate> points = new ArrayList<>();
    for (Segment s : path.segments()) {
      int n = s.match(line -> 1, a -> chords(a, chordErrorMm));
      for (int i = points.isEmpty() ? 0 : 1; i <= n; i++) {
        points.add(coordinate(s.at(i / (double) n)));
      }
    }
    BufferParameters how = new BufferParameters(quadrant);
    how.setSimplifyFactor(1e-4); // the default leaves out corners of up to 1 % of the width
    return BufferOp.bufferOp(
        GEOMETRY.createLineString(points.toArray(new Coordinate[0])), width / 2, how);
  }

  private static int chords(Arc a, double errorMm) {
    double ratio = Math.min(1, errorMm / a.radiusMm());
    return (int) Math.ceil(a.lengthMm() / a.radiusMm() / (2 * Math.acos(1 - ratio)));
  }

  private static Coordinate coordinate(Point p) {
    return new Coordinate(p.x(), p.y());
  }
}
