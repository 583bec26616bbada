package etchloom.proof.read;

import javax.xml.stream.XMLStreamReader;

/** The size of a user unit, from width, height and viewBox of the root. SVG 1.1, section 7.7. */
final class SvgUnits {
  /** CSS: 96 px to the inch. */
  private static final double PX_MM = 25.4 / 96;

  private SvgUnits() {}

  /** From user units, y down, to mm, y up. */
  static SvgTransform of(XMLStreamReader root, Reading reading, int line) throws UnreadableFile {
    String box = root.getAttributeValue(null, "viewBox");
    double width = mm(root.getAttributeValue(null, "width"), reading, line);
    double height = mm(root.getAttributeValue(null, "height"), reading, line);
    if (box == null || Double.isNaN(width)) {
      reading.warn(line, "unit", "no width in mm and viewBox; a unit is taken as 1 mm");
      return SvgTransform.scale(1, -1);
    }
    SvgScanner s = new SvgScanner(box, reading, line);
    s.number();
    s.number();
    double w = s.number();
    double h = s.number();
    double unit = width / w;
    boolean even = Double.isNaN(height) || Math.abs(height / h - unit) <= 1e-6 * unit;
    if (!(unit > 1e-6 && unit < 1e6 && even)) {
      throw reading.fail(line, "svg", "width and height do not match the viewBox");
    }
    return SvgTransform.scale(unit, -unit);
  }

  /** A length with its unit; NaN when there is none. */
  private static double mm(String text, Reading reading, int line) throws UnreadableFile {
    if (text == null || text.endsWith("%")) {
      return Double.NaN;
    }
    SvgScanner s = new SvgScanner(text, reading, line);
    double v = s.number();
    return switch (s.word()) {
      case "mm" -> v;
      case "cm" -> v * 10;
      case "in" -> v * 25.4;
      case "px", "" -> v * PX_MM;
      default -> throw s.wrong("one of the units mm, cm, in, px");
    };
  }
}
