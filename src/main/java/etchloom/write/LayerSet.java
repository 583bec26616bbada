package etchloom.write;

import etchloom.artwork.Artwork;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.ForkJoinTask;

/** Everything the artwork alone decides, as file names and bytes; nothing touches the disk. */
public final class LayerSet {
  private LayerSet() {}

  /**
   * All files of the set that do not need a report: layers, drill, netlist, drawings, notes, job,
   * and the fab's archive.
   *
   * @param art on the nanometre grid: {@code artwork.onGrid()}
   * @return by file name; reports, inputs and the manifest are the caller's to add
   * @throws IllegalArgumentException when a point is off the grid or beyond what a format can say
   */
  public static SortedMap<String, byte[]> write(Artwork art, OrderInfo info) {
    FileNames names = new FileNames(art.slug());
    ForkJoinTask<byte[]> outlines = ForkJoinTask.adapt(() -> DxfWriter.outlines(art)).fork();
    ForkJoinTask<byte[]> lines = ForkJoinTask.adapt(() -> DxfWriter.lines(art)).fork();
    ForkJoinTask<byte[]> picture = ForkJoinTask.adapt(() -> SvgWriter.write(art)).fork();
    SortedMap<String, byte[]> out = new TreeMap<>();
    new GerberLayers(art, info).write(out);
    XncWriter.write(art, out);
    out.put(names.netlist(), IpcWriter.write(art));
    out.put(names.notes(), NotesWriter.write(art, info));
    out.put(names.job(), JobWriter.whole(art, info));
    byte[] zip = FabZip.write(art, info, out);
    out.put(names.fabZip(), zip);
    out.put(names.picture(), picture.join());
    out.put(names.dxf(), lines.join());
    out.put(names.outlines(), outlines.join());
    return out;
  }
}
