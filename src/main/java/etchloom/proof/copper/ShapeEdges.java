package etchloom.proof.copper;

import etchloom.geometry.Path;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.ApertureShape.Circle;
import etchloom.proof.image.ApertureShape.Composite;
import etchloom.proof.image.ApertureShape.Obround;
import etchloom.proof.image.ApertureShape.Part;
import etchloom.proof.image.ApertureShape.Rectangle;
import etchloom.proof.image.ApertureShape.RegularPolygon;
import etchloom.proof.plane.EdgeSet;
import etchloom.proof.plane.Figure;
import etchloom.proof.plane.Overlay;
import java.util.LinkedHashMap;
import java.util.Map;

/** The outlines of apertures about their origin, each worked out once. */
final class ShapeEdges {
  private final double chordErrorMm;
  private final Map<ApertureShape, EdgeSet> known = new LinkedHashMap<>();

  ShapeEdges(double chordErrorMm) {
    this.chordErrorMm = chordErrorMm;
  }

  /** Rings of weight 1 about the shape, of -1 about its holes. */
  EdgeSet of(ApertureShape shape) {
    return known.computeIfAbsent(shape, this::build);
  }

  private EdgeSet build(ApertureShape shape) {
    RingPen pen = new RingPen(new EdgeSet(), chordErrorMm);
    if (shape instanceof Circle c) {
      disc(pen, c.diameterMm(), 1);
      disc(pen, c.holeDiameterMm(), -1);
    } else if (shape instanceof Rectangle r) {
      rectangle(pen, r);
      disc(pen, r.holeDiameterMm(), -1);
    } else if (shape instanceof Obround o) {
      obround(pen, o);
      disc(pen, o.holeDiameterMm(), -1);
    } else if (shape instanceof RegularPolygon p) {
      polygon(pen, p);
      disc(pen, p.holeDiameterMm(), -1);
    } else if (shape instanceof Composite c) {
      return composite(c);
    }
    return pen.edges();
  }

  private static void disc(RingPen pen, double diameterMm, int weight) {
    if (diameterMm > 0) {
      pen.circle(0, 0, diameterMm / 2 * RingPen.NM, weight);
    }
  }

  private static void rectangle(RingPen pen, Rectangle r) {
    if (!(r.widthMm() > 0 && r.heightMm() > 0)) {
      return;
    }
    double[] x = {-1, 1, 1, -1};
    double[] y = {-1, -1, 1, 1};
    double c = Math.cos(r.rotationRad());
    double s = Math.sin(r.rotationRad());
    for (int i = 0; i < 4; i++) {
      double px = x[i] * r.widthMm() / 2 * RingPen.NM;
      double py = y[i] * r.heightMm() / 2 * RingPen.NM;
      corner(pen, i == 0, px * c - py * s, px * s + py * c);
    }
    pen.edges().close(EdgeSet.STRAIGHT);
  }

  private static void corner(RingPen pen, boolean first, double x, double y) {
    if (first) {
      pen.edges().begin(x, y, 1);
    } else {
      pen.edges().to(x, y, EdgeSet.STRAIGHT);
    }
  }

  private static void obround(RingPen pen, Obround o) {
    double d = Math.min(o.widthMm(), o.heightMm());
    double half = (Math.max(o.widthMm(), o.heightMm()) - d) / 2;
    double turn = o.rotationRad() + (o.widthMm() >= o.heightMm() ? 0 : Math.PI / 2);
    etchloom.geometry.Point end = etchloom.geometry.Point.polar(half, turn);
    Path path = Path.of(new etchloom.geometry.Line(end.times(-1), end));
    PenTour.draw(pen, path, d * RingPen.NM, 1);
  }

  private static void polygon(RingPen pen, RegularPolygon p) {
    double r = p.outerDiameterMm() / 2 * RingPen.NM;
    for (int i = 0; i < p.vertices(); i++) {
      double t = p.rotationRad() + 2 * Math.PI * i / p.vertices();
      corner(pen, i == 0, r * Math.cos(t), r * Math.sin(t));
    }
    pen.edges().close(EdgeSet.STRAIGHT);
  }

  private EdgeSet composite(Composite c) {
    Figure f = Overlay.union(new EdgeSet());
    for (Part p : c.parts()) {
      EdgeSet part = part(p);
      f = p.exposed() ? Overlay.add(f, part) : Overlay.subtract(f, part);
    }
    EdgeSet out = new EdgeSet();
    f.copyTo(out, 1);
    return out;
  }

  private EdgeSet part(Part p) {
    RingPen pen = new RingPen(new EdgeSet(), chordErrorMm);
    pen.ring(p.outline(), RingPen.areaSign(p.outline()) < 0 ? -1 : 1);
    for (Path hole : p.holes()) {
      pen.ring(hole, RingPen.areaSign(hole) < 0 ? 1 : -1);
    }
    return pen.edges();
  }
}
