package etchloom.proof.read;

import etchloom.geometry.Arc;
import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.ApertureShape.Part;
import java.util.ArrayList;
import java.util.List;

/** The primitives of aperture macros as outlines, in mm. Section 4.5.1 of the format. */
final class MacroPrimitives {
  /** A size below a nanometre makes no image; it also would not survive being moved about. */
  private static final double NO_IMAGE_MM = 1e-6;

  private final Reading reading;
  private final double unitMm;

  MacroPrimitives(Reading reading, double unitMm) {
    this.reading = reading;
    this.unitMm = unitMm;
  }

  /**
   * @param v the primitive's code and then its values
   * @return no part for a primitive of no area
   */
  List<Part> parts(double[] v, int line) throws UnreadableFile {
    int code = (int) v[0];
    if (code != v[0]) {
      throw unknown(v[0], line);
    }
    return switch (code) {
      case 1 -> circle(v, line);
      case 2, 20 -> vectorLine(v, line);
      case 4 -> outline(v, line);
      case 5 -> polygon(v, line);
      case 6 -> moire(v, line);
      case 7 -> thermal(v, line);
      case 21 -> centreLine(v, line);
      case 22 -> cornerLine(v, line);
      default -> throw unknown(v[0], line);
    };
  }

  private UnreadableFile unknown(double code, int line) {
    return reading.fail(line, "macro-primitive", "there is no macro primitive " + code);
  }

  private List<Part> circle(double[] v, int line) throws UnreadableFile {
    count(v, 5, 6, line);
    double r = size(v[2], "diameter", line) / 2;
    Point centre = turned(length(v[3]), length(v[4]), v.length > 5 ? v[5] : 0);
    return r == 0 ? List.of() : List.of(solid(v[1], Path.circle(centre, r), line));
  }

  private List<Part> vectorLine(double[] v, int line) throws UnreadableFile {
    count(v, 7, 8, line);
    if (v[0] == 2) {
      deprecated("2", line);
    }
    double half = size(v[2], "width", line) / 2;
    Point a = new Point(length(v[3]), length(v[4]));
    Point b = new Point(length(v[5]), length(v[6]));
    double len = a.distanceTo(b);
    if (len == 0 || half == 0) {
      return List.of();
    }
    Point u = b.minus(a).times(half / len);
    Point n = new Point(-u.y(), u.x());
    List<Point> corners = List.of(a.minus(n), b.minus(n), b.plus(n), a.plus(n));
    return List.of(solid(v[1], closed(corners, v.length > 7 ? v[7] : 0), line));
  }

  private List<Part> centreLine(double[] v, int line) throws UnreadableFile {
    count(v, 6, 7, line);
    double w = size(v[2], "width", line);
    double h = size(v[3], "height", line);
    return box(v, length(v[4]) - w / 2, length(v[5]) - h / 2, w, h, line);
  }

  private List<Part> cornerLine(double[] v, int line) throws UnreadableFile {
    count(v, 6, 7, line);
    deprecated("22", line);
    double w = size(v[2], "width", line);
    double h = size(v[3], "height", line);
    return box(v, length(v[4]), length(v[5]), w, h, line);
  }

  private List<Part> box(double[] v, double x, double y, double w, double h, int line)
      throws UnreadableFile {
    if (w == 0 || h == 0) {
      return List.of();
    }
    List<Point> corners =
        List.of(new Point(x, y), new Point(x + w, y), new Point(x + w, y + h), new Point(x, y + h));
    return List.of(solid(v[1], closed(corners, v.length > 6 ? v[6] : 0), line));
  }

  private List<Part> outline(double[] v, int line) throws UnreadableFile {
    double n = v.length > 2 ? v[2] : 0;
    int points = (v.length - 3) / 2;
    if (!(n >= 3 && points == n + 1)) {
      throw reading.fail(
          line,
          "macro-primitive",
          "an outline of " + n + " sides needs " + (n + 1) + " points, got " + points);
    }
    List<Point> corners = new ArrayList<>(points);
    for (int i = 0; i < points; i++) {
      corners.add(new Point(length(v[3 + 2 * i]), length(v[4 + 2 * i])));
    }
    if (corners.get(0).equals(corners.get(points - 1))) {
      corners.remove(points - 1);
    } else {
      reading.warn(line, "open-contour", "a macro outline does not end where it starts");
    }
    boolean turns = v.length == 4 + 2 * points;
    return List.of(solid(v[1], closed(corners, turns ? v[v.length - 1] : 0), line));
  }

  private List<Part> polygon(double[] v, int line) throws UnreadableFile {
    count(v, 6, 7, line);
    double n = v[2];
    if (!(n >= 3 && n <= 12 && n == Math.rint(n))) {
      throw reading.fail(line, "macro-primitive", "a polygon has 3 to 12 corners, not " + n);
    }
    double r = size(v[5], "diameter", line) / 2;
    Point centre = new Point(length(v[3]), length(v[4]));
    List<Point> corners = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      corners.add(centre.plus(Point.polar(r, 2 * Math.PI * i / n)));
    }
    return r == 0
        ? List.of()
        : List.of(solid(v[1], closed(corners, v.length > 6 ? v[6] : 0), line));
  }

  private List<Part> moire(double[] v, int line) throws UnreadableFile {
    count(v, 9, 10, line);
    deprecated("6", line);
    double rotation = v.length > 9 ? v[9] : 0;
    Point c = turned(length(v[1]), length(v[2]), rotation);
    double outer = size(v[3], "diameter", line) / 2;
    double ring = size(v[4], "ring thickness", line);
    double gap = size(v[5], "ring gap", line);
    List<Part> parts = new ArrayList<>();
    double most = Math.min(v[6], 1000);
    for (int i = 0; i < most && outer > 0 && ring > 0; i++) {
      Path edge = Path.circle(c, outer);
      double inner = outer - ring;
      parts.add(new Part(true, edge, inner > 0 ? List.of(Path.circle(c, inner)) : List.of()));
      outer = inner - gap;
    }
    double thick = size(v[7], "cross hair thickness", line);
    double len = size(v[8], "cross hair length", line);
    double x = length(v[1]);
    double y = length(v[2]);
    double[] turn = {6, 1, 0, 0, 0, 0, rotation};
    parts.addAll(box(turn, x - len / 2, y - thick / 2, len, thick, line));
    parts.addAll(box(turn, x - thick / 2, y - len / 2, thick, len, line));
    return parts;
  }

  private List<Part> thermal(double[] v, int line) throws UnreadableFile {
    count(v, 6, 7, line);
    double outer = size(v[3], "outer diameter", line) / 2;
    double inner = size(v[4], "inner diameter", line) / 2;
    double g = size(v[5], "gap", line) / 2;
    if (inner >= outer) {
      throw reading.fail(line, "macro-primitive", "a thermal's inner circle is not the smaller");
    }
    double rotation = v.length > 6 ? v[6] : 0;
    List<Part> parts = new ArrayList<>();
    if (g * Math.sqrt(2) < outer) {
      Point centre = turned(length(v[1]), length(v[2]), rotation);
      for (int q = 0; q < 4; q++) {
        Placement turn = Placement.of(false, false, rotation + 90 * q, 1).movedTo(centre);
        parts.add(new Part(true, turn.path(quarter(outer, inner, g)), List.of()));
      }
    }
    return parts;
  }

  /** The first quarter of a thermal about the origin, counter-clockwise. */
  private static Path quarter(double outer, double inner, double g) {
    double far = Math.sqrt(outer * outer - g * g);
    Point a = new Point(far, g);
    Point b = new Point(g, far);
    Segment arc = new Arc(a, b, Point.ORIGIN, true);
    if (inner <= g * Math.sqrt(2)) {
      Point corner = new Point(g, g);
      return Path.of(arc, new Line(b, corner), new Line(corner, a));
    }
    double near = Math.sqrt(inner * inner - g * g);
    Point c = new Point(g, near);
    Point d = new Point(near, g);
    Segment back = new Arc(c, d, Point.ORIGIN, false);
    return Path.of(arc, new Line(b, c), back, new Line(d, a));
  }

  private Part solid(double exposure, Path outline, int line) throws UnreadableFile {
    if (exposure != 0 && exposure != 1) {
      throw reading.fail(line, "macro-primitive", "exposure is 0 or 1, not " + exposure);
    }
    return new Part(exposure == 1, outline, List.of());
  }

  private static Path closed(List<Point> corners, double rotationDeg) {
    Placement turn = Placement.of(false, false, rotationDeg, 1);
    List<Segment> sides = new ArrayList<>(corners.size());
    Point first = turn.point(corners.get(0));
    Point at = first;
    for (int i = 1; i <= corners.size(); i++) {
      Point next = i == corners.size() ? first : turn.point(corners.get(i));
      if (!next.equals(at) || i == corners.size()) {
        sides.add(new Line(at, next));
      }
      at = next;
    }
    return new Path(sides);
  }

  private static Point turned(double x, double y, double rotationDeg) {
    return Placement.of(false, false, rotationDeg, 1).point(new Point(x, y));
  }

  private double length(double value) {
    return value * unitMm;
  }

  private double size(double value, String what, int line) throws UnreadableFile {
    if (!(value >= 0)) {
      throw reading.fail(line, "macro-primitive", "a macro " + what + " is " + value);
    }
    double mm = value * unitMm;
    return mm < NO_IMAGE_MM ? 0 : mm;
  }

  private void count(double[] v, int least, int most, int line) throws UnreadableFile {
    if (v.length < least || v.length > most) {
      throw reading.fail(
          line,
          "macro-primitive",
          "macro primitive "
              + (int) v[0]
              + " takes "
              + (least - 1)
              + " or "
              + (most - 1)
              + " values, got "
              + (v.length - 1));
    }
  }

  private void deprecated(String code, int line) {
    reading.warnOnce(line, "deprecated", "macro primitive " + code + " is deprecated");
  }
}
