package etchloom.write;

import etchloom.artwork.Artwork;
import etchloom.artwork.Conductor;
import etchloom.artwork.Joint;
import etchloom.artwork.Opening;
import etchloom.artwork.Stroke;
import etchloom.geometry.Grid;
import etchloom.geometry.Path;
import etchloom.geometry.Point;
import java.util.List;
import java.util.Locale;

/**
 * A picture of the board for people, seen from L1: a group for each layer, the lowest first.
 *
 * <p>SVG 1.1, millimetres, drawn y up in one flipped group; shapes and attributes only, no styles,
 * so that any viewer shows the same. Places are rounded to the micrometre: a picture, not a tool's
 * input. Copper tones lighten with depth, a scale that all kinds of colour vision tell apart.
 */
final class SvgWriter {
  private static final String BOARD = "#eceee8";
  private static final String PAGE = "#ffffff";
  private static final String BARE = "#c9b27a";
  private static final String TENTED_HOLE = "#3a2417";
  private static final String LEGEND = "#22303a";

  /** Red, green and blue of the lowest layer, the middle and L1. */
  private static final int[][] COPPER = {{214, 176, 138}, {176, 108, 66}, {112, 46, 20}};

  private final Artwork art;
  private final StringBuilder out;

  private SvgWriter(Artwork art) {
    this.art = art;
    int pieces = art.conductors().stream().mapToInt(c -> c.path().segments().size()).sum();
    out = new StringBuilder(60 * pieces + 20_000);
  }

  static byte[] write(Artwork art) {
    return new SvgWriter(art).picture();
  }

  private byte[] picture() {
    SvgFrame frame = new SvgFrame(art, out);
    frame.open();
    out.append("<g transform=\"scale(1,-1)\">\n");
    board();
    openings("mask-bottom", "Mask openings, bottom", art.maskBottom());
    for (int layer = art.layers(); layer >= 1; layer--) {
      copper(layer);
    }
    openings("mask-top", "Mask openings, top", art.maskTop());
    legend();
    holes("drill-plated", "Plated holes", Holes.plated(art));
    holes("drill-nonplated", "Non-plated holes", Holes.nonPlated(art));
    frame.datum();
    SvgPhases phases = new SvgPhases(art, out);
    phases.bands();
    out.append("</g>\n");
    phases.names();
    frame.footer();
    out.append("</svg>\n");
    return Ascii.bytes(out);
  }

  /** The colour of a copper layer, for the drawing and its key. */
  static String colour(int layer, int layers) {
    double t = layers == 1 ? 0 : (layer - 1) / (double) (layers - 1);
    // 0 at L1, 1 at the bottom; two straight stretches of colour
    int from = t > 0.5 ? 1 : 2;
    double k = t > 0.5 ? 2 * t - 1 : 2 * t;
    StringBuilder s = new StringBuilder("#");
    for (int i = 0; i < 3; i++) {
      long v = Math.round(COPPER[from][i] + k * (COPPER[from - 1][i] - COPPER[from][i]));
      s.append(v < 16 ? "0" : "").append(Long.toHexString(v));
    }
    return s.toString().toLowerCase(Locale.ROOT);
  }

  private void board() {
    group("profile", "Board");
    out.append("<path fill=\"" + BOARD + "\" fill-rule=\"evenodd\" d=\"");
    for (Path p : art.profile()) {
      data(p);
      out.append('Z');
    }
    out.append("\"/>\n</g>\n");
  }

  private void copper(int layer) {
    group("copper-L" + layer, "Copper L" + layer);
    String colour = colour(layer, art.layers());
    lines(colour);
    for (Conductor c : art.conductorsOn(layer)) {
      for (Conductor.Stretch s : c.stretches()) {
        stroke(s.path(), s.widthMm(), c.what().describe(-1));
      }
    }
    out.append("</g>\n<g fill=\"").append(colour).append("\">\n");
    for (Joint j : art.padsOn(layer)) {
      circle(j.at(), j.padMm(), j.what());
    }
    out.append("</g>\n</g>\n");
  }

  private void openings(String id, String name, List<Opening> openings) {
    group(id, name);
    out.append("<g fill=\"" + BARE + "\">\n");
    openings.forEach(o -> circle(o.at(), o.diameterMm(), o.what()));
    out.append("</g>\n</g>\n");
  }

  private void legend() {
    group("legend-top", "Legend");
    lines(LEGEND);
    for (Stroke s : art.legend()) {
      stroke(s.path(), s.widthMm(), "");
    }
    out.append("</g>\n</g>\n");
  }

  private void holes(String id, String name, List<Holes.Tool> tools) {
    group(id, name);
    for (Holes.Tool t : tools) {
      out.append("<g fill=\"").append(t.function().equals("ViaDrill") ? TENTED_HOLE : PAGE);
      out.append("\">\n");
      for (Holes.Hit h : t.hits()) {
        circle(h.x(), h.y(), t.diameterNm(), "");
      }
      out.append("</g>\n");
    }
    out.append("</g>\n");
  }

  private void group(String id, String title) {
    out.append("<g id=\"").append(id).append("\">\n<title>").append(title).append("</title>\n");
  }

  private void lines(String colour) {
    out.append("<g fill=\"none\" stroke=\"").append(colour);
    out.append("\" stroke-linecap=\"round\" stroke-linejoin=\"round\">\n");
  }

  private void stroke(Path p, double widthMm, String title) {
    out.append("<path stroke-width=\"");
    um(Grid.nm(widthMm));
    out.append("\" d=\"");
    data(p);
    out.append('"');
    end("path", title);
  }

  private void circle(Point at, double diameterMm, String title) {
    circle(Trace.steps(at.x()), Trace.steps(at.y()), Grid.nm(diameterMm), title);
  }

  private void circle(long x, long y, long diameterNm, String title) {
    out.append("<circle cx=\"");
    um(x);
    out.append("\" cy=\"");
    um(y);
    out.append("\" r=\"");
    um((diameterNm + 1) / 2);
    out.append('"');
    end("circle", title);
  }

  /** A title is what viewers show under the pointer. */
  private void end(String element, String title) {
    if (title.isEmpty()) {
      out.append("/>\n");
    } else {
      out.append("><title>").append(Ascii.xml(title)).append("</title></");
      out.append(element).append(">\n");
    }
  }

  private void data(Path p) {
    Trace t = Trace.of(p, Trace.SVG_SWEEP_RAD);
    out.append('M');
    point(t.x(), t.y());
    long x = t.x();
    long y = t.y();
    for (Trace.Step s : t.steps()) {
      if (s.arc()) {
        double dx = x - s.cx();
        double dy = y - s.cy();
        long radius = Math.round(Math.sqrt(dx * dx + dy * dy));
        out.append('A');
        point(radius, radius);
        // Counter-clockwise is the positive sweep, since the drawing is flipped.
        out.append(s.turn() > 0 ? " 0 0 1 " : " 0 0 0 ");
      } else {
        out.append('L');
      }
      point(s.x(), s.y());
      x = s.x();
      y = s.y();
    }
  }

  private void point(long x, long y) {
    um(x);
    out.append(' ');
    um(y);
  }

  private void um(long nm) {
    Numbers.fixed(out, Numbers.micrometres(nm), 3);
  }
}
