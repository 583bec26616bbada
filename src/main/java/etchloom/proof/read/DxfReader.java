package etchloom.proof.read;

import etchloom.proof.image.DxfFile;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Reads DXF files of text form, R12 and later: LINE, ARC, CIRCLE, TEXT and both kinds of polyline
 * of model space. Entities of other kinds are counted in a warning; blocks are not inserted.
 *
 * <p>Source: the DXF Reference of R12 and of 2000, by group code.
 */
public final class DxfReader {
  /** {@code $INSUNITS} to mm. */
  private static final Map<Integer, Double> UNITS =
      Map.ofEntries(
          Map.entry(1, 25.4),
          Map.entry(2, 304.8),
          Map.entry(4, 1.0),
          Map.entry(5, 10.0),
          Map.entry(6, 1000.0),
          Map.entry(8, 25.4e-6),
          Map.entry(9, 25.4e-3),
          Map.entry(10, 914.4),
          Map.entry(12, 1e-6),
          Map.entry(13, 1e-3),
          Map.entry(14, 100.0));

  private static final int MAX_LAYERS = 10_000;

  private final Reading reading;
  private final DxfPairs pairs;
  private final DxfEntities entities;
  private final List<String> layers = new ArrayList<>();
  private String version = "";
  private int units;
  private boolean drawn;

  private DxfReader(Reading reading, byte[] bytes) {
    this.reading = reading;
    this.pairs = new DxfPairs(bytes, reading);
    this.entities = new DxfEntities(reading);
  }

  /**
   * @param name for messages
   * @throws UnreadableFile at the first thing that cannot be read
   */
  public static DxfFile read(String name, byte[] bytes) throws UnreadableFile {
    Reading reading = new Reading(name);
    for (int i = 0; i < Math.min(bytes.length, 64); i++) {
      if (bytes[i] == 0) {
        throw reading.fail(0, "binary", "binary DXF is not read, only its text form");
      }
    }
    return new DxfReader(reading, bytes).file();
  }

  private DxfFile file() throws UnreadableFile {
    boolean ended = false;
    while (!ended) {
      need(pairs.next());
      if (pairs.code != 0 || !(pairs.is("SECTION") || pairs.is("EOF"))) {
        throw reading.fail(pairs.line, "dxf", "a SECTION is wanted, not " + pairs.shown());
      }
      ended = pairs.is("EOF");
      if (!ended) {
        need(pairs.next());
        section(pairs.code == 2 ? pairs.text().strip() : "");
      }
    }
    if (!drawn) {
      throw reading.fail(0, "dxf", "the file has no ENTITIES section");
    }
    entities.finish(pairs.line);
    Set<String> declared = new HashSet<>(layers);
    for (String layer : entities.layersUsed()) {
      if (!declared.contains(layer) && !layer.equals("0")) {
        reading.warn(0, "dxf-layer", "layer " + layer + " is used but not in the layer table");
      }
    }
    return new DxfFile(reading.file(), version, layers, entities.entities(), reading.warnings());
  }

  private void need(boolean more) throws UnreadableFile {
    if (!more) {
      throw reading.fail(pairs.line, "missing-end", "the file does not end in EOF");
    }
  }

  private void section(String name) throws UnreadableFile {
    switch (name) {
      case "HEADER" -> header();
      case "TABLES" -> tables();
      case "ENTITIES" -> drawing();
      default -> skip();
    }
  }

  private boolean inSection() throws UnreadableFile {
    need(pairs.next());
    if (pairs.code == 0 && pairs.is("EOF")) {
      throw reading.fail(pairs.line, "dxf", "the file ends within a section");
    }
    return pairs.code != 0 || !pairs.is("ENDSEC");
  }

  private void skip() throws UnreadableFile {
    while (inSection()) {
      // Nothing of the other sections is drawn.
    }
  }

  private void header() throws UnreadableFile {
    String variable = "";
    while (inSection()) {
      if (pairs.code == 9) {
        variable = pairs.text().strip();
      } else if (variable.equals("$ACADVER") && pairs.code == 1) {
        version = pairs.text().strip();
      } else if (variable.equals("$INSUNITS") && pairs.code == 70) {
        units = pairs.whole();
      }
    }
  }

  private void tables() throws UnreadableFile {
    boolean layer = false;
    while (inSection()) {
      if (pairs.code == 0) {
        layer = pairs.is("LAYER");
      } else if (layer && pairs.code == 2) {
        if (layers.size() == MAX_LAYERS) {
          throw reading.fail(pairs.line, "too-large", "more than " + MAX_LAYERS + " layers");
        }
        layers.add(pairs.text().strip());
        layer = false;
      }
    }
  }

  private void drawing() throws UnreadableFile {
    drawn = true;
    Double mm = UNITS.get(units);
    if (mm == null) {
      reading.warn(
          pairs.line, "unit", "the drawing's unit (" + units + ") is not known; taken as mm");
    }
    entities.unit(mm == null ? 1 : mm);
    DxfDraft draft = null;
    while (inSection()) {
      if (pairs.code != 0) {
        if (draft == null) {
          throw reading.fail(pairs.line, "dxf", "an entity starts with its kind, group code 0");
        }
        draft.take(pairs, reading);
        continue;
      }
      if (draft != null) {
        entities.add(draft);
      }
      draft = new DxfDraft(pairs.text().strip(), pairs.line);
    }
    if (draft != null) {
      entities.add(draft);
    }
  }
}
