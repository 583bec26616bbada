package etchloom.write;

import java.util.List;
import java.util.Locale;

/**
 * The nine tables of a DXF file. All must be there, some with records that nobody uses; a viewport
 * makes viewers open at the board.
 */
final class DxfTables {
  private static final double MARGIN = 1.1;

  private final List<DxfFile.Layer> layers;
  private final int firstLayer;
  private final Box extents;

  /**
   * @param firstLayer handle of the first layer's record
   */
  DxfTables(List<DxfFile.Layer> layers, int firstLayer, Box extents) {
    this.layers = layers;
    this.firstLayer = firstLayer;
    this.extents = extents;
  }

  void write(StringBuilder s) {
    DxfFile.section(s, "TABLES");
    table(s, "VPORT", "8", 1);
    viewport(s);
    endTable(s);
    table(s, "LTYPE", "5", 3);
    lineType(s, "14", "ByBlock", "");
    lineType(s, "15", "ByLayer", "");
    lineType(s, "16", "Continuous", "Solid line");
    endTable(s);
    table(s, "LAYER", "2", layers.size() + 1);
    layer(s, "10", new DxfFile.Layer("0", 7));
    for (int i = 0; i < layers.size(); i++) {
      layer(s, Integer.toHexString(firstLayer + i).toUpperCase(Locale.ROOT), layers.get(i));
    }
    endTable(s);
    table(s, "STYLE", "3", 1);
    record(s, "STYLE", "11", "3", "AcDbTextStyleTableRecord", "Standard");
    tags(s, "40", "0.0", "41", "1.0", "50", "0.0", "71", "0", "42", "2.5", "3", "txt", "4", "");
    endTable(s);
    table(s, "VIEW", "6", 0);
    endTable(s);
    table(s, "UCS", "7", 0);
    endTable(s);
    table(s, "APPID", "9", 1);
    record(s, "APPID", "12", "9", "AcDbRegAppTableRecord", "ACAD");
    endTable(s);
    dimensionStyles(s);
    table(s, "BLOCK_RECORD", "1", 2);
    blockRecord(s, "1F", "*Model_Space");
    blockRecord(s, "1B", "*Paper_Space");
    endTable(s);
    DxfFile.end(s);
  }

  private void viewport(StringBuilder s) {
    record(s, "VPORT", "29", "8", "AcDbViewportTableRecord", "*ACTIVE");
    tags(s, "10", "0.0", "20", "0.0", "11", "1.0", "21", "1.0");
    tags(s, "12", Numbers.mm((extents.minX() + extents.maxX()) / 2));
    tags(s, "22", Numbers.mm((extents.minY() + extents.maxY()) / 2));
    tags(s, "13", "0.0", "23", "0.0", "14", "1.0", "24", "1.0", "15", "1.0", "25", "1.0");
    tags(s, "16", "0.0", "26", "0.0", "36", "1.0", "17", "0.0", "27", "0.0", "37", "0.0");
    tags(s, "40", Numbers.mm(extents.height() * MARGIN), "41", "1.5", "42", "50.0");
    tags(s, "43", "0.0", "44", "0.0", "50", "0.0", "51", "0.0", "71", "0", "72", "1000");
    tags(s, "73", "1", "74", "3", "75", "0", "76", "0", "77", "0", "78", "0");
  }

  private static void lineType(StringBuilder s, String handle, String name, String text) {
    record(s, "LTYPE", handle, "5", "AcDbLinetypeTableRecord", name);
    tags(s, "3", text, "72", "65", "73", "0", "40", "0.0");
  }

  private static void layer(StringBuilder s, String handle, DxfFile.Layer l) {
    record(s, "LAYER", handle, "2", "AcDbLayerTableRecord", l.name());
    tags(s, "62", Integer.toString(l.colour()), "6", "Continuous", "370", "-3");
  }

  /** Its records keep their handle under another code, and the table has a mark of its own. */
  private static void dimensionStyles(StringBuilder s) {
    table(s, "DIMSTYLE", "A", 1);
    tags(s, "100", "AcDbDimStyleTable", "0", "DIMSTYLE", "105", "27", "330", "A");
    tags(s, "100", "AcDbSymbolTableRecord", "100", "AcDbDimStyleTableRecord");
    tags(s, "2", "Standard", "70", "0", "340", "11");
    endTable(s);
  }

  private static void blockRecord(StringBuilder s, String handle, String name) {
    tags(s, "0", "BLOCK_RECORD", "5", handle, "330", "1", "100", "AcDbSymbolTableRecord");
    tags(s, "100", "AcDbBlockTableRecord", "2", name);
  }

  private static void record(
      StringBuilder s, String type, String handle, String owner, String subclass, String name) {
    tags(s, "0", type, "5", handle, "330", owner, "100", "AcDbSymbolTableRecord");
    tags(s, "100", subclass, "2", name, "70", "0");
  }

  private static void table(StringBuilder s, String name, String handle, int records) {
    tags(s, "0", "TABLE", "2", name, "5", handle, "330", "0", "100", "AcDbSymbolTable");
    tags(s, "70", Integer.toString(records));
  }

  private static void endTable(StringBuilder s) {
    tags(s, "0", "ENDTAB");
  }

  /** Codes and values in turn; codes stand at the right of three columns. */
  private static void tags(StringBuilder s, String... pairs) {
    for (int i = 0; i < pairs.length; i += 2) {
      s.append(" ".repeat(3 - pairs[i].length())).append(pairs[i]);
      s.append("\r\n").append(pairs[i + 1]).append("\r\n");
    }
  }
}
