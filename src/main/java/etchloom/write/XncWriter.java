package etchloom.write;

import etchloom.artwork.Artwork;
import java.util.List;
import java.util.SortedMap;

/**
 * Drill files in XNC form, one for plated and one for non-plated holes, finished diameters.
 *
 * <p>Source: XNC Format Specification 2021.11. Every number carries a decimal point: without it
 * readers guess a zero suppression and {@code X10} becomes 0.010 mm.
 */
final class XncWriter {
  /** Longer tool numbers are read as tool and compensation. */
  private static final int LAST_TOOL = 99;

  private XncWriter() {}

  static void write(Artwork art, SortedMap<String, byte[]> out) {
    FileNames names = new FileNames(art.slug());
    List<Holes.Tool> plated = Holes.plated(art);
    if (!plated.isEmpty()) {
      String function = FileFunctions.plated(art.layers());
      out.put(names.platedXnc(), file(art, function, "Plated,PTH", plated));
    }
    List<Holes.Tool> nonPlated = Holes.nonPlated(art);
    if (!nonPlated.isEmpty()) {
      String function = FileFunctions.nonPlated(art.layers());
      out.put(names.nonPlatedXnc(), file(art, function, "NonPlated,NPTH", nonPlated));
    }
  }

  private static byte[] file(Artwork art, String function, String plating, List<Holes.Tool> tools) {
    if (tools.size() > LAST_TOOL) {
      throw new IllegalArgumentException(tools.size() + " drill sizes, XNC has room for 99");
    }
    StringBuilder s = new StringBuilder("M48\n");
    if (art.draft()) {
      s.append("; DRAFT: rules are broken, not for production\n");
    }
    s.append("; #@! TF.FileFunction,").append(function).append('\n');
    s.append("; #@! TF.SameCoordinates,").append(Project.coordinates(art)).append('\n');
    s.append("METRIC\n");
    int number = 0;
    for (Holes.Tool t : tools) {
      s.append("; #@! TA.AperFunction,").append(plating).append(',').append(t.function());
      s.append("\nT").append(Numbers.padded(++number, 2));
      s.append('C').append(Numbers.mm(t.diameterNm())).append('\n');
    }
    s.append("%\nG05\n");
    number = 0;
    for (Holes.Tool t : tools) {
      s.append('T').append(Numbers.padded(++number, 2)).append('\n');
      for (Holes.Hit h : t.hits()) {
        place(s, 'X', h.x());
        place(s, 'Y', h.y());
        s.append('\n');
      }
    }
    return Ascii.bytes(s.append("M30\n"));
  }

  /**
   * Always with its sign: from {@code X20.5} one reader guesses a zero suppression, decimal point
   * or not, for the 0 after digits; {@code X+20.5} leaves it nothing to guess.
   */
  private static void place(StringBuilder s, char axis, long nm) {
    s.append(axis);
    if (nm >= 0) {
      s.append('+');
    }
    Numbers.mm(s, nm);
  }
}
