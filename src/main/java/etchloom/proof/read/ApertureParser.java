package etchloom.proof.read;

import etchloom.proof.image.ApertureShape;
import etchloom.proof.image.ApertureShape.Circle;
import etchloom.proof.image.ApertureShape.Obround;
import etchloom.proof.image.ApertureShape.Rectangle;
import etchloom.proof.image.ApertureShape.RegularPolygon;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** Aperture definitions: the four standard templates, and macros. Sections 4.3 to 4.5. */
final class ApertureParser {
  private final Reading reading;
  private final Map<String, Macro> macros = new HashMap<>();

  ApertureParser(Reading reading) {
    this.reading = reading;
  }

  Macro newMacro(String name, int line) throws UnreadableFile {
    Macro macro = new Macro(name, reading);
    if (name.isEmpty()) {
      throw reading.fail(line, "syntax", "an aperture macro has no name");
    }
    if (macros.put(name, macro) != null) {
      throw reading.fail(line, "macro-twice", "the macro " + name + " is defined twice");
    }
    return macro;
  }

  /**
   * @param definition what follows the aperture number: {@code R,1.0X0.5}
   */
  ApertureShape shape(byte[] b, int from, int to, double unitMm, int line) throws UnreadableFile {
    int comma = from;
    while (comma < to && b[comma] != ',') {
      comma++;
    }
    String template = AttributeStore.decode(b, from, comma);
    List<Double> values = values(b, comma + 1, to, line);
    ApertureShape shape =
        switch (template) {
          case "C" -> circle(values, unitMm, line);
          case "R" -> rectangle(values, unitMm, line);
          case "O" -> obround(values, unitMm, line);
          case "P" -> polygon(values, unitMm, line);
          default -> {
            Macro macro = macros.get(template);
            if (macro == null) {
              throw reading.fail(
                  line, "undefined-macro", "there is no aperture template or macro " + template);
            }
            yield macro.shape(values, unitMm, line);
          }
        };
    return shape;
  }

  private List<Double> values(byte[] b, int from, int to, int line) throws UnreadableFile {
    List<Double> out = new ArrayList<>();
    int start = from;
    for (int i = from; i <= to; i++) {
      if (i == to || b[i] == 'X') {
        OptionalDouble v = Decimals.parse(b, start, i);
        if (v.isEmpty() || Math.abs(v.getAsDouble()) > Reading.MAX_MM) {
          throw reading.fail(
              line,
              "aperture-size",
              "'" + GerberLexer.printable(b, start, i) + "' is no size of an aperture");
        }
        out.add(v.getAsDouble());
        start = i + 1;
      }
    }
    return out;
  }

  private Circle circle(List<Double> v, double unitMm, int line) throws UnreadableFile {
    count("C", v, 1, 2, line);
    double d = v.get(0) * unitMm;
    if (d < 0) {
      throw size("circle", d, line);
    }
    if (d == 0) {
      reading.warnOnce(line, "zero-size", "a circle of no diameter makes no image");
    }
    return new Circle(d, hole(v, 1, unitMm, d, line));
  }

  private Rectangle rectangle(List<Double> v, double unitMm, int line) throws UnreadableFile {
    count("R", v, 2, 3, line);
    double w = side(v.get(0), "rectangle", unitMm, line);
    double h = side(v.get(1), "rectangle", unitMm, line);
    return new Rectangle(w, h, 0, hole(v, 2, unitMm, Math.min(w, h), line));
  }

  private Obround obround(List<Double> v, double unitMm, int line) throws UnreadableFile {
    count("O", v, 2, 3, line);
    double w = side(v.get(0), "obround", unitMm, line);
    double h = side(v.get(1), "obround", unitMm, line);
    return new Obround(w, h, 0, hole(v, 2, unitMm, Math.min(w, h), line));
  }

  private RegularPolygon polygon(List<Double> v, double unitMm, int line) throws UnreadableFile {
    count("P", v, 2, 4, line);
    double d = side(v.get(0), "polygon", unitMm, line);
    double n = v.get(1);
    if (!(n >= 3 && n <= 12 && n == Math.rint(n))) {
      throw reading.fail(line, "aperture-size", "a polygon has 3 to 12 corners, not " + n);
    }
    double turn = v.size() > 2 ? Math.toRadians(v.get(2) % 360) : 0;
    double inside = d * Math.cos(Math.PI / n);
    return new RegularPolygon(d, (int) n, turn, hole(v, 3, unitMm, inside, line));
  }

  private double side(double value, String what, double unitMm, int line) throws UnreadableFile {
    double mm = value * unitMm;
    if (!(mm > 0)) {
      throw size(what, mm, line);
    }
    return mm;
  }

  private UnreadableFile size(String what, double mm, int line) {
    return reading.fail(
        line, "aperture-size", "a " + what + " aperture has the size " + mm + " mm");
  }

  private double hole(List<Double> v, int index, double unitMm, double inside, int line)
      throws UnreadableFile {
    if (v.size() <= index) {
      return 0;
    }
    double d = v.get(index) * unitMm;
    if (d < 0) {
      throw size("hole of an", d, line);
    }
    if (d >= inside && d > 0) {
      reading.warn(
          line, "aperture-hole", "the hole of " + d + " mm does not fit inside its aperture");
    }
    return d;
  }

  private void count(String template, List<Double> v, int least, int most, int line)
      throws UnreadableFile {
    if (v.size() == most + 1) {
      throw reading.fail(
          line, "aperture-hole", "rectangular holes in apertures are deprecated and not read");
    }
    if (v.size() < least || v.size() > most) {
      throw reading.fail(
          line,
          "aperture-size",
          "aperture " + template + " takes " + least + " to " + most + " values, got " + v.size());
    }
  }
}
