package etchloom.proof.read;

import etchloom.proof.image.ApertureShape.Composite;
import etchloom.proof.image.ApertureShape.Part;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** An aperture macro: its statements as written, evaluated for each aperture that uses it. */
final class Macro {
  /** Bytes of macro text that weigh as much as one drawn piece when evaluated. */
  private static final int BYTES_A_PIECE = 4;

  private static final class Statement {
    final byte[] text;
    final int line;

    Statement(byte[] text, int line) {
      this.text = text;
      this.line = line;
    }
  }

  private final String name;
  private final Reading reading;
  private final List<Statement> statements = new ArrayList<>();
  private long size;

  Macro(String name, Reading reading) {
    this.name = name;
    this.reading = reading;
  }

  void add(byte[] text, int from, int to, int line) {
    byte[] copy = new byte[to - from];
    System.arraycopy(text, from, copy, 0, copy.length);
    statements.add(new Statement(copy, line));
    size += copy.length + BYTES_A_PIECE;
  }

  /**
   * @param parameters {@code $1} and on
   * @param unitMm length of one unit of the file
   */
  Composite shape(List<Double> parameters, double unitMm, int line) throws UnreadableFile {
    reading.charge(size / BYTES_A_PIECE, line);
    Map<Integer, Double> variables = new HashMap<>();
    for (int i = 0; i < parameters.size(); i++) {
      variables.put(i + 1, parameters.get(i));
    }
    MacroPrimitives primitives = new MacroPrimitives(reading, unitMm);
    List<Part> parts = new ArrayList<>();
    for (Statement s : statements) {
      int first = firstOf(s.text);
      if (first == '$') {
        assign(s, variables);
      } else if (first != '0') {
        parts.addAll(primitives.parts(values(s, variables), s.line));
      }
    }
    Composite shape = new Composite(name, parts);
    reading.charge(Placement.pieces(shape), line);
    return shape;
  }

  /** The first byte that is no blank; 0 stands for the comment, also when nothing is there. */
  private static int firstOf(byte[] text) {
    int i = 0;
    while (i < text.length && text[i] == ' ') {
      i++;
    }
    return i < text.length ? text[i] : '0';
  }

  private void assign(Statement s, Map<Integer, Double> variables) throws UnreadableFile {
    int equals = 0;
    while (equals < s.text.length && s.text[equals] != '=') {
      equals++;
    }
    int start = 0;
    while (s.text[start] != '$') {
      start++;
    }
    double number = Decimals.parse(s.text, start + 1, equals).orElse(0);
    if (!(number >= 1 && number <= Integer.MAX_VALUE && number == Math.rint(number))
        || equals >= s.text.length) {
      throw reading.fail(s.line, "macro-syntax", "a macro variable is set without $n=value");
    }
    variables.put((int) number, value(s, equals + 1, s.text.length, variables));
  }

  private double[] values(Statement s, Map<Integer, Double> variables) throws UnreadableFile {
    int count = 1;
    for (byte b : s.text) {
      count += b == ',' ? 1 : 0;
    }
    double[] out = new double[count];
    int n = 0;
    int start = 0;
    for (int i = 0; i <= s.text.length; i++) {
      if (i == s.text.length || s.text[i] == ',') {
        out[n++] = value(s, start, i, variables);
        start = i + 1;
      }
    }
    return out;
  }

  private double value(Statement s, int from, int to, Map<Integer, Double> variables)
      throws UnreadableFile {
    return MacroExpression.value(s.text, from, to, variables, reading, s.line);
  }
}
