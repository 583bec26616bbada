package etchloom.write;

import com.fasterxml.jackson.core.JsonGenerator;
import etchloom.artwork.Artwork;
import etchloom.artwork.Stackup;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The Gerber job file: the board as a whole, and what each layer file is.
 *
 * <p>Source: Gerber Job Format Specification 2020.08. Copper and dielectrics alone add up to {@code
 * BoardThickness}, which is ordered over the copper; the masks are listed without a thickness. The
 * creation date is left out unless one is given, so that equal input gives equal bytes.
 */
final class JobWriter {
  private final Artwork art;
  private final OrderInfo info;
  private final FileNames names;

  private JobWriter(Artwork art, OrderInfo info) {
    this.art = art;
    this.info = info;
    names = new FileNames(art.slug());
  }

  /** For the whole set: the drill files as Gerber. */
  static byte[] whole(Artwork art, OrderInfo info) {
    return new JobWriter(art, info).job(false);
  }

  /** For the fab: the drill files as XNC. */
  static byte[] fab(Artwork art, OrderInfo info) {
    return new JobWriter(art, info).job(true);
  }

  private record Entry(String path, String function, boolean positive) {}

  private List<Entry> entries(boolean xnc) {
    List<Entry> out = new ArrayList<>();
    for (int layer = 1; layer <= art.layers(); layer++) {
      out.add(new Entry(names.copper(layer), FileFunctions.copper(layer, art.layers()), true));
    }
    out.add(new Entry(names.maskTop(), FileFunctions.MASK_TOP, false));
    out.add(new Entry(names.maskBottom(), FileFunctions.MASK_BOTTOM, false));
    out.add(new Entry(names.legendTop(), FileFunctions.LEGEND_TOP, true));
    out.add(new Entry(names.profile(), FileFunctions.PROFILE, true));
    if (!Holes.plated(art).isEmpty()) {
      String name = xnc ? names.platedXnc() : names.platedGerber();
      out.add(new Entry(name, FileFunctions.plated(art.layers()), true));
    }
    if (!Holes.nonPlated(art).isEmpty()) {
      String name = xnc ? names.nonPlatedXnc() : names.nonPlatedGerber();
      out.add(new Entry(name, FileFunctions.nonPlated(art.layers()), true));
    }
    return out;
  }

  private byte[] job(boolean xnc) {
    return Json.write(
        g -> {
          g.writeStartObject();
          header(g);
          general(g);
          rules(g);
          files(g, entries(xnc));
          stackup(g);
          g.writeEndObject();
        });
  }

  private void header(JsonGenerator g) throws IOException {
    g.writeObjectFieldStart("Header");
    g.writeObjectFieldStart("GenerationSoftware");
    g.writeStringField("Vendor", Project.VENDOR);
    g.writeStringField("Application", Project.APPLICATION);
    g.writeStringField("Version", info.toolVersion());
    g.writeEndObject();
    if (info.created().isPresent()) {
      g.writeStringField("CreationDate", info.created().get().toString());
    }
    if (!comment().isEmpty()) {
      g.writeStringField("Comment", comment());
    }
    g.writeEndObject();
  }

  private String comment() {
    List<String> parts = new ArrayList<>();
    if (art.draft()) {
      parts.add("DRAFT: rules are broken, not for production");
    }
    parts.addAll(info.resistanceLines());
    return String.join("; ", parts);
  }

  private void general(JsonGenerator g) throws IOException {
    Box size = Box.of(art.profile().get(0));
    g.writeObjectFieldStart("GeneralSpecs");
    g.writeObjectFieldStart("ProjectId");
    g.writeStringField("Name", art.title());
    g.writeStringField("GUID", Project.guid(art));
    g.writeStringField("Revision", art.revision());
    g.writeEndObject();
    g.writeObjectFieldStart("Size");
    number(g, "X", size.width());
    number(g, "Y", size.height());
    g.writeEndObject();
    g.writeNumberField("LayerNumber", art.layers());
    number(g, "BoardThickness", info.boardThicknessMm());
    g.writeStringField("Finish", info.finish());
    g.writeEndObject();
  }

  private void rules(JsonGenerator g) throws IOException {
    g.writeArrayFieldStart("DesignRules");
    rule(g, "Outer", info.outer());
    if (art.layers() > 2 && info.inner().isPresent()) {
      rule(g, "Inner", info.inner().get());
    }
    g.writeEndArray();
  }

  private static void rule(JsonGenerator g, String layers, OrderInfo.Drawn d) throws IOException {
    g.writeStartObject();
    g.writeStringField("Layers", layers);
    number(g, "PadToPad", d.padMm().orElse(d.spaceMm()));
    number(g, "PadToTrack", d.spaceMm());
    number(g, "TrackToTrack", d.spaceMm());
    number(g, "MinLineWidth", d.trackMm());
    g.writeEndObject();
  }

  private static void files(JsonGenerator g, List<Entry> entries) throws IOException {
    g.writeArrayFieldStart("FilesAttributes");
    for (Entry e : entries) {
      g.writeStartObject();
      g.writeStringField("Path", e.path);
      g.writeStringField("FileFunction", e.function);
      g.writeStringField("FilePolarity", e.positive ? "Positive" : "Negative");
      g.writeEndObject();
    }
    g.writeEndArray();
  }

  private void stackup(JsonGenerator g) throws IOException {
    g.writeArrayFieldStart("MaterialStackup");
    layer(g, "Legend", "Legend top");
    g.writeEndObject();
    mask(g, "Mask top");
    Stackup s = art.stackup();
    for (int i = 0; i < s.layers(); i++) {
      layer(g, "Copper", "L" + (i + 1));
      number(g, "Thickness", s.copper().get(i).thicknessMm());
      g.writeStringField("Notes", "finished copper");
      g.writeEndObject();
      if (i < s.dielectricMm().size()) {
        layer(g, "Dielectric", "Dielectric L" + (i + 1) + "/L" + (i + 2));
        number(g, "Thickness", s.dielectricMm().get(i));
        g.writeStringField("Notes", "Tg at least " + Numbers.mm(info.laminateTgC()) + " C");
        g.writeEndObject();
      }
    }
    mask(g, "Mask bottom");
    g.writeEndArray();
  }

  private void mask(JsonGenerator g, String name) throws IOException {
    layer(g, "SolderMask", name);
    String c = info.maskColour();
    if (!c.isEmpty()) {
      g.writeStringField("Color", c.substring(0, 1).toUpperCase(Locale.ROOT) + c.substring(1));
    }
    g.writeEndObject();
  }

  private static void layer(JsonGenerator g, String type, String name) throws IOException {
    g.writeStartObject();
    g.writeStringField("Type", type);
    g.writeStringField("Name", name);
  }

  private static void number(JsonGenerator g, String key, double mm) throws IOException {
    g.writeFieldName(key);
    g.writeNumber(new BigDecimal(Numbers.mm(mm)));
  }
}
