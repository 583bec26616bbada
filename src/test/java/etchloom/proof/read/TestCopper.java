package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.ApertureShape.Circle;
import etchloom.proof.image.ApertureShape.Composite;
import etchloom.proof.image.ApertureShape.Obround;
import etchloom.proof.image.ApertureShape.Part;
import etchloom.proof.image.ApertureShape.Rectangle;
import etchloom.proof.image.ApertureShape.RegularPolygon;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Region;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.LayerImage;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.util.AffineTransformation;

/**
 * The image of a file as a JTS shape, for areas in tests: finely chorded arcs, one object after
 * another, slow and simple.
 */
final class TestCopper {
  private static final GeometryFactory FACTORY = new GeometryFactory();
  private static final int PER_TURN = 1440;

  private TestCopper() {}

  static Geometry of(LayerImage image) {
    return of(image.objects());
  }

  static Geometry of(List<DrawnObject> objects) {
    Geometry all = FACTORY.createPolygon();
    for (DrawnObject o : objects) {
      Geometry g = shape(o);
      all = o.dark() ? all.union(g) : all.difference(g);
    }
    return all;
  }

  static Geometry shape(DrawnObject o) {
    return o.match(TestCopper::stroke, TestCopper::flash, TestCopper::region);
  }

  private static Geometry stroke(Stroke s) {
    Geometry line = FACTORY.createLineString(coordinates(s.path()));
    if (s.pen() instanceof Circle c) {
      return line.buffer(c.diameterMm() / 2, PER_TURN / 4);
    }
    Geometry all = FACTORY.createPolygon();
    for (Segment g : s.path().segments()) {
      Geometry a = moved(shape(s.pen()), g.start());
      all = all.union(a.union(moved(shape(s.pen()), g.end())).convexHull());
    }
    return all;
  }

  private static Geometry flash(Flash f) {
    return moved(shape(f.shape()), f.at());
  }

  private static Geometry moved(Geometry g, Point by) {
    return AffineTransformation.translationInstance(by.x(), by.y()).transform(g);
  }

  private static Geometry region(Region r) {
    Geometry all = FACTORY.createPolygon();
    for (Path p : r.contours()) {
      all = all.union(filled(p));
    }
    return all;
  }

  /** Filled by even and odd, so that cut-ins come out as holes. */
  static Geometry filled(Path p) {
    return new org.locationtech.jts.geom.util.GeometryFixer(FACTORY.createPolygon(coordinates(p))) {
      {
        setKeepCollapsed(false);
      }
    }.getResult();
  }

  static Geometry shape(ApertureShape shape) {
    if (shape instanceof Circle c) {
      return disc(c.diameterMm()).difference(disc(c.holeDiameterMm()));
    }
    if (shape instanceof Rectangle r) {
      Geometry g = box(r.widthMm(), r.heightMm());
      return turned(g, r.rotationRad()).difference(disc(r.holeDiameterMm()));
    }
    if (shape instanceof Obround o) {
      double d = Math.min(o.widthMm(), o.heightMm());
      double x = (o.widthMm() - d) / 2;
      double y = (o.heightMm() - d) / 2;
      LineString axis =
          FACTORY.createLineString(new Coordinate[] {new Coordinate(-x, -y), new Coordinate(x, y)});
      return turned(axis.buffer(d / 2, PER_TURN / 4), o.rotationRad())
          .difference(disc(o.holeDiameterMm()));
    }
    if (shape instanceof RegularPolygon p) {
      Coordinate[] c = new Coordinate[p.vertices() + 1];
      for (int i = 0; i <= p.vertices(); i++) {
        double a = p.rotationRad() + 2 * Math.PI * (i % p.vertices()) / p.vertices();
        Point q = Point.polar(p.outerDiameterMm() / 2, a);
        c[i] = new Coordinate(q.x(), q.y());
      }
      return FACTORY.createPolygon(c).difference(disc(p.holeDiameterMm()));
    }
    Geometry all = FACTORY.createPolygon();
    for (Part part : ((Composite) shape).parts()) {
      Geometry g = FACTORY.createPolygon(coordinates(part.outline()));
      for (Path hole : part.holes()) {
        g = g.difference(FACTORY.createPolygon(coordinates(hole)));
      }
      all = part.exposed() ? all.union(g) : all.difference(g);
    }
    return all;
  }

  private static Geometry disc(double diameterMm) {
    Geometry at = FACTORY.createPoint(new Coordinate(0, 0));
    return diameterMm == 0 ? FACTORY.createPolygon() : at.buffer(diameterMm / 2, PER_TURN / 4);
  }

  private static Geometry box(double w, double h) {
    return FACTORY.createPolygon(
        new Coordinate[] {
          new Coordinate(-w / 2, -h / 2),
          new Coordinate(w / 2, -h / 2),
          new Coordinate(w / 2, h / 2),
          new Coordinate(-w / 2, h / 2),
          new Coordinate(-w / 2, -h / 2)
        });
  }

  private static Geometry turned(Geometry g, double rad) {
    return AffineTransformation.rotationInstance(rad).transform(g);
  }

  static Coordinate[] coordinates(Path path) {
    List<Coordinate> out = new ArrayList<>();
    out.add(new Coordinate(path.start().x(), path.start().y()));
    for (Segment s : path.segments()) {
      int n =
          s instanceof Arc a
              ? Math.max(1, (int) Math.ceil(Math.abs(a.sweepRad()) / (2 * Math.PI) * PER_TURN))
              : 1;
      for (int i = 1; i <= n; i++) {
        Point p = i == n ? s.end() : s.at((double) i / n);
        out.add(new Coordinate(p.x(), p.y()));
      }
    }
    return out.toArray(new Coordinate[0]);
  }
}
