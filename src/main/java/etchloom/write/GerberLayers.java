package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Opening;
import etchloom.artwork.Stroke;
import etchloom.geometry.Grid;
import etchloom.geometry.Path;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;

/**
 * The board's layers as Gerber X2 files.
 *
 * <p>Tracks are draws of function {@code Conductor} along exact lines and arcs, every pad is a
 * flash. A winding is one piece of copper from terminal to terminal, so its net is one name; turns
 * are never told apart by nets.
 */
final class GerberLayers {
  /** Pen of the profile; its centre line is the edge. */
  private static final long PROFILE_PEN_NM = 100_000;

  private final Artwork art;
  private final OrderInfo info;
  private final FileNames names;

  GerberLayers(Artwork art, OrderInfo info) {
    this.art = art;
    this.info = info;
    names = new FileNames(art.slug());
  }

  void write(SortedMap<String, byte[]> out) {
    for (int layer = 1; layer <= art.layers(); layer++) {
      out.put(names.copper(layer), copper(layer));
    }
    out.put(
        names.maskTop(), mask("Solder mask openings, top", FileFunctions.MASK_TOP, art.maskTop()));
    out.put(
        names.maskBottom(),
        mask("Solder mask openings, bottom", FileFunctions.MASK_BOTTOM, art.maskBottom()));
    out.put(names.legendTop(), legend());
    out.put(names.profile(), profile());
    List<Holes.Tool> plated = Holes.plated(art);
    if (!plated.isEmpty()) {
      out.put(
          names.platedGerber(),
          drill("Plated holes, finished sizes", FileFunctions.plated(art.layers()), plated));
    }
    List<Holes.Tool> nonPlated = Holes.nonPlated(art);
    if (!nonPlated.isEmpty()) {
      out.put(
          names.nonPlatedGerber(),
          drill("Non-plated holes", FileFunctions.nonPlated(art.layers()), nonPlated));
    }
  }

  private byte[] copper(int layer) {
    GerberFile f =
        file(
            "Copper, layer " + layer + " of " + art.layers(),
            FileFunctions.copper(layer, art.layers()),
            true);
    for (Conductor c : art.conductorsOn(layer)) {
      f.net(Optional.of(c.net()));
      for (Conductor.Stretch s : c.stretches()) {
        f.draw(gerber(s.path()), "Conductor", Grid.nm(s.widthMm()));
      }
    }
    for (Joint j : art.padsOn(layer)) {
      f.net(Optional.of(j.net()));
      long[] at = Trace.steps(j.at());
      long size = Grid.nm(j.padMm());
      if (j.terminal()) {
        f.terminal(at[0], at[1], terminalFunction(j), size, j.mark());
      } else {
        // A node that joins two tracks of one layer is no via: nothing is drilled there.
        f.flash(at[0], at[1], j.hole().isPresent() ? "ViaPad" : "Conductor", size);
      }
    }
    return f.finish();
  }

  /** A bare pad is soldered on its surface, and the mask's opening is larger than its copper. */
  private static String terminalFunction(Joint j) {
    return j.hole().isPresent() ? "ComponentPad" : "SMDPad,CuDef";
  }

  /** Openings are drawn, so the polarity is negative; pad functions are not allowed here. */
  private byte[] mask(String what, String function, List<Opening> openings) {
    GerberFile f = file(what, function, false);
    for (Opening o : openings) {
      long[] at = Trace.steps(o.at());
      f.flash(at[0], at[1], "Material", Grid.nm(o.diameterMm()));
    }
    return f.finish();
  }

  private byte[] legend() {
    GerberFile f = file("Legend, top", FileFunctions.LEGEND_TOP, true);
    for (Stroke s : art.legend()) {
      f.draw(gerber(s.path()), "Material", Grid.nm(s.widthMm()));
    }
    return f.finish();
  }

  private byte[] profile() {
    GerberFile f = file("Profile: the edge is the centre of the line", FileFunctions.PROFILE, true);
    for (Path p : art.profile()) {
      f.draw(gerber(p), "Profile", PROFILE_PEN_NM);
    }
    return f.finish();
  }

  private byte[] drill(String what, String function, List<Holes.Tool> tools) {
    GerberFile f = file(what, function, true);
    for (Holes.Tool t : tools) {
      for (Holes.Hit h : t.hits()) {
        f.net(h.net());
        f.flash(h.x(), h.y(), t.function(), t.diameterNm());
      }
    }
    return f.finish();
  }

  private GerberFile file(String what, String function, boolean positive) {
    return new GerberFile(art, info, what, function, positive);
  }

  private static Trace gerber(Path p) {
    return Trace.of(p, Trace.GERBER_SWEEP_RAD);
  }
}
