package etchloom.proof.read;

import etchloom.proof.image.NetlistFile;
import etchloom.proof.image.NetlistFile.NetLine;
import etchloom.proof.image.NetlistFile.TestPoint;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Reads bare-board netlists after IPC-D-356A: parameters, net name aliases, test records (3x7 and
 * their 0x7 continuations), conductors (378) and outlines (389). Adjacency (379) and in-board parts
 * (370) are passed over.
 */
public final class NetlistReader {
  /** The standard's records end here. */
  private static final int CARD = 80;

  private final Reading reading;
  private final NetUnits units;
  private final Map<String, String> header = new LinkedHashMap<>();
  private final Map<String, String> aliases = new HashMap<>();
  private final List<TestPoint> points = new ArrayList<>();
  private final List<NetLine> lines = new ArrayList<>();
  private final NetRecords records;
  private NetPen pen;
  private boolean known;

  private NetlistReader(Reading reading) {
    this.reading = reading;
    this.units = new NetUnits(reading);
    this.records = new NetRecords(reading, units);
  }

  /**
   * @param name for messages
   * @throws UnreadableFile at the first thing that cannot be read
   */
  public static NetlistFile read(String name, byte[] bytes) throws UnreadableFile {
    return new NetlistReader(new Reading(name)).file(bytes);
  }

  private NetlistFile file(byte[] bytes) throws UnreadableFile {
    Lines in = new Lines(bytes);
    boolean ended = false;
    while (!ended && in.next()) {
      ended = record(new Card(in.text()), in.line);
    }
    if (!known) {
      throw reading.fail(0, "not-a-netlist", "there is no record of an IPC-D-356A netlist");
    }
    if (!ended) {
      throw reading.fail(in.line, "missing-end", "the netlist does not end in 999");
    }
    endPen();
    return new NetlistFile(
        reading.file(),
        Collections.unmodifiableMap(header),
        points.stream().map(this::named).toList(),
        lines.stream().map(this::named).toList(),
        reading.warnings());
  }

  /** Obeys one record; true for the last. */
  private boolean record(Card card, int line) throws UnreadableFile {
    if (card.columns(1, CARD).isEmpty()) {
      return false;
    }
    if (card.length() > CARD) {
      reading.warnOnce(line, "card-length", "a record of more than 80 columns");
    }
    char first = card.column(1);
    if (first == 'C' || first == 'P') {
      known = true;
      if (first == 'P') {
        parameter(card, line);
      }
      return false;
    }
    long op = Card.digits(card.raw(1, 3));
    if (op < 0 || card.raw(1, 3).length() < 3) {
      throw reading.fail(
          line,
          "syntax",
          "a record starts with C, P or three digits, not with '"
              + GerberLexer.printable(card.raw(1, 10))
              + "'");
    }
    known = true;
    return op == 999 || operation((int) op, card, line);
  }

  private boolean operation(int op, Card card, int line) throws UnreadableFile {
    switch (op) {
      case 307, 317, 327, 337, 347, 357, 367 -> {
        endPen();
        put(records.point(op, card, line), line);
      }
      case 7, 17, 27, 37, 47, 57, 67 -> {
        if (points.isEmpty() || pen != null) {
          throw reading.fail(line, "continuation", "a continuation without a test record above");
        }
        put(records.continued(points.get(points.size() - 1), op, card, line), line);
      }
      case 378, 389 -> {
        endPen();
        pen = new NetPen(reading, units, op, card, line);
      }
      case 78, 89 -> {
        if (pen == null || !pen.continuedBy(op)) {
          throw reading.fail(line, "continuation", "a continuation without its record above");
        }
        pen.points(card.rest(4), line);
      }
      case 370, 70, 379, 79, 90, 99, 390, 399 -> endPen();
      default -> {
        endPen();
        reading.warn(line, "unknown-record", "records " + op + " are not read");
      }
    }
    return false;
  }

  private void put(TestPoint point, int line) throws UnreadableFile {
    // Strings and boxed numbers weigh more than a drawn piece.
    reading.charge(4, line);
    points.add(point);
  }

  private void endPen() throws UnreadableFile {
    if (pen != null) {
      lines.add(pen.finished());
      pen = null;
    }
  }

  private void parameter(Card card, int line) throws UnreadableFile {
    reading.charge(2, line);
    String name = card.columns(4, 9);
    if (card.raw(4, 8).equals("NNAME")) {
      String alias = card.columns(4, 13);
      if (alias.length() > 5) {
        aliases.put(alias, card.columns(15, 72));
      }
      return;
    }
    if (name.equals("UNITS")) {
      units.set(card.columns(10, 72), line);
    }
    if (!name.isEmpty()) {
      header.put(name, card.columns(10, 72));
    }
  }

  private String net(String written) {
    return aliases.getOrDefault(written, written);
  }

  private TestPoint named(TestPoint p) {
    return new TestPoint(
        p.operation(),
        net(p.net()),
        p.refdes(),
        p.pin(),
        p.mid(),
        p.holeMm(),
        p.plating(),
        p.access(),
        p.at(),
        p.widthMm(),
        p.heightMm(),
        p.rotationRad(),
        p.mask(),
        p.fromLayer(),
        p.toLayer(),
        p.line());
  }

  private NetLine named(NetLine l) {
    return new NetLine(l.operation(), net(l.name()), l.layer(), l.widthMm(), l.paths(), l.line());
  }
}
