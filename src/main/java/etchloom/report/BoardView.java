package etchloom.report;

import etchloom.artwork.Coil;
import etchloom.artwork.Stackup;
import etchloom.geometry.Point;
import etchloom.units.Numbers;
import java.util.List;
import java.util.Locale;

/**
 * The board's picture with what the page adds to it: places to point at for each coil, findings,
 * buttons, and the cross-section whose copper bars switch the layers. Without the page's script it
 * is a plain picture.
 */
final class BoardView {
  private static final String COPPER = "#b06a34";

  /** Share of a coil's sector that is pointed at. */
  private static final double COVER = 0.96;

  private final Html h;
  private final Results r;
  private final String svg;

  /**
   * @param svg the element as the set's picture has it
   */
  BoardView(Html h, Results r, String svg) {
    this.h = h;
    this.r = r;
    this.svg = svg;
  }

  void write() {
    h.open("figure", "id=\"board\"", "class=\"board\"");
    h.open("div", "class=\"viewer\"");
    h.open(
        "div",
        "class=\"sheet view\"",
        "role=\"group\"",
        "aria-label=\"The board seen from L1. Plus and minus zoom, arrow keys move, 0 shows all;"
            + " the coils table says the same in words.\"");
    h.raw(picture());
    h.open("div", "class=\"scalebar\"", "aria-hidden=\"true\"").open("i").close("i");
    h.open("span").close("span").close("div");
    h.close("div");
    tools();
    h.element(
        "p",
        "Point at a coil, or step from coil to coil with the arrow keys, to read its data here.",
        "class=\"said\"",
        "role=\"status\"");
    h.close("div");
    stack(r.artwork().stackup());
    h.element(
        "figcaption",
        "The board seen from L1, the face that looks at the rotor; the set holds the same picture"
            + " as a file. Coil 1 stands at 0\u00b0, the datum. The band inside each coil shows its"
            + " phase by dashes and mark, with a minus where the current is reversed."
            + " Cross-section not to scale.");
    h.close("figure");
  }

  /** What the set's picture holds is for the eye; what is added can be reached. */
  private String picture() {
    int open = svg.indexOf('>') + 1;
    int close = svg.lastIndexOf("</svg>");
    if (close < open) {
      return svg;
    }
    StringBuilder b = new StringBuilder(svg.length() + 20_000);
    b.append(svg, 0, open).append("<g aria-hidden=\"true\">").append(svg, open, close);
    b.append("</g>\n");
    coils(b);
    BoardMarks.draw(b, BoardMarks.of(r), r.spec().board().diameterMm() / 600);
    return b.append(svg, close, svg.length()).toString();
  }

  private void coils(StringBuilder b) {
    double inner = 0.97 * r.spec().coil().innerRadiusMm();
    double outer = 1.02 * r.spec().coil().outerRadiusMm();
    List<Coil> coils = r.artwork().coils();
    double half = COVER * Math.PI / Math.max(2, coils.size());
    b.append("<g id=\"coils\" role=\"group\" aria-label=\"Coils\">\n");
    for (Coil c : coils) {
      b.append("<path data-coil=\"").append(c.number()).append("\" d=\"M");
      point(b, inner, c.axisRad() - half);
      b.append('L');
      point(b, outer, c.axisRad() - half);
      arc(b, outer, c.axisRad() + half, 0);
      b.append('L');
      point(b, inner, c.axisRad() + half);
      arc(b, inner, c.axisRad() - half, 1);
      b.append("Z\"/>\n");
    }
    b.append("</g>\n");
  }

  private static void arc(StringBuilder b, double radius, double toRad, int sweep) {
    b.append('A').append(n(radius)).append(' ').append(n(radius)).append(" 0 0 ");
    b.append(sweep).append(' ');
    point(b, radius, toRad);
  }

  private static void point(StringBuilder b, double radius, double rad) {
    Point p = Point.polar(radius, rad);
    b.append(n(p.x())).append(' ').append(n(-p.y()));
  }

  private static String n(double v) {
    return Numbers.trimmed(v, 3);
  }

  private void tools() {
    h.open("div", "class=\"tools\"", "role=\"group\"", "aria-label=\"Zoom and move\"");
    tool("in", "+", "Zoom in");
    tool("out", "\u2212", "Zoom out");
    tool("all", "0", "Whole board");
    tool("left", "\u2190", "Move left");
    tool("up", "\u2191", "Move up");
    tool("down", "\u2193", "Move down");
    tool("right", "\u2192", "Move right");
    h.element(
        "button",
        "Findings: shown",
        "type=\"button\"",
        "class=\"findings\"",
        "aria-pressed=\"true\"",
        "disabled=\"disabled\"");
    h.close("div");
  }

  private void tool(String what, String sign, String name) {
    h.element(
        "button",
        sign,
        "type=\"button\"",
        "data-do=\"" + what + "\"",
        "aria-label=\"" + name + "\"",
        "title=\"" + name + "\"",
        "disabled=\"disabled\"");
  }

  private void stack(Stackup s) {
    h.open("div", "class=\"stack\"", "role=\"group\"", "aria-label=\"Layers\"");
    h.element("p", "Cross-section: press a copper bar to show, fade or hide its layer.");
    for (int i = 0; i < s.layers(); i++) {
      bar(i + 1, s.copper().get(i));
      if (i < s.layers() - 1) {
        double mm = s.dielectricMm().get(i);
        h.element("div", "dielectric " + OrderLines.mm(mm), "class=\"core " + thickness(mm) + "\"");
      }
    }
    h.close("div");
  }

  private void bar(int layer, Stackup.Copper c) {
    String um = Words.symbols(OrderLines.um(c.thicknessMm()));
    h.open(
        "button",
        "type=\"button\"",
        "class=\"bar\"",
        "data-layer=\"" + layer + "\"",
        "aria-pressed=\"true\"",
        "disabled=\"disabled\"");
    h.raw("<svg viewBox=\"0 0 100 8\" preserveAspectRatio=\"none\" aria-hidden=\"true\">");
    h.raw("<path fill=\"" + colour(layer) + "\" d=\"M0 0H100V8H0Z\"/></svg>");
    h.element("span", "L" + layer, "class=\"name\"").text(" ").element("span", um).text(" ");
    h.element("span", "shown", "class=\"state\"").close("button");
  }

  private static String thickness(double mm) {
    return mm < 0.25 ? "thin" : mm < 0.6 ? "middle" : "thick";
  }

  /** The layer's colour in the picture. */
  private String colour(int layer) {
    String mark = "stroke=\"#";
    int group = svg.indexOf(String.format(Locale.ROOT, "id=\"copper-L%d\"", layer));
    int at = group < 0 ? -1 : svg.indexOf(mark, group);
    return at < 0 ? COPPER : svg.substring(at + mark.length() - 1, at + mark.length() + 6);
  }
}
