package etchloom.proof.read;

import etchloom.geometry.Line;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import etchloom.proof.image.NetlistFile.NetLine;
import java.util.ArrayList;
import java.util.List;

/** A conductor (378) or outline (389) being read, over all its continuations. */
final class NetPen {
  private final Reading reading;
  private final NetUnits units;
  private final int operation;
  private final String name;
  private final int layer;
  private final double widthMm;
  private final int line;
  private final List<Path> paths = new ArrayList<>();
  private final List<Segment> chain = new ArrayList<>();
  private boolean begun;
  private Point at = Point.ORIGIN;

  NetPen(Reading reading, NetUnits units, int operation, Card card, int line)
      throws UnreadableFile {
    this.reading = reading;
    this.units = units;
    this.operation = operation;
    this.name = card.columns(4, 17);
    this.line = line;
    String l = card.columns(19, 21);
    layer = l.startsWith("L") ? (int) Card.digits(l.substring(1)) : 0;
    if (layer < 0 || (operation == 378 && layer == 0)) {
      throw reading.fail(line, "syntax", "columns 19 to 21 are L and the layer of the conductor");
    }
    String rest = card.rest(23);
    int end = rest.indexOf(' ');
    widthMm = pen(end < 0 ? rest : rest.substring(0, end));
    points(end < 0 ? "" : rest.substring(end), line);
  }

  boolean continuedBy(int op) {
    return operation == op + 300;
  }

  /** {@code X300} round, {@code X300Y200} rectangular, of which the smaller side counts. */
  private double pen(String text) throws UnreadableFile {
    int y = text.indexOf('Y');
    long w = text.startsWith("X") ? Card.digits(text.substring(1, y < 0 ? text.length() : y)) : -1;
    long h = y < 0 ? w : Card.digits(text.substring(y + 1));
    if (w < 0 || h < 0) {
      throw reading.fail(
          line,
          "syntax",
          "from column 23 the pen is wanted, such as X0300, not '"
              + GerberLexer.printable(text)
              + "'");
    }
    return units.mm(Math.min(w, h), line);
  }

  /** Points joined by blanks; {@code *} starts anew. */
  void points(String text, int where) throws UnreadableFile {
    int i = 0;
    while (i < text.length()) {
      char c = text.charAt(i);
      if (c == '*') {
        end();
        i++;
      } else if (c == ' ') {
        i++;
      } else {
        int stop = i;
        while (stop < text.length() && text.charAt(stop) != ' ' && text.charAt(stop) != '*') {
          stop++;
        }
        to(point(text.substring(i, stop), where));
        i = stop;
      }
    }
  }

  private Point point(String word, int where) throws UnreadableFile {
    int y = word.indexOf('Y');
    String xs = y < 0 ? word : word.substring(0, y);
    if (!(xs.startsWith("X") || (xs.isEmpty() && y == 0))) {
      throw wrong(word, where);
    }
    double px = xs.isEmpty() ? at.x() : value(xs.substring(1), word, where);
    double py = y < 0 ? at.y() : value(word.substring(y + 1), word, where);
    return new Point(px, py);
  }

  private double value(String digits, String word, int where) throws UnreadableFile {
    boolean minus = digits.startsWith("-");
    long v = Card.digits(minus || digits.startsWith("+") ? digits.substring(1) : digits);
    double mm = v < 0 ? Double.NaN : units.mm(minus ? -v : v, where);
    if (!(Math.abs(mm) <= Reading.MAX_MM)) {
      throw wrong(word, where);
    }
    return mm;
  }

  private UnreadableFile wrong(String word, int where) {
    return reading.fail(
        where, "syntax", "'" + GerberLexer.printable(word) + "' is no point X+000000Y+000000");
  }

  private void to(Point p) throws UnreadableFile {
    if (begun && !p.equals(at)) {
      reading.charge(1, line);
      chain.add(new Line(at, p));
    }
    at = p;
    begun = true;
  }

  private void end() {
    if (!chain.isEmpty()) {
      paths.add(new Path(chain));
    } else if (begun) {
      paths.add(Path.of(new Line(at, at)));
    }
    chain.clear();
    begun = false;
  }

  NetLine finished() {
    end();
    return new NetLine(operation, name, layer, widthMm, paths, line);
  }
}
