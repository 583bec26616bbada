package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Region;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The graphics state, and what the operations make of it. Sections 2.3 and 4.7 to 4.11. */
final class GerberPlotter {
  /** Plot modes. */
  enum Mode {
    NONE,
    LINE,
    CLOCKWISE,
    COUNTER_CLOCKWISE
  }

  private final Reading reading;
  private final GerberFormat format;
  private final AttributeStore attributes;
  private final ObjectSink sink;
  private final GerberPen pen;
  private final GerberContours contours;
  private final GerberArcs arcs;
  private final Map<Integer, Aperture> apertures = new HashMap<>();

  private Mode mode = Mode.NONE;
  private Aperture aperture;
  private boolean dark = true;
  private Placement placement = Placement.NONE;
  private boolean region;
  private int regionLine;

  private boolean placed;
  private long x;
  private long y;
  private Point at = Point.ORIGIN;

  GerberPlotter(Reading reading, GerberFormat format, AttributeStore attributes) {
    this.reading = reading;
    this.format = format;
    this.attributes = attributes;
    this.sink = new ObjectSink(reading);
    this.pen = new GerberPen(sink, reading);
    this.contours = new GerberContours(reading);
    this.arcs = new GerberArcs(reading, format);
  }

  GerberArcs arcs() {
    return arcs;
  }

  ObjectSink sink() {
    return sink;
  }

  boolean inRegion() {
    return region;
  }

  void mode(Mode next) {
    mode = next;
  }

  void polarity(boolean nextDark, int line) throws UnreadableFile {
    outsideRegion("polarity", line);
    dark = nextDark;
  }

  Placement placement() {
    return placement;
  }

  void placement(Placement next) {
    placement = next;
  }

  void define(Aperture a, int line) throws UnreadableFile {
    if (apertures.putIfAbsent(a.number(), a) != null) {
      throw reading.fail(line, "aperture-twice", "aperture D" + a.number() + " is defined twice");
    }
  }

  void select(int number, int line) throws UnreadableFile {
    if (region) {
      reading.warnOnce(line, "in-region", "an aperture is selected within a region");
    }
    Aperture next = apertures.get(number);
    if (next == null) {
      throw reading.fail(line, "undefined-aperture", "aperture D" + number + " is not defined");
    }
    aperture = next;
  }

  /** Ends what is being drawn, before anything that must come after it in the image. */
  void settle() throws UnreadableFile {
    pen.lift();
  }

  void outsideRegion(String what, int line) throws UnreadableFile {
    if (region) {
      throw reading.fail(line, "in-region", what + " is not allowed within a region");
    }
  }

  void openRegion(int line) throws UnreadableFile {
    outsideRegion("G36", line);
    settle();
    region = true;
    regionLine = line;
  }

  void closeRegion(int line) throws UnreadableFile {
    if (!region) {
      throw reading.fail(line, "region", "G37 ends a region, but none is open");
    }
    contours.close();
    region = false;
    int pieces = contours.pieces() + 1;
    List<Path> made = contours.taken();
    if (made.isEmpty()) {
      reading.warn(regionLine, "empty-region", "the region has no contour");
      return;
    }
    Attributes now = attributes.regionNow(line);
    sink.add(new Region(made, dark, now, regionLine), pieces, regionLine);
  }

  /** D02. */
  void move(long toX, long toY) throws UnreadableFile {
    if (region) {
      contours.close();
    } else {
      pen.lift();
    }
    goTo(toX, toY);
  }

  /** D01. */
  void draw(long toX, long toY, long i, long j, int line) throws UnreadableFile {
    start(line);
    Point to = toX == x && toY == y ? at : format.point(toX, toY);
    boolean straight = mode == Mode.LINE;
    if (!region) {
      readyPen(straight, line);
    }
    if (straight) {
      segment(new Line(at, to), line);
    } else {
      boolean ccw = mode == Mode.COUNTER_CLOCKWISE;
      for (Segment s : arcs.segments(x, y, toX, toY, i, j, ccw, line)) {
        segment(s, line);
      }
    }
    x = toX;
    y = toY;
    at = to;
  }

  private void start(int line) throws UnreadableFile {
    if (mode == Mode.NONE) {
      reading.warn(line, "no-plot-mode", "a draw before G01, G02 or G03; taken as G01");
      mode = Mode.LINE;
    }
    if (!placed) {
      reading.warn(line, "no-current-point", "a draw before any point is set; starts at (0, 0)");
      placed = true;
    }
  }

  private void readyPen(boolean straight, int line) throws UnreadableFile {
    Aperture a = needAperture("draw", line);
    if (a.isBlock()) {
      throw reading.fail(
          line, "draw-aperture", "only a circle may draw, not the block D" + a.number());
    }
    ApertureShape shape = a.shape(placement, reading, line);
    pen.check(shape, !straight, line);
    pen.ready(shape, a.attributes(attributes, line), dark, line);
  }

  private Aperture needAperture(String what, int line) throws UnreadableFile {
    if (aperture == null) {
      throw reading.fail(line, "no-aperture", "a " + what + " before an aperture is selected");
    }
    return aperture;
  }

  private void segment(Segment s, int line) {
    boolean none = s.start().equals(s.end());
    if (region) {
      if (none) {
        reading.warnOnce(line, "zero-length", "a contour has a piece of no length");
      } else {
        contours.draw(s, line);
      }
    } else if (none) {
      pen.dot(s.start());
    } else {
      pen.draw(s);
    }
  }

  /** D03. */
  void flash(long toX, long toY, int line) throws UnreadableFile {
    outsideRegion("a flash", line);
    pen.lift();
    goTo(toX, toY);
    Aperture a = needAperture("flash", line);
    Attributes now = a.attributes(attributes, line);
    if (a.isBlock()) {
      sink.addBlock(a, placement.movedTo(at), dark, now, line);
      return;
    }
    ApertureShape shape = a.shape(placement, reading, line);
    sink.add(new Flash(at, shape, a.number(), dark, now, line), 1, line);
  }

  private void goTo(long toX, long toY) {
    x = toX;
    y = toY;
    at = format.point(x, y);
    placed = true;
  }

  long x() {
    return x;
  }

  long y() {
    return y;
  }

  /** End of the file: nothing may be open. */
  void finish(int line) throws UnreadableFile {
    if (region) {
      throw reading.fail(line, "region", "the region opened on line " + regionLine + " never ends");
    }
    settle();
    if (sink.repeating()) {
      reading.warn(line, "repeat", "a step and repeat is not closed before the end");
      sink.closeRepeat(line);
    }
  }
}
