package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject.Stroke;
import java.util.ArrayList;
import java.util.List;

/** Gathers draws that follow each other, with one pen and one set of attributes, into a stroke. */
final class GerberPen {
  private final ObjectSink sink;
  private final Reading reading;
  private final List<Segment> chain = new ArrayList<>();
  private ApertureShape pen = new ApertureShape.Circle(0, 0);
  private Attributes attributes = Attributes.NONE;
  private boolean dark;
  private int line;

  GerberPen(ObjectSink sink, Reading reading) {
    this.sink = sink;
    this.reading = reading;
  }

  /** Ends the chain if the next draw would not belong to it. */
  void ready(ApertureShape nextPen, Attributes nextAttributes, boolean nextDark, int nextLine)
      throws UnreadableFile {
    if (!chain.isEmpty()) {
      if (nextPen.equals(pen) && nextAttributes.equals(attributes) && nextDark == dark) {
        return;
      }
      lift();
    }
    pen = nextPen;
    attributes = nextAttributes;
    dark = nextDark;
    line = nextLine;
  }

  /** A draw to the point where the pen is: a dot, unless the pen draws on from here. */
  void dot(Point at) {
    if (chain.isEmpty()) {
      chain.add(new Line(at, at));
    }
  }

  void draw(Segment segment) {
    if (chain.size() == 1 && chain.get(0).start().equals(chain.get(0).end())) {
      chain.clear();
    }
    chain.add(segment);
  }

  /** Ends the chain. */
  void lift() throws UnreadableFile {
    if (!chain.isEmpty()) {
      Stroke stroke = new Stroke(new Path(chain), pen, dark, attributes, line);
      sink.add(stroke, 1 + chain.size(), line);
      chain.clear();
    }
  }

  /** Refuses a pen that the format does not allow to draw with. */
  void check(ApertureShape shape, boolean arc, int at) throws UnreadableFile {
    if (shape instanceof ApertureShape.Circle c && c.holeDiameterMm() == 0) {
      return;
    }
    boolean solid = shape instanceof ApertureShape.Rectangle r && r.holeDiameterMm() == 0;
    if (!solid || arc) {
      throw reading.fail(
          at,
          "draw-aperture",
          "only a circle without hole may draw" + (solid ? " arcs" : "") + ", not " + kind(shape));
    }
    reading.warnOnce(at, "deprecated", "drawing with a rectangle is deprecated");
  }

  private static String kind(ApertureShape shape) {
    if (shape instanceof ApertureShape.Composite c) {
      return "macro " + c.macro();
    }
    String name = shape instanceof ApertureShape.RegularPolygon ? "polygon" : null;
    name = shape instanceof ApertureShape.Rectangle ? "rectangle" : name;
    name = shape instanceof ApertureShape.Obround ? "obround" : name;
    return name == null ? "a circle with a hole" : "a " + name;
  }
}
