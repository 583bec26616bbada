package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.DrillFile.DrilledHole;
import etchloom.proof.image.DrillFile.Slot;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** What follows the header of a drill program: tools, hits, slots and routs. */
final class NcBody {
  private final Reading reading;
  private final DrillNumbers numbers;
  private final NcTools tools;
  private final AttributeStore attributes;
  private final List<DrilledHole> holes = new ArrayList<>();
  private final List<Slot> slots = new ArrayList<>();
  private final List<Segment> cut = new ArrayList<>();

  private DrillTool tool;
  private List<String> nets = List.of();
  private boolean routing;
  private boolean down;
  private int motion;
  private int cutLine;
  private boolean placed;
  private Point at = Point.ORIGIN;
  private boolean ended;

  NcBody(Reading reading, DrillNumbers numbers, NcTools tools, AttributeStore attributes) {
    this.reading = reading;
    this.numbers = numbers;
    this.tools = tools;
    this.attributes = attributes;
  }

  boolean ended() {
    return ended;
  }

  List<DrilledHole> holes() {
    return holes;
  }

  List<Slot> slots() {
    return slots;
  }

  void attributesChanged(int line) throws UnreadableFile {
    nets = attributes.objectNow(Map.of(), line).nets();
  }

  /** Where a line leads: what its words come to before anything is done. */
  private static final class Target {
    double x;
    double y;
    boolean placedX;
    boolean placedY;
    Point slotFrom;
    double radius = Double.NaN;
    double i;
    double j;
    boolean offset;
    int repeat;

    Point point() {
      return new Point(x, y);
    }

    boolean any() {
      return placedX || placedY;
    }
  }

  void obey(NcWords words, int line) throws UnreadableFile {
    if (words.letter(0) == 'T') {
      change(tools.define(words, line), line);
      return;
    }
    Target t = new Target();
    t.x = at.x();
    t.y = at.y();
    for (int k = 0; k < words.count() && !ended; k++) {
      word(words, k, t, line);
    }
    if (t.slotFrom != null) {
      slot(t, line);
    } else if (t.repeat > 0) {
      repeat(t, line);
    } else if (t.any() || t.offset) {
      go(t, line);
    }
  }

  private void word(NcWords words, int k, Target t, int line) throws UnreadableFile {
    switch (words.letter(k)) {
      case 'G' -> general(words.whole(k), t, line);
      case 'M' -> miscellaneous(words.whole(k), line);
      case 'X' -> {
        t.x = words.mm(k, numbers, line);
        t.placedX = true;
      }
      case 'Y' -> {
        t.y = words.mm(k, numbers, line);
        t.placedY = true;
      }
      case 'A' -> t.radius = words.mm(k, numbers, line);
      case 'I' -> {
        t.i = words.mm(k, numbers, line);
        t.offset = true;
      }
      case 'J' -> {
        t.j = words.mm(k, numbers, line);
        t.offset = true;
      }
      case 'R' -> {
        t.repeat = words.whole(k);
        if (t.repeat < 1) {
          throw reading.fail(line, "syntax", "no count after R");
        }
        t.x = 0;
        t.y = 0;
      }
      case 'F', 'S', 'N' ->
          reading.warnOnce(line, "drill-format", "feed, speed and line numbers are not read");
      default ->
          throw reading.fail(
              line, "unknown-command", "unknown drill command '" + words.letter(k) + "'");
    }
  }

  private void change(int number, int line) throws UnreadableFile {
    if (down) {
      throw reading.fail(line, "rout", "the tool changes while it cuts");
    }
    tool = number == 0 ? null : tools.select(number, line);
  }

  private void general(int g, Target t, int line) throws UnreadableFile {
    switch (g) {
      case 0, 1, 2, 3 -> {
        routing = true;
        motion = g;
      }
      case 5, 81 -> {
        if (down) {
          throw reading.fail(line, "rout", "drilling starts while the tool cuts");
        }
        routing = false;
      }
      case 85 -> {
        if (!t.any()) {
          throw reading.fail(line, "syntax", "a slot (G85) has no start");
        }
        t.slotFrom = t.point();
        t.placedX = false;
        t.placedY = false;
      }
      case 40, 90 -> reading.warnOnce(line, "drill-format", "G" + g + " is not needed");
      case 91 ->
          throw reading.fail(line, "incremental", "incremental coordinates (G91) are not read");
      default ->
          throw reading.fail(line, "unknown-command", "the drill command G" + g + " is not read");
    }
  }

  private void miscellaneous(int m, int line) throws UnreadableFile {
    switch (m) {
      case 14, 15 -> plunge(line);
      case 16, 17 -> lift(line);
      case 0, 30 -> ended = true;
      case 71, 72 -> numbers.set(m == 72, line);
      default ->
          throw reading.fail(line, "unknown-command", "the drill command M" + m + " is not read");
    }
  }

  private void plunge(int line) throws UnreadableFile {
    if (!routing || down || !placed) {
      throw reading.fail(line, "rout", "M15 lowers the tool, but no G00 has set the start");
    }
    needTool(line);
    down = true;
    cutLine = line;
  }

  private void lift(int line) throws UnreadableFile {
    if (!down) {
      throw reading.fail(line, "rout", "M16 lifts the tool, but it is not down");
    }
    down = false;
    motion = 0;
    if (cut.isEmpty()) {
      reading.warn(cutLine, "short-slot", "a rout of no length; taken as a hole");
      hole(at, cutLine);
    } else {
      add(cut, cutLine);
      cut.clear();
    }
  }

  private DrillTool needTool(int line) throws UnreadableFile {
    if (tool == null) {
      throw reading.fail(line, "no-tool", "a hole before a tool is chosen");
    }
    return tool;
  }

  private void hole(Point p, int line) throws UnreadableFile {
    DrillTool t = needTool(line);
    reading.charge(1, line);
    holes.add(
        new DrilledHole(p, t.diameterMm(), t.plating(), t.function(), nets, t.number(), line));
  }

  private void add(List<Segment> path, int line) throws UnreadableFile {
    DrillTool t = needTool(line);
    reading.charge(1L + path.size(), line);
    slots.add(
        new Slot(
            new Path(path), t.diameterMm(), t.plating(), t.function(), nets, t.number(), line));
  }

  private void slot(Target t, int line) throws UnreadableFile {
    if (!t.any()) {
      throw reading.fail(line, "syntax", "a slot (G85) has no end");
    }
    if (routing) {
      throw reading.fail(line, "rout", "a slot (G85) while routing; G05 ends that");
    }
    at = t.point();
    placed = true;
    if (at.equals(t.slotFrom)) {
      reading.warn(line, "short-slot", "a slot of no length; taken as a hole");
      hole(at, line);
    } else {
      add(List.of(new Line(t.slotFrom, at)), line);
    }
  }

  private void repeat(Target t, int line) throws UnreadableFile {
    if (routing || !placed || !t.any()) {
      throw reading.fail(line, "repeat", "R repeats a hole by X and Y, but there is none");
    }
    reading.warnOnce(line, "drill-format", "repeated holes (R) are not part of XNC");
    for (int n = 0; n < t.repeat; n++) {
      at = at.plus(t.point());
      inRange(at, line);
      hole(at, line);
    }
  }

  private void inRange(Point p, int line) throws UnreadableFile {
    if (!(Math.max(Math.abs(p.x()), Math.abs(p.y())) <= Reading.MAX_MM)) {
      throw reading.fail(line, "coordinate-range", "a hole is beyond 1 km");
    }
  }

  private void go(Target t, int line) throws UnreadableFile {
    if (!placed && !(t.placedX && t.placedY)) {
      throw reading.fail(line, "syntax", "the first point lacks X or Y");
    }
    if (!t.placedX || !t.placedY) {
      reading.warnOnce(line, "drill-format", "a point without X or Y keeps the last one");
    }
    Point to = t.point();
    if (!routing) {
      hole(to, line);
    } else if (down != (motion > 0)) {
      throw reading.fail(
          line, "rout", down ? "G00 while the tool is down" : "a cut while the tool is up");
    } else if (down) {
      cut(to, t, line);
    }
    at = to;
    placed = true;
  }

  private void cut(Point to, Target t, int line) throws UnreadableFile {
    int before = cut.size();
    if (motion > 1) {
      NcArcs arcs = new NcArcs(reading, motion == 3, line);
      cut.addAll(
          t.offset
              ? arcs.byCentre(at, to, at.plus(new Point(t.i, t.j)))
              : arcs.byRadius(at, to, t.radius));
    } else if (!to.equals(at)) {
      cut.add(new Line(at, to));
    }
    reading.charge(cut.size() - before, line);
  }

  void finish(int line) throws UnreadableFile {
    if (down) {
      throw reading.fail(line, "rout", "the rout begun on line " + cutLine + " never ends");
    }
    if (!ended) {
      throw reading.fail(line, "missing-end", "the file does not end in M30");
    }
  }
}
