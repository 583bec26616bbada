package etchloom.proof.read;

import etchloom.geometry.Point;
import etchloom.proof.image.NetlistFile.TestPoint;
import etchloom.proof.image.Plating;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** Test records by their columns. Source: IPC-D-356A, sections on operation codes 3x7 and 0x7. */
final class NetRecords {
  private final Reading reading;
  private final NetUnits units;

  NetRecords(Reading reading, NetUnits units) {
    this.reading = reading;
    this.units = units;
  }

  TestPoint point(int op, Card c, int line) throws UnreadableFile {
    String net = c.columns(4, 17);
    if (net.isEmpty()) {
      throw reading.fail(line, "no-net", "the record names no net in columns 4 to 17");
    }
    return read(op, c, line, net, c.columns(21, 26), c.columns(28, 31));
  }

  /** A further side of the point above, whose names it takes over. */
  TestPoint continued(TestPoint above, int op, Card c, int line) throws UnreadableFile {
    String refdes = c.columns(21, 26);
    String pin = c.columns(28, 31);
    return read(
        300 + op,
        c,
        line,
        above.net(),
        refdes.isEmpty() ? above.refdes() : refdes,
        pin.isEmpty() ? above.pin() : pin);
  }

  private TestPoint read(int op, Card c, int line, String net, String refdes, String pin)
      throws UnreadableFile {
    boolean spans = op == 307 && c.column(75) == 'L';
    return new TestPoint(
        op,
        net,
        refdes,
        pin,
        c.column(32) == 'M',
        hole(c, line),
        plating(c, line),
        optional(c, 39, 'A', 40, 41, line),
        new Point(coordinate(c, 42, 'X', line), coordinate(c, 50, 'Y', line)),
        size(c, 58, 'X', line),
        size(c, 63, 'Y', line),
        rotation(c, line),
        optional(c, 73, 'S', 74, 74, line),
        spans ? layer(c, 75, line) : 0,
        spans ? layer(c, 78, line) : 0,
        line);
  }

  private OptionalDouble hole(Card c, int line) throws UnreadableFile {
    double d = size(c, 33, 'D', line);
    return c.column(33) == 'D' ? OptionalDouble.of(d) : OptionalDouble.empty();
  }

  private Plating plating(Card c, int line) throws UnreadableFile {
    if (c.column(33) != 'D') {
      return Plating.UNKNOWN;
    }
    return switch (c.column(38)) {
      case 'P' -> Plating.PLATED;
      case 'U' -> Plating.NON_PLATED;
      case ' ' -> Plating.UNKNOWN;
      default -> throw wrong("column 38 is P for plated or U for unplated", c, line);
    };
  }

  private double coordinate(Card c, int at, char letter, int line) throws UnreadableFile {
    char sign = c.column(at + 1);
    long v = Card.digits(c.raw(at + 2, at + 7).stripTrailing());
    if (c.column(at) != letter || v < 0 || " +-".indexOf(sign) < 0) {
      throw wrong(
          "columns " + at + " to " + (at + 7) + " are " + letter + ", sign and six digits",
          c,
          line);
    }
    return units.mm(sign == '-' ? -v : v, line);
  }

  /** Four digits after a letter; 0 when the field is blank. */
  private double size(Card c, int at, char letter, int line) throws UnreadableFile {
    if (c.column(at) == ' ') {
      return 0;
    }
    long v = Card.digits(c.columns(at + 1, at + 4));
    if (c.column(at) != letter || v < 0) {
      throw wrong("columns " + at + " to " + (at + 4) + " are " + letter + " and digits", c, line);
    }
    return units.mm(v, line);
  }

  private double rotation(Card c, int line) throws UnreadableFile {
    if (c.column(68) == ' ') {
      return 0;
    }
    long v = Card.digits(c.columns(69, 71));
    if (c.column(68) != 'R' || v < 0) {
      throw wrong("columns 68 to 71 are R and three digits", c, line);
    }
    return units.rad(v);
  }

  private OptionalInt optional(Card c, int at, char letter, int from, int to, int line)
      throws UnreadableFile {
    if (c.column(at) == ' ') {
      return OptionalInt.empty();
    }
    long v = Card.digits(c.columns(from, to));
    if (c.column(at) != letter || v < 0) {
      throw wrong("column " + at + " is " + letter + " and then a number", c, line);
    }
    return OptionalInt.of((int) v);
  }

  private int layer(Card c, int at, int line) throws UnreadableFile {
    long v = Card.digits(c.columns(at + 1, at + 2));
    if (c.column(at) != 'L' || v < 0) {
      throw wrong("columns 75 to 80 are Lss and Lee, the layers of the span", c, line);
    }
    return (int) v;
  }

  private UnreadableFile wrong(String wanted, Card c, int line) {
    return reading.fail(
        line, "syntax", wanted + ", not '" + GerberLexer.printable(c.raw(33, 80)) + "'");
  }
}
