package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.geometry.Point;
import etchloom.geometry.Segment;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/** A clean set, of which a test spoils some files, and what the proof then finds. */
final class EditedSet {
  private static final Artwork WHEEL = WrittenSets.smallWheel();
  private static final SortedMap<String, byte[]> WHEEL_FILES =
      WrittenSets.withoutSums(WrittenSets.write(WHEEL));
  private static final Artwork DELTA = WrittenSets.delta();
  private static final SortedMap<String, byte[]> DELTA_FILES =
      WrittenSets.withoutSums(WrittenSets.write(DELTA));

  final Artwork art;
  final SortedMap<String, byte[]> files;
  private ProofReport report;

  private EditedSet(Artwork art, SortedMap<String, byte[]> clean) {
    this.art = art;
    this.files = new TreeMap<>(clean);
  }

  String text(String suffix) {
    return WrittenSets.text(files.get(art.slug() + suffix));
  }

  EditedSet put(String suffix, String text) {
    files.put(art.slug() + suffix, text.getBytes(WrittenSets.ASCII));
    return this;
  }

  /** Replaces one appearance, which must be there. */
  EditedSet replace(String suffix, String from, String to) {
    String t = text(suffix);
    int at = t.indexOf(from);
    assertTrue(at >= 0, () -> "no '" + from + "' in " + suffix);
    return put(suffix, t.substring(0, at) + to + t.substring(at + from.length()));
  }

  /** A stroke at the end of a copper layer. */
  EditedSet draw(int layer, boolean dark, double widthMm, Point from, Point to) {
    return replace(
        copper(layer),
        "M02*",
        (dark ? "" : "%LPC*%\n")
            + "%ADD90C,"
            + widthMm
            + "*%\n%TO.N,"
            + art.conductors().get(0).net()
            + "*%\nD90*\n"
            + xy(from)
            + "D02*\nG01*\n"
            + xy(to)
            + "D01*\nM02*");
  }

  /** The set must not be changed any more. */
  ProofReport prove() {
    if (report == null) {
      report = Prover.prove(files, ProofExpectation.of(art));
    }
    return report;
  }

  /** The finding of a name on a layer that is nearest to a place. */
  ProofFinding mustFind(String name, int layer, Point at, double withinMm) {
    ProofReport r = prove();
    String all = String.join("\n", r.findings().stream().map(ProofFinding::text).toList());
    ProofFinding best =
        r.findings().stream()
            .filter(f -> f.name().equals(name))
            .filter(f -> f.layer().equals(layer == 0 ? "" : "L" + layer))
            .filter(f -> f.at().isPresent())
            .min((f, g) -> Double.compare(away(f, at), away(g, at)))
            .orElse(null);
    assertTrue(best != null, () -> "no " + name + " on L" + layer + " in\n" + all);
    assertTrue(away(best, at) <= withinMm, () -> name + " is not at " + at + "\n" + all);
    return best;
  }

  private static double away(ProofFinding f, Point at) {
    return f.at().orElseThrow().distanceTo(at);
  }

  /** The filter wheel with few turns. */
  static EditedSet wheel() {
    return new EditedSet(WHEEL, WHEEL_FILES);
  }

  static EditedSet delta() {
    return new EditedSet(DELTA, DELTA_FILES);
  }

  static String copper(int layer) {
    return "-copper-L" + layer + ".gbr";
  }

  static String xy(Point p) {
    return "X" + Math.round(p.x() * 1e6) + "Y" + Math.round(p.y() * 1e6);
  }

  /** The line of a file by which a piece is drawn, without its operation. */
  static String drawTo(Segment s, String file) {
    String to = xy(s.end());
    int at = file.indexOf(to);
    assertTrue(at >= 0, () -> "no draw to " + to);
    return file.substring(at, file.indexOf("D0", at));
  }

  /** Cuts an entity of a layer out of a DXF file: from its kind to the next entity's. */
  static String withoutEntity(String dxf, String layer, int which) {
    int at = dxf.indexOf("ENTITIES");
    for (int k = 0; k <= which; k++) {
      at =
          dxf.indexOf("\n" + layer + "\r\n", at + 1) > 0
              ? dxf.indexOf("\n" + layer + "\r\n", at + 1)
              : dxf.indexOf("\n" + layer + "\n", at + 1);
    }
    int from = Math.max(dxf.lastIndexOf("\nLWPOLYLINE", at), dxf.lastIndexOf("\nCIRCLE", at));
    from = dxf.lastIndexOf('\n', from - 1) + 1;
    int to = Math.min(after(dxf, "\nLWPOLYLINE", at), after(dxf, "\nCIRCLE", at));
    to = dxf.lastIndexOf('\n', to - 1) + 1;
    return dxf.substring(0, from) + dxf.substring(to);
  }

  private static int after(String text, String word, int at) {
    int found = text.indexOf(word, at);
    return found < 0 ? Integer.MAX_VALUE : found;
  }

  static ProofFinding only(ProofReport r, String name) {
    List<ProofFinding> some = r.findings().stream().filter(f -> f.name().equals(name)).toList();
    assertEquals(1, some.size(), () -> r.findings().toString());
    return some.get(0);
  }
}
