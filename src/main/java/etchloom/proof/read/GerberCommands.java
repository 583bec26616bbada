package etchloom.proof.read;

import etchloom.geometry.Point;
import etchloom.proof.image.ApertureShape;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * The commands between {@code %} signs. Sections 4.1 to 4.12 and 5, and the deprecated ones of 8.
 */
final class GerberCommands {
  /** Deprecated commands and the only value of each that leaves the image as it is. */
  private static final Set<String> HARMLESS =
      Set.of(
          "IPPOS",
          "ASAXBY",
          "IR0",
          "MIA0B0",
          "MI",
          "OF",
          "OFA0B0",
          "OFA0.0B0.0",
          "SF",
          "SFA1B1",
          "SFA1.0B1.0");

  private static final Set<String> DEPRECATED = Set.of("IP", "AS", "IR", "MI", "OF", "SF");

  private final Reading reading;
  private final byte[] bytes;
  private final GerberLexer lexer;
  private final GerberFormat format;
  private final GerberPlotter plotter;
  private final AttributeStore attributes;
  private final ApertureParser parser;

  private Macro openMacro;
  private boolean mirrorX;
  private boolean mirrorY;
  private double rotationDeg;
  private double scale = 1;

  GerberCommands(
      Reading reading,
      byte[] bytes,
      GerberLexer lexer,
      GerberFormat format,
      GerberPlotter plotter,
      AttributeStore attributes) {
    this.reading = reading;
    this.bytes = bytes;
    this.lexer = lexer;
    this.format = format;
    this.plotter = plotter;
    this.attributes = attributes;
    this.parser = new ApertureParser(reading);
  }

  /** Obeys the lexer's block. */
  void command() throws UnreadableFile {
    int line = lexer.line;
    if (!lexer.first && openMacro != null) {
      openMacro.add(lexer.text, lexer.from, lexer.to, line);
      return;
    }
    openMacro = null;
    if (!lexer.first) {
      reading.warnOnce(line, "deprecated", "several commands between one pair of % signs");
    }
    if (lexer.to - lexer.from < 2) {
      throw unknown();
    }
    char a = (char) lexer.text[lexer.from];
    char b = (char) lexer.text[lexer.from + 1];
    if (a == 'T') {
      attribute(line);
      return;
    }
    switch ("" + a + b) {
      case "FS" -> format.fs(lexer.text, lexer.from, lexer.to, lexer.shown(), line);
      case "MO" -> unit(line);
      case "AD" -> aperture(line);
      case "AM" -> openMacro = parser.newMacro(rest(2), line);
      case "AB" -> block(line);
      case "SR" -> repeat(line);
      case "LP" -> polarity(line);
      case "LM", "LR", "LS" -> transform(b, line);
      default -> deprecated("" + a + b, line);
    }
  }

  private String rest(int skip) {
    return AttributeStore.decode(lexer.text, lexer.from + skip, lexer.to).strip();
  }

  private UnreadableFile unknown() {
    return reading.fail(lexer.line, "unknown-command", "unknown command %" + lexer.shown());
  }

  private void attribute(int line) throws UnreadableFile {
    if (plotter.inRegion()) {
      reading.warnOnce(line, "in-region", "an attribute within a region");
    }
    String text = rest(0);
    attributes.command(text, line);
    if (text.startsWith("TF.MD5,")) {
      checkSum(text.substring(7), line);
    }
  }

  private void checkSum(String wanted, int line) {
    try {
      MessageDigest md5 = MessageDigest.getInstance("MD5");
      int start = 0;
      for (int i = 0; i <= lexer.commandStart; i++) {
        if (i == lexer.commandStart || bytes[i] == '\n' || bytes[i] == '\r') {
          md5.update(bytes, start, i - start);
          start = i + 1;
        }
      }
      String found = HexFormat.of().formatHex(md5.digest());
      if (!found.equals(wanted.toLowerCase(Locale.ROOT))) {
        reading.warn(line, "md5-mismatch", "the file's MD5 is " + found + ", it says " + wanted);
      }
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has MD5", e);
    }
  }

  private void unit(int line) throws UnreadableFile {
    switch (rest(2)) {
      case "MM" -> format.unit(false, line);
      case "IN" -> format.unit(true, line);
      default -> throw unknown();
    }
  }

  private void aperture(int line) throws UnreadableFile {
    plotter.outsideRegion("an aperture definition", line);
    int p = lexer.from + 2;
    if (p >= lexer.to || lexer.text[p] != 'D') {
      throw unknown();
    }
    int digits = p + 1;
    int i = digits;
    while (i < lexer.to && Decimals.digit(lexer.text[i])) {
      i++;
    }
    int number = number(digits, i, line);
    double unitMm = format.unitMm(line);
    ApertureShape shape = parser.shape(lexer.text, i, lexer.to, unitMm, line);
    plotter.define(Aperture.of(number, shape, attributes.apertureNow(line)), line);
  }

  private int number(int from, int to, int line) throws UnreadableFile {
    double n = Decimals.parse(lexer.text, from, to).orElse(-1);
    if (!(n >= 10 && n <= Integer.MAX_VALUE && n == Math.rint(n))) {
      throw reading.fail(
          line, "aperture-number", "aperture numbers start at D10: " + lexer.shown());
    }
    return (int) n;
  }

  private void block(int line) throws UnreadableFile {
    plotter.outsideRegion("a block", line);
    plotter.settle();
    if (lexer.to - lexer.from == 2) {
      plotter.define(plotter.sink().closeBlock(attributes, line), line);
    } else if (lexer.text[lexer.from + 2] == 'D') {
      plotter.sink().openBlock(number(lexer.from + 3, lexer.to, line), line);
    } else {
      throw unknown();
    }
  }

  private void repeat(int line) throws UnreadableFile {
    plotter.outsideRegion("step and repeat", line);
    plotter.settle();
    if (plotter.sink().repeating()) {
      plotter.sink().closeRepeat(line);
    }
    if (lexer.to - lexer.from == 2) {
      return;
    }
    double nx = valueAfter('X', 1, line);
    double ny = valueAfter('Y', 1, line);
    Point step = new Point(valueAfter('I', 0, line), valueAfter('J', 0, line));
    boolean whole = nx == Math.rint(nx) && ny == Math.rint(ny);
    double most = Reading.MAX_MM * 10;
    boolean near = Math.abs(step.x()) * nx <= most && Math.abs(step.y()) * ny <= most;
    if (!(whole && nx >= 1 && ny >= 1 && nx * ny <= Reading.MAX_PIECES && near)) {
      throw reading.fail(line, "repeat", "cannot repeat by " + lexer.shown());
    }
    if (nx > 1 || ny > 1) {
      Point stepMm = step.times(format.unitMm(line));
      plotter.sink().openRepeat((int) nx, (int) ny, stepMm, line);
    }
  }

  private double valueAfter(char letter, double otherwise, int line) throws UnreadableFile {
    int i = lexer.from + 2;
    while (i < lexer.to && lexer.text[i] != letter) {
      i++;
    }
    if (i == lexer.to) {
      return otherwise;
    }
    int start = i + 1;
    int stop = start;
    while (stop < lexer.to && (lexer.text[stop] < 'A' || lexer.text[stop] > 'Z')) {
      stop++;
    }
    OptionalDouble v = Decimals.parse(lexer.text, start, stop);
    if (v.isEmpty()) {
      throw reading.fail(line, "syntax", "no number after " + letter + " in " + lexer.shown());
    }
    return v.getAsDouble();
  }

  private void polarity(int line) throws UnreadableFile {
    switch (rest(2)) {
      case "D" -> plotter.polarity(true, line);
      case "C" -> plotter.polarity(false, line);
      default -> throw unknown();
    }
  }

  private void transform(char kind, int line) throws UnreadableFile {
    plotter.outsideRegion("L" + kind, line);
    String text = rest(2);
    if (kind == 'M') {
      if (!List.of("N", "X", "Y", "XY").contains(text)) {
        throw unknown();
      }
      mirrorX = text.startsWith("X");
      mirrorY = text.endsWith("Y");
    } else {
      OptionalDouble v = Decimals.parse(lexer.text, lexer.from + 2, lexer.to);
      boolean fine = kind == 'R' || (v.orElse(0) >= 1e-6 && v.orElse(0) <= 1e6);
      if (v.isEmpty() || !fine) {
        throw unknown();
      }
      rotationDeg = kind == 'R' ? v.getAsDouble() : rotationDeg;
      scale = kind == 'S' ? v.getAsDouble() : scale;
    }
    plotter.placement(Placement.of(mirrorX, mirrorY, rotationDeg, scale));
  }

  private void deprecated(String code, int line) throws UnreadableFile {
    String all = rest(0);
    if (code.equals("IN") || code.equals("LN") || HARMLESS.contains(all)) {
      reading.warnOnce(line, "deprecated", code + " is deprecated and changes nothing here");
      return;
    }
    if (DEPRECATED.contains(code)) {
      throw reading.fail(
          line, "deprecated", "the deprecated command " + lexer.shown() + " changes the image");
    }
    throw unknown();
  }
}
