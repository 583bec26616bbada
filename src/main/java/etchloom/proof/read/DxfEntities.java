package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.DxfFile.Circle;
import etchloom.proof.image.DxfFile.Entity;
import etchloom.proof.image.DxfFile.Polyline;
import etchloom.proof.image.DxfFile.Text;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Entities out of their drafts, scaled to mm. */
final class DxfEntities {
  /** Kinds of entity that are named when they are left out. */
  private static final int MAX_KINDS = 50;

  private final Reading reading;
  private final List<Entity> entities = new ArrayList<>();
  private final Map<String, String> layers = new HashMap<>();
  private final Map<String, Integer> leftOut = new TreeMap<>();
  private double unitMm = 1;
  private DxfDraft open;

  DxfEntities(Reading reading) {
    this.reading = reading;
  }

  void unit(double mm) {
    unitMm = mm;
  }

  List<Entity> entities() {
    return entities;
  }

  /** The layers that entities stand on. */
  Iterable<String> layersUsed() {
    return layers.keySet().stream().sorted().toList();
  }

  /** Takes over a finished entity. */
  void add(DxfDraft d) throws UnreadableFile {
    if (open != null) {
      if (d.type.equals("VERTEX")) {
        reading.charge(1, d.line);
        open.vertices.add(d.asVertex());
        return;
      }
      if (!d.type.equals("SEQEND")) {
        throw reading.fail(d.line, "polyline", "a polyline goes on in " + shown(d.type));
      }
      DxfDraft done = open;
      open = null;
      polyline(done, done.size, done.size2);
      return;
    }
    if (d.paper) {
      count(d.type + " on paper");
      return;
    }
    make(d);
  }

  private void make(DxfDraft d) throws UnreadableFile {
    switch (d.type) {
      case "LWPOLYLINE" -> {
        flat(d);
        if (d.count >= 0 && d.count != d.vertices.size()) {
          throw reading.fail(
              d.line,
              "polyline",
              "the polyline says " + d.count + " corners and has " + d.vertices.size());
        }
        polyline(d, d.constantWidth, d.constantWidth);
      }
      case "POLYLINE" -> {
        flat(d);
        if ((d.flags & ~129) != 0) {
          throw reading.fail(d.line, "polyline", "only plain polylines of the plane are read");
        }
        open = d;
      }
      case "LINE" -> {
        flat(d);
        Point a = d.at(unitMm);
        Point b = new Point(d.endX * unitMm, d.endY * unitMm);
        if (!a.equals(b)) {
          put(new Polyline(layer(d), Path.of(new Line(a, b)), 0, false, d.line), 2);
        }
      }
      case "ARC" -> arc(d);
      case "CIRCLE" -> {
        flat(d);
        put(new Circle(layer(d), inRange(d.at(unitMm), d), radius(d), d.line), 1);
      }
      case "TEXT" -> {
        flat(d);
        double height = Double.isNaN(d.size) ? 0 : d.size * unitMm;
        double turn = Math.toRadians(d.angle % 360);
        put(new Text(layer(d), inRange(d.at(unitMm), d), height, turn, d.text, d.line), 2);
      }
      default -> count(d.type);
    }
  }

  private void count(String kind) {
    if (leftOut.size() < MAX_KINDS || leftOut.containsKey(kind)) {
      leftOut.merge(kind, 1, Integer::sum);
    }
  }

  private void put(Entity e, int pieces) throws UnreadableFile {
    reading.charge(pieces, e.line());
    entities.add(e);
  }

  private String layer(DxfDraft d) {
    return layers.computeIfAbsent(d.layer.isEmpty() ? "0" : d.layer, n -> n);
  }

  private void flat(DxfDraft d) throws UnreadableFile {
    if (d.tilted) {
      throw reading.fail(
          d.line, "tilted", shown(d.type) + " stands in a tilted or mirrored plane (210 to 230)");
    }
  }

  private Point inRange(Point p, DxfDraft d) throws UnreadableFile {
    if (!(Math.max(Math.abs(p.x()), Math.abs(p.y())) <= Reading.MAX_MM)) {
      throw reading.fail(d.line, "coordinate-range", shown(d.type) + " is drawn beyond 1 km");
    }
    return p;
  }

  private double radius(DxfDraft d) throws UnreadableFile {
    double r = d.size * unitMm;
    if (!(r >= 1e-9 && r <= Reading.MAX_MM)) {
      throw reading.fail(d.line, "radius", shown(d.type) + " has no positive radius");
    }
    return r;
  }

  private void arc(DxfDraft d) throws UnreadableFile {
    flat(d);
    Point c = inRange(d.at(unitMm), d);
    double r = radius(d);
    double sweep = (d.endAngle - d.angle) % 360;
    sweep = sweep <= 0 ? sweep + 360 : sweep;
    Point start = c.plus(Point.polar(r, Math.toRadians(d.angle % 360)));
    Point end = c.plus(Point.polar(r, Math.toRadians(d.endAngle % 360)));
    boolean full = sweep > 360 - 1e-9 || start.equals(end);
    Path path =
        full ? new Path(Arcs.fullTurn(start, c, true)) : Path.of(Arcs.between(start, end, c, true));
    put(new Polyline(layer(d), path, 0, full, d.line), 3);
  }

  private void polyline(DxfDraft d, double start, double end) throws UnreadableFile {
    boolean closed = (d.flags & 1) != 0;
    int n = d.vertices.size();
    List<Segment> pieces = new ArrayList<>();
    double width = Double.NaN;
    for (int i = 0; i + 1 < n || (closed && i < n); i++) {
      DxfDraft.Vertex v = d.vertices.get(i);
      Point a = corner(v, d);
      Point b = corner(d.vertices.get((i + 1) % n), d);
      if (!a.equals(b)) {
        pieces.add(Arcs.ofBulge(a, b, v.bulge));
        double w = width(either(v.startWidth, start), either(v.endWidth, end), d);
        width = i > 0 && !Double.isNaN(width) ? width(width, w, d) : w;
      }
    }
    if (pieces.isEmpty()) {
      reading.warn(d.line, "zero-length", "a polyline of no length is left out");
      return;
    }
    Path path = new Path(pieces);
    put(new Polyline(layer(d), path, width * unitMm, path.closed(), d.line), 1 + pieces.size());
  }

  private Point corner(DxfDraft.Vertex v, DxfDraft d) throws UnreadableFile {
    return inRange(new Point(v.x * unitMm, v.y * unitMm), d);
  }

  private static double either(double own, double otherwise) {
    double w = Double.isNaN(own) ? otherwise : own;
    return Double.isNaN(w) ? 0 : w;
  }

  private double width(double a, double b, DxfDraft d) throws UnreadableFile {
    if (a != b || !(a >= 0 && a * unitMm <= Reading.MAX_MM)) {
      throw reading.fail(
          d.line, "width", "a polyline's width must be one and the same all along, and positive");
    }
    return a;
  }

  private static String shown(String type) {
    return GerberLexer.printable(type);
  }

  void finish(int line) throws UnreadableFile {
    if (open != null) {
      throw reading.fail(open.line, "polyline", "the polyline never ends (SEQEND)");
    }
    leftOut.forEach(
        (kind, n) ->
            reading.warn(
                line, "not-drawn", n + " entities of kind " + shown(kind) + " are not read"));
  }
}
