package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Region;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.SvgFile;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Gathers what is drawn, group by group. */
final class SvgCanvas {
  private final Reading reading;
  private final Map<List<String>, List<DrawnObject>> groups = new LinkedHashMap<>();

  SvgCanvas(Reading reading) {
    this.reading = reading;
  }

  List<SvgFile.Group> groups() {
    List<SvgFile.Group> out = new ArrayList<>();
    groups.forEach((ids, objects) -> out.add(new SvgFile.Group(ids, objects)));
    return out;
  }

  void circle(double x, double y, double r, SvgStyle style, int line) throws UnreadableFile {
    if (r < 0) {
      throw reading.fail(line, "svg", "a circle of negative radius");
    }
    if (r > 0) {
      Point start = new Point(x + r, y);
      Path path = new Path(Arcs.fullTurn(start, new Point(x, y), true));
      draw(List.of(path), style, line);
    }
  }

  void path(String d, SvgStyle style, int line) throws UnreadableFile {
    List<Path> paths = SvgPathData.parse(d, reading, line);
    if (!paths.isEmpty()) {
      draw(paths, style, line);
    }
  }

  private void draw(List<Path> inUnits, SvgStyle style, int line) throws UnreadableFile {
    List<Path> paths = new ArrayList<>();
    for (Path p : inUnits) {
      Path moved = style.transform().path(p);
      inRange(moved, line);
      paths.add(moved);
    }
    List<DrawnObject> into = groups.computeIfAbsent(style.ids(), k -> new ArrayList<>());
    if (style.filled()) {
      List<Path> closed =
          paths.stream().filter(p -> p.lengthMm() > 0).map(SvgCanvas::closed).toList();
      if (!closed.isEmpty()) {
        reading.charge(2L * pieces(closed), line);
        List<Path> filled = Nesting.filled(closed, style.evenOdd(), reading, line);
        into.add(new Region(filled, true, Attributes.NONE, line));
      }
    }
    double width = style.width() * style.transform().factor();
    if (style.stroked() && width > 0) {
      if (!style.round()) {
        reading.warnOnce(line, "stroke-end", "strokes without round ends; taken as round");
      }
      ApertureShape pen = new ApertureShape.Circle(width, 0);
      for (Path p : paths) {
        reading.charge(1L + p.segments().size(), line);
        into.add(new Stroke(p, pen, true, Attributes.NONE, line));
      }
    }
  }

  private static int pieces(List<Path> paths) {
    return paths.stream().mapToInt(p -> 2 + p.segments().size()).sum();
  }

  private void inRange(Path path, int line) throws UnreadableFile {
    for (Segment s : path.segments()) {
      Point p = s.end();
      if (!(Math.max(Math.abs(p.x()), Math.abs(p.y())) <= Reading.MAX_MM)) {
        throw reading.fail(line, "coordinate-range", "something is drawn beyond 1 km");
      }
    }
  }

  /** With the straight line that closes it, as filling takes it. */
  private static Path closed(Path p) {
    if (p.closed()) {
      return p;
    }
    List<Segment> all = new ArrayList<>(p.segments());
    all.add(new Line(/* start= */ p.end(), /* end= */ p.start()));
    return new Path(all);
  }
}
