package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.ArrayList;
import java.util.List;

/** The d attribute of an SVG path: M L H V A Z, absolute and relative. SVG 1.1, section 8.3. */
final class SvgPathData {
  /** How far the two radii of an arc may differ, and the arc still count as circular: relative. */
  private static final double ROUND = 1e-9;

  private final SvgScanner in;
  private final Reading reading;
  private final int line;
  private final List<Path> paths = new ArrayList<>();
  private final List<Segment> chain = new ArrayList<>();
  private Point start = Point.ORIGIN;
  private Point at = Point.ORIGIN;
  private boolean begun;
  private boolean drawn;

  private SvgPathData(String d, Reading reading, int line) {
    this.in = new SvgScanner(d, reading, line);
    this.reading = reading;
    this.line = line;
  }

  /** The sub-paths, those that Z closes with their last line; one of no length is a dot. */
  static List<Path> parse(String d, Reading reading, int line) throws UnreadableFile {
    SvgPathData data = new SvgPathData(d, reading, line);
    while (data.in.peek() != 0) {
      data.command(data.in.take());
    }
    data.end();
    return data.paths;
  }

  private void command(char letter) throws UnreadableFile {
    if (!begun && letter != 'M' && letter != 'm') {
      throw in.wrong("a path starts with M, which");
    }
    if (letter == 'Z' || letter == 'z') {
      drawn = true;
      line(start);
      end();
      at = start;
      return;
    }
    char now = letter;
    do {
      step(now);
      now = now == 'M' ? 'L' : now == 'm' ? 'l' : now;
    } while (in.atNumber());
  }

  private void step(char letter) throws UnreadableFile {
    boolean relative = Character.isLowerCase(letter);
    Point o = relative ? at : Point.ORIGIN;
    switch (Character.toUpperCase(letter)) {
      case 'M' -> {
        end();
        start = new Point(o.x() + in.number(), o.y() + in.number());
        at = start;
        begun = true;
      }
      case 'L' -> line(new Point(o.x() + in.number(), o.y() + in.number()));
      case 'H' -> line(new Point(o.x() + in.number(), at.y()));
      case 'V' -> line(new Point(at.x(), o.y() + in.number()));
      case 'A' -> arc(o);
      default -> throw in.wrong("one of M L H V A Z");
    }
  }

  private void line(Point to) throws UnreadableFile {
    drawn = true;
    if (!to.equals(at)) {
      add(new Line(at, to));
    }
  }

  private void add(Segment s) throws UnreadableFile {
    reading.charge(1, line);
    chain.add(s);
    at = s.end();
  }

  private void arc(Point o) throws UnreadableFile {
    double rx = Math.abs(in.number());
    double ry = Math.abs(in.number());
    in.number();
    boolean large = in.flag();
    boolean sweep = in.flag();
    Point to = new Point(o.x() + in.number(), o.y() + in.number());
    drawn = true;
    if (to.equals(at)) {
      return;
    }
    if (rx == 0 || ry == 0) {
      add(new Line(at, to));
      return;
    }
    if (Math.abs(rx - ry) > ROUND * rx) {
      throw reading.fail(line, "svg", "elliptic arcs are not read");
    }
    Point chord = to.minus(at);
    double half = chord.norm() / 2;
    double r = Math.max(rx, half);
    double side = Math.sqrt(r * r - half * half) / (2 * half) * (sweep == large ? -1 : 1);
    Point middle = at.plus(to).times(0.5);
    Point centre = middle.plus(new Point(-chord.y() * side, chord.x() * side));
    add(Arcs.between(at, to, centre, sweep));
  }

  private void end() {
    if (!chain.isEmpty()) {
      paths.add(new Path(chain));
    } else if (drawn) {
      paths.add(Path.of(new Line(at, at)));
    }
    chain.clear();
    drawn = false;
  }
}
