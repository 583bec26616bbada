package etchloom.write;

import etchloom.artwork.Artwork;
import java.util.SortedMap;
import java.util.TreeMap;

/** Everything the artwork alone decides, as file names and bytes; nothing touches the disk. */
public final class LayerSet {
  private LayerSet() {}

  /**
   * @param art on the nanometre grid: {@code artwork.onGrid()}
   * @return by file name; reports, inputs and the manifest are the caller's to add
   * @throws IllegalArgumentException when a point is off the grid or beyond what a format can say
   */
  public static SortedMap<String, byte[]> write(Artwork art, OrderInfo info) {
    FileNames names = new FileNames(art.slug());
    SortedMap<String, byte[]> out = new TreeMap<>();
    new GerberLayers(art, info).write(out);
    XncWriter.write(art, out);
    out.put(names.job(), JobWriter.whole(art, info));
    return out;
  }
}
