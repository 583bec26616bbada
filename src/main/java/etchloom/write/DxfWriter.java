package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Opening;
import etchloom.artwork.Stroke;
import etchloom.geometry.Grid;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import etchloom.write.outline.Outline;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/** The artwork as DXF: once as centre lines with a width, once as closed outlines of the copper. */
final class DxfWriter {
  private static final String PLATED = "DRILL_PLATED";
  private static final String NON_PLATED = "DRILL_NONPLATED";
  private static final String PROFILE = "PROFILE";
  private static final String MASK_TOP = "MASK_TOP";
  private static final String MASK_BOTTOM = "MASK_BOTTOM";
  private static final String LEGEND_TOP = "LEGEND_TOP";

  /** Indices of the format's colour table that differ well in lightness, for copper in turn. */
  private static final int[] COPPER_COLOURS = {30, 4, 2, 5, 6, 140, 40, 3};

  /** About how many characters a piece of a path takes, for the buffer's first size. */
  private static final int PER_PIECE = 90;

  private final Artwork art;
  private final DxfFile dxf;

  private DxfWriter(Artwork art, boolean masks) {
    this.art = art;
    int pieces = art.conductors().stream().mapToInt(c -> c.path().segments().size()).sum();
    dxf =
        new DxfFile(
            layers(art.layers(), masks),
            Box.of(art.profile().get(0)),
            (masks ? 1 : 2) * PER_PIECE * pieces + 20_000);
  }

  private static List<DxfFile.Layer> layers(int copper, boolean masks) {
    List<DxfFile.Layer> out = new ArrayList<>();
    for (int i = 1; i <= copper; i++) {
      out.add(new DxfFile.Layer(copper(i), COPPER_COLOURS[(i - 1) % COPPER_COLOURS.length]));
    }
    out.add(new DxfFile.Layer(PLATED, 8));
    out.add(new DxfFile.Layer(NON_PLATED, 9));
    out.add(new DxfFile.Layer(PROFILE, 7));
    if (masks) {
      out.add(new DxfFile.Layer(MASK_TOP, 94));
      out.add(new DxfFile.Layer(MASK_BOTTOM, 96));
      out.add(new DxfFile.Layer(LEGEND_TOP, 7));
    }
    return out;
  }

  /** Centre lines with width, pads, holes, profile, mask openings, legend. */
  static byte[] lines(Artwork art) {
    DxfWriter w = new DxfWriter(art, true);
    for (int layer = 1; layer <= art.layers(); layer++) {
      for (Conductor c : art.conductorsOn(layer)) {
        w.dxf.polyline(copper(layer), bulges(c.path()), false, Grid.nm(c.widthMm()));
      }
      for (Joint j : art.padsOn(layer)) {
        w.circle(copper(layer), j.at(), j.padMm());
      }
    }
    w.holesAndProfile();
    for (Opening o : art.maskTop()) {
      w.circle(MASK_TOP, o.at(), o.diameterMm());
    }
    for (Opening o : art.maskBottom()) {
      w.circle(MASK_BOTTOM, o.at(), o.diameterMm());
    }
    for (Stroke s : art.legend()) {
      w.dxf.polyline(LEGEND_TOP, bulges(s.path()), false, Grid.nm(s.widthMm()));
    }
    return w.dxf.finish();
  }

  /**
   * Each layer's copper as closed outlines that neither cross nor touch: outer ones
   * counter-clockwise, holes clockwise, so that the sum of their signed areas is the copper's.
   */
  static byte[] outlines(Artwork art) {
    DxfWriter w = new DxfWriter(art, false);
    List<List<Path>> outlines =
        IntStream.rangeClosed(1, art.layers())
            .parallel()
            .mapToObj(layer -> Outline.of(art, layer))
            .toList();
    for (int layer = 1; layer <= art.layers(); layer++) {
      for (Path p : outlines.get(layer - 1)) {
        w.dxf.polyline(copper(layer), bulges(p), true, 0);
      }
    }
    w.holesAndProfile();
    return w.dxf.finish();
  }

  private void holesAndProfile() {
    holes(PLATED, Holes.plated(art));
    holes(NON_PLATED, Holes.nonPlated(art));
    for (Path p : art.profile()) {
      dxf.polyline(PROFILE, bulges(p), p.closed(), 0);
    }
  }

  private void holes(String layer, List<Holes.Tool> tools) {
    for (Holes.Tool t : tools) {
      for (Holes.Hit h : t.hits()) {
        dxf.circle(layer, h.x(), h.y(), t.diameterNm());
      }
    }
  }

  private void circle(String layer, Point at, double diameterMm) {
    dxf.circle(layer, Trace.steps(at.x()), Trace.steps(at.y()), Grid.nm(diameterMm));
  }

  private static Trace bulges(Path p) {
    return Trace.of(p, Trace.BULGE_SWEEP_RAD);
  }

  private static String copper(int layer) {
    return "COPPER_L" + layer;
  }
}
