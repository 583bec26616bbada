package etchloom.write;

import java.util.List;

/**
 * One DXF file in the making: the frame that every reader wants, layers, entities.
 *
 * <p>Release 2000 (AC1015), millimetres. Source: Autodesk DXF Reference 2000, sections HEADER,
 * TABLES, BLOCKS, ENTITIES and OBJECTS. Layouts and plot styles are left out, and with them all
 * pointers to them. Readers repair much in silence, so handles, owners and counts are kept whole
 * here.
 */
final class DxfFile {
  private static final String MODEL_SPACE = "1F";
  private static final String PAPER_SPACE = "1B";
  private static final int FIRST_ENTITY = 0x100;

  /** Fixed handles of the layer table's records start here. */
  private static final int FIRST_LAYER = 0x40;

  /** Largest layer count that fits before the entities. */
  private static final int MOST_LAYERS = FIRST_ENTITY - FIRST_LAYER;

  /** Names are also the layers'; the colour is an index of the format's own table. */
  record Layer(String name, int colour) {}

  private final StringBuilder body;
  private final List<Layer> layers;
  private final Box extents;
  private int handle = FIRST_ENTITY;

  /**
   * @param expected about how many characters the entities will take
   */
  DxfFile(List<Layer> layers, Box extents, int expected) {
    if (layers.size() >= MOST_LAYERS) {
      throw new IllegalArgumentException(layers.size() + " DXF layers are too many");
    }
    this.layers = List.copyOf(layers);
    this.extents = extents;
    body = new StringBuilder(expected);
  }

  /** A track: its centre line with a width, or a line without one where the width is 0. */
  void polyline(String layer, Trace t, boolean closed, long widthNm) {
    List<Trace.Step> steps = t.steps();
    int n = steps.size() + (closed ? 0 : 1);
    head("LWPOLYLINE", layer, "AcDbPolyline");
    tag(90, Integer.toString(n));
    tag(70, closed ? "1" : "0");
    mm(43, widthNm);
    long x = t.x();
    long y = t.y();
    for (Trace.Step s : steps) {
      vertex(x, y);
      if (s.arc()) {
        body.append(" 42\r\n");
        Numbers.ratio(body, StrictMath.tan(s.sweepRad(x, y) / 4));
        body.append("\r\n");
      }
      x = s.x();
      y = s.y();
    }
    if (!closed) {
      vertex(x, y);
    } else if (x != t.x() || y != t.y()) {
      throw new IllegalArgumentException("a closed outline ends elsewhere than it starts");
    }
  }

  void circle(String layer, long x, long y, long diameterNm) {
    head("CIRCLE", layer, "AcDbCircle");
    vertex(x, y);
    tag(30, "0.0");
    body.append(" 40\r\n");
    Numbers.half(body, diameterNm);
    body.append("\r\n");
  }

  private void vertex(long x, long y) {
    mm(10, x);
    mm(20, y);
  }

  private void mm(int code, long nm) {
    body.append(' ').append(code).append("\r\n");
    Numbers.mm(body, nm);
    body.append("\r\n");
  }

  private void head(String type, String layer, String subclass) {
    body.append("  0\r\n").append(type).append("\r\n  5\r\n");
    body.append(Integer.toHexString(handle++).toUpperCase(java.util.Locale.ROOT));
    body.append("\r\n330\r\n" + MODEL_SPACE + "\r\n100\r\nAcDbEntity\r\n  8\r\n");
    body.append(layer).append("\r\n100\r\n").append(subclass).append("\r\n");
  }

  private void tag(int code, String value) {
    tag(body, code, value);
  }

  private static void tag(StringBuilder s, int code, String value) {
    s.append(code < 10 ? "  " : code < 100 ? " " : "").append(code);
    s.append("\r\n").append(value).append("\r\n");
  }

  byte[] finish() {
    StringBuilder s = new StringBuilder(body.length() + 8_000);
    header(s);
    section(s, "CLASSES");
    end(s);
    new DxfTables(layers, FIRST_LAYER, extents).write(s);
    blocks(s);
    section(s, "ENTITIES");
    s.append(body);
    end(s);
    objects(s);
    tag(s, 0, "EOF");
    return Ascii.bytes(s);
  }

  private void header(StringBuilder s) {
    section(s, "HEADER");
    variable(s, "$ACADVER", 1, "AC1015");
    variable(s, "$DWGCODEPAGE", 3, "ANSI_1252");
    variable(s, "$INSUNITS", 70, "4");
    variable(s, "$MEASUREMENT", 70, "1");
    variable(s, "$LUNITS", 70, "2");
    corner(s, "$EXTMIN", extents.minX(), extents.minY());
    corner(s, "$EXTMAX", extents.maxX(), extents.maxY());
    variable(s, "$HANDSEED", 5, Integer.toHexString(handle).toUpperCase(java.util.Locale.ROOT));
    end(s);
  }

  private static void variable(StringBuilder s, String name, int code, String value) {
    tag(s, 9, name);
    tag(s, code, value);
  }

  private static void corner(StringBuilder s, String name, double x, double y) {
    variable(s, name, 10, Numbers.mm(x));
    tag(s, 20, Numbers.mm(y));
    tag(s, 30, "0.0");
  }

  private static void blocks(StringBuilder s) {
    section(s, "BLOCKS");
    block(s, "*Model_Space", MODEL_SPACE, "20", "21", false);
    block(s, "*Paper_Space", PAPER_SPACE, "1C", "1D", true);
    end(s);
  }

  private static void block(
      StringBuilder s, String name, String record, String begin, String end, boolean paper) {
    blockPart(s, "BLOCK", begin, record, paper, "AcDbBlockBegin");
    tag(s, 2, name);
    tag(s, 70, "0");
    tag(s, 10, "0.0");
    tag(s, 20, "0.0");
    tag(s, 30, "0.0");
    tag(s, 3, name);
    tag(s, 1, "");
    blockPart(s, "ENDBLK", end, record, paper, "AcDbBlockEnd");
  }

  private static void blockPart(
      StringBuilder s, String type, String handle, String record, boolean paper, String subclass) {
    tag(s, 0, type);
    tag(s, 5, handle);
    tag(s, 330, record);
    tag(s, 100, "AcDbEntity");
    if (paper) {
      tag(s, 67, "1");
    }
    tag(s, 8, "0");
    tag(s, 100, subclass);
  }

  private static void objects(StringBuilder s) {
    section(s, "OBJECTS");
    dictionary(s, "C", "0");
    tag(s, 3, "ACAD_GROUP");
    tag(s, 350, "D");
    dictionary(s, "D", "C");
    end(s);
  }

  private static void dictionary(StringBuilder s, String handle, String owner) {
    tag(s, 0, "DICTIONARY");
    tag(s, 5, handle);
    tag(s, 330, owner);
    tag(s, 100, "AcDbDictionary");
    tag(s, 281, "1");
  }

  static void section(StringBuilder s, String name) {
    tag(s, 0, "SECTION");
    tag(s, 2, name);
  }

  static void end(StringBuilder s) {
    tag(s, 0, "ENDSEC");
  }
}
