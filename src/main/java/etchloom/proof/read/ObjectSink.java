package etchloom.proof.read;

import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Region;
import etchloom.proof.image.DrawnObject.Stroke;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/** Where finished objects go: the layer, or the block or repeated group that is open. */
final class ObjectSink {
  private static final int MAX_DEPTH = 20;

  private static final class Frame {
    final List<DrawnObject> objects = new ArrayList<>();
    final int line;
    final int blockNumber;
    int pieces;

    Frame(int line, int blockNumber) {
      this.line = line;
      this.blockNumber = blockNumber;
    }
  }

  private final Reading reading;
  private final Deque<Frame> frames = new ArrayDeque<>();
  private int repeatX;
  private int repeatY;
  private Point repeatStep = Point.ORIGIN;

  ObjectSink(Reading reading) {
    this.reading = reading;
    frames.push(new Frame(0, 0));
  }

  void add(DrawnObject object, int pieces, int line) throws UnreadableFile {
    reading.charge(pieces, line);
    frames.peek().objects.add(object);
    frames.peek().pieces += pieces;
  }

  /** Adds every object of a block, placed; a clear flash turns dark to clear and back. */
  void addBlock(Aperture block, Placement placement, boolean dark, Attributes flashed, int line)
      throws UnreadableFile {
    reading.charge(block.blockPieces(), line);
    Frame frame = frames.peek();
    for (DrawnObject o : block.block()) {
      if (o instanceof Flash f && !placement.onlyMoves()) {
        reading.charge(Placement.pieces(f.shape()), line);
      }
      frame.objects.add(placed(o, placement, !dark, flashed));
    }
    frame.pieces += block.blockPieces();
    Point at = placement.move();
    if (Math.max(Math.abs(at.x()), Math.abs(at.y())) > Reading.MAX_MM) {
      throw reading.fail(line, "coordinate-range", "a block is placed beyond 1 km");
    }
  }

  void openBlock(int number, int line) throws UnreadableFile {
    push(new Frame(line, number));
  }

  Aperture closeBlock(AttributeStore store, int line) throws UnreadableFile {
    Frame frame = frames.peek();
    if (frame.blockNumber == 0) {
      throw reading.fail(line, "block", "a block is closed that is not open");
    }
    frames.pop();
    return Aperture.ofBlock(
        frame.blockNumber, frame.objects, frame.pieces, store.apertureNow(line));
  }

  boolean repeating() {
    return repeatX > 0;
  }

  void openRepeat(int x, int y, Point step, int line) throws UnreadableFile {
    push(new Frame(line, 0));
    repeatX = x;
    repeatY = y;
    repeatStep = step;
  }

  /** Copies the group, first along y and then along x, as the format orders it. */
  void closeRepeat(int line) throws UnreadableFile {
    Frame group = frames.peek();
    if (group.blockNumber != 0) {
      throw reading.fail(line, "block", "a block stays open within a repeated group");
    }
    frames.pop();
    int nx = repeatX;
    int ny = repeatY;
    repeatX = 0;
    if (group.objects.isEmpty()) {
      return;
    }
    // The group itself has been charged when it was drawn.
    long more = (long) nx * ny - 1;
    reading.charge(more, group.line);
    reading.charge(more * group.pieces, group.line);
    Frame frame = frames.peek();
    for (int i = 0; i < nx; i++) {
      for (int k = 0; k < ny; k++) {
        Point move = new Point(i * repeatStep.x(), k * repeatStep.y());
        copy(group, move, frame);
      }
    }
    frame.pieces += nx * ny * group.pieces;
  }

  private static void copy(Frame group, Point move, Frame to) {
    if (move.equals(Point.ORIGIN)) {
      to.objects.addAll(group.objects);
      return;
    }
    Placement placement = Placement.NONE.movedTo(move);
    for (DrawnObject o : group.objects) {
      to.objects.add(placed(o, placement, false, Attributes.NONE));
    }
  }

  private void push(Frame frame) throws UnreadableFile {
    if (frames.size() > MAX_DEPTH) {
      throw reading.fail(
          frame.line, "too-large", "more than " + MAX_DEPTH + " blocks within blocks");
    }
    frames.push(frame);
  }

  /** The objects of the layer; nothing may be open any more. */
  List<DrawnObject> finished(int line) throws UnreadableFile {
    if (frames.size() > 1) {
      throw reading.fail(
          line, "block", "the block opened on line " + frames.peek().line + " is never closed");
    }
    return frames.peek().objects;
  }

  private static DrawnObject placed(
      DrawnObject object, Placement p, boolean toggle, Attributes flashed) {
    boolean dark = object.dark() != toggle;
    Attributes attributes = under(object.attributes(), flashed);
    return object.match(
        s -> new Stroke(p.path(s.path()), pen(s, p), dark, attributes, s.line()),
        f ->
            new Flash(
                p.point(f.at()), p.shape(f.shape()), f.aperture(), dark, attributes, f.line()),
        r -> {
          List<Path> contours = r.contours().stream().map(p::path).toList();
          return new Region(contours, dark, attributes, r.line());
        });
  }

  private static ApertureShape pen(Stroke s, Placement p) {
    return p.shape(s.pen());
  }

  /** Nets and pins given with the flash of a block hold for objects that have none of their own. */
  private static Attributes under(Attributes own, Attributes flashed) {
    boolean nothingNew = flashed.nets().isEmpty() && flashed.refdes().isEmpty();
    if (nothingNew || !own.nets().isEmpty()) {
      return own;
    }
    boolean pinned = !own.refdes().isEmpty();
    return new Attributes(
        flashed.nets(),
        pinned ? own.refdes() : flashed.refdes(),
        pinned ? own.pin() : flashed.pin(),
        own.aperFunction(),
        own.other());
  }
}
