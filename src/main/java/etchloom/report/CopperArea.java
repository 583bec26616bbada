package etchloom.report;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.rules.RuleReport;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.operation.buffer.BufferParameters;
import org.locationtech.jts.operation.union.UnaryUnionOp;

/**
 * Area of the copper of each layer, what lies over each other counted once.
 *
 * <p>Away from joints a track covers width times length exactly (lines and arcs, tangent to each
 * other; a corner of another angle is taken into account). Only what lies near joints, where tracks
 * and pads cover each other, is merged as polygons. That holds where copper keeps apart elsewhere;
 * a layer where the check found copper touching is merged whole, which is slow. Discs are polygons
 * of the same area and arcs there are chords: good to 1e-4 of the area.
 */
final class CopperArea {
  private static final GeometryFactory GEOMETRY = new GeometryFactory();

  /** Chords of centre lines; errors of a track's two sides cancel. */
  private static final double CHORD_ERROR_MM = 5e-4;

  private static final int QUADRANT = 16;

  /** Makes a disc's polygon as large as the disc. */
  private static final double EQUAL_AREA =
      Math.sqrt(Math.PI / (2 * QUADRANT) / Math.sin(Math.PI / (2 * QUADRANT)));

  /** How much of a track, in its own widths, counts as near a joint beyond the pad. */
  private static final double NEAR_WIDTHS = 3;

  private final List<Geometry> merged = new ArrayList<>();
  private double plainMm2;

  private CopperArea() {}

  /** One entry a layer, L1 first, mm². */
  static List<Double> of(Artwork artwork, RuleReport rules) {
    List<Double> out = new ArrayList<>();
    for (int layer = 1; layer <= artwork.layers(); layer++) {
      String name = "L" + layer;
      boolean touching =
          rules.findings().stream()
              .anyMatch(
                  f -> f.rule().equals("space") && f.layer().equals(name) && f.measured() <= 0);
      out.add(area(artwork, layer, touching));
    }
    return out;
  }

  static double area(Artwork artwork, int layer, boolean whole) {
    CopperArea a = new CopperArea();
    for (Conductor c : artwork.conductorsOn(layer)) {
      if (whole) {
        a.merge(c.path(), c.widthMm());
      } else {
        a.add(c, artwork.joints().get(c.fromJoint()), artwork.joints().get(c.toJoint()));
      }
    }
    for (Joint j : artwork.padsOn(layer)) {
      a.disc(j.at(), j.padMm() / 2);
    }
    return a.plainMm2 + UnaryUnionOp.union(a.merged, GEOMETRY).getArea();
  }

  private void add(Conductor c, Joint from, Joint to) {
    double w = c.widthMm();
    double head = from.padMm() / 2 + NEAR_WIDTHS * w;
    double tail = to.padMm() / 2 + NEAR_WIDTHS * w;
    double length = c.path().lengthMm();
    if (head + tail >= length) {
      merge(c.path(), w);
      return;
    }
    List<Segment> first = new ArrayList<>();
    List<Segment> middle = new ArrayList<>();
    List<Segment> last = new ArrayList<>();
    double at = 0;
    for (Segment s : c.path().segments()) {
      double end = at + s.lengthMm();
      piece(first, s, at, end, 0, head);
      piece(middle, s, at, end, head, length - tail);
      piece(last, s, at, end, length - tail, length);
      at = end;
    }
    mergeFlat(first, w);
    disc(c.path().start(), w / 2);
    mergeFlat(last, w);
    disc(c.path().end(), w / 2);
    plain(middle, w);
  }

  /** The part of a segment that lies between two lengths along the path. */
  private static void piece(
      List<Segment> out, Segment s, double at, double end, double low, double high) {
    double from = Math.max(at, low);
    double to = Math.min(end, high);
    if (to - from > 1e-9) {
      out.add(s.part((from - at) / (end - at), (to - at) / (end - at)));
    }
  }

  /** Width times length; a corner by θ gains a sector outside and loses a kite inside. */
  private void plain(List<Segment> pieces, double width) {
    double square = width * width / 4;
    for (int i = 0; i < pieces.size(); i++) {
      plainMm2 += width * pieces.get(i).lengthMm();
      if (i > 0) {
        Point a = pieces.get(i - 1).tangent(1);
        Point b = pieces.get(i).tangent(0);
        double turn = Math.abs(Math.atan2(a.cross(b), a.dot(b)));
        plainMm2 += square * (turn / 2 - Math.tan(turn / 2));
      }
    }
  }

  private void merge(Path path, double width) {
    mergeFlat(path.segments(), width);
    disc(path.start(), width / 2);
    disc(path.end(), width / 2);
  }

  private void mergeFlat(List<Segment> pieces, double width) {
    List<Coordinate> points = new ArrayList<>();
    for (Segment s : pieces) {
      int n = s.match(line -> 1, CopperArea::chords);
      for (int i = points.isEmpty() ? 0 : 1; i <= n; i++) {
        points.add(coordinate(s.at(i / (double) n)));
      }
    }
    Geometry line = GEOMETRY.createLineString(points.toArray(new Coordinate[0]));
    merged.add(line.buffer(width / 2, QUADRANT, BufferParameters.CAP_FLAT));
  }

  private static int chords(Arc a) {
    double ratio = Math.min(1, CHORD_ERROR_MM / a.radiusMm());
    double step = 2 * Math.acos(1 - ratio);
    return (int) Math.ceil(a.lengthMm() / a.radiusMm() / step);
  }

  private void disc(Point at, double radiusMm) {
    merged.add(GEOMETRY.createPoint(coordinate(at)).buffer(EQUAL_AREA * radiusMm, QUADRANT));
  }

  private static Coordinate coordinate(Point p) {
    return new Coordinate(p.x(), p.y());
  }
}
