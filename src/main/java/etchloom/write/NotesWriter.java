package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import etchloom.artwork.Stackup;
import java.util.ArrayList;
import java.util.List;

/**
 * Order notes for the fab, in plain words: what the drawing files cannot say, and what a CAM
 * department would otherwise put right that is not wrong.
 */
final class NotesWriter {
  private static final int COLUMNS = 76;

  private final Artwork art;
  private final OrderInfo info;
  private final FileNames names;
  private final StringBuilder out = new StringBuilder(4_000);

  private NotesWriter(Artwork art, OrderInfo info) {
    this.art = art;
    this.info = info;
    names = new FileNames(art.slug());
  }

  static byte[] write(Artwork art, OrderInfo info) {
    return new NotesWriter(art, info).notes();
  }

  private byte[] notes() {
    if (art.draft()) {
      line("DRAFT: rules are broken. Not for production.");
      line("");
    }
    line("Order notes: " + art.title() + ", revision " + art.revision());
    info.created().ifPresent(c -> line("Date: " + c));
    line("Written by etchloom " + info.toolVersion() + "; rules: " + info.fabTitle() + ".");
    line("Lengths in mm. Layers and terminals as seen from L1, the top.");
    board();
    stackup();
    holes();
    copper();
    test();
    files();
    return Ascii.bytes(out);
  }

  private void board() {
    Box size = Box.of(art.profile().get(0));
    title("Board");
    row("Outline", mm(size.width()) + " x " + mm(size.height()));
    row("Copper layers", Integer.toString(art.layers()));
    row("Finished thickness", mm(info.boardThicknessMm()) + ", over the copper, without mask");
    row("Laminate", "Tg at least " + mm(info.laminateTgC()) + " C");
    row("Finish", info.finish());
    row("Solder mask", info.maskColour() + ", both sides; files show the openings");
    row("Vias", "tented on both sides, not plugged");
    row("Legend", "top side only");
  }

  private void stackup() {
    Stackup s = art.stackup();
    title("Stackup, from the top");
    for (int i = 0; i < s.layers(); i++) {
      Stackup.Copper c = s.copper().get(i);
      row(
          "L" + (i + 1),
          "copper, finished " + um(c.thicknessMm()) + " um, from " + mm(c.ounces()) + " oz");
      if (i < s.dielectricMm().size()) {
        row("", "dielectric " + mm(s.dielectricMm().get(i)));
      }
    }
    para(
        "The finished copper is what the winding's resistance was computed with. Please tell us"
            + " before production if yours differs.");
  }

  private void holes() {
    title("Holes, finished diameters, tolerance " + info.holeTolerance());
    tools(Holes.plated(art), "plated, wall at least " + um(art.stackup().platingMm()) + " um");
    tools(Holes.nonPlated(art), "not plated");
    para("The drill files hold the same holes as XNC; no slots, no blind or buried holes.");
  }

  private void tools(List<Holes.Tool> tools, String plating) {
    for (Holes.Tool t : tools) {
      String use =
          switch (t.function()) {
            case "ViaDrill" -> "vias";
            case "ComponentDrill" -> "terminals";
            default -> "mounting";
          };
      row(brief(Numbers.mm(t.diameterNm())), t.hits().size() + " holes, " + use + ", " + plating);
    }
  }

  private void copper() {
    title("Copper");
    row("Outer layers", drawn(info.outer()));
    if (art.layers() > 2) {
      info.inner().ifPresent(d -> row("Inner layers", drawn(d)));
    }
    para(
        "This is a winding: please leave the copper as drawn. No added copper (thieving, balancing,"
            + " logos, date codes in copper), no teardrops, no changed tracks or pads, no removed"
            + " inner-layer pads. Etch compensation is yours, towards the drawn widths.");
  }

  private void test() {
    title("Electrical test");
    para(
        "By design the winding is joined copper: "
            + info.circuits()
            + ". Test against the netlist: continuity within each net, isolation between different"
            + " nets. Please make no isolation test between terminals of one net: they are joined"
            + " by the winding.");
    List<String> marks = new ArrayList<>();
    for (Joint j : art.terminals()) {
      marks.add(j.mark());
    }
    if (!marks.isEmpty()) {
      para("Terminals in order: " + String.join(" ", marks) + ".");
    }
    if (!info.resistanceLines().isEmpty()) {
      para("Expected resistances:");
      info.resistanceLines().forEach(r -> line("  " + r));
    }
  }

  private void files() {
    title("Files");
    for (int layer = 1; layer <= art.layers(); layer++) {
      row("Copper L" + layer, names.copper(layer));
    }
    row("Mask", names.maskTop() + ", " + names.maskBottom());
    row("Legend", names.legendTop());
    row("Profile", names.profile());
    if (!Holes.plated(art).isEmpty()) {
      row("Plated holes", names.platedXnc());
    }
    if (!Holes.nonPlated(art).isEmpty()) {
      row("Non-plated holes", names.nonPlatedXnc());
    }
    row("Netlist", names.netlist());
    row("Job", names.job());
  }

  private static String drawn(OrderInfo.Drawn d) {
    return "track at least " + mm(d.trackMm()) + ", space at least " + mm(d.spaceMm());
  }

  private void title(String text) {
    line("");
    line(text);
    line("-".repeat(text.length()));
  }

  private void row(String name, String value) {
    line(name + " ".repeat(Math.max(1, 20 - name.length())) + value);
  }

  /** Text broken between words. */
  private void para(String text) {
    StringBuilder s = new StringBuilder(COLUMNS);
    for (String word : text.split(" ")) {
      if (s.length() > 0 && s.length() + 1 + word.length() > COLUMNS) {
        line(s.toString());
        s.setLength(0);
      }
      s.append(s.length() > 0 ? " " : "").append(word);
    }
    line(s.toString());
  }

  private void line(String text) {
    out.append(Ascii.plain(text)).append('\n');
  }

  /** A number as people write it: {@code 1.2}, {@code 84}. */
  private static String mm(double value) {
    return brief(Numbers.mm(value));
  }

  private static String um(double mm) {
    return brief(Numbers.fixed(Math.round(mm * 10_000), 1));
  }

  private static String brief(String number) {
    return number.endsWith(".0") ? number.substring(0, number.length() - 2) : number;
  }
}
