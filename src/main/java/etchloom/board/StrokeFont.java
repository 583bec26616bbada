package etchloom.board;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.PathBuilder;
import etchloom.geometry.Point;
import java.text.Normalizer;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Plain letters of straight strokes for the legend, drawn on a grid four wide and six high.
 *
 * <p>Small letters are set as capitals, accents are dropped; what has no letter here becomes a
 * hyphen.
 */
final class StrokeFont {
  private static final double GRID_HIGH = 6;
  private static final double ADVANCE = 6;
  private static final double WIDE = 4;

  /** Each glyph: strokes apart by blanks, each a run of grid points of two digits, x then y. */
  private static final Map<Character, String> GLYPHS = new HashMap<>();

  static {
    // Letters and figures, one line each: the character, then its strokes.
    String[] table = {
      "A 00042644 4440 0343",
      "B 00063645443303 33424130 3000",
      "C 4536160501103041",
      "D 0006264442 4220 2000",
      "E 46060040 0333",
      "F 460600 0333",
      "G 4536160501103041 414323",
      "H 0006 4046 0343",
      "I 1636 2620 1030",
      "J 4641301001",
      "K 0006 0246 1340",
      "L 060040",
      "M 0006234640",
      "N 00064046",
      "O 1636454130100105 0516",
      "P 00063645443303",
      "Q 1636454130100105 0516 2240",
      "R 00063645443303 2340",
      "S 453616050413334241301001",
      "T 0646 2620",
      "U 060110304146",
      "V 062046",
      "W 0610233046",
      "X 0046 0640",
      "Y 062346 2320",
      "Z 06460040",
      "0 1636454130100105 0516 0145",
      "1 152620 1030",
      "2 05163645440040",
      "3 05163645443342413010 1001 1333",
      "4 30360242",
      "5 46060434434130 301001",
      "6 4536160501103041 41423303",
      "7 064610",
      "8 1333444536160504 0413 1302011030 30414233",
      "9 0110304145361605 05041343",
      "- 0343",
      "+ 0343 2125",
      ". 1021",
      ", 1021",
      "/ 0046",
      ": 2122 2425",
      "( 35242231",
      ") 15242211",
      "_ 0040",
      "= 0242 0444",
      "' 2625",
      "# 1016 3036 0242 0444",
      "& 40141526 26353413020110 103042",
    };
    for (String row : table) {
      GLYPHS.put(row.charAt(0), row.substring(2));
    }
  }

  private StrokeFont() {}

  /** Width of a text of a given height, from the first stroke's left to the last one's right. */
  static double widthMm(String text, double heightMm) {
    return (text.length() * ADVANCE - (ADVANCE - WIDE)) * heightMm / GRID_HIGH;
  }

  /** The text as it will be drawn. */
  static String plain(String text) {
    String upper =
        Normalizer.normalize(text, Normalizer.Form.NFD)
            .replaceAll("\\p{M}", "")
            .toUpperCase(Locale.ROOT);
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < upper.length(); i++) {
      char c = upper.charAt(i);
      out.append(c == ' ' || GLYPHS.containsKey(c) ? c : '-');
    }
    return out.toString();
  }

  /** Strokes of one character, its lower left corner at the origin, upright. */
  static List<Path> glyph(char c, double heightMm) {
    List<Path> out = new ArrayList<>();
    String strokes = GLYPHS.get(c);
    if (strokes == null) {
      return out;
    }
    double unit = heightMm / GRID_HIGH;
    for (String run : strokes.split(" ")) {
      PathBuilder p = new PathBuilder(point(run, 0, unit));
      for (int i = 2; i < run.length(); i += 2) {
        p.lineTo(point(run, i, unit));
      }
      out.add(p.build());
    }
    return out;
  }

  private static Point point(String run, int i, double unit) {
    return new Point((run.charAt(i) - '0') * unit, (run.charAt(i + 1) - '0') * unit);
  }

  /** Moves a path drawn upright at the origin: first by an offset, then turned, then set down. */
  static Path placed(Path glyph, Point offset, double turnRad, Point at) {
    return glyph.mapped(p -> p.plus(offset).rotated(turnRad).plus(at));
  }

  /** A plain straight stroke. */
  static Path stroke(Point a, Point b) {
    return Path.of(new Line(a, b));
  }
}
